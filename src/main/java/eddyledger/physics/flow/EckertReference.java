package eddyledger.physics.flow;

import static eddyledger.physics.flow.AirState.HEAT_RATIO;

/**
 * Compressible layer over an adiabatic wall by way of a reference temperature at which the
 * incompressible formulas hold.
 *
 * <p>Formula: T_aw = T_e (1 + r (γ−1)/2 M_e²); T_w = T_aw; T* = T_e + 0.5 (T_w − T_e) + 0.22 (T_aw
 * − T_e). Momentum thickness with density θ_c = θ T_e/T*, displacement thickness with density δ*_c
 * = θ_c [(H + 1)(1 + r (γ−1)/2 M_e²) − 1].
 *
 * <p>Symbols: T_e, T_w, T_aw, T* temperatures at edge, wall, adiabatic wall and reference, K; r =
 * 0.89 recovery factor of a turbulent layer; M_e Mach number at the edge; θ kinematic momentum
 * thickness, m; H kinematic shape factor; γ = 1.4.
 *
 * <p>Source: E. R. G. Eckert, J. Aeronaut. Sci. 22 (1955) 585, from memory; displacement thickness
 * after J. E. Green, D. J. Weeks, J. W. F. Brooman, RAE TR 72231 (1973), from memory.
 *
 * <p>Range: subsonic and moderately supersonic edges, wall without heat flow; not remarked here (a
 * supersonic edge is remarked by {@link EdgeFlow}).
 *
 * <p>Checked by {@code BoundaryLayerReferenceTest}.
 */
final class EckertReference {
  private static final double RECOVERY = 0.89;
  private static final double WALL_SHARE = 0.5;
  private static final double RECOVERY_SHARE = 0.22;

  private EckertReference() {}

  /** The three airs of a layer over an adiabatic wall. */
  static LayerAir adiabatic(EdgeFlow edge) {
    AirState air = edge.air();
    double heating = (recoveryRatio(edge.mach()) - 1.0) * air.temperature();
    double reference = air.temperature() + (WALL_SHARE + RECOVERY_SHARE) * heating;
    return new LayerAir(
        air,
        new AirState(reference, air.pressure()),
        new AirState(air.temperature() + heating, air.pressure()));
  }

  /**
   * Displacement thickness with the density in its integral, m.
   *
   * @param air the airs of the layer; its edge and wall say how much the air is heated
   * @param displacement kinematic displacement thickness, m
   * @param momentum kinematic momentum thickness, m
   */
  static double compressibleDisplacement(LayerAir air, double displacement, double momentum) {
    double edge = air.edge().temperature();
    double compressibleMomentum = momentum * edge / air.reference().temperature();
    double wallRatio = air.wall().temperature() / edge;
    return compressibleMomentum * ((displacement / momentum + 1.0) * wallRatio - 1.0);
  }

  private static double recoveryRatio(double mach) {
    return 1.0 + RECOVERY * 0.5 * (HEAT_RATIO - 1.0) * mach * mach;
  }
}
