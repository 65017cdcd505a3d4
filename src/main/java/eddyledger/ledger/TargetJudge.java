package eddyledger.ledger;

import eddyledger.model.PassRule;
import eddyledger.model.Rating;
import eddyledger.model.Target;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Decibels;
import eddyledger.quantity.SpeechInterferenceLevel;
import java.util.List;

/** Judges levels after a target's own pass rule. */
final class TargetJudge {
  private final double tightBand;

  TargetJudge(double tightBand) {
    this.tightBand = tightBand;
  }

  /** What a target asks of one receiver's total. */
  record Total(String receiver, Contribution contribution) {}

  /** The result over the receivers a target names; at least one. */
  TargetResult judge(Target target, List<Total> totals) {
    if (target.rule().across() == PassRule.Across.ENERGY_MEAN && totals.size() > 1) {
      double[] levels =
          totals.stream().mapToDouble(total -> level(target.rating(), total)).toArray();
      Total unwhole =
          totals.stream()
              .filter(total -> total.contribution().status() != Status.OK)
              .findFirst()
              .orElse(totals.get(0));
      return result(target, "", Decibels.mean(levels), unwhole.contribution());
    }
    TargetResult worst = null;
    for (Total total : totals) {
      TargetResult here =
          result(target, total.receiver(), level(target.rating(), total), total.contribution());
      if (worst == null || worse(here, worst)) {
        worst = here;
      }
    }
    return worst;
  }

  private static boolean worse(TargetResult here, TargetResult other) {
    if (rank(here) != rank(other)) {
      return rank(here) < rank(other);
    }
    if (Double.isNaN(other.margin())) {
      return false;
    }
    return Double.isNaN(here.margin()) || here.margin() < other.margin();
  }

  /** Over is certain whatever is unknown elsewhere; the unknown is worse news than what holds. */
  private static int rank(TargetResult result) {
    if (result.missed()) {
      return 0;
    }
    return result.state() == null ? 1 : 2;
  }

  private TargetResult result(
      Target target, String receiver, double level, Contribution contribution) {
    double judged = target.rule().rounding().apply(level);
    double allowed = target.allowed();
    State state = state(target, level, contribution.status());
    return new TargetResult(
        target,
        receiver,
        level,
        judged,
        allowed,
        allowed - level,
        state,
        contribution.status(),
        contribution.reason());
  }

  /** The state of one receiver's level after a target's pass rule; null if it cannot be said. */
  State state(Target target, double level, Status status) {
    double judged = target.rule().rounding().apply(level);
    return state(target.allowed() + target.rule().tolerance() - judged, status);
  }

  /** The state of a margin in dB; null if it cannot be said. */
  State state(double margin, Status status) {
    if (Double.isNaN(margin)) {
      return null;
    }
    State state = State.of(margin, tightBand);
    // of a lower bound only one thing can be said: that it is over already
    return status == Status.OK || state == State.OVER ? state : null;
  }

  private static double level(Rating rating, Total total) {
    BandSpectrum meanSquares = BandSpectrum.of(total.contribution().meanSquares());
    LedgerRow row =
        new LedgerRow("", "", 0, "", RowKind.TOTAL, Way.ALL, "", meanSquares, null, Status.OK, "");
    return switch (rating) {
      case OVERALL_A -> row.levelA();
      case OVERALL_LINEAR -> row.level();
      case SIL_500_2K -> row.speechInterference(SpeechInterferenceLevel.THREE_BANDS_500_TO_2000);
      case SIL_1K_4K -> row.speechInterference(SpeechInterferenceLevel.THREE_BANDS_1000_TO_4000);
      case SIL_500_4K -> row.speechInterference(SpeechInterferenceLevel.FOUR_BANDS_500_TO_4000);
    };
  }
}
