package eddyledger.present;

import eddyledger.ledger.Ledger;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.State;
import eddyledger.ledger.TargetResult;
import eddyledger.model.PassRule.Across;
import eddyledger.model.Rating;
import eddyledger.model.Receiver;
import eddyledger.model.Target;
import eddyledger.model.Vehicle;
import eddyledger.present.TargetTile.OtherTarget;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** The targets of a receiver in a condition besides what its tile says. */
final class OtherTargets {
  private final Vehicle vehicle;
  private final ReceiverSheet sheet;
  private final List<TargetResult> here;

  OtherTargets(Ledger ledger, ReceiverSheet sheet) {
    this.vehicle = ledger.vehicle();
    this.sheet = sheet;
    this.here =
        ledger.targets().stream()
            .filter(result -> result.target().condition().equals(sheet.condition().id()))
            .filter(result -> result.target().receivers().contains(sheet.receiver().id()))
            .toList();
  }

  /** The target that the tile is judged by: the first on the A-weighted overall level. */
  Optional<TargetResult> own() {
    return here.stream().filter(it -> it.target().rating() == Rating.OVERALL_A).findFirst();
  }

  /** The worst of the others that is tight or over at this receiver; null if none is. */
  OtherTarget worst() {
    Optional<TargetResult> worst =
        others().stream()
            .filter(result -> result.state() == State.OVER || result.state() == State.TIGHT)
            .filter(result -> counts(result))
            .min(
                Comparator.comparing((TargetResult result) -> result.state() != State.OVER)
                    .thenComparing(TargetResult::margin));
    return worst
        .map(result -> new OtherTarget(result.state(), word(result) + " " + result.state().text()))
        .orElse(null);
  }

  /** The others; the tile's own among them where it counts the mean of several receivers. */
  private List<TargetResult> others() {
    Optional<TargetResult> own = own();
    List<TargetResult> others = new ArrayList<>(here);
    own.filter(result -> !mean(result)).ifPresent(others::remove);
    return others;
  }

  private boolean counts(TargetResult result) {
    return result.receiver().isEmpty() || result.receiver().equals(sheet.receiver().id());
  }

  private static boolean mean(TargetResult result) {
    Target target = result.target();
    return target.rule().across() == Across.ENERGY_MEAN && target.receivers().size() > 1;
  }

  private static String word(TargetResult result) {
    if (mean(result)) {
      return "mean";
    }
    return switch (result.target().rating()) {
      case OVERALL_A -> "dB(A)";
      case OVERALL_LINEAR -> "dB";
      case SIL_500_2K, SIL_1K_4K, SIL_500_4K -> "SIL";
    };
  }

  /** One line for each of the others, as "Speech: 60.2 dB, inside by 0.8 dB; worst at Row 9". */
  List<String> tips() {
    return others().stream().map(this::tip).toList();
  }

  private String tip(TargetResult result) {
    String name = result.target().name() + ": ";
    String level = DeskNumbers.level(result.level(), result.status());
    String unit = " " + result.target().rating().unit();
    if (result.state() == null || !Double.isFinite(result.margin())) {
      return name + "not known";
    }
    String margin = DeskNumbers.margin(result.margin(), vehicle.tightBandOrDefault());
    Verdict verdict = new Verdict(margin, result.state(), result.state().text());
    return name + level + unit + ", " + verdict.spoken() + where(result);
  }

  private String where(TargetResult result) {
    if (result.target().receivers().size() < 2) {
      return "";
    }
    if (mean(result)) {
      return "; the mean of " + result.target().receivers().size() + " receivers counts";
    }
    return vehicle.receivers().stream()
        .filter(receiver -> receiver.id().equals(result.receiver()))
        .findFirst()
        .map((Receiver receiver) -> "; worst at " + SheetOnDesk.place(vehicle, receiver))
        .orElse("");
  }
}
