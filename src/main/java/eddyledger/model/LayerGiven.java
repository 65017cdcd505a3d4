package eddyledger.model;

/**
 * What is known of the boundary layer over a panel; whatever is left out is filled in.
 *
 * @param runningLength running length of turbulent flow up to the panel, m; null if not given
 * @param thickness boundary-layer thickness, m; null if not given
 * @param displacementThickness displacement thickness, m; null if not given
 * @param momentumThickness momentum thickness, m; null if not given
 * @param wallShear wall shear stress, Pa; null if not given
 * @param extras unknown properties
 */
public record LayerGiven(
    Judged runningLength,
    Judged thickness,
    Judged displacementThickness,
    Judged momentumThickness,
    Judged wallShear,
    Extras extras) {

  /** A layer known by its thickness in metres. */
  public static LayerGiven thickness(double thickness) {
    return new LayerGiven(null, Judged.of(thickness), null, null, null, Extras.NONE);
  }

  /** Whether nothing at all is given. */
  public boolean empty() {
    return runningLength == null
        && thickness == null
        && displacementThickness == null
        && momentumThickness == null
        && wallShear == null;
  }
}
