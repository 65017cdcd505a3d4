package eddyledger.ledger;

import static eddyledger.ledger.SampleVehicle.DRIVER;
import static eddyledger.ledger.SampleVehicle.FLIGHT;
import static eddyledger.ledger.SampleVehicle.PASSENGER;
import static eddyledger.ledger.SampleVehicle.ROAD;
import static eddyledger.ledger.SampleVehicle.TRUNK_EAR;
import static eddyledger.ledger.SampleVehicle.allowance;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.model.PassRule;
import eddyledger.model.PassRule.Across;
import eddyledger.model.PassRule.Rounding;
import eddyledger.model.Rating;
import eddyledger.model.Target;
import eddyledger.model.Vehicle;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Targets and allowances on the sheets: on which rows they stand, and against which level. */
class JudgedRowsTest {
  private static final Vehicle SAMPLE = SampleVehicle.vehicle();
  private static final Ledger LEDGER = Ledger.of(SAMPLE);

  @ParameterizedTest
  @CsvSource({"1.5, INSIDE", "1.0, INSIDE", "0.4, TIGHT", "0.0, TIGHT", "-0.4, OVER"})
  void anAllowanceIsJudgedAgainstItsRow(double margin, State state) {
    for (String node : List.of("body", "sides", "side-glass", "hatch")) {
      double level = Sheets.row(LEDGER, ROAD, DRIVER, node).levelA();
      Vehicle vehicle =
          Edits.with(
              SAMPLE, it -> it.allowances(List.of(allowance(node, DRIVER, ROAD, level + margin))));
      Ledger ledger = Ledger.of(vehicle);
      Judgement judgement = Sheets.row(ledger, ROAD, DRIVER, node).judgement();
      assertThat(judgement.allowance()).isEqualTo(level + margin);
      assertThat(judgement.margin()).isCloseTo(margin, within(1.0e-9));
      assertThat(judgement.state()).as(node).isEqualTo(state);
      assertThat(judgement.target()).isNaN();
      // only there: neither at another receiver nor in another condition nor on another row
      assertThat(
              ledger.sheets().stream()
                  .flatMap(sheet -> sheet.rows().stream())
                  .filter(row -> row.kind() != RowKind.TOTAL && row.judgement().judged()))
          .hasSize(1);
    }
  }

  @Test
  void ofTwoAllowancesForOneRowTheFirstHolds() {
    Vehicle vehicle =
        Edits.with(
            SAMPLE,
            it ->
                it.allowances(
                    List.of(
                        allowance("floor", DRIVER, ROAD, 61.0),
                        allowance("floor", PASSENGER, ROAD, 62.0),
                        allowance("floor", DRIVER, ROAD, 63.0))));
    Ledger ledger = Ledger.of(vehicle);
    assertThat(Sheets.row(ledger, ROAD, DRIVER, "floor").judgement().allowance()).isEqualTo(61.0);
    assertThat(Sheets.row(ledger, ROAD, DRIVER, "floor").status()).isEqualTo(Status.OK);
    assertThat(Sheets.row(ledger, ROAD, PASSENGER, "floor").judgement().allowance())
        .isEqualTo(62.0);
    assertThat(ledger.findings())
        .filteredOn(finding -> finding.code().equals("duplicate-allowance"))
        .singleElement()
        .extracting(finding -> finding.where())
        .isEqualTo("allowances[2] (floor)");
  }

  @Test
  void anAllowanceOfAPartialSectionIsNoVerdictUnlessOver() {
    Vehicle vehicle = Edits.settings(SAMPLE, "floor", it -> it.construction("absent"));
    for (double margin : new double[] {5.0, -5.0}) {
      double level = Sheets.row(Ledger.of(vehicle), ROAD, DRIVER, "body").levelA();
      Ledger ledger =
          Ledger.of(
              Edits.with(
                  vehicle,
                  it -> it.allowances(List.of(allowance("body", DRIVER, ROAD, level + margin)))));
      assertThat(Sheets.row(ledger, ROAD, DRIVER, "body").judgement().state())
          .isEqualTo(margin > 0.0 ? null : State.OVER);
    }
  }

  @Test
  void aTotalCarriesItsOwnTargetAndTheModelRangeToo() {
    for (ReceiverSheet sheet : LEDGER.sheets()) {
      boolean judged =
          sheet.title().equals("driver in road") || sheet.title().equals("passenger in flight");
      assertThat(sheet.total().judgement().judged()).as(sheet.title()).isEqualTo(judged);
      for (LedgerRow row : sheet.range()) {
        assertThat(row.judgement().judged()).as(sheet.title()).isEqualTo(judged);
        if (judged) {
          double margin = row.judgement().allowance() - row.levelA();
          assertThat(row.judgement().margin()).isEqualTo(margin);
          assertThat(row.judgement().state()).isEqualTo(State.of(margin, 1.0));
        }
      }
    }
    Judgement driver = Sheets.sheet(LEDGER, ROAD, DRIVER).total().judgement();
    assertThat(driver.target()).isEqualTo(66.0);
    assertThat(driver.reserve()).isEqualTo(0.5);
    assertThat(driver.allowance()).isEqualTo(65.5);
  }

