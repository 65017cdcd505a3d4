package eddyledger.ledger;

import static eddyledger.ledger.SampleVehicle.DRIVER;
import static eddyledger.ledger.SampleVehicle.FLIGHT;
import static eddyledger.ledger.SampleVehicle.PASSENGER;
import static eddyledger.ledger.SampleVehicle.ROAD;
import static eddyledger.ledger.SampleVehicle.TRUNK_EAR;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import eddyledger.check.Severity;
import eddyledger.model.Allowance;
import eddyledger.model.ByCondition;
import eddyledger.model.Construction;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.Extras;
import eddyledger.model.Judged;
import eddyledger.model.Vehicle;
import eddyledger.model.Zone;
import eddyledger.quantity.BandSpectrum;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** A fault stops what it concerns, is told of everywhere above, and leaves the rest to the bit. */
class StatusTest {
  private static final Vehicle SAMPLE = SampleVehicle.vehicle();
  private static final Ledger WHOLE = Ledger.of(SAMPLE);

  @Test
  void aPanelWithoutZoneIsMissing() {
    Ledger ledger = Ledger.of(Edits.settings(SAMPLE, "tail", it -> it.zone(null)));
    LedgerRow tail = Sheets.row(ledger, ROAD, TRUNK_EAR, "tail");
    assertThat(tail.status()).isEqualTo(Status.MISSING);
    assertThat(tail.reason()).contains("tree[2].zone (tail)", "has no zone");
    assertThat(tail.meanSquares()).isEqualTo(BandSpectrum.constant(Double.NaN));
    assertThat(tail.levelA()).isNaN();
    assertPartialAbove(ledger, Set.of("tail"), Set.of("sample"), "tail: ");
    Trace trace = ledger.trace("tail", ROAD, TRUNK_EAR).orElseThrow();
    assertThat(trace.hasValue()).isFalse();
    assertThat(trace.steps()).isEmpty();
    assertThat(trace.status()).isEqualTo(Status.MISSING);
    assertThat(trace.reason()).isEqualTo(tail.reason());
  }

  @Test
  void aPanelOfAnAbsurdConstructionFails() {
    List<Construction> constructions = new ArrayList<>(SAMPLE.constructions());
    constructions.add(SampleTree.plate("absurd", 3.0, 70.0e9, 2500.0, 0.23, null, null));
    Vehicle vehicle = Edits.with(SAMPLE, it -> it.constructions(constructions));
    Ledger ledger = Ledger.of(Edits.settings(vehicle, "floor", it -> it.construction("absurd")));
    LedgerRow floor = Sheets.row(ledger, FLIGHT, DRIVER, "floor");
    assertThat(floor.status()).isEqualTo(Status.FAILED);
    assertThat(floor.reason())
        .contains("constructions[3].thickness_m (absurd)", "thickness of 3 m");
    assertPartialAbove(ledger, Set.of("floor"), Set.of("body", "sample"), "floor: ");
    assertThat(Sheets.row(ledger, FLIGHT, DRIVER, "sample").reason()).startsWith("body: floor: ");
  }

  @Test
  void aLocalFlowBeyondStagnationStopsItsPanel() {
    EdgeSpeed still =
        new EdgeSpeed(
            EdgeSpeed.Way.PRESSURE_COEFFICIENT_INCOMPRESSIBLE, Judged.of(1.0), Extras.NONE);
    Ledger ledger =
        Ledger.of(
            Edits.settings(SAMPLE, "side-glass", it -> it.localSpeed(ByCondition.always(still))));
    LedgerRow row = Sheets.row(ledger, ROAD, DRIVER, "side-glass");
    assertThat(row.status()).isEqualTo(Status.FAILED);
    assertThat(row.reason()).contains("pressure coefficient", "stagnation");
    assertPartialAbove(ledger, Set.of("side-glass"), Set.of("sides", "body", "sample"), "side-");
    assertThat(ledger.findings())
        .filteredOn(finding -> finding.code().equals("not-computed"))
        .hasSize(2)
        .allSatisfy(
            finding -> {
              assertThat(finding.severity()).isEqualTo(Severity.ERROR);
              assertThat(finding.where()).isEqualTo("tree[0].children[0].children[0] (side-glass)");
              assertThat(finding.what()).contains("stagnation");
            });
  }

  @Test
  void aPanelMayFailInOneConditionOnly() {
    EdgeSpeed vacuum =
        new EdgeSpeed(EdgeSpeed.Way.PRESSURE_COEFFICIENT, Judged.of(-5.0), Extras.NONE);
    Ledger ledger =
        Ledger.of(Edits.settings(SAMPLE, "tail", it -> it.localSpeed(ByCondition.always(vacuum))));
    assertThat(Sheets.row(ledger, FLIGHT, DRIVER, "tail").status()).isEqualTo(Status.FAILED);
    assertThat(Sheets.row(ledger, FLIGHT, DRIVER, "tail").reason()).contains("vacuum");
    assertThat(Sheets.row(ledger, ROAD, DRIVER, "tail").status()).isEqualTo(Status.OK);
    assertThat(Sheets.row(ledger, ROAD, DRIVER, "sample").status()).isEqualTo(Status.OK);
  }

