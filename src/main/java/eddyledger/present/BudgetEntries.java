package eddyledger.present;

import eddyledger.app.BudgetEdit;
import eddyledger.check.Limit;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.Status;
import eddyledger.model.PassRule.Rounding;
import eddyledger.model.Rating;
import eddyledger.model.Target;
import eddyledger.model.Vehicle;
import eddyledger.present.SheetField.Option;
import eddyledger.present.SheetField.Weight;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/** Fields of level, allowance, target and margin. */
final class BudgetEntries {
  private static final String NONE = "—";

  /** Where in the file: of use in a list of findings, not beside the field itself. */
  private static final String PLACE = "[\\w.\\[\\]-]+ \\([^)]*\\): ";

  private final SheetContext context;
  private final String receiver;
  private final String condition;

  BudgetEntries(SheetContext context) {
    this.context = context;
    receiver = context.selection().receiverId();
    condition = context.selection().conditionId();
  }

  /** Level, allowance and margin of a section or panel. */
  List<Entry> allowance() {
    return List.of(level(), allowed(), margin());
  }

  /** Level and targets of the whole vehicle. */
  List<Entry> targets() {
    List<Entry> entries = new ArrayList<>();
    entries.add(level());
    Optional<Target> overall = overall(context.vehicle());
    entries.add(overallTarget());
    overall.ifPresent(target -> entries.addAll(rule("target", "", target.id())));
    entries.add(margin());
    for (Target target : BudgetEdit.targets(context.vehicle(), receiver, condition)) {
      if (!overall.map(target::equals).orElse(false)) {
        String key = "target." + target.id();
        entries.add(value(key, label(target.rating()), target));
        entries.addAll(rule(key, "", target.id()));
      }
    }
    return entries;
  }

  private static String label(Rating rating) {
    return switch (rating) {
      case OVERALL_A -> "Target";
      case OVERALL_LINEAR -> "Target, linear";
      case SIL_500_2K -> "SIL ½, 1, 2 k";
      case SIL_1K_4K -> "SIL 1, 2, 4 k";
      case SIL_500_4K -> "SIL ½ to 4 k";
    };
  }

  /** Level only. */
  Entry level() {
    return new ShownEntry("level", "Level", BudgetEntries::level);
  }

  private static FieldBuilder level(FieldBuilder field, SheetContext context) {
    Optional<LedgerRow> row = context.ledgerRow();
    double level = row.map(LedgerRow::levelA).orElse(Double.NaN);
    boolean partial = row.map(it -> it.status() == Status.PARTIAL).orElse(false);
    String text = row.isEmpty() || Double.isNaN(level) ? NONE : LevelWords.level(level);
    row.filter(it -> it.status() != Status.OK && !it.reason().isEmpty())
        .ifPresent(it -> field.message(SheetMessage.warning(reason(it.reason()))));
    return field
        .text(partial && !text.equals(NONE) ? "≥ " + text : text)
        .unit(Unit.DECIBEL_A, Quantity.LEVEL)
        .origin(context.pending(), false)
        .weight(context.stale() ? Weight.FAINT : Weight.RESULT);
  }

  private static String reason(String reason) {
    String words = Words.sentence(reason.replaceAll(PLACE, ""));
    return words.endsWith(".") ? words : words + ".";
  }

  private Entry margin() {
    return new ShownEntry("margin", "Margin", BudgetEntries::margin);
  }

  private static FieldBuilder margin(FieldBuilder field, SheetContext context) {
    Optional<LedgerRow> row = context.ledgerRow();
    double margin = row.map(it -> it.judgement().margin()).orElse(Double.NaN);
    boolean whole = row.map(it -> it.status() == Status.OK).orElse(false);
    boolean over = row.map(it -> it.judgement().judged()).orElse(false);
    String words = Double.isNaN(margin) ? "" : "not known";
    String state = row.map(it -> it.judgement().state()).map(it -> it.text()).orElse(words);
    return field
        .text(Double.isNaN(margin) || !(whole || over) ? NONE : LevelWords.margin(margin))
        .unit(Unit.DECIBEL, Quantity.LEVEL)
        .origin(state, false)
        .tip(context.stale() ? "Of the last result, before the last change." : "")
        .state(row.map(it -> it.judgement().state()).orElse(null))
        .weight(context.stale() ? Weight.FAINT : Weight.RESULT);
  }

