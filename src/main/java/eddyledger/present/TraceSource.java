package eddyledger.present;

import eddyledger.ledger.Ledger;
import eddyledger.ledger.Trace;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import eddyledger.model.Zone;
import eddyledger.present.StageSteps.Stage;
import eddyledger.quantity.Bands;

/**
 * What the stages of an account are written from.
 *
 * @param ledger the ledger
 * @param trace the trace, with a value
 * @param path the panel's place in the tree
 * @param steps the trace's steps by stage
 * @param where where settings are from
 * @param band the followed band, 0 .. 27
 */
record TraceSource(
    Ledger ledger, Trace trace, TreePath path, StageSteps steps, Where where, int band) {

  static TraceSource of(Ledger ledger, Trace trace, TreePath path, int band) {
    Where where = new Where(ledger.vehicle(), path, trace.condition().id());
    return new TraceSource(ledger, trace, path, new StageSteps(trace), where, band);
  }

  Vehicle vehicle() {
    return ledger.vehicle();
  }

  /** Whether the panel is given by measurement. */
  boolean measured() {
    return trace.panel().measured() != null;
  }

  /** The value of a step in the followed band; NaN if there is no such step. */
  double value(String symbol) {
    return steps.find(symbol).map(step -> step.values().value(band)).orElse(Double.NaN);
  }

  /** The values of a step in all bands, shape [28]; NaN if there is no such step. */
  double[] values(String symbol) {
    return steps
        .find(symbol)
        .map(step -> step.values().toArray())
        .orElseGet(() -> each(position -> Double.NaN));
  }

  /** What a stage changes in all bands, dB, shape [28]. */
  double[] changes(Stage stage) {
    return each(position -> steps.change(stage, position));
  }

  /** The running level after a stage in all bands, dB, shape [28]. */
  double[] levels(Stage stage) {
    return each(position -> steps.level(stage, position));
  }

  private static double[] each(java.util.function.IntToDoubleFunction function) {
    double[] values = new double[Bands.COUNT];
    for (int position = 0; position < Bands.COUNT; position++) {
      values[position] = function.applyAsDouble(position);
    }
    return values;
  }

  /** Name of the followed band. */
  String bandName() {
    return Readable.band(band);
  }

  /** The zone the panel radiates into. */
  Zone zone() {
    return zone(where.fixed(settings -> settings.zone()).orElse(""));
  }

  /** A zone by its id. */
  Zone zone(String id) {
    return vehicle().zones().stream()
        .filter(zone -> zone.id().equals(id))
        .findFirst()
        .orElseThrow();
  }
}
