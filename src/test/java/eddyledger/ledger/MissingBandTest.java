package eddyledger.ledger;

import static eddyledger.ledger.SampleVehicle.DRIVER;
import static eddyledger.ledger.SampleVehicle.FLIGHT;
import static eddyledger.ledger.SampleVehicle.PASSENGER;
import static eddyledger.ledger.SampleVehicle.ROAD;
import static eddyledger.ledger.SampleVehicle.TRUNK_EAR;
import static eddyledger.ledger.SampleVehicle.without;
import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.model.ByCondition;
import eddyledger.model.Extras;
import eddyledger.model.LayUp;
import eddyledger.model.MeasuredPanel;
import eddyledger.model.OtherSource;
import eddyledger.model.Panel;
import eddyledger.model.PassRule;
import eddyledger.model.Rating;
import eddyledger.model.Target;
import eddyledger.model.Vehicle;
import eddyledger.quantity.Bands;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * A band that was not entered makes a level unavailable or a lower bound, never quietly smaller.
 */
class MissingBandTest {
  private static final Vehicle SAMPLE = SampleVehicle.vehicle();
  private static final Ledger WHOLE = Ledger.of(SAMPLE);

  @ParameterizedTest
  @ValueSource(strings = {"25", "1000", "12500"})
  void aBandOfAnInsertionLoss(String band) {
    List<LayUp> layUps = List.of(SampleTree.layUp("carpet", without(5.0, band)));
    List<LayUp> all = new ArrayList<>(layUps);
    all.add(SAMPLE.layUps().get(1));
    Ledger ledger = Ledger.of(Edits.with(SAMPLE, it -> it.layUps(all)));
    assertLeafUnavailable(ledger, FLIGHT, DRIVER, "floor", band);
    for (String above : List.of("body", "sample")) {
      LedgerRow sum = Sheets.row(ledger, FLIGHT, DRIVER, above);
      assertThat(sum.status()).isEqualTo(Status.PARTIAL);
      assertThat(sum.reason()).contains("floor: no value at " + band + " Hz");
    }
    Sheets.assertSameBits(ledger, WHOLE, row -> row.id().equals("aft"), "beside");
  }

  @Test
  void aBandOfALossFactorStopsThePanel() {
    Vehicle vehicle =
        Edits.settings(
            SAMPLE, "tail", it -> it.lossFactor(ByCondition.always(without(0.02, "500"))));
    LedgerRow tail = Sheets.row(Ledger.of(vehicle), ROAD, TRUNK_EAR, "tail");
    assertThat(tail.status()).isEqualTo(Status.FAILED);
    assertThat(tail.reason()).contains("loss factor lacks a value");
  }

  @Test
  void aBandOfAMeasurement() {
    MeasuredPanel data =
        new MeasuredPanel(without(60.0, "200"), SampleVehicle.single(10.0), Extras.NONE);
    Vehicle vehicle =
        Edits.panel(
            SAMPLE,
            SampleTree.MEASURED,
            it ->
                new Panel(it.id(), it.name(), 1, it.settings(), data, it.evidence(), it.extras()));
    assertLeafUnavailable(Ledger.of(vehicle), ROAD, PASSENGER, SampleTree.MEASURED, "200");
  }

  @Test
  void aBandOfAZonesAbsorptionIsMissingInEveryPanel() {
    Vehicle vehicle =
        Edits.zone(
            SAMPLE, "trunk", zone -> SampleVehicle.zone("trunk", null, null, without(0.6, "1000")));
    Ledger ledger = Ledger.of(vehicle);
    for (String panel : SampleTree.COMPUTED) {
      assertLeafUnavailable(ledger, ROAD, DRIVER, panel, "1000");
    }
    // no panel has the band, so that the sections above have none either
    LedgerRow body = Sheets.row(ledger, ROAD, DRIVER, "body");
    assertThat(body.meanSquares().has(Bands.position("1000"))).isFalse();
    assertThat(body.levelA()).isNaN();
    Contributed flow = Sheets.sheet(ledger, ROAD, DRIVER).flow();
    assertThat(flow.meanSquares().has(Bands.position("1000"))).isFalse();
    assertThat(flow.levelA()).isNaN();
    assertThat(flow.status()).isEqualTo(Status.PARTIAL);
    // an empty section beside the panels is no knowledge of the band
    assertThat(Sheets.row(ledger, ROAD, DRIVER, "aft").levelA()).isNaN();
    // the other sources have it: the total is a lower bound and says so
    LedgerRow total = Sheets.row(ledger, ROAD, DRIVER, "sample");
    assertThat(total.status()).isEqualTo(Status.PARTIAL);
    assertThat(Sheets.row(ledger, ROAD, PASSENGER, "sample").levelA()).isNaN();
  }

