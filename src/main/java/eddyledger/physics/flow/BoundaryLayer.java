package eddyledger.physics.flow;

import eddyledger.physics.Remark;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Complete state of a turbulent boundary layer, as the wall-pressure spectra need it.
 *
 * <p>Symbols: U_e, ρ_e at the edge; ρ_w, ν_w at the wall; u_τ = √(τ_w/ρ_w); C_f = τ_w/(ρ_e U_e²/2);
 * Re_τ = u_τ δ/ν_w; Re_θ = U_e θ/ν_w; R_T = (δ/U_e)/(ν_w/u_τ²); H = δ* / θ.
 *
 * <p>Made by {@link BoundaryLayerCompletion}; made directly only where a published state is given.
 *
 * @param edge flow at the edge, with its own remarks
 * @param thickness 99 % thickness δ, m
 * @param displacementThickness kinematic displacement thickness δ*, m
 * @param momentumThickness kinematic momentum thickness θ, m
 * @param compressibleDisplacementThickness displacement thickness with the density in its integral,
 *     m
 * @param wallShearStress τ_w, Pa
 * @param wallDensity ρ_w, kg/m³
 * @param wallKinematicViscosity ν_w, m²/s
 * @param runningLength length of turbulent flow upstream, m, as given or as it would have to be for
 *     this momentum thickness; empty if there is none
 * @param remarks what was filled in by which rule, and what lies outside its range
 */
public record BoundaryLayer(
    EdgeFlow edge,
    double thickness,
    double displacementThickness,
    double momentumThickness,
    double compressibleDisplacementThickness,
    double wallShearStress,
    double wallDensity,
    double wallKinematicViscosity,
    OptionalDouble runningLength,
    List<Remark> remarks) {

  /**
   * Checks the state.
   *
   * @throws IllegalArgumentException if a number is not finite and above 0
   */
  public BoundaryLayer {
    Numbers.requirePositive("boundary-layer thickness", thickness, "m");
    Numbers.requirePositive("displacement thickness", displacementThickness, "m");
    Numbers.requirePositive("momentum thickness", momentumThickness, "m");
    Numbers.requirePositive(
        "compressible displacement thickness", compressibleDisplacementThickness, "m");
    Numbers.requirePositive("wall shear stress", wallShearStress, "Pa");
    Numbers.requirePositive("density at the wall", wallDensity, "kg/m³");
    Numbers.requirePositive("kinematic viscosity at the wall", wallKinematicViscosity, "m²/s");
    remarks = List.copyOf(remarks);
  }

  /** Speed at the edge U_e, m/s. */
  public double edgeSpeed() {
    return edge.speed();
  }

  /** Dynamic pressure at the edge q = ρ_e U_e²/2, Pa. */
  public double dynamicPressure() {
    return edge.dynamicPressure();
  }

  /** Friction velocity u_τ, m/s. */
  public double frictionVelocity() {
    return Math.sqrt(wallShearStress / wallDensity);
  }

  /** Skin-friction coefficient C_f over the dynamic pressure at the edge. */
  public double skinFriction() {
    return wallShearStress / dynamicPressure();
  }

  /** Friction Reynolds number Re_τ. */
  public double frictionReynolds() {
    return frictionVelocity() * thickness / wallKinematicViscosity;
  }

  /** Momentum-thickness Reynolds number Re_θ with the viscosity at the wall. */
  public double momentumReynolds() {
    return edgeSpeed() * momentumThickness / wallKinematicViscosity;
  }

  /** Ratio of outer to inner time scale R_T. */
  public double timeScaleRatio() {
    return frictionReynolds() * frictionVelocity() / edgeSpeed();
  }

  /** Shape factor H of the kinematic thicknesses. */
  public double shapeFactor() {
    return displacementThickness / momentumThickness;
  }
}
