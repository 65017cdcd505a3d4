package eddyledger.physics.cabin;

import eddyledger.physics.Remark;
import java.util.Locale;
import java.util.Optional;

/**
 * Reverberation time, absorption area and mean absorption of a zone.
 *
 * <p>Formula: T = 0.161 V/A; ᾱ = A/S.
 *
 * <ul>
 *   <li>T: reverberation time, s
 *   <li>V: volume of the zone, m³
 *   <li>A: absorption area, m²
 *   <li>S: inner surface, m²
 *   <li>ᾱ: mean absorption coefficient, dimensionless
 *   <li>0.161: 24 ln 10 / c0 at room temperature, s/m
 * </ul>
 *
 * <p>Source: Sabine; for example Kuttruff, Room Acoustics (from memory). Air absorption left out.
 *
 * <p>Range: nearly diffuse zones, ᾱ up to {@value #DIFFUSE_LIMIT}. Cabins often exceed it; the
 * values are then still returned, and {@link #remark(double)} says so.
 *
 * <p>Checked by {@code SabineReferenceTest}.
 */
public final class Sabine {
  /** Mean absorption up to which a zone passes for diffuse. */
  public static final double DIFFUSE_LIMIT = 0.4;

  private static final double SECONDS_PER_METRE = 0.161;

  private Sabine() {}

  /**
   * Reverberation time in s of a volume in m³ with an absorption area in m².
   *
   * @throws IllegalArgumentException if one is not positive
   */
  public static double reverberationTime(double volume, double absorptionArea) {
    requirePositive(volume, "volume");
    requirePositive(absorptionArea, "absorption area");
    return SECONDS_PER_METRE * volume / absorptionArea;
  }

  /**
   * Absorption area in m² of a volume in m³ with a reverberation time in s.
   *
   * @throws IllegalArgumentException if one is not positive
   */
  public static double absorptionArea(double volume, double reverberationTime) {
    requirePositive(volume, "volume");
    requirePositive(reverberationTime, "reverberation time");
    return SECONDS_PER_METRE * volume / reverberationTime;
  }

  /**
   * Mean absorption coefficient of an absorption area and an inner surface, both in m²; above 1
   * where the two do not belong together.
   *
   * @throws IllegalArgumentException if one is not positive
   */
  public static double meanAbsorption(double absorptionArea, double surface) {
    requirePositive(absorptionArea, "absorption area");
    requirePositive(surface, "inner surface");
    return absorptionArea / surface;
  }

  /** What to say about a zone of a mean absorption; empty where it passes for diffuse. */
  public static Optional<Remark> remark(double meanAbsorption) {
    if (meanAbsorption <= DIFFUSE_LIMIT) {
      return Optional.empty();
    }
    return Optional.of(
        Remark.outOfRange(
            "mean absorption of a diffuse zone",
            String.format(
                Locale.ROOT,
                "mean absorption %.2f is above %.1f: the zone is not diffuse, "
                    + "levels differ from place to place",
                meanAbsorption,
                DIFFUSE_LIMIT)));
  }

  private static void requirePositive(double value, String what) {
    if (!(value > 0.0)) {
      throw new IllegalArgumentException("the " + what + " must be positive, not " + value);
    }
  }
}