  @Test
  void aBandOfAnOtherSource() {
    OtherSource gap = SampleVehicle.other("tyres", DRIVER, ROAD, without(50.0, "2000"));
    Ledger ledger = Ledger.of(Edits.with(SAMPLE, it -> it.otherSources(List.of(gap))));
    assertLeafUnavailable(ledger, ROAD, DRIVER, "tyres", "2000");
    LedgerRow total = Sheets.row(ledger, ROAD, DRIVER, "sample");
    assertThat(total.status()).isEqualTo(Status.PARTIAL);
    assertThat(total.reason()).contains("tyres: no value at 2000 Hz: its level was not entered");
  }

  @Test
  void ratingsLackTheBandOrAreNoVerdict() {
    Vehicle vehicle =
        Edits.zone(
            SAMPLE, "trunk", zone -> SampleVehicle.zone("trunk", null, null, without(0.6, "1000")));
    List<Target> targets = new ArrayList<>();
    for (Rating rating : Rating.values()) {
      targets.add(
          SampleVehicle.target(
              rating.text(), ROAD, List.of(PASSENGER), rating, 150.0, PassRule.PLAIN));
      targets.add(
          SampleVehicle.target(
              rating.text() + "-bound", ROAD, List.of(DRIVER), rating, 150.0, PassRule.PLAIN));
    }
    for (TargetResult result :
        Ledger.of(Edits.with(vehicle, it -> it.targets(targets))).targets()) {
      String what = result.target().id();
      assertThat(result.state()).as(what).isNull();
      assertThat(result.missed()).as(what).isFalse();
      assertThat(result.status()).as(what).isEqualTo(Status.PARTIAL);
      assertThat(result.reason()).as(what).isNotBlank();
      // where no source has the band there is no level at all
      assertThat(Double.isNaN(result.level())).as(what).isEqualTo(!what.endsWith("-bound"));
    }
  }

  @Test
  void aPartialTotalIsOverIfTheKnownPartIsAlready() {
    Vehicle vehicle = Edits.settings(SAMPLE, "tail", it -> it.zone(null));
    double known = Sheets.row(Ledger.of(vehicle), ROAD, DRIVER, "sample").levelA();
    double whole = Sheets.row(WHOLE, ROAD, DRIVER, "sample").levelA();
    assertThat(known).isLessThan(whole);
    assertThat(driver(vehicle, known + 10.0)).isNull();
    assertThat(driver(vehicle, known + 0.5)).isNull();
    assertThat(driver(vehicle, known - 0.1)).isEqualTo(State.OVER);
  }

  private static State driver(Vehicle vehicle, double allowed) {
    Target target =
        SampleVehicle.target(
            "t", ROAD, List.of(DRIVER), Rating.OVERALL_A, allowed + 0.5, PassRule.PLAIN);
    Ledger ledger = Ledger.of(Edits.with(vehicle, it -> it.targets(List.of(target))));
    State state = ledger.targets().get(0).state();
    assertThat(Sheets.sheet(ledger, ROAD, DRIVER).total().judgement().state()).isEqualTo(state);
    return state;
  }

  private static void assertLeafUnavailable(
      Ledger ledger, String condition, String receiver, String id, String band) {
    LedgerRow row = Sheets.row(ledger, condition, receiver, id);
    assertThat(row.status()).as(id).isEqualTo(Status.PARTIAL);
    assertThat(row.reason()).as(id).contains("no value at " + band + " Hz");
    for (int i = 0; i < Bands.COUNT; i++) {
      assertThat(row.meanSquares().has(i)).as(id).isEqualTo(!Bands.label(i).equals(band));
    }
    assertThat(row.levelA()).as(id).isNaN();
    assertThat(row.level()).as(id).isNaN();
  }
}
