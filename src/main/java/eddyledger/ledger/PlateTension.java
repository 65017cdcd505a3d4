package eddyledger.ledger;

import eddyledger.model.ByCondition;
import eddyledger.model.Judged;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Tension;

/**
 * The in-plane tension of a plate in a condition.
 *
 * <p>Formula: on a cylinder of radius R under the overpressure p, N_along = s p R/2 and N_across =
 * s p R with the skin's share s; nothing below zero, since a skin that is pressed in would buckle,
 * not slacken.
 *
 * <p>Source: thin-walled cylinder, any textbook of strength of materials; the share is judged.
 *
 * @param along tension along the length, N/m
 * @param across tension across, N/m
 * @param words how it came about, for the trace
 */
record PlateTension(double along, double across, String words) {

  static PlateTension of(PlateConstruction plate, ResolvedCondition condition) {
    Tension tension = plate.tension();
    if (tension == null) {
      return new PlateTension(0.0, 0.0, "no tension");
    }
    if (tension.skinShare() == null) {
      return new PlateTension(
          entered(tension.along(), condition), entered(tension.across(), condition), "entered");
    }
    double share = tension.skinShare().best();
    double load = Math.max(0.0, condition.overpressure()) * plate.radius();
    return new PlateTension(
        share * load / 2.0,
        share * load,
        "cabin's overpressure "
            + Math.round(condition.overpressure())
            + " Pa on radius "
            + plate.radius()
            + " m, of which the skin carries "
            + share);
  }

  private static double entered(ByCondition<Judged> value, ResolvedCondition condition) {
    Judged held = value == null ? null : value.in(condition.id());
    return held == null ? 0.0 : held.best();
  }
}
