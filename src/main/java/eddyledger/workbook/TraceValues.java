package eddyledger.workbook;

import eddyledger.ledger.Trace;
import eddyledger.ledger.TraceStep;
import java.util.Optional;

/** Looks up steps of a trace by their symbol. */
final class TraceValues {
  private final Optional<Trace> trace;

  TraceValues(Optional<Trace> trace) {
    this.trace = trace.filter(Trace::hasValue);
  }

  /** Whether there is anything to look up. */
  boolean known() {
    return trace.isPresent();
  }

  /** The step of a symbol; empty if there is none. */
  Optional<TraceStep> step(String symbol) {
    return trace.flatMap(
        it -> it.steps().stream().filter(step -> step.symbol().equals(symbol)).findFirst());
  }

  /** The value of a symbol times a factor; {@link Answer#UNAVAILABLE} if there is none. */
  Answer value(String symbol, double factor) {
    return Answer.number(step(symbol).map(step -> factor * step.value()).orElse(Double.NaN));
  }
}
