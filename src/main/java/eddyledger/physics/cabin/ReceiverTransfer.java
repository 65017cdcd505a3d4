package eddyledger.physics.cabin;

/**
 * Mean-square pressure at a receiver per sound power of a panel, in one band.
 *
 * <p>Formula: without a distance the diffuse part alone, P_rz; with one, (1 − ᾱ) P_rz + ρ0 c0/(S +
 * 2 π d²).
 *
 * <ul>
 *   <li>P_rz: mean square in the receiver's zone per watt let into the panel's zone, Pa²/W ({@link
 *       ZoneBalance})
 *   <li>ᾱ: mean absorption coefficient of the panel's zone, dimensionless
 *   <li>S, d, ρ0 c0: as in {@link DirectField}
 * </ul>
 *
 * <p>Source: Kuttruff, Room Acoustics (direct and reverberant field of a source in a room). The
 * factor (1 − ᾱ), from memory, takes away the power that the direct sound loses at its first
 * reflection before it feeds the diffuse field; it stands only where the direct sound is counted on
 * its own, for else its power would be lost from the balance.
 *
 * <p>Range: direct sound only within the receiver's own zone. Contributions of panels add as mean
 * squares.
 *
 * <p>One-sided mean squares and powers of a band, no densities.
 *
 * <p>Checked by {@code CabinReferenceTest} and {@code ReceiverTransferTest}.
 */
public final class ReceiverTransfer {
  private final ZoneBalance balance;
  private final int zone;

  /**
   * A receiver in a zone.
   *
   * @param balance the zones' balance in the band
   * @param zone position of the receiver's zone
   * @throws IllegalArgumentException if there is no such zone
   */
  public ReceiverTransfer(ZoneBalance balance, int zone) {
    if (zone < 0 || zone >= balance.zones()) {
      throw new IllegalArgumentException("there is no zone " + zone + " for a receiver");
    }
    this.balance = balance;
    this.zone = zone;
  }

  /** Pa²/W from a panel of the zone at a position, diffuse part alone. */
  public double diffuse(int sourceZone) {
    return balance.meanSquarePerWatt(zone, sourceZone);
  }

  /**
   * Pa²/W from a panel of the receiver's own zone in its line of sight, diffuse and direct part.
   *
   * @param meanAbsorption mean absorption coefficient of the zone, 0 .. 1
   * @param panelArea area of the panel, m²
   * @param distance distance from the panel to the receiver, m
   * @throws IllegalArgumentException if the mean absorption is outside 0 .. 1, the area is not
   *     positive or the distance negative
   */
  public double withDirect(double meanAbsorption, double panelArea, double distance) {
    if (!(meanAbsorption >= 0.0 && meanAbsorption <= 1.0)) {
      throw new IllegalArgumentException(
          "a mean absorption coefficient lies between 0 and 1, not at " + meanAbsorption);
    }
    return (1.0 - meanAbsorption) * diffuse(zone)
        + DirectField.meanSquarePerWatt(panelArea, distance, balance.characteristicImpedance());
  }
}
