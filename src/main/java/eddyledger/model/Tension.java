package eddyledger.model;

/**
 * In-plane tension of a panel, in one of two ways.
 *
 * <p>From the cabin's overpressure on a cylinder of the construction's radius: share · p R/2 along
 * and share · p R across, with p the cabin's pressure less the outside pressure of the condition.
 * Or entered for each condition.
 *
 * @param skinShare part of the load that the skin carries beside its stiffeners, 0 to 1; null if
 *     the tension is entered
 * @param along tension along the panel's length, N/m; null if it comes from the overpressure
 * @param across tension across, N/m; null if it comes from the overpressure
 * @param extras unknown properties
 */
public record Tension(
    Judged skinShare, ByCondition<Judged> along, ByCondition<Judged> across, Extras extras) {

  /** Tension from the cabin's overpressure, of which the skin carries a share. */
  public static Tension fromCabinPressure(double skinShare) {
    return new Tension(Judged.of(skinShare), null, null, Extras.NONE);
  }
}
