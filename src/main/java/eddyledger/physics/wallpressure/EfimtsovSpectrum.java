package eddyledger.physics.wallpressure;

import eddyledger.physics.Remark;
import eddyledger.physics.flow.BoundaryLayer;
import java.util.ArrayList;
import java.util.List;

/**
 * Wall-pressure spectrum of aircraft in flight after Efimtsov.
 *
 * <p>Formula: G(f) = 2π α b u_τ³ ρ_w² δ/{(1 + 8 α³ Sh²)^(1/3) + α b Re_τ (Sh/Re_τ)^(10/3)} with Sh
 * = ω δ/u_τ and b = [1 + (3000/Re_τ)³]^(1/3).
 *
 * <p>Symbols: G spectral density per hertz, Pa²/Hz; α = 0.01; u_τ friction velocity, m/s; ρ_w
 * density at the wall, kg/m³; δ 99 % thickness, m; ω angular frequency, rad/s; Re_τ = u_τ δ/ν_w.
 *
 * <p>Source: B. M. Efimtsov, Sov. Phys. Acoust. 28 (1982) 289; constants as in R. Rackl, A. Weston,
 * NASA/CR-2005-213938. α, the exponents and the 2π agree with a third-party table; b from memory.
 *
 * <p>Range: flight data at about M 0.41 to 2.1 and Re_x 0.5e8 to 4.85e8 (from memory); outside, a
 * remark. Flat below its peak, where most wind-tunnel models fall with ω².
 *
 * <p>One-sided, per hertz, mean square.
 *
 * <p>Checked by {@code PointSpectraReferenceTest} and {@code EfimtsovTableReferenceTest}.
 */
public final class EfimtsovSpectrum implements WallPressureSpectrum {
  private static final double ALPHA = 0.01;

  @Override
  public String id() {
    return "efimtsov";
  }

  @Override
  public String name() {
    return "Efimtsov";
  }

  @Override
  public String source() {
    return "Efimtsov, Sov. Phys. Acoust. 28 (1982); constants of NASA/CR-2005-213938 (2005)";
  }

  @Override
  public String confidence() {
    return "shape, level and constant α agree with one third-party table; correction b and the range"
        + " from memory";
  }

  @Override
  public double spectralDensity(double frequencyHz, BoundaryLayer layer) {
    double friction = layer.frictionVelocity();
    double reynolds = layer.frictionReynolds();
    double strouhal = 2.0 * Math.PI * frequencyHz * layer.thickness() / friction;
    double b = Math.cbrt(1.0 + Math.pow(3000.0 / reynolds, 3.0));
    double outer = Math.cbrt(1.0 + 8.0 * ALPHA * ALPHA * ALPHA * strouhal * strouhal);
    double viscous = ALPHA * b * reynolds * Math.pow(strouhal / reynolds, 10.0 / 3.0);
    double momentum = layer.wallDensity() * friction;
    double scale = ALPHA * b * momentum * momentum * friction * layer.thickness();
    return 2.0 * Math.PI * scale / (outer + viscous);
  }

  @Override
  public List<Remark> remarks(BoundaryLayer layer) {
    List<Remark> remarks = new ArrayList<>();
    RangeCheck.add(remarks, name(), "edge Mach number", layer.edge().mach(), 0.41, 2.1);
    layer
        .runningLength()
        .ifPresent(
            length ->
                RangeCheck.add(
                    remarks,
                    name(),
                    "running-length Reynolds number",
                    layer.edgeSpeed() * length / layer.edge().air().kinematicViscosity(),
                    0.5e8,
                    4.85e8));
    return remarks;
  }
}
