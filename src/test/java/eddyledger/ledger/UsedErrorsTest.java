package eddyledger.ledger;

import static eddyledger.ledger.SampleVehicle.DRIVER;
import static eddyledger.ledger.SampleVehicle.FLIGHT;
import static eddyledger.ledger.SampleVehicle.ROAD;
import static eddyledger.ledger.SampleVehicle.single;
import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.model.ByCondition;
import eddyledger.model.CrossSpectrumChoice;
import eddyledger.model.CrossSpectrumChoice.Rule;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.Extras;
import eddyledger.model.Judged;
import eddyledger.model.Node;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Section;
import eddyledger.model.SettingsBuilder;
import eddyledger.model.Vehicle;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Consumer;
import org.junit.jupiter.api.Test;

/** A faulty setting stops the panels that are computed with it, and no other. */
class UsedErrorsTest {
  private static final Vehicle SAMPLE = SampleVehicle.vehicle();

  @Test
  void aSectionsFaultyValueStopsOnlyThePanelsThatTakeIt() {
    // the glass panes take zone and boundary layer from the section, and keep their own damping
    Vehicle vehicle = SAMPLE;
    for (String glass : List.of("side-glass", "quarter-glass")) {
      vehicle =
          Edits.settings(vehicle, glass, it -> it.lossFactor(ByCondition.always(single(0.05))));
    }
    Vehicle faulty = section(vehicle, "body", it -> it.lossFactor(ByCondition.always(single(5.0))));
    assertStopped(vehicle, faulty, Set.of("floor"), ROAD, FLIGHT);
    LedgerRow floor = Sheets.row(Ledger.of(faulty), ROAD, DRIVER, "floor");
    assertThat(floor.status()).isEqualTo(Status.FAILED);
    assertThat(floor.reason()).startsWith("tree[0].loss_factor (body): ");
  }

  @Test
  void anOverrideThatIsFaultyStopsItsConditionOnly() {
    ByCondition<EdgeSpeed> speeds =
        new ByCondition<>(EdgeSpeed.ratio(1.0), Map.of(FLIGHT, EdgeSpeed.ratio(90.0)));
    assertStopped(
        SAMPLE,
        Edits.settings(SAMPLE, "tail", it -> it.localSpeed(speeds)),
        Set.of("tail"),
        FLIGHT);
    ByCondition<EdgeSpeed> other =
        new ByCondition<>(EdgeSpeed.ratio(90.0), Map.of(FLIGHT, EdgeSpeed.ratio(1.0)));
    assertStopped(
        SAMPLE, Edits.settings(SAMPLE, "tail", it -> it.localSpeed(other)), Set.of("tail"), ROAD);
  }

  @Test
  void anOverrideForNoConditionStopsWhateverMayBeMeant() {
    ByCondition<EdgeSpeed> slip =
        new ByCondition<>(
            EdgeSpeed.ratio(1.0),
            Map.of(ROAD, EdgeSpeed.ratio(1.0), "fligth", EdgeSpeed.ratio(1.0)));
    assertStopped(
        SAMPLE, Edits.settings(SAMPLE, "tail", it -> it.localSpeed(slip)), Set.of("tail"), FLIGHT);
  }

  @Test
  void conditionsWhoseIdsBeginAlikeAreToldApart() {
    OperatingCondition road = SAMPLE.conditions().get(0);
    OperatingCondition wet =
        SampleVehicle.condition(
            "road.2", road.speed(), road.mach(), road.outsideAir(), road.cabinAir());
    List<OperatingCondition> three = new ArrayList<>(SAMPLE.conditions());
    three.add(wet);
    Vehicle sample = Edits.with(SAMPLE, it -> it.conditions(three));
    Map<String, EdgeSpeed> overrides =
        Map.of(ROAD, EdgeSpeed.ratio(1.0), "road.2", EdgeSpeed.ratio(90.0));
    Vehicle faulty =
        Edits.settings(
            sample,
            "tail",
            it -> it.localSpeed(new ByCondition<>(EdgeSpeed.ratio(1.0), overrides)));
    assertStopped(sample, faulty, Set.of("tail"), "road.2");
  }

