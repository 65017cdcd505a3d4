package eddyledger.ledger;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.ledger.TargetJudge.Total;
import eddyledger.model.Evidence;
import eddyledger.model.Extras;
import eddyledger.model.PassRule;
import eddyledger.model.PassRule.Across;
import eddyledger.model.PassRule.Rounding;
import eddyledger.model.Rating;
import eddyledger.model.Target;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Decibels;
import eddyledger.quantity.LevelText;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Levels are judged after the target's own rule, and the margin is shown beside unrounded. */
class TargetJudgeTest {
  private static final double TIGHT_BAND = 1.0;
  private static final TargetJudge JUDGE = new TargetJudge(TIGHT_BAND);

  @ParameterizedTest
  @CsvSource({
    // level, target, rounding, tolerance, judged, margin, state
    "64.0, 65.0, NONE, 0.0, 64.0, 1.0, INSIDE",
    "64.000001, 65.0, NONE, 0.0, 64.000001, 0.999999, TIGHT",
    "65.0, 65.0, NONE, 0.0, 65.0, 0.0, TIGHT",
    "65.000001, 65.0, NONE, 0.0, 65.000001, -0.000001, OVER",
    "65.04, 65.0, NONE, 0.0, 65.04, -0.04, OVER",
    "65.04, 65.0, TENTH, 0.0, 65.0, -0.04, TIGHT",
    "65.06, 65.0, TENTH, 0.0, 65.1, -0.06, OVER",
    "65.1, 65.1, TENTH, 0.0, 65.1, 0.0, TIGHT",
    "65.49, 65.0, WHOLE, 0.0, 65.0, -0.49, TIGHT",
    "65.5, 65.0, WHOLE, 0.0, 66.0, -0.5, OVER",
    "64.4, 65.0, WHOLE, 0.0, 64.0, 0.6, INSIDE",
    "64.6, 65.0, WHOLE, 0.0, 65.0, 0.4, TIGHT",
    "65.5, 65.0, NONE, 0.5, 65.5, -0.5, TIGHT",
    "65.51, 65.0, NONE, 0.5, 65.51, -0.51, OVER",
    "64.5, 65.0, NONE, 0.5, 64.5, 0.5, INSIDE",
    "66.4, 65.0, WHOLE, 1.0, 66.0, -1.4, TIGHT",
  })
  void roundingAndTolerance(
      double level,
      double value,
      Rounding rounding,
      double tolerance,
      double judged,
      double margin,
      State state) {
    Target target =
        target(Rating.OVERALL_LINEAR, value, 0.0, new PassRule(rounding, tolerance, Across.WORST));
    TargetResult result = JUDGE.judge(target, List.of(total("a", level)));
    assertThat(result.level()).isCloseTo(level, within(1.0e-12));
    assertThat(result.judged()).isCloseTo(judged, within(1.0e-11));
    assertThat(result.margin()).isCloseTo(margin, within(1.0e-11));
    assertThat(result.state()).isEqualTo(state);
    assertThat(result.missed()).isEqualTo(state == State.OVER);
    assertThat(LevelText.text(result.margin())).isNotEqualTo("-0.0");
  }

  @Test
  void theReserveIsTakenFromTheTarget() {
    Target target = target(Rating.OVERALL_LINEAR, 66.0, 1.5, PassRule.PLAIN);
    TargetResult result = JUDGE.judge(target, List.of(total("a", 64.6)));
    assertThat(result.allowed()).isEqualTo(64.5);
    assertThat(result.margin()).isCloseTo(-0.1, within(1.0e-12));
    assertThat(result.state()).isEqualTo(State.OVER);
  }

  @ParameterizedTest
  @CsvSource({
    // arithmetic noise about nought and about the tight band is no judgement
    "1e-12, TIGHT",
    "-1e-12, TIGHT",
    "0.0, TIGHT",
    "-0.0, TIGHT",
    "-1e-6, OVER",
    "0.999999999999, INSIDE",
    "1.0, INSIDE",
    "0.99999, TIGHT",
    "Infinity, INSIDE",
  })
  void edgesOfTheStates(double margin, State state) {
    assertThat(JUDGE.state(margin, Status.OK)).isEqualTo(state);
    assertThat(JUDGE.state(margin, Status.PARTIAL)).isEqualTo(state == State.OVER ? state : null);
  }

  @Test
  void withoutTightBandNothingIsTight() {
    TargetJudge none = new TargetJudge(0.0);
    assertThat(none.state(0.0, Status.OK)).isEqualTo(State.INSIDE);
    assertThat(none.state(-1.0e-6, Status.OK)).isEqualTo(State.OVER);
    assertThat(none.state(Double.NaN, Status.OK)).isNull();
  }

