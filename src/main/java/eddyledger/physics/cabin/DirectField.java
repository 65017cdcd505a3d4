package eddyledger.physics.cabin;

/**
 * Mean-square pressure that comes straight from a panel to a receiver in its line of sight.
 *
 * <p>Formula: p² = ρ0 c0 W / (S + 2 π d²).
 *
 * <ul>
 *   <li>p²: mean-square pressure of the direct field, Pa²
 *   <li>W: sound power radiated by the panel, W
 *   <li>S: area of the panel, m²
 *   <li>d: distance from the panel to the receiver, m
 *   <li>ρ0 c0: characteristic impedance of the cabin air, Pa s/m
 * </ul>
 *
 * <p>Source: this program's own bridge between two exact ends: the intensity W/S at the panel and
 * W/(2 π d²) of a source in a wall far from it.
 *
 * <p>Range: d from 0 up, receiver in the same zone. Without the directivity of the panel; between
 * the two ends it is an estimate, good to a few decibels.
 *
 * <p>One-sided mean squares and powers of a band, no densities.
 *
 * <p>Checked by {@code CabinReferenceTest} and {@code ReceiverTransferTest}.
 */
public final class DirectField {
  private DirectField() {}

  /**
   * Mean-square pressure per watt, Pa²/W.
   *
   * @param panelArea S, m²
   * @param distance d, m
   * @param characteristicImpedance ρ0 c0, Pa s/m
   * @throws IllegalArgumentException if the area or the impedance is not positive, or the distance
   *     negative
   */
  public static double meanSquarePerWatt(
      double panelArea, double distance, double characteristicImpedance) {
    if (!(panelArea > 0.0)) {
      throw new IllegalArgumentException("a panel's area must be positive, not " + panelArea);
    }
    if (!(distance >= 0.0)) {
      throw new IllegalArgumentException("a distance must not be negative: " + distance);
    }
    if (!(characteristicImpedance > 0.0)) {
      throw new IllegalArgumentException(
          "the characteristic impedance must be positive, not " + characteristicImpedance);
    }
    return characteristicImpedance / (panelArea + 2.0 * Math.PI * distance * distance);
  }
}
