package eddyledger.ledger;

import eddyledger.physics.flow.StandardAtmosphere;
import eddyledger.physics.wallpressure.ButterworthCrossSpectrum;
import eddyledger.physics.wallpressure.ExponentialTerms;

/**
 * Curves that explain a step of a trace, from the same formulas that the step was computed with.
 * They are drawn, never added to a level.
 */
public final class PictureCurves {
  private PictureCurves() {}

  /**
   * Coherence of the wall pressure over distances in one direction: 1 at no distance, falling to 0.
   *
   * @param order order of the cross-spectrum in that direction, 1 to 5
   * @param decay decay rate at that order, above 0
   * @param convectionSpeed convection speed, m/s
   * @param frequency frequency, Hz
   * @param distances distances, m
   * @return the coherence, shape of the distances
   */
  public static double[] coherence(
      int order, double decay, double convectionSpeed, double frequency, double[] distances) {
    ExponentialTerms terms =
        new ButterworthCrossSpectrum(order, order, decay, decay)
            .acrossFlow(2.0 * Math.PI * frequency, convectionSpeed);
    double[] coherence = new double[distances.length];
    for (int i = 0; i < distances.length; i++) {
      coherence[i] = terms.coherence(distances[i]);
    }
    return coherence;
  }

  /**
   * Temperature of the standard atmosphere over pressure altitude.
   *
   * @param altitudes pressure altitudes, m, 0 to 20 000
   * @param offset temperature above the standard day's, K
   * @return temperatures, K, shape of the altitudes
   */
  public static double[] temperature(double[] altitudes, double offset) {
    double[] temperatures = new double[altitudes.length];
    for (int i = 0; i < altitudes.length; i++) {
      temperatures[i] = StandardAtmosphere.at(altitudes[i], offset).temperature();
    }
    return temperatures;
  }
}
