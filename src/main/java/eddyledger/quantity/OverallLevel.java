package eddyledger.quantity;

import java.util.OptionalDouble;

/**
 * Overall level of a band spectrum, linear (unweighted) or A-weighted.
 *
 * <p>Formula: L = 10 lg Σ_i 10^(L_i/10) and L_A = 10 lg Σ_i 10^((L_i + A_i)/10); on mean squares p²
 * = Σ_i p²_i and p²_A = Σ_i 10^(A_i/10) p²_i.
 *
 * <ul>
 *   <li>L_i: level of band i, dB re 20 µPa; L, L_A: overall level, dB and dB(A) re 20 µPa
 *   <li>p²_i: mean-square pressure of band i, Pa²
 *   <li>A_i: A-weight at the exact mid-band frequency, dB
 * </ul>
 *
 * <p>Source: ISO 80000-8 (levels add as energies); IEC 61672-1:2013 (weighting).
 *
 * <p>Range: the 28 bands, all of them. A spectrum that lacks a band has no overall level: the
 * result is empty, or NaN for mean squares, and never smaller by the missing band.
 *
 * <p>One-sided mean squares in bands, no densities.
 *
 * <p>Checked by {@code LevelSumsReferenceTest}, {@code OctaveRowsReferenceTest} and {@code
 * OverallLevelTest}.
 */
public final class OverallLevel {
  private OverallLevel() {}

  /** Linear overall level in dB of band levels in dB; empty if a band is missing. */
  public static OptionalDouble linear(BandSpectrum levels) {
    return level(linearMeanSquare(meanSquares(levels)));
  }

  /**
   * A-weighted overall level in dB(A) of unweighted band levels in dB; empty if a band is missing.
   */
  public static OptionalDouble aWeighted(BandSpectrum levels) {
    return level(aWeightedMeanSquare(meanSquares(levels)));
  }

  /**
   * Overall mean square.
   *
   * @param meanSquares mean squares of the bands, Pa², shape [28], NaN where missing
   * @return Pa²; NaN if a band is missing
   * @throws IllegalArgumentException if there are not 28 values
   */
  public static double linearMeanSquare(double[] meanSquares) {
    requireAllBands(meanSquares);
    double sum = 0.0;
    for (double meanSquare : meanSquares) {
      sum += meanSquare;
    }
    return sum;
  }

  /**
   * A-weighted overall mean square.
   *
   * @param meanSquares unweighted mean squares of the bands, Pa², shape [28], NaN where missing
   * @return Pa²; NaN if a band is missing
   * @throws IllegalArgumentException if there are not 28 values
   */
  public static double aWeightedMeanSquare(double[] meanSquares) {
    requireAllBands(meanSquares);
    BandSpectrum ratios = AWeighting.energyRatios();
    double sum = 0.0;
    for (int i = 0; i < Bands.COUNT; i++) {
      sum += ratios.value(i) * meanSquares[i];
    }
    return sum;
  }

  private static double[] meanSquares(BandSpectrum levels) {
    return levels.map(Decibels::meanSquarePressure).toArray();
  }

  private static OptionalDouble level(double meanSquare) {
    return Double.isNaN(meanSquare)
        ? OptionalDouble.empty()
        : OptionalDouble.of(Decibels.pressureLevel(meanSquare));
  }

  private static void requireAllBands(double[] values) {
    if (values.length != Bands.COUNT) {
      throw new IllegalArgumentException(
          "an overall value needs " + Bands.COUNT + " bands, not " + values.length);
    }
  }
}