  @Test
  void targetResultsFollowTheLevelsOfTheirReceivers() {
    assertThat(LEDGER.targets().stream().map(result -> result.target().id()))
        .containsExactly("driver-a", "flight-a", "road-both", "flight-sil");
    TargetResult single = LEDGER.targets().get(0);
    LedgerRow driver = Sheets.sheet(LEDGER, ROAD, DRIVER).total();
    assertThat(single.level()).isEqualTo(driver.levelA());
    assertThat(single.margin()).isEqualTo(driver.judgement().margin());
    LedgerRow passenger = Sheets.sheet(LEDGER, ROAD, PASSENGER).total();
    double mean =
        10.0
            * Math.log10(
                (Math.pow(10.0, driver.level() / 10.0) + Math.pow(10.0, passenger.level() / 10.0))
                    / 2.0);
    TargetResult both = LEDGER.targets().get(2);
    assertThat(both.level()).isCloseTo(mean, within(1.0e-10));
    assertThat(both.judged()).isEqualTo(Math.rint(mean));
  }

  @Test
  void aTotalIsJudgedByTheRuleOfItsTarget() {
    double level = Sheets.sheet(LEDGER, ROAD, DRIVER).total().levelA();
    PassRule generous = new PassRule(Rounding.NONE, 2.0, Across.WORST);
    Target target =
        SampleVehicle.target("t", ROAD, List.of(DRIVER), Rating.OVERALL_A, level - 1.0, generous);
    Ledger ledger = Ledger.of(Edits.with(SAMPLE, it -> it.targets(List.of(target))));
    Judgement judgement = Sheets.sheet(ledger, ROAD, DRIVER).total().judgement();
    assertThat(judgement.margin()).isCloseTo(-1.5, within(1.0e-9));
    assertThat(judgement.state()).isEqualTo(State.TIGHT);
    assertThat(ledger.targets().get(0).state()).isEqualTo(State.TIGHT);
  }

  @Test
  void ofSeveralTargetsTheOneOfLeastMarginJudgesTheTotal() {
    double level = Sheets.sheet(LEDGER, ROAD, DRIVER).total().levelA();
    Target easy = overall("easy", ROAD, DRIVER, level + 6.0);
    Target hard = overall("hard", ROAD, DRIVER, level + 1.0);
    Target between = overall("between", ROAD, DRIVER, level + 3.0);
    PassRule generous = new PassRule(Rounding.NONE, 9.0, Across.WORST);
    Target lenient =
        SampleVehicle.target(
            "lenient", ROAD, List.of(DRIVER), Rating.OVERALL_A, level + 1.0, generous);
    for (List<Target> targets :
        List.of(List.of(easy, hard, between), List.of(between, lenient, hard, easy))) {
      Ledger ledger = Ledger.of(Edits.with(SAMPLE, it -> it.targets(targets)));
      ReceiverSheet sheet = Sheets.sheet(ledger, ROAD, DRIVER);
      assertThat(sheet.total().judgement().target()).isEqualTo(level + 1.0);
      assertThat(sheet.total().judgement().margin()).isCloseTo(0.5, within(1.0e-9));
      assertThat(sheet.total().judgement().state()).isEqualTo(State.TIGHT);
      assertThat(sheet.range()).allMatch(row -> row.judgement().target() == level + 1.0);
      assertThat(ledger.targets().stream().map(TargetResult::target)).isEqualTo(targets);
    }
  }

  @Test
  void theWorstSheetIsTheOneOfLeastMargin() {
    Target easy = overall("easy", FLIGHT, PASSENGER, 140.0);
    Target hard = overall("hard", ROAD, TRUNK_EAR, 20.0);
    Ledger ledger = Ledger.of(Edits.with(SAMPLE, it -> it.targets(List.of(easy, hard))));
    assertThat(ledger.worst().title()).isEqualTo("trunk-ear in road");
    ReceiverSheet judged = Sheets.sheet(ledger, FLIGHT, PASSENGER);
    ReceiverSheet louder = Sheets.sheet(ledger, FLIGHT, DRIVER);
    ReceiverSheet quieter = Sheets.sheet(ledger, ROAD, PASSENGER);
    assertThat(Ledger.worst(List.of(louder, judged))).isSameAs(judged);
    assertThat(Ledger.worst(List.of(quieter, louder))).isSameAs(louder);
    assertThat(louder.total().levelA()).isGreaterThan(quieter.total().levelA());
  }

  private static Target overall(String id, String condition, String receiver, double value) {
    return SampleVehicle.target(
        id, condition, List.of(receiver), Rating.OVERALL_A, value, PassRule.PLAIN);
  }
}
