package eddyledger.ledger;

import static eddyledger.ledger.SampleVehicle.DRIVER;
import static eddyledger.ledger.SampleVehicle.FLIGHT;
import static eddyledger.ledger.SampleVehicle.ROAD;
import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.model.AirGiven;
import eddyledger.model.ByCondition;
import eddyledger.model.Node;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Section;
import eddyledger.model.Vehicle;
import eddyledger.model.WallPressureChoice;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** What a run has to say beyond the check of the description. */
class RunFindingsTest {
  private static final Vehicle SAMPLE = SampleVehicle.vehicle();

  @Test
  void aModelOutsideItsRangeIsToldOnceForAllPanels() {
    List<Finding> mach =
        found(SAMPLE, "out-of-range").stream()
            .filter(it -> it.what().contains("Goody is used at edge Mach number"))
            .toList();
    // all panels but the roof, which has another spectrum, and in flight only
    assertThat(mach).hasSize(1);
    Finding finding = mach.get(0);
    assertThat(finding.severity()).isEqualTo(Severity.WARNING);
    assertThat(finding.subject()).isEqualTo("side-glass");
    assertThat(finding.what()).contains("\"flight\"", "its range is 0 to 0.3", "4 more panels");
  }

  @Test
  void onePanelMoreIsOnePanel() {
    assertThat(found(SAMPLE, "out-of-range"))
        .filteredOn(it -> it.what().contains("more panel"))
        .anyMatch(it -> it.what().contains("(and 1 more panel alike)"))
        .noneMatch(it -> it.what().contains("1 more panels"));
  }

  @Test
  void bandsBelowTheSchroederFrequencyAreNoted() {
    List<Finding> notes = found(SAMPLE, "schroeder");
    assertThat(notes.stream().map(Finding::subject)).containsExactly("front", "rear");
    assertThat(notes).allMatch(it -> it.severity() == Severity.NOTE);
    assertThat(notes.get(0).what()).contains("Schroeder frequency", "Hz");
  }

  @Test
  void anUnknownSpectrumStopsItsPanelsAndSuggestsTheNearest() {
    Vehicle vehicle = Edits.settings(SAMPLE, "tail", it -> it.wallPressure(unknown("goodi")));
    Ledger ledger = Ledger.of(vehicle);
    List<Finding> findings = found(vehicle, "not-computed");
    assertThat(findings).hasSize(2);
    for (Finding finding : findings) {
      assertThat(finding.severity()).isEqualTo(Severity.ERROR);
      assertThat(finding.where()).isEqualTo("tree[2] (tail)");
      assertThat(finding.what()).contains("no wall-pressure spectrum \"goodi\"");
      assertThat(finding.remedy()).contains("Did you mean \"goody\"?");
    }
    Sheets.assertSameBits(
        ledger,
        Ledger.of(SAMPLE),
        row -> !row.id().equals("tail") && row.kind() != RowKind.TOTAL,
        "beside tail");
    assertThat(Sheets.row(ledger, ROAD, DRIVER, "tail").status()).isEqualTo(Status.FAILED);
    assertThat(Sheets.row(ledger, ROAD, DRIVER, "sample").status()).isEqualTo(Status.PARTIAL);
  }

  @Test
  void anUnknownSpectrumIsSuggestedForWhereverItIsSet() {
    // on a section, for one condition, on computed and measured panels alike
    List<Node> tree = new ArrayList<>(SAMPLE.tree());
    Section aft = (Section) tree.get(1);
    tree.set(
        1,
        new Section(
            aft.id(),
            aft.name(),
            aft.settings()
                .edit()
                .wallPressure(
                    new ByCondition<>(null, Map.of(FLIGHT, WallPressureChoice.of("efimtsof"))))
                .build(),
            aft.children(),
            aft.extras()));
    Vehicle vehicle =
        Edits.settings(
            Edits.with(SAMPLE, it -> it.tree(tree)), "roof", it -> it.wallPressure(null));
    List<Finding> findings = found(vehicle, "not-computed");
    assertThat(findings.stream().map(Finding::subject)).containsExactly("roof", "hatch");
    assertThat(findings).allMatch(it -> it.remedy().contains("Did you mean \"efimtsov\"?"));
    assertThat(Sheets.row(Ledger.of(vehicle), ROAD, DRIVER, "aft").status()).isEqualTo(Status.OK);
  }

  @Test
  void cabinAirTakenFromAThinOutsideIsWarnedOf() {
    OperatingCondition flight = SAMPLE.conditions().get(1);
    OperatingCondition open =
        SampleVehicle.condition(FLIGHT, null, flight.mach(), flight.outsideAir(), null);
    OperatingCondition road =
        SampleVehicle.condition(ROAD, 38.0, null, AirGiven.of(283.15, 100_400.0), null);
    Vehicle vehicle = Edits.with(SAMPLE, it -> it.conditions(List.of(road, open)));
    List<Finding> findings = found(vehicle, "cabin-air");
    assertThat(findings).hasSize(1);
    assertThat(findings.get(0).where()).isEqualTo("conditions[1].cabin_air (flight)");
    assertThat(findings.get(0).severity()).isEqualTo(Severity.WARNING);
  }

  @Test
  void directSoundThatCannotBeCountedIsWarnedOf() {
    Vehicle vehicle =
        Edits.zone(
            SAMPLE,
            "front",
            zone -> SampleVehicle.zone("front", 3.0, null, zone.absorptionArea().base()));
    assertThat(found(SAMPLE, "no-direct-sound")).isEmpty();
    assertThat(found(vehicle, "no-direct-sound"))
        .hasSize(1)
        .allMatch(it -> it.where().equals("receivers[0].direct[0] (driver)"));
  }

  @Test
  void aZoneThatAbsorbsMoreThanFallsOnItIsWarnedOfAndStopsNothing() {
    Vehicle vehicle =
        Edits.zone(
            SAMPLE,
            "front",
            zone -> SampleVehicle.zone("front", 3.0, 2.5, zone.absorptionArea().base()));
    Ledger ledger = Ledger.of(vehicle);
    assertThat(found(vehicle, "absorption-above-surface"))
        .hasSize(1)
        .allMatch(it -> it.severity() == Severity.WARNING)
        .allMatch(it -> it.where().equals("zones[0] (front)"));
    LedgerRow glass = Sheets.row(ledger, ROAD, DRIVER, "side-glass");
    assertThat(glass.status()).isEqualTo(Status.OK);
    assertThat(glass.levelA()).isNotNaN();
    assertThat(found(SAMPLE, "absorption-above-surface")).isEmpty();
  }

  private static List<Finding> found(Vehicle vehicle, String code) {
    return Ledger.of(vehicle).findings().stream().filter(it -> it.code().equals(code)).toList();
  }

  private static ByCondition<WallPressureChoice> unknown(String id) {
    return ByCondition.always(WallPressureChoice.of(id));
  }
}
