package eddyledger.physics.flow;

import static eddyledger.physics.Wording.number;
import static eddyledger.physics.flow.Numbers.requirePositive;

import eddyledger.physics.Remark;
import java.util.List;

/**
 * The flow at the outer edge of the boundary layer, and the ways to it from the free stream.
 *
 * <p>Formula: {@link IsentropicFlow} between free stream and edge; or, only when asked for,
 * incompressible U_e = U √(1 − C_p) with the air unchanged.
 *
 * <p>Source: as {@link IsentropicFlow}; the incompressible way is Bernoulli's equation.
 *
 * <p>Range: a local Mach number above 1 is remarked (shocks, no loss-free path, no attached layer);
 * so is the incompressible way above Mach 0.3. Impossible inputs throw.
 *
 * <p>Checked by {@code EdgeFlowReferenceTest} and {@code EdgeFlowTest}.
 *
 * @param speed local speed U_e, m/s, above 0
 * @param air state of the air at the edge
 * @param remarks what there is to say about the way the edge was found
 */
public record EdgeFlow(double speed, AirState air, List<Remark> remarks) {
  /** Mach number up to which the incompressible way is used without a remark. */
  public static final double INCOMPRESSIBLE_MACH = 0.3;

  /**
   * Checks the flow.
   *
   * @throws IllegalArgumentException if the speed is not finite and above 0
   */
  public EdgeFlow {
    requirePositive("local flow speed", speed, "m/s");
    remarks = List.copyOf(remarks);
  }

  /** An edge whose speed and air are known as they are. */
  public static EdgeFlow of(AirState edgeAir, double edgeSpeed) {
    return new EdgeFlow(edgeSpeed, edgeAir, sonicRemark(edgeAir, edgeSpeed));
  }

  /**
   * From the local speed, isentropic.
   *
   * @param freeStream air of the free stream
   * @param freeStreamSpeed U, m/s
   * @param localSpeed U_e, m/s
   * @throws IllegalArgumentException if a speed is not above 0, or U_e is past the vacuum limit
   */
  public static EdgeFlow fromSpeed(AirState freeStream, double freeStreamSpeed, double localSpeed) {
    requirePositive("free-stream speed", freeStreamSpeed, "m/s");
    requirePositive("local flow speed", localSpeed, "m/s");
    return atSpeed(freeStream, freeStreamSpeed, localSpeed, localSpeed / freeStreamSpeed);
  }

  /**
   * From the ratio of local to free-stream speed, isentropic.
   *
   * @param speedRatio U_e/U
   * @throws IllegalArgumentException as {@link #fromSpeed}
   */
  public static EdgeFlow fromSpeedRatio(
      AirState freeStream, double freeStreamSpeed, double speedRatio) {
    requirePositive("free-stream speed", freeStreamSpeed, "m/s");
    requirePositive("speed ratio", speedRatio, "");
    return atSpeed(freeStream, freeStreamSpeed, freeStreamSpeed * speedRatio, speedRatio);
  }

  /**
   * From the pressure coefficient, isentropic.
   *
   * @param pressureCoefficient C_p, between the vacuum limit and stagnation
   * @throws IllegalArgumentException outside these limits, or if the speed is not above 0
   */
  public static EdgeFlow fromPressureCoefficient(
      AirState freeStream, double freeStreamSpeed, double pressureCoefficient) {
    requirePositive("free-stream speed", freeStreamSpeed, "m/s");
    double mach = freeStreamSpeed / freeStream.soundSpeed();
    double vacuum = IsentropicFlow.vacuumPressureCoefficient(mach);
    double stagnation = IsentropicFlow.stagnationPressureCoefficient(mach);
    requireBetween(pressureCoefficient, vacuum, stagnation, "at Mach " + number(mach));
    double excess = IsentropicFlow.temperatureExcess(pressureCoefficient, mach);
    double speed = freeStreamSpeed * Math.sqrt(IsentropicFlow.squaredSpeedRatio(excess, mach));
    return of(IsentropicFlow.brought(freeStream, excess), speed);
  }

  /**
   * From the pressure coefficient, incompressible: the air stays that of the free stream.
   *
   * @param pressureCoefficient C_p, below 1
   * @throws IllegalArgumentException if C_p is 1 or more, or the speed is not above 0
   */
  public static EdgeFlow incompressible(
      AirState freeStream, double freeStreamSpeed, double pressureCoefficient) {
    requirePositive("free-stream speed", freeStreamSpeed, "m/s");
    requireBetween(pressureCoefficient, Double.NEGATIVE_INFINITY, 1.0, "without compressibility");
    double speed = freeStreamSpeed * Math.sqrt(1.0 - pressureCoefficient);
    double mach = freeStreamSpeed / freeStream.soundSpeed();
    if (mach < INCOMPRESSIBLE_MACH) {
      return of(freeStream, speed);
    }
    Remark remark =
        Remark.outOfRange(
            "incompressible edge flow at high Mach number",
            "incompressible edge flow used at free-stream Mach "
                + number(mach)
                + "; it holds below 0.3");
    return new EdgeFlow(speed, freeStream, List.of(remark));
  }

  /** Local Mach number at the edge. */
  public double mach() {
    return speed / air.soundSpeed();
  }

  /** Dynamic pressure at the edge ρ_e U_e²/2, Pa. */
  public double dynamicPressure() {
    return 0.5 * air.density() * speed * speed;
  }

  private static EdgeFlow atSpeed(
      AirState freeStream, double freeStreamSpeed, double localSpeed, double ratio) {
    double mach = freeStreamSpeed / freeStream.soundSpeed();
    double excess = IsentropicFlow.temperatureExcessOfRatio(ratio, mach);
    if (!(excess > -1.0)) {
      throw new IllegalArgumentException(
          "local flow speed "
              + number(localSpeed)
              + " m/s is past the vacuum limit of "
              + number(freeStreamSpeed)
              + " m/s at Mach "
              + number(mach));
    }
    return of(IsentropicFlow.brought(freeStream, excess), localSpeed);
  }

  private static void requireBetween(double value, double low, double high, String where) {
    if (!(value > low && value < high)) {
      throw new IllegalArgumentException(
          "pressure coefficient must be above "
              + number(low)
              + " (vacuum) and below "
              + number(high)
              + " (stagnation) "
              + where
              + ", not "
              + value);
    }
  }

  private static List<Remark> sonicRemark(AirState air, double speed) {
    double mach = speed / air.soundSpeed();
    if (mach <= 1.0) {
      return List.of();
    }
    return List.of(
        Remark.outOfRange(
            "local flow past the sonic point",
            "local Mach number "
                + number(mach)
                + " is past the sonic point: shocks, neither the loss-free path nor the attached"
                + " boundary layer holds"));
  }
}