  @Test
  void aZoneWithoutAbsorptionStopsEveryPanelButNoOtherSource() {
    Vehicle vehicle =
        Edits.zone(SAMPLE, "rear", zone -> new Zone("rear", "rear", 2.4, 11.0, null, Extras.NONE));
    Ledger ledger = Ledger.of(vehicle);
    for (ReceiverSheet sheet : ledger.sheets()) {
      for (LedgerRow row : sheet.rows()) {
        if (row.kind() == RowKind.PANEL) {
          assertThat(row.status()).isEqualTo(Status.FAILED);
          assertThat(row.reason()).contains("zones[1].absorption_area_m2 (rear)", "missing");
        }
      }
      assertThat(sheet.total().status()).isNotEqualTo(Status.OK);
      assertThat(sheet.total().reason()).contains("zones[1]");
    }
    LedgerRow tyres = Sheets.row(ledger, ROAD, DRIVER, "tyres");
    assertThat(tyres).isEqualTo(Sheets.row(WHOLE, ROAD, DRIVER, "tyres"));
    assertThat(Sheets.row(ledger, ROAD, DRIVER, "sample").status()).isEqualTo(Status.PARTIAL);
    LedgerRow alone = Sheets.row(ledger, ROAD, PASSENGER, "sample");
    assertThat(alone.levelA()).isNaN();
    assertThat(alone.status()).isEqualTo(Status.FAILED);
  }

  @Test
  void aSumOfWhichNothingWasEnteredIsMissing() {
    Vehicle vehicle =
        Edits.panels(SAMPLE, panel -> panel.id().equals("floor") ? List.of(panel) : List.of());
    Ledger ledger = Ledger.of(Edits.settings(vehicle, "floor", it -> it.size(null, 0.2)));
    LedgerRow total = Sheets.row(ledger, ROAD, PASSENGER, "sample");
    assertThat(total.status()).isEqualTo(Status.MISSING);
    assertThat(total.levelA()).isNaN();
    assertThat(total.reason()).contains("floor", "length along the flow");
  }

  @ParameterizedTest
  @EnumSource(SettingsFault.class)
  void aFaultThatNoLevelDependsOnStopsNoPanel(SettingsFault fault) {
    Ledger ledger = Ledger.of(fault.in(SAMPLE));
    assertThat(ledger.findings()).anyMatch(finding -> finding.severity() == Severity.ERROR);
    Sheets.assertSameBits(ledger, WHOLE, fault.toString());
  }

  /** Errors of the description that concern no number of the computation. */
  enum SettingsFault {
    ALLOWANCE {
      @Override
      Vehicle in(Vehicle vehicle) {
        Allowance loud = SampleVehicle.allowance("side-glass", DRIVER, ROAD, 900.0);
        Allowance nowhere = SampleVehicle.allowance("body", "nobody", ROAD, 60.0);
        return Edits.with(vehicle, it -> it.allowances(List.of(loud, nowhere)));
      }
    },
    SUPPLIER {
      @Override
      Vehicle in(Vehicle vehicle) {
        return Edits.settings(vehicle, "floor", it -> it.supplier("nobody"));
      }
    };

    abstract Vehicle in(Vehicle vehicle);
  }

  @Test
  void anEmptySectionIsSilentAndWhole() {
    for (ReceiverSheet sheet : WHOLE.sheets()) {
      LedgerRow empty = sheet.row("empty-bay", Way.ALL).orElseThrow();
      assertThat(empty.status()).isEqualTo(Status.OK);
      assertThat(empty.reason()).isEmpty();
      assertThat(empty.meanSquares()).isEqualTo(BandSpectrum.constant(0.0));
      assertThat(empty.level()).isEqualTo(Double.NEGATIVE_INFINITY);
      for (LedgerRow row : sheet.rows()) {
        assertThat(row.meanSquares().complete()).as(row.id()).isTrue();
        assertThat(row.levelA()).as(row.id()).isNotNaN();
      }
    }
  }

  @Test
  void aVehicleOfWhichNothingCanBeComputedIsRefusedWithReasons() {
    Vehicle empty = Edits.with(SAMPLE, it -> it.tree(List.of()).conditions(List.of()));
    assertThatThrownBy(() -> Ledger.of(empty))
        .isInstanceOfSatisfying(
            UnusableVehicle.class,
            refused ->
                assertThat(refused.findings().stream().map(finding -> finding.code()))
                    .contains("empty-vehicle", "no-condition"));
  }

  /** The sums above say what is missing; every other row is what it was, to the bit. */
  private static void assertPartialAbove(
      Ledger ledger, Set<String> stopped, Set<String> above, String reason) {
    for (ReceiverSheet sheet : ledger.sheets()) {
      for (String id : above) {
        LedgerRow sum = sheet.row(id, Way.ALL).orElseThrow();
        assertThat(sum.status()).as(id).isEqualTo(Status.PARTIAL);
        assertThat(sum.reason()).as(id).contains(reason);
      }
    }
    Sheets.assertSameBits(
        ledger,
        WHOLE,
        row -> !stopped.contains(row.id()) && !above.contains(row.id()),
        "beside " + stopped);
  }
}