  @ParameterizedTest
  @CsvSource({
    "OVERALL_LINEAR, 64.4716",
    "OVERALL_A, 61.8322",
    "SIL_500_2K, 54.7712",
    "SIL_1K_4K, 54.7712",
    "SIL_500_4K, 54.7712",
  })
  void everyRatingOfAFlatSpectrum(Rating rating, double level) {
    // 28 thirds of 50 dB: 10 lg 28 above one, an octave of them 10 lg 3; A-weighted from the
    // weighting's defining formula
    double[] flat = new double[Bands.COUNT];
    Arrays.fill(flat, Decibels.meanSquarePressure(50.0));
    Total total = new Total("a", Contribution.of(flat, ""));
    TargetResult result = JUDGE.judge(target(rating, 70.0, 0.0, PassRule.PLAIN), List.of(total));
    assertThat(result.level()).isCloseTo(level, within(1.0e-3));
    assertThat(result.state()).isEqualTo(State.INSIDE);
  }

  @Test
  void theWorstReceiverOrTheEnergyMeanCounts() {
    List<Total> totals = List.of(total("a", 60.0), total("b", 66.0), total("c", 63.0));
    TargetResult worst =
        JUDGE.judge(target(Rating.OVERALL_LINEAR, 65.0, 0.0, PassRule.PLAIN), totals);
    assertThat(worst.receiver()).isEqualTo("b");
    assertThat(worst.level()).isCloseTo(66.0, within(1.0e-12));
    assertThat(worst.state()).isEqualTo(State.OVER);
    TargetResult mean = JUDGE.judge(mean(65.0), totals);
    double expected =
        10.0 * Math.log10((Math.pow(10, 6.0) + Math.pow(10, 6.6) + Math.pow(10, 6.3)) / 3.0);
    assertThat(mean.receiver()).isEmpty();
    assertThat(mean.level()).isCloseTo(expected, within(1.0e-12));
    assertThat(mean.state()).isEqualTo(State.INSIDE);
  }

  @Test
  void theEnergyMeanOfOneReceiverIsItsLevel() {
    TargetResult result = JUDGE.judge(mean(65.0), List.of(total("a", 63.0)));
    assertThat(result.receiver()).isEqualTo("a");
    assertThat(result.level()).isCloseTo(63.0, within(1.0e-12));
  }

  @Test
  void anEnergyMeanWithAPartialReceiverIsNoVerdictUnlessOver() {
    List<Total> totals = List.of(total("a", 60.0), partial("b", 60.0));
    assertThat(JUDGE.judge(mean(65.0), totals).state()).isNull();
    assertThat(JUDGE.judge(mean(65.0), totals).status()).isEqualTo(Status.PARTIAL);
    assertThat(JUDGE.judge(mean(59.0), totals).state()).isEqualTo(State.OVER);
  }

  @Test
  void aReceiverThatCannotBeJudgedComesBeforeOneThatHolds() {
    Target target = target(Rating.OVERALL_LINEAR, 65.0, 0.0, PassRule.PLAIN);
    for (Total unknown : List.of(partial("b", 50.0), none("b"))) {
      for (List<Total> totals : bothOrders(total("a", 64.5), unknown)) {
        TargetResult result = JUDGE.judge(target, totals);
        assertThat(result.receiver()).isEqualTo("b");
        assertThat(result.state()).isNull();
        assertThat(result.status()).isNotEqualTo(Status.OK);
      }
    }
  }

  @Test
  void aReceiverThatIsOverDecidesWhateverIsUnknownElsewhere() {
    Target target = target(Rating.OVERALL_LINEAR, 65.0, 0.0, PassRule.PLAIN);
    for (Total unknown : List.of(partial("b", 50.0), none("b"))) {
      for (List<Total> totals : bothOrders(total("a", 66.0), unknown)) {
        TargetResult result = JUDGE.judge(target, totals);
        assertThat(result.receiver()).isEqualTo("a");
        assertThat(result.state()).isEqualTo(State.OVER);
      }
    }
  }

  private static List<List<Total>> bothOrders(Total one, Total other) {
    return List.of(List.of(one, other), List.of(other, one));
  }

  private static Target mean(double value) {
    PassRule rule = new PassRule(Rounding.NONE, 0.0, Across.ENERGY_MEAN);
    return target(Rating.OVERALL_LINEAR, value, 0.0, rule);
  }

  private static Target target(Rating rating, double value, double reserve, PassRule rule) {
    return new Target(
        "t", "t", "c", List.of("a"), rating, value, reserve, rule, Evidence.NONE, Extras.NONE);
  }

  /** All the energy at 1 kHz, so that the overall level is the band's to the last digits. */
  private static Contribution tone(double level) {
    double[] meanSquares = new double[Bands.COUNT];
    meanSquares[Bands.position("1000")] = Decibels.meanSquarePressure(level);
    return Contribution.of(meanSquares, "");
  }

  private static Total total(String receiver, double level) {
    return new Total(receiver, tone(level));
  }

  private static Total partial(String receiver, double level) {
    List<Contribution.Part> parts = new ArrayList<>();
    parts.add(new Contribution.Part("known", tone(level)));
    parts.add(new Contribution.Part("unknown", Contribution.none(Status.FAILED, "why")));
    return new Total(receiver, Contribution.sum(parts));
  }

  private static Total none(String receiver) {
    Contribution none = Contribution.none(Status.FAILED, "why");
    assertThat(BandSpectrum.of(none.meanSquares()).complete()).isFalse();
    return new Total(receiver, none);
  }
}
