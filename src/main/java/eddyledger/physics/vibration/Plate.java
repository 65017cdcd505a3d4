package eddyledger.physics.vibration;

/**
 * A simply supported rectangular plate, flat or slightly curved, with or without tension: its modes
 * and the quantities that follow from them.
 *
 * <p>Formula: ω_mn² = [Dx kx⁴ + 2H kx² ky² + Dy ky⁴ + Nx kx² + Ny ky²]/m'' + C kx⁴/(kx² + ky²)²
 * with kx = mπ/a, ky = nπ/b and mode shapes sin(kx x) sin(ky y).
 *
 * <p>Symbols: a length along the flow, b width across it, m; Dx, H, Dy bending stiffness along,
 * mixed (H = D1 + 2 Dxy, twice the twisting stiffness plus the Poisson part) and across, N m; m''
 * mass per area, kg/m²; Nx, Ny tension, N/m; C = E/(ρR²) curvature term, 1/s², of a cylinder whose
 * axis lies along the length.
 *
 * <p>Source: A. W. Leissa, "Vibration of Plates", NASA SP-160 (1969), orthotropic plate with
 * in-plane force; the curvature term is the membrane term of Donnell-Mushtari-Vlasov shallow-shell
 * theory, A. W. Leissa, "Vibration of Shells", NASA SP-288 (1973); both from memory.
 *
 * <p>Range: bending wavelength above about six thicknesses; tension, not compression; a curved bay
 * shallower than about a sixth of its width. Nothing is done outside this range.
 *
 * <p>Angular frequencies in rad/s, frequencies in Hz.
 *
 * <p>Checked by {@code PlateReferenceTest}.
 *
 * @param length a, m, above 0
 * @param width b, m, above 0
 * @param stiffnessAlong Dx, N m, above 0
 * @param stiffnessMixed H, N m, above 0
 * @param stiffnessAcross Dy, N m, above 0
 * @param surfaceMass m'', kg/m², above 0
 * @param tensionAlong Nx, N/m, 0 or more
 * @param tensionAcross Ny, N/m, 0 or more
 * @param curvature C, 1/s², 0 for a flat plate
 */
