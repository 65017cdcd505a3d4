package eddyledger.command;

import eddyledger.ledger.Trace;
import eddyledger.ledger.TraceStep;
import eddyledger.quantity.Bands;
import java.util.ArrayList;
import java.util.List;

/** The account of a contribution in words and numbers. */
final class TraceText {
  private static final int BANDS_A_LINE = 14;

  private final Trace trace;

  TraceText(Trace trace) {
    this.trace = trace;
  }

  List<String> lines() {
    List<String> lines = new ArrayList<>();
    lines.add(
        "Panel "
            + trace.panel().id()
            + " ("
            + trace.panel().name()
            + ") at "
            + trace.receiver().id()
            + " in "
            + trace.condition().id());
    if (!trace.reason().isEmpty()) {
      lines.add(trace.status().text() + ": " + trace.reason());
    }
    lines.add("");
    for (TraceStep step : trace.steps()) {
      step(step, lines);
    }
    if (trace.hasValue()) {
      lines.add("");
      lines.add("The start [*] times all factors [x] is p² at the receiver.");
    }
    return lines;
  }

  private static void step(TraceStep step, List<String> lines) {
    String mark =
        switch (step.role()) {
          case QUANTITY -> "   ";
          case START -> "[*]";
          case FACTOR -> "[x]";
          case RESULT -> "[=]";
        };
    String unit = step.unit().isEmpty() ? "" : " " + step.unit();
    String value = step.varies() ? "per band," + unit : Figures.number(step.value()) + unit;
    lines.add(mark + " " + step.symbol() + " = " + value + "   " + step.meaning());
    if (step.varies()) {
      bands(step, lines);
    }
    if (!step.source().isEmpty()) {
      lines.add("      source: " + step.source());
    }
    if (!step.note().isEmpty()) {
      lines.add("      note: " + step.note());
    }
  }

  private static void bands(TraceStep step, List<String> lines) {
    for (int first = 0; first < Bands.COUNT; first += BANDS_A_LINE) {
      TextTable table = new TextTable("r".repeat(BANDS_A_LINE));
      String[] labels = new String[BANDS_A_LINE];
      String[] values = new String[BANDS_A_LINE];
      for (int i = 0; i < BANDS_A_LINE; i++) {
        labels[i] = Bands.label(first + i);
        values[i] = Figures.number(step.values().value(first + i));
      }
      table.row(labels).row(values).lines().forEach(line -> lines.add("      " + line));
    }
  }
}
