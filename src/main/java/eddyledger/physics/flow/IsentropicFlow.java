package eddyledger.physics.flow;

import static eddyledger.physics.flow.AirState.HEAT_RATIO;

/**
 * How temperature, pressure and speed along the skin hang together where no heat is lost and no
 * shock stands: the relations between free stream and edge of the boundary layer.
 *
 * <p>Formula: p_e/p = 1 + (γ/2) M² C_p; T_e/T = (p_e/p)^((γ−1)/γ); U_e/U = √(1 + 2 (1 −
 * T_e/T)/((γ−1) M²)), or backwards T_e/T = 1 + ((γ−1)/2) M² (1 − (U_e/U)²). Limits of C_p: vacuum
 * −2/(γ M²); stagnation (2/(γ M²)) {[1 + ((γ−1)/2) M²]^(γ/(γ−1)) − 1}; local sonic point (2/(γ M²))
 * {[(2 + (γ−1) M²)/(γ+1)]^(γ/(γ−1)) − 1}.
 *
 * <p>Symbols: M free-stream Mach number; C_p pressure coefficient over the free stream's dynamic
 * pressure; U, U_e speeds, m/s; T, T_e, K; p, p_e, Pa; index e at the edge; γ = 1.4.
 *
 * <p>Source: H. W. Liepmann, A. Roshko, "Elements of Gasdynamics" (1957), chapter 2.
 *
 * <p>Range: from the vacuum limit to stagnation. Differences from 1 are carried as such, so that no
 * digits are lost at small M.
 *
 * <p>Checked by {@code EdgeFlowReferenceTest} and {@code EdgeFlowTest}.
 */
public final class IsentropicFlow {
  private static final double PRESSURE_EXPONENT = HEAT_RATIO / (HEAT_RATIO - 1.0);

  private IsentropicFlow() {}

  /** Pressure coefficient of vacuum, not reached. */
  public static double vacuumPressureCoefficient(double mach) {
    return -2.0 / (HEAT_RATIO * mach * mach);
  }

  /** Pressure coefficient where the flow comes to rest. */
  public static double stagnationPressureCoefficient(double mach) {
    return pressureCoefficient(0.5 * (HEAT_RATIO - 1.0) * mach * mach, mach);
  }

  /** Pressure coefficient where the local Mach number is 1. */
  public static double sonicPressureCoefficient(double mach) {
    double excess = (HEAT_RATIO - 1.0) * (mach * mach - 1.0) / (HEAT_RATIO + 1.0);
    return pressureCoefficient(excess, mach);
  }

  /** Pressure coefficient of a temperature excess T_e/T − 1. */
  static double pressureCoefficient(double temperatureExcess, double mach) {
    double pressureExcess = Math.expm1(PRESSURE_EXPONENT * Math.log1p(temperatureExcess));
    return 2.0 * pressureExcess / (HEAT_RATIO * mach * mach);
  }

  /** Temperature excess T_e/T − 1 of a pressure coefficient above the vacuum limit. */
  static double temperatureExcess(double pressureCoefficient, double mach) {
    double pressureExcess = 0.5 * HEAT_RATIO * mach * mach * pressureCoefficient;
    return Math.expm1(Math.log1p(pressureExcess) / PRESSURE_EXPONENT);
  }

  /** Temperature excess T_e/T − 1 of a speed ratio U_e/U; −1 or less past the vacuum limit. */
  static double temperatureExcessOfRatio(double speedRatio, double mach) {
    return 0.5 * (HEAT_RATIO - 1.0) * mach * mach * (1.0 - speedRatio * speedRatio);
  }

  /** Squared speed ratio (U_e/U)² of a temperature excess; 0 or less past stagnation. */
  static double squaredSpeedRatio(double temperatureExcess, double mach) {
    return 1.0 - 2.0 * temperatureExcess / ((HEAT_RATIO - 1.0) * mach * mach);
  }

  /** The air of a free stream brought to another temperature without loss. */
  static AirState brought(AirState freeStream, double temperatureExcess) {
    double pressureRatio = Math.exp(PRESSURE_EXPONENT * Math.log1p(temperatureExcess));
    return new AirState(
        freeStream.temperature() * (1.0 + temperatureExcess),
        freeStream.pressure() * pressureRatio);
  }
}
