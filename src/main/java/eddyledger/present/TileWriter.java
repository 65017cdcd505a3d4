package eddyledger.present;

import eddyledger.app.ProjectState;
import eddyledger.ledger.Judgement;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.Status;
import eddyledger.model.OperatingCondition;
import eddyledger.model.PassRule;
import eddyledger.model.Receiver;
import eddyledger.model.Vehicle;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Writes the tiles of the target strip. */
final class TileWriter {
  private final ProjectState state;
  private final Vehicle vehicle;

  /** For a project that is open. */
  TileWriter(ProjectState state) {
    this.state = state;
    this.vehicle = state.vehicle();
  }

  /** One tile per condition and receiver, conditions first, in the order of the file. */
  List<TargetTile> tiles() {
    List<TargetTile> tiles = new ArrayList<>();
    for (OperatingCondition condition : vehicle.conditions()) {
      for (Receiver receiver : vehicle.receivers()) {
        Optional<Ledger> ledger = state.ledger();
        Optional<ReceiverSheet> sheet =
            ledger.flatMap(it -> it.sheet(condition.id(), receiver.id()));
        tiles.add(
            sheet
                .map(it -> counted(ledger.orElseThrow(), it, condition, receiver))
                .orElseGet(() -> blank(condition, receiver)));
      }
    }
    return tiles;
  }

  private boolean selected(OperatingCondition condition, Receiver receiver) {
    return state.selection().conditionId().equals(condition.id())
        && state.selection().receiverId().equals(receiver.id());
  }

  private TargetTile blank(OperatingCondition condition, Receiver receiver) {
    String place = SheetOnDesk.place(vehicle, receiver);
    String conditionName = SheetOnDesk.condition(vehicle, condition);
    String why = SheetOnDesk.why(state);
    return new TargetTile(
        condition.id(),
        receiver.id(),
        place,
        conditionName,
        "",
        DeskNumbers.NONE,
        new Verdict("", null, state.unusable() ? "not known" : "not computed yet"),
        "",
        null,
        "",
        "",
        TileScale.of(Double.NaN, Double.NaN, Double.NaN, List.of()),
        state.stale(),
        selected(condition, receiver),
        place + ", " + conditionName + ": " + why,
        List.of(receiver.name(), condition.name(), why));
  }

  private TargetTile counted(
      Ledger ledger, ReceiverSheet sheet, OperatingCondition condition, Receiver receiver) {
    LedgerRow total = sheet.total();
    Judgement judgement = total.judgement();
    double level = total.levelA();
    double tight = ledger.vehicle().tightBandOrDefault();
    Verdict verdict = Verdict.of(judgement, total.status(), tight);
    boolean asked = verdict.asked();
    boolean bound = Double.isFinite(level) && total.status() != Status.OK;
    String missing = Missing.text(LedgerTree.contributions(sheet.rows()));
    String reserve = asked ? "reserve " + DeskNumbers.level(judgement.reserve()) : "";
    ModelRange range = new ModelRange(sheet);
    OtherTargets others = new OtherTargets(ledger, sheet);
    String place = SheetOnDesk.place(vehicle, receiver);
    String conditionName = SheetOnDesk.condition(vehicle, condition);
    String number = (bound ? DeskNumbers.AT_LEAST : "") + DeskNumbers.level(level) + " dB(A)";
    String heard = DeskNumbers.level(level).equals(DeskNumbers.NONE) ? "level not known" : number;
    return new TargetTile(
        condition.id(),
        receiver.id(),
        place,
        conditionName,
        bound ? DeskNumbers.AT_LEAST.strip() : "",
        DeskNumbers.level(level),
        asked ? verdict : new Verdict("", null, "no target"),
        missing.isEmpty() ? reserve : missing,
        others.worst(),
        asked ? "target " + DeskNumbers.level(judgement.target()) : "",
        range.text(),
        TileScale.of(judgement.target(), judgement.allowance(), finite(level), range.ends()),
        state.stale(),
        selected(condition, receiver),
        place
            + ", "
            + conditionName
            + ": "
            + heard
            + ", "
            + (asked ? verdict.spoken() : "no target")
            + (others.worst() == null ? "" : ", " + others.worst().text())
            + (missing.isEmpty() ? "" : ", " + missing)
            + (state.stale() ? ", being computed anew" : ""),
        tips(sheet, others, range, missing));
  }

  private static double finite(double level) {
    return Double.isFinite(level) ? level : Double.NaN;
  }

  private List<String> tips(
      ReceiverSheet sheet, OtherTargets others, ModelRange range, String missing) {
    List<String> tips = new ArrayList<>();
    tips.add(sheet.receiver().name());
    tips.add(sheet.condition().name());
    Judgement judgement = sheet.total().judgement();
    if (!Double.isNaN(judgement.target())) {
      tips.add(
          "target "
              + DeskNumbers.level(judgement.target())
              + " dB(A), reserve "
              + DeskNumbers.level(judgement.reserve())
              + " dB: "
              + DeskNumbers.level(judgement.allowance())
              + " dB(A) allowed");
      others
          .own()
          .map(it -> rule(it.target().rule()))
          .filter(it -> !it.isEmpty())
          .ifPresent(tips::add);
    }
    tips.addAll(others.tips());
    List<LedgerRow> contributions = LedgerTree.contributions(sheet.rows());
    if (!missing.isEmpty()) {
      tips.add(missing);
      tips.addAll(Missing.tips(contributions));
    }
    tips.addAll(range.tips());
    return tips;
  }

  /** How a level is judged, where it is more than a comparison; else empty. */
  private static String rule(PassRule rule) {
    List<String> words = new ArrayList<>();
    if (rule.rounding() != PassRule.Rounding.NONE) {
      words.add("rounded to " + rule.rounding().text() + " dB");
    }
    if (rule.tolerance() > 0.0) {
      words.add("with a tolerance of " + DeskNumbers.level(rule.tolerance()) + " dB");
    }
    return words.isEmpty() ? "" : "the level is judged " + String.join(" ", words);
  }
}
