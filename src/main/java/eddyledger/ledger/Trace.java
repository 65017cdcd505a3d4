package eddyledger.ledger;

import eddyledger.model.OperatingCondition;
import eddyledger.model.Panel;
import eddyledger.model.Receiver;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.util.Arrays;
import java.util.List;

/**
 * The account of one panel's contribution at one receiver in one condition, from ambient air to
 * level.
 *
 * @param panel the panel
 * @param condition the operating condition
 * @param receiver the receiver
 * @param steps the steps in the order sound travels; empty if there is no value
 * @param bands the numbers of each band; null if there is no value
 * @param status whether there is a value
 * @param reason why there is none, or what is missing; empty if nothing
 */
public record Trace(
    Panel panel,
    OperatingCondition condition,
    Receiver receiver,
    List<TraceStep> steps,
    TraceBands bands,
    Status status,
    String reason) {
  public Trace {
    steps = List.copyOf(steps);
  }

  /** Whether there is a value to account for. */
  public boolean hasValue() {
    return bands != null;
  }

  /**
   * The start times all factors: the mean square at the receiver as the steps tell it, Pa² per
   * band.
   */
  public BandSpectrum product() {
    double[] product = new double[Bands.COUNT];
    Arrays.fill(product, 1.0);
    for (TraceStep step : steps) {
      if (step.role() == TraceStep.Role.START || step.role() == TraceStep.Role.FACTOR) {
        for (int band = 0; band < Bands.COUNT; band++) {
          product[band] *= step.values().value(band);
        }
      }
    }
    return BandSpectrum.of(product);
  }
}