  @Test
  void aVehiclesFaultyDefaultSparesThePanelsThatChooseForThemselves() {
    CrossSpectrumChoice absurd = SampleTree.orders(9, 1, Rule.HALF_POWER_WIDTH);
    Vehicle faulty =
        Edits.with(
            SAMPLE,
            it ->
                it.settings(
                    SAMPLE.settings().edit().crossSpectrum(ByCondition.always(absurd)).build()));
    // quarter glass and tail choose their own orders, and the hatch is measured
    assertStopped(SAMPLE, faulty, Set.of("side-glass", "floor", "roof"), ROAD, FLIGHT);
  }

  @Test
  void aMeasuredPanelIsSparedByWhatAMeasurementReplaces() {
    Vehicle faulty = section(SAMPLE, "aft", it -> it.construction("absent").layUp("absent"));
    assertStopped(SAMPLE, faulty, Set.of("roof"), ROAD, FLIGHT);
  }

  @Test
  void aPanelStoppedByItsPhysicsIsToldEvenIfItHasAnErrorElsewhere() {
    EdgeSpeed vacuum =
        new EdgeSpeed(EdgeSpeed.Way.PRESSURE_COEFFICIENT, Judged.of(-5.0), Extras.NONE);
    ByCondition<EdgeSpeed> speeds = new ByCondition<>(vacuum, Map.of(ROAD, EdgeSpeed.ratio(90.0)));
    Vehicle faulty = Edits.settings(SAMPLE, "tail", it -> it.localSpeed(speeds));
    assertThat(Ledger.of(faulty).findings())
        .filteredOn(finding -> finding.code().equals("not-computed"))
        .singleElement()
        .extracting(Finding::what)
        .asString()
        .contains("\"flight\"", "vacuum");
  }

  private static Vehicle section(Vehicle vehicle, String id, Consumer<SettingsBuilder> change) {
    List<Node> tree = new ArrayList<>(vehicle.tree());
    tree.replaceAll(
        node -> {
          if (!node.id().equals(id)) {
            return node;
          }
          Section section = (Section) node;
          SettingsBuilder settings = section.settings().edit();
          change.accept(settings);
          return new Section(
              section.id(), section.name(), settings.build(), section.children(), section.extras());
        });
    return Edits.with(vehicle, it -> it.tree(tree));
  }

  /** In these conditions these panels have no level; every other row of a panel has its bits. */
  private static void assertStopped(
      Vehicle sound, Vehicle faulty, Set<String> stopped, String... conditions) {
    Ledger before = Ledger.of(sound);
    Ledger after = Ledger.of(faulty);
    assertThat(after.findings()).anyMatch(finding -> finding.severity() == Severity.ERROR);
    for (ReceiverSheet sheet : after.sheets()) {
      ReceiverSheet whole = Sheets.sheet(before, sheet.condition().id(), sheet.receiver().id());
      boolean concerned = List.of(conditions).contains(sheet.condition().id());
      for (LedgerRow row : sheet.rows()) {
        if (row.kind() != RowKind.PANEL) {
          continue;
        }
        String what = row.id() + " of " + sheet.title();
        if (concerned && stopped.contains(row.id())) {
          assertThat(row.status()).as(what).isIn(Status.FAILED, Status.MISSING);
        } else {
          assertThat(row.status()).as(what).isEqualTo(Status.OK);
          assertThat(row.meanSquares())
              .as(what)
              .isEqualTo(whole.row(row.id(), row.way()).orElseThrow().meanSquares());
        }
      }
      assertThat(sheet.total().status()).isEqualTo(concerned ? Status.PARTIAL : Status.OK);
    }
  }
}
