package eddyledger.present;

import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.Trace;
import eddyledger.ledger.TraceStep;
import eddyledger.ledger.Way;
import eddyledger.model.TreePath;
import eddyledger.present.StageSteps.Stage;
import eddyledger.present.TraceNote.Kind;
import eddyledger.present.TraceStage.LevelKind;
import eddyledger.quantity.AWeighting;
import eddyledger.quantity.Bands;
import java.util.ArrayList;
import java.util.List;

/** Puts an account together. */
final class AccountBuilder {
  private final Ledger ledger;
  private final Trace trace;
  private final TreePath path;
  private final int band;
  private final ReceiverSheet sheet;
  private final LedgerRow row;

  AccountBuilder(Ledger ledger, Trace trace, TreePath path, int band) {
    this.ledger = ledger;
    this.trace = trace;
    this.path = path;
    this.band = band;
    sheet = ledger.sheet(trace.condition().id(), trace.receiver().id()).orElseThrow();
    row = sheet.row(trace.panel().id(), Way.ALL).orElseThrow();
  }

  TraceAccount account() {
    TraceTotal total = new TotalWords(sheet, row, path).total();
    List<TraceStage> stages = trace.hasValue() ? stages() : List.of();
    return new TraceAccount(
        trace.panel().id(),
        trace.condition().id(),
        trace.receiver().id(),
        trace.panel().name(),
        "Heard at "
            + trace.receiver().name()
            + " in "
            + trace.condition().name()
            + (trace.hasValue()
                ? ": from the air outside to " + total.level() + ", step by step."
                : ": there is no value to account for."),
        band,
        stages,
        LevelAxis.over(stages),
        total,
        numbers(),
        trace.reason());
  }

  private List<TraceStage> stages() {
    TraceSource source = TraceSource.of(ledger, trace, path, band);
    List<TraceStage> stages = new ArrayList<>();
    for (Stage stage : Stage.values()) {
      StageText text = text(source, stage);
      stages.add(
          new TraceStage(
              stage.ordinal() + 1,
              stage.title(),
              text.sentence(),
              text.origin(),
              text.rule(),
              text.numbers(),
              notes(source, stage),
              text.picture(),
              source.steps().change(stage, band),
              source.steps().level(stage, band),
              kind(stage)));
    }
    return stages;
  }

  private static StageText text(TraceSource source, Stage stage) {
    return switch (stage) {
      case AMBIENT -> new FlowStages(source).ambient();
      case FLOW -> new FlowStages(source).flow();
      case LAYER -> new FlowStages(source).layer();
      case WALL -> new PressureStages(source).wall();
      case CROSS -> new PressureStages(source).cross();
      case PANEL -> new PathStages(source).panel();
      case LAY_UP -> new PathStages(source).layUp();
      case ZONE -> new CabinStages(source).zone();
      case RECEIVER -> new CabinStages(source).receiver();
    };
  }

  private List<TraceNote> notes(TraceSource source, Stage stage) {
    List<TraceNote> notes = new ArrayList<>(StageNotes.of(source.steps().of(stage)));
    switch (stage) {
      case CROSS -> new PressureStages(source).carried().ifPresent(notes::add);
      case PANEL -> notes.addAll(new PathStages(source).interpolated());
      case ZONE -> notes.addAll(new CabinStages(source).notes());
      case RECEIVER -> {
        if (!trace.reason().isEmpty()) {
          notes.add(new TraceNote(Kind.MISSING, trace.reason()));
        }
      }
      case AMBIENT, FLOW, LAYER, WALL, LAY_UP -> {}
    }
    return notes;
  }

  private static LevelKind kind(Stage stage) {
    return switch (stage) {
      case AMBIENT, FLOW, LAYER -> LevelKind.NONE;
      case WALL, CROSS -> LevelKind.WALL;
      case PANEL, LAY_UP -> LevelKind.POWER;
      case ZONE -> LevelKind.PRESSURE;
      case RECEIVER -> LevelKind.WEIGHTED;
    };
  }

  private List<TraceNumber> numbers() {
    StageSteps steps = new StageSteps(trace);
    List<TraceNumber> numbers = new ArrayList<>();
    for (Stage stage : Stage.values()) {
      for (TraceStep step : steps.of(stage)) {
        numbers.add(TraceNumber.of(stage.title(), step, band));
      }
    }
    return numbers;
  }

  /** The band of a trace whose A-weighted level is highest. */
  static int loudest(Trace trace) {
    int loudest = -1;
    double most = Double.NEGATIVE_INFINITY;
    for (int band = 0; band < Bands.COUNT; band++) {
      double weighted =
          trace.bands().meanSquare().value(band) * AWeighting.energyRatios().value(band);
      if (weighted > most) {
        most = weighted;
        loudest = band;
      }
    }
    return loudest < 0 ? TraceAccount.FIRST_BAND : loudest;
  }
}
