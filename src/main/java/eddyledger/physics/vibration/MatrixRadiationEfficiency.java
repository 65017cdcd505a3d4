package eddyledger.physics.vibration;

/**
 * Radiation efficiency of the modes of a baffled, simply supported plate, exactly, for all modes at
 * once as two matrix products.
 *
 * <p>Formula: σ_mn = (8k²/(πab)) ∫_0^a ∫_0^b g_m(u) g_n(v) sin(kR)/(kR) du dv with R² = u² + v² and
 * g_m(u) = ½[(a − u) cos(mπu/a) + (a/mπ) sin(mπu/a)], g_n alike with b.
 *
 * <p>Symbols: a length, b width of the plate, m; k = ω/c acoustic wavenumber, rad/m; m, n
 * half-waves along and across. The integrand is entire, so a Gauss-Legendre rule is exact to
 * rounding.
 *
 * <p>Source: C. E. Wallace, "Radiation resistance of a rectangular panel", J. Acoust. Soc. Am. 51
 * (1972) 946, from memory; the reduction of the double area integral by autocorrelation compares
 * with W. L. Li and H. J. Gibeling, J. Sound Vib. 229 (2000) 1213, from memory.
 *
 * <p>Range: any mode and wavenumber. Relative error about 1e-10; rounding leaves an absolute error
 * of about 1e-15 at low wavenumbers, which shows at efficiencies below 1e-9. Coupling of modes
 * through the air is left out.
 *
 * <p>Dimensionless ratio of powers; nothing per hertz.
 *
 * <p>Checked by {@code RadiationEfficiencyReferenceTest}.
 */
public final class MatrixRadiationEfficiency implements RadiationEfficiency {
  private final GaussRules rules = new GaussRules();
  private final double length;
  private final double width;

  /**
   * For one size of plate.
   *
   * @param length a, m, above 0
   * @param width b, m, above 0
   * @throws IllegalArgumentException if one is not above 0
   */
  public MatrixRadiationEfficiency(double length, double width) {
    this.length = Require.positive(length, "length of the plate");
    this.width = Require.positive(width, "width of the plate");
  }

  @Override
  public double[][] efficiencies(double wavenumber, int modesAlong, int modesAcross) {
    Require.positive(wavenumber, "wavenumber");
    Require.atLeastOne(modesAlong, "number of modes along");
    Require.atLeastOne(modesAcross, "number of modes across");
    double[][] sigma = new double[modesAcross][modesAlong];
    new AutocorrelationProduct(rules, length, width, wavenumber, modesAlong, modesAcross)
        .fill(wavenumber, sigma);
    for (double[] row : sigma) {
      for (int m = 0; m < row.length; m++) {
        row[m] *= wavenumber * wavenumber;
      }
    }
    return sigma;
  }
}
