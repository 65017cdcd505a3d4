package eddyledger.physics.path;

import eddyledger.quantity.Decibels;

/**
 * Sound power that a panel lets into its zone, from a measured level difference between the wall
 * pressure outside and the zone inside.
 *
 * <p>Formula: W = p²_out · 10^(−D/10) · A / (4 ρ0 c0).
 *
 * <ul>
 *   <li>W: sound power let into the zone, W
 *   <li>p²_out: mean-square wall pressure on the outside in the band, Pa²
 *   <li>D: level difference in the band, level of the outside wall pressure minus level in the
 *       receiving zone, dB
 *   <li>A: absorption area of the receiving zone when D was measured, m²
 *   <li>ρ0 c0: characteristic impedance of the air in that zone, Pa s/m
 * </ul>
 *
 * <p>Derivation: in the measurement the zone held p²_in = p²_out 10^(−D/10). A diffuse field of
 * mean square p²_in carries the one-sided intensity p²_in / (4 ρ0 c0) onto every surface, so the
 * zone swallowed the power A p²_in / (4 ρ0 c0), and in the steady state that is what came in. With
 * the power, the panel can be put into a zone of another absorption. Source: textbook power balance
 * of a diffuse field, for example Kuttruff, Room Acoustics (from memory).
 *
 * <p>Range: a receiving zone that was nearly diffuse, and no other way into it that counted. D
 * holds for the kind of outside pressure it was measured with: one for sound is not one for a
 * turbulent boundary layer.
 *
 * <p>Band mean squares and band powers, one-sided, no densities.
 *
 * <p>Checked by {@code LevelDifferenceTest}.
 */
public final class LevelDifference {
  private LevelDifference() {}

  /**
   * Power let into the zone in one band.
   *
   * @param outsideMeanSquare mean-square wall pressure outside, Pa²
   * @param difference level difference, dB, may be negative; NaN if missing
   * @param absorptionArea absorption area of the zone it was measured in, m²
   * @param characteristicImpedance ρ0 c0 of the air in that zone, Pa s/m
   * @return W; NaN if pressure or difference is missing
   * @throws IllegalArgumentException if the absorption area or the impedance is not positive
   */
  public static double power(
      double outsideMeanSquare,
      double difference,
      double absorptionArea,
      double characteristicImpedance) {
    if (!(absorptionArea > 0.0)) {
      throw new IllegalArgumentException(
          "a level difference needs a positive absorption area, not " + absorptionArea + " m²");
    }
    if (!(characteristicImpedance > 0.0)) {
      throw new IllegalArgumentException(
          "the characteristic impedance must be positive, not " + characteristicImpedance);
    }
    double insideMeanSquare = outsideMeanSquare * Decibels.ratio(-difference);
    return insideMeanSquare * absorptionArea / (4.0 * characteristicImpedance);
  }
}
