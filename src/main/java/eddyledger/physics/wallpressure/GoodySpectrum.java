package eddyledger.physics.wallpressure;

import eddyledger.physics.Remark;
import eddyledger.physics.flow.BoundaryLayer;
import java.util.ArrayList;
import java.util.List;

/**
 * Wall-pressure spectrum of a flat-plate layer without pressure gradient after Goody.
 *
 * <p>Formula: Φ U_e/(τ_w² δ) = 3 x²/{[x^0.75 + 0.5]^3.7 + [1.1 R_T^(−0.57) x]^7} with x = ω δ/U_e;
 * G(f) = 2π Φ(2πf).
 *
 * <p>Symbols: Φ spectral density per rad/s, Pa² s/rad; G per hertz, Pa²/Hz; U_e edge speed, m/s;
 * τ_w wall shear stress, Pa; δ 99 % thickness, m; R_T = (δ/U_e)/(ν_w/u_τ²); ω angular frequency,
 * rad/s.
 *
 * <p>Source: M. Goody, "Empirical spectral model of surface pressure fluctuations", AIAA J. 42
 * (2004) 1788; constants met in three independent public places.
 *
 * <p>Range: smooth wall, no pressure gradient, low Mach number, 1.4e3 &lt; Re_θ &lt; 2.3e4;
 * outside, a remark. Its mean square lies 0.8 dB above the accepted one at Re_τ = 500 and 2.7 dB at
 * 1e4.
 *
 * <p>One-sided, per hertz, mean square.
 *
 * <p>Checked by {@code PointSpectraReferenceTest} and {@code GoodySpectrumTest}.
 */
public final class GoodySpectrum implements WallPressureSpectrum {
  private static final double LOW_MACH = 0.3;

  @Override
  public String id() {
    return "goody";
  }

  @Override
  public String name() {
    return "Goody";
  }

  @Override
  public String source() {
    return "Goody, AIAA J. 42 (2004) 1788";
  }

  @Override
  public String confidence() {
    return "formula and constants met in three independent public places";
  }

  @Override
  public double spectralDensity(double frequencyHz, BoundaryLayer layer) {
    double omega = 2.0 * Math.PI * frequencyHz;
    double outerTime = layer.thickness() / layer.edgeSpeed();
    double x = omega * outerTime;
    double middle = Math.pow(Math.pow(x, 0.75) + 0.5, 3.7);
    double viscous = Math.pow(1.1 * Math.pow(layer.timeScaleRatio(), -0.57) * x, 7.0);
    double stress = layer.wallShearStress();
    double perRadian = 3.0 * x * x / (middle + viscous) * stress * stress * outerTime;
    return 2.0 * Math.PI * perRadian;
  }

  @Override
  public List<Remark> remarks(BoundaryLayer layer) {
    List<Remark> remarks = new ArrayList<>();
    RangeCheck.add(
        remarks,
        name(),
        "momentum-thickness Reynolds number",
        layer.momentumReynolds(),
        1.4e3,
        2.3e4);
    RangeCheck.add(remarks, name(), "edge Mach number", layer.edge().mach(), 0.0, LOW_MACH);
    return remarks;
  }
}
