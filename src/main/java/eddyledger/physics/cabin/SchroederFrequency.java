package eddyledger.physics.cabin;

import eddyledger.physics.Remark;
import java.util.Locale;
import java.util.Optional;

/**
 * Frequency above which the modes of a zone overlap enough to be taken as a diffuse field.
 *
 * <p>Formula: f_S = 2000 √(T/V).
 *
 * <ul>
 *   <li>f_S: Schroeder frequency, Hz
 *   <li>T: reverberation time, s
 *   <li>V: volume, m³
 *   <li>2000: (m³/s³)^½, three modes within a half-power bandwidth
 * </ul>
 *
 * <p>Source: Schroeder, The "Schroeder frequency" revisited, J. Acoust. Soc. Am. 99 (1996) 3240,
 * eq. (1).
 *
 * <p>Range: below f_S the power balance gives the average over the zone only; single places differ
 * by some 5 dB, and differences between seats mean nothing. {@link #remark(double, double)} says
 * so.
 *
 * <p>Checked by {@code SabineReferenceTest}.
 */
public final class SchroederFrequency {
  private static final double FACTOR = 2000.0;

  private SchroederFrequency() {}

  /**
   * Schroeder frequency in Hz of a volume in m³ with a reverberation time in s.
   *
   * @throws IllegalArgumentException if one is not positive
   */
  public static double ofReverberationTime(double volume, double reverberationTime) {
    if (!(volume > 0.0) || !(reverberationTime > 0.0)) {
      throw new IllegalArgumentException(
          "volume and reverberation time must be positive, not "
              + volume
              + " m³ and "
              + reverberationTime
              + " s");
    }
    return FACTOR * Math.sqrt(reverberationTime / volume);
  }

  /**
   * Schroeder frequency in Hz of a volume in m³ with an absorption area in m², through {@link
   * Sabine}.
   *
   * @throws IllegalArgumentException if one is not positive
   */
  public static double ofAbsorptionArea(double volume, double absorptionArea) {
    return ofReverberationTime(volume, Sabine.reverberationTime(volume, absorptionArea));
  }

  /** What to say about a band below the Schroeder frequency, both in Hz; empty at or above it. */
  public static Optional<Remark> remark(double bandFrequency, double schroederFrequency) {
    if (bandFrequency >= schroederFrequency) {
      return Optional.empty();
    }
    return Optional.of(
        Remark.outOfRange(
            "Schroeder frequency",
            String.format(
                Locale.ROOT,
                "%.0f Hz is below the zone's Schroeder frequency of %.0f Hz: "
                    + "the level is the zone's average, seats differ by some 5 dB",
                bandFrequency,
                schroederFrequency)));
  }
}