public record Plate(
    double length,
    double width,
    double stiffnessAlong,
    double stiffnessMixed,
    double stiffnessAcross,
    double surfaceMass,
    double tensionAlong,
    double tensionAcross,
    double curvature) {

  /**
   * Checks the values.
   *
   * @throws IllegalArgumentException if one is out of the range stated for it, or not finite
   */
  public Plate {
    Require.positive(length, "length of the plate");
    Require.positive(width, "width of the plate");
    Require.positive(stiffnessAlong, "bending stiffness along the length");
    Require.positive(stiffnessMixed, "mixed bending stiffness");
    Require.positive(stiffnessAcross, "bending stiffness across the length");
    Require.positive(surfaceMass, "surface mass");
    Require.notNegative(tensionAlong, "tension along the length");
    Require.notNegative(tensionAcross, "tension across the length");
    Require.notNegative(curvature, "curvature term");
  }

  /**
   * A flat plate of one stiffness without tension.
   *
   * @param stiffness bending stiffness D, N m
   * @throws IllegalArgumentException if a value is not above 0
   */
  public static Plate uniform(double length, double width, double stiffness, double surfaceMass) {
    return new Plate(length, width, stiffness, stiffness, stiffness, surfaceMass, 0.0, 0.0, 0.0);
  }

  /**
   * A flat plate of an isotropic material without tension: D = E h³/(12 (1 − ν²)), m'' = ρh.
   *
   * @param thickness h, m
   * @param youngsModulus E, Pa
   * @param density ρ, kg/m³
   * @param poissonsRatio ν, from 0 up to below 1
   * @throws IllegalArgumentException if a value is out of its range
   */
  public static Plate isotropic(
      double length,
      double width,
      double thickness,
      double youngsModulus,
      double density,
      double poissonsRatio) {
    Require.positive(thickness, "thickness of the plate");
    Require.positive(youngsModulus, "Young's modulus");
    Require.positive(density, "density of the plate");
    if (!(poissonsRatio >= 0.0 && poissonsRatio < 1.0)) {
      throw new IllegalArgumentException(
          "Poisson's ratio must be 0 or more and below 1, not " + poissonsRatio);
    }
    double stiffness =
        youngsModulus
            * thickness
            * thickness
            * thickness
            / (12.0 * (1.0 - poissonsRatio * poissonsRatio));
    return uniform(length, width, stiffness, density * thickness);
  }

  /** The same plate under tension Nx along and Ny across its length, N/m. */
  public Plate withTension(double along, double across) {
    return new Plate(
        length,
        width,
        stiffnessAlong,
        stiffnessMixed,
        stiffnessAcross,
        surfaceMass,
        along,
        across,
        curvature);
  }

  /**
   * The same plate bent to a cylinder with its axis along the length: C = E/(ρR²).
   *
   * @param youngsModulus E, Pa
   * @param density ρ, kg/m³
   * @param radius R, m
   */
  public Plate withRadius(double youngsModulus, double density, double radius) {
    return new Plate(
        length,
        width,
        stiffnessAlong,
        stiffnessMixed,
        stiffnessAcross,
        surfaceMass,
        tensionAlong,
        tensionAcross,
        youngsModulus / (density * radius * radius));
  }

  /** Area S = ab, m². */
  public double area() {
    return length * width;
  }

  /** ω_mn², rad²/s², of the mode with m half-waves along and n across, both from 1. */
  public double modeAngularFrequencySquared(int m, int n) {
    double kx = m * Math.PI / length;
    double ky = n * Math.PI / width;
    double x = kx * kx;
    double y = ky * ky;
    double bending =
        stiffnessAlong * x * x + 2.0 * stiffnessMixed * x * y + stiffnessAcross * y * y;
    double stretching = tensionAlong * x + tensionAcross * y;
    double share = x / (x + y);
    return (bending + stretching) / surfaceMass + curvature * share * share;
  }

  /** Angular frequency ω_mn, rad/s, of the mode with m half-waves along and n across, from 1. */
  public double modeAngularFrequency(int m, int n) {
    return Math.sqrt(modeAngularFrequencySquared(m, n));
  }

  /** Frequency, Hz, of the mode with m half-waves along and n across, from 1. */
  public double modeFrequency(int m, int n) {
    return modeAngularFrequency(m, n) / (2.0 * Math.PI);
  }

  /** Bending stiffness of the plate of one stiffness with the same modal density, N m. */
  public double meanStiffness() {
    return Math.sqrt(stiffnessAlong * stiffnessAcross);
  }

  /**
   * Critical frequency f_c = (c²/2π) √(m''/D), Hz, without tension and curvature; D is {@link
   * #meanStiffness}.
   *
   * @param soundSpeed c, m/s
   */
  public double criticalFrequency(double soundSpeed) {
    return soundSpeed * soundSpeed / (2.0 * Math.PI) * Math.sqrt(surfaceMass / meanStiffness());
  }

  /** Modal density n = (S/2) √(m''/D), modes per Hz, without tension, curvature and edges. */
  public double modalDensity() {
    return 0.5 * area() * Math.sqrt(surfaceMass / meanStiffness());
  }

  /**
   * Number of modes below a frequency on average, N = k²S/4π − kP/4π + ¼ with k⁴ = m''ω²/D and the
   * perimeter P, simply supported, without tension and curvature; 0 where the formula is below 0.
   *
   * @param frequency Hz, 0 or more
   */
  public double modeCountBelow(double frequency) {
    double omega = 2.0 * Math.PI * frequency;
    double k2 = omega * Math.sqrt(surfaceMass / meanStiffness());
    double perimeter = 2.0 * (length + width);
    double count = (k2 * area() - Math.sqrt(k2) * perimeter) / (4.0 * Math.PI) + 0.25;
    return Math.max(0.0, count);
  }
}
