package eddyledger.physics.flow;

import java.util.stream.Stream;

/**
 * What is known of a boundary layer: any non-empty subset of five quantities, null where unknown.
 *
 * @param runningLength length of turbulent flow upstream x, m
 * @param thickness 99 % thickness δ, m
 * @param displacementThickness kinematic displacement thickness δ*, m (density left out of the
 *     integral)
 * @param momentumThickness kinematic momentum thickness θ, m
 * @param wallShearStress τ_w, Pa
 */
public record BoundaryLayerInput(
    Double runningLength,
    Double thickness,
    Double displacementThickness,
    Double momentumThickness,
    Double wallShearStress) {

  /**
   * Checks the quantities.
   *
   * @throws IllegalArgumentException if none is given, or one is not finite and above 0
   */
  public BoundaryLayerInput {
    check("running length", runningLength, "m");
    check("boundary-layer thickness", thickness, "m");
    check("displacement thickness", displacementThickness, "m");
    check("momentum thickness", momentumThickness, "m");
    check("wall shear stress", wallShearStress, "Pa");
    if (Stream.of(
            runningLength != null,
            thickness != null,
            displacementThickness != null,
            momentumThickness != null,
            wallShearStress != null)
        .noneMatch(given -> given)) {
      throw new IllegalArgumentException(
          "a boundary layer needs one of running length, thickness, displacement thickness,"
              + " momentum thickness, wall shear stress");
    }
  }

  /** Only the running length is known, m. */
  public static BoundaryLayerInput ofRunningLength(double length) {
    return new BoundaryLayerInput(length, null, null, null, null);
  }

  /** Only the 99 % thickness is known, m. */
  public static BoundaryLayerInput ofThickness(double thickness) {
    return new BoundaryLayerInput(null, thickness, null, null, null);
  }

  /** Only the displacement thickness is known, m. */
  public static BoundaryLayerInput ofDisplacementThickness(double thickness) {
    return new BoundaryLayerInput(null, null, thickness, null, null);
  }

  /** Only the momentum thickness is known, m. */
  public static BoundaryLayerInput ofMomentumThickness(double thickness) {
    return new BoundaryLayerInput(null, null, null, thickness, null);
  }

  /** Only the wall shear stress is known, Pa. */
  public static BoundaryLayerInput ofWallShearStress(double stress) {
    return new BoundaryLayerInput(null, null, null, null, stress);
  }

  /** How many of the three thicknesses are given, 0 to 3. */
  int thicknessCount() {
    int count = thickness == null ? 0 : 1;
    count += displacementThickness == null ? 0 : 1;
    return count + (momentumThickness == null ? 0 : 1);
  }

  private static void check(String quantity, Double value, String unit) {
    if (value != null) {
      Numbers.requirePositive(quantity, value, unit);
    }
  }
}