  private Entry allowed() {
    String node = context.row();
    return new DirectNumber("allowance", "Allowance", "allowance", Quantity.LEVEL_A, Limit.LEVEL)
        .on(
            now ->
                BudgetEdit.allowance(now.vehicle(), node, receiver, condition)
                    .map(it -> it.level())
                    .orElse(null),
            (vehicle, level) -> BudgetEdit.allow(vehicle, node, receiver, condition, level))
        .clearedBy(
            vehicle -> BudgetEdit.disallow(vehicle, node, receiver, condition), "back to none")
        .otherwise(now -> "not given")
        .at(vehicle -> allowancePlace(vehicle, node));
  }

  private List<String> allowancePlace(Vehicle vehicle, String node) {
    return BudgetEdit.allowance(vehicle, node, receiver, condition)
        .map(it -> "allowances[" + vehicle.allowances().indexOf(it) + "]")
        .map(List::of)
        .orElse(List.of());
  }

  private Optional<Target> overall(Vehicle vehicle) {
    return BudgetEdit.targets(vehicle, receiver, condition).stream()
        .filter(it -> it.rating() == Rating.OVERALL_A)
        .findFirst();
  }

  private Entry overallTarget() {
    return new DirectNumber("target", "Target", "target", Quantity.LEVEL_A, Limit.LEVEL)
        .on(
            now -> overall(now.vehicle()).map(Target::value).orElse(null),
            (vehicle, value) ->
                overall(vehicle)
                    .map(it -> target(vehicle, it.id(), value))
                    .orElseGet(() -> BudgetEdit.addTarget(vehicle, receiver, condition, value)))
        .otherwise(now -> "not given")
        .at(vehicle -> overall(vehicle).map(it -> place(vehicle, it, "value")).orElse(List.of()));
  }

  private static Vehicle target(Vehicle vehicle, String id, double value) {
    return BudgetEdit.target(vehicle, id, it -> BudgetEdit.withValue(it, value));
  }

  private static List<String> place(Vehicle vehicle, Target target, String property) {
    return List.of("targets[" + vehicle.targets().indexOf(target) + "]." + property);
  }

  private static Target byId(Vehicle vehicle, String id) {
    return vehicle.targets().stream().filter(it -> it.id().equals(id)).findFirst().orElse(null);
  }

  private static Entry value(String key, String label, Target target) {
    String id = target.id();
    Quantity quantity = target.rating() == Rating.OVERALL_A ? Quantity.LEVEL_A : Quantity.LEVEL;
    return new DirectNumber(key, label, "target", quantity, Limit.LEVEL)
        .on(now -> byId(now.vehicle(), id).value(), (vehicle, value) -> target(vehicle, id, value))
        .at(vehicle -> place(vehicle, byId(vehicle, id), "value"));
  }

  private static List<Entry> rule(String key, String prefix, String id) {
    Entry reserve =
        new DirectNumber(
                key + ".reserve", prefix + "Reserve", "reserve", Quantity.LEVEL, Limit.RESERVE)
            .on(
                now -> byId(now.vehicle(), id).reserve(),
                (vehicle, value) ->
                    BudgetEdit.target(vehicle, id, it -> BudgetEdit.withReserve(it, value)))
            .at(vehicle -> place(vehicle, byId(vehicle, id), "reserve_dB"));
    List<Option> roundings =
        Stream.of(Rounding.values()).map(it -> new Option(it.text(), words(it))).toList();
    Entry rounding =
        new DirectChoice(
            key + ".rounding",
            "Level rounded",
            "rounding of the judged level",
            roundings,
            vehicle -> byId(vehicle, id).rule().rounding().text(),
            (vehicle, text) ->
                Stream.of(Rounding.values())
                    .filter(it -> it.text().equals(text))
                    .findFirst()
                    .map(
                        it ->
                            BudgetEdit.target(
                                vehicle, id, target -> BudgetEdit.withRounding(target, it)))
                    .orElse(vehicle));
    return List.of(reserve, rounding);
  }

  private static String words(Rounding rounding) {
    return switch (rounding) {
      case NONE -> "Not at all";
      case TENTH -> "To 0.1 dB";
      case WHOLE -> "To 1 dB";
    };
  }
}
