package eddyledger.ledger;

import eddyledger.check.Finding;
import eddyledger.ledger.TargetJudge.Total;
import eddyledger.model.OperatingCondition;
import eddyledger.model.OtherSource;
import eddyledger.model.Rating;
import eddyledger.model.Receiver;
import eddyledger.model.Target;
import eddyledger.model.Vehicle;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Decibels;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Sums the contributions up the tree and judges them: from a run to sheets and target results. */
final class SheetBuilder {
  private final Vehicle vehicle;
  private final LedgerRun run;
  private final TargetJudge judge;
  private final Map<SheetKey, Contribution> totals = new LinkedHashMap<>();
  private final List<TargetResult> targets = new ArrayList<>();

  private record SheetKey(String condition, String receiver) {}

  SheetBuilder(Vehicle vehicle, LedgerRun run) {
    this.vehicle = vehicle;
    this.run = run;
    judge = new TargetJudge(vehicle.tightBandOrDefault());
  }

  /** All sheets, conditions first. */
  List<ReceiverSheet> sheets() {
    Map<SheetKey, TreeSum> sums = new LinkedHashMap<>();
    for (OperatingCondition condition : vehicle.conditions()) {
      for (Receiver receiver : vehicle.receivers()) {
        TreeSum sum = new TreeSum(vehicle, run, condition, receiver, others(condition, receiver));
        SheetKey key = new SheetKey(condition.id(), receiver.id());
        sums.put(key, sum);
        totals.put(key, sum.total(0));
      }
    }
    for (Target target : vehicle.targets()) {
      judge(target).ifPresent(targets::add);
    }
    List<ReceiverSheet> sheets = new ArrayList<>();
    for (OperatingCondition condition : vehicle.conditions()) {
      for (Receiver receiver : vehicle.receivers()) {
        sheets.add(sheet(condition, receiver, sums));
      }
    }
    return sheets;
  }

  /** The results of the targets, known once the sheets are. */
  List<TargetResult> targets() {
    return targets;
  }

  private Optional<TargetResult> judge(Target target) {
    if (run.error(target.id()).isPresent()) {
      return Optional.empty();
    }
    List<Total> at =
        target.receivers().stream()
            .map(
                receiver ->
                    new Total(receiver, totals.get(new SheetKey(target.condition(), receiver))))
            .toList();
    return Optional.of(judge.judge(target, at));
  }

  private ReceiverSheet sheet(
      OperatingCondition condition, Receiver receiver, Map<SheetKey, TreeSum> sums) {
    TreeSum sum = sums.get(new SheetKey(condition.id(), receiver.id()));
    Optional<Target> target = overallTarget(condition.id(), receiver.id());
    List<LedgerRow> rows = new ArrayList<>();
    LedgerRow chosen = total(sum.total(0), Choice.CHOSEN.name(), target);
    rows.add(chosen.noting(ChosenModels.words(run, condition.id())));
    rows.addAll(new SheetRows(vehicle, condition, receiver, judge).rows(sum));
    List<LedgerRow> range = new ArrayList<>();
    List<Choice> choices = Choice.all();
    for (int c = 1; c < choices.size(); c++) {
      LedgerRow row = total(sum.total(c), choices.get(c).name(), target);
      range.add(row.noting(doubt(choices.get(c), condition.id())));
    }
    return new ReceiverSheet(condition, receiver, rows, range);
  }

  /** What makes an alternative doubtful here; empty if nothing. */
  private String doubt(Choice choice, String condition) {
    if (choice.spectrum() == null) {
      return "";
    }
    long beyond = run.panelsOutOfRange(choice.spectrum(), condition);
    return beyond == 0
        ? ""
        : "outside its range on " + beyond + " of " + run.panels().size() + " panels";
  }

  /**
   * The overall target that a total is judged by. Where several hold, the one with the least margin
   * counts: of one level, that is the one that allows least; among equals the one with the least
   * tolerance, then the first. All of them remain in {@link #targets()}.
   */
  private Optional<Target> overallTarget(String condition, String receiver) {
    return targets.stream()
        .map(TargetResult::target)
        .filter(target -> target.rating() == Rating.OVERALL_A)
        .filter(target -> target.condition().equals(condition))
        .filter(target -> target.receivers().contains(receiver))
        .min(
            Comparator.comparingDouble(Target::allowed)
                .thenComparingDouble(target -> target.rule().tolerance()));
  }

  private LedgerRow total(Contribution sum, String choice, Optional<Target> target) {
    BandSpectrum meanSquares = BandSpectrum.of(sum.meanSquares());
    LedgerRow bare =
        new LedgerRow(
            vehicle.id(),
            "",
            0,
            vehicle.name(),
            RowKind.TOTAL,
            Way.ALL,
            choice,
            meanSquares,
            Judgement.NONE,
            sum.status(),
            sum.reason());
    if (target.isEmpty()) {
      return bare;
    }
    double allowed = target.get().allowed();
    double level = bare.levelA();
    // the state follows the target's own pass rule, for this receiver by itself
    State state = judge.state(target.get(), level, sum.status());
    return bare.judged(
        new Judgement(
            target.get().value(), target.get().reserve(), allowed, allowed - level, state));
  }

  private Map<OtherSource, Contribution> others(OperatingCondition condition, Receiver receiver) {
    Map<OtherSource, Contribution> others = new LinkedHashMap<>();
    for (OtherSource source : vehicle.otherSources()) {
      if (receiver.id().equals(source.receiver()) && condition.id().equals(source.condition())) {
        others.put(source, contribution(source));
      }
    }
    return others;
  }

  private Contribution contribution(OtherSource source) {
    Optional<Finding> error = run.error(source.id());
    if (error.isPresent()) {
      return Contribution.none(Status.FAILED, error.get().where() + ": " + error.get().what());
    }
    BandSpectrum levels = source.levels().best().spectrum();
    return Contribution.of(
        levels.map(Decibels::meanSquarePressure).toArray(), "its level was not entered");
  }
}
