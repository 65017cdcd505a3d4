package eddyledger.physics.vibration;

/**
 * Radiation efficiencies of one size of plate, kept once for all: they depend on size and
 * wavenumber, not on the material of the plate, its damping or the air, so that all conditions,
 * both faces and every change of treatment draw on the same numbers.
 *
 * <p>Formula: σ/k² interpolated from Chebyshev nodes in k, see {@link WavenumberInterval}, with σ
 * at the nodes from the product of {@link MatrixRadiationEfficiency}. Beyond kR = 256 (R the
 * diagonal, k wavenumber in rad/m) the product itself is kept for each wavenumber asked for.
 *
 * <p>Source: the interpolation is our own choice; σ/k² is entire in k and of exponential type R.
 *
 * <p>Range: any mode and wavenumber. Error at most 1e-6 of the mode's largest σ/k² in the same
 * stretch of wavenumbers, and as a rule 1e-6 of the value itself; below kR = 0.05 some 1e-5.
 *
 * <p>Dimensionless ratio of powers. Safe for any number of threads; a value does not depend on what
 * was asked before.
 *
 * <p>Checked by {@code RadiationTableTest}.
 */
public final class RadiationTable implements RadiationEfficiency {
  private static final double CLASS_STEP = 1.1;

  private final RadiationCache cache;
  private final double length;
  private final double width;
  private final double diagonal;

  RadiationTable(RadiationCache cache, double length, double width) {
    this.cache = cache;
    this.length = Require.positive(length, "length of the plate");
    this.width = Require.positive(width, "width of the plate");
    this.diagonal = Math.sqrt(length * length + width * width);
  }

  @Override
  public double[][] efficiencies(double wavenumber, int modesAlong, int modesAcross) {
    Require.positive(wavenumber, "wavenumber");
    Require.atLeastOne(modesAlong, "number of modes along");
    Require.atLeastOne(modesAcross, "number of modes across");
    RadiationBlock block = block(wavenumber, modesAlong, modesAcross);
    double[] weights = block.weights(wavenumber, diagonal);
    double[][] sigma = new double[modesAcross][modesAlong];
    for (int n = 0; n < modesAcross; n++) {
      block.combine(weights, n * block.modesAlong(), modesAlong, sigma[n], 0);
    }
    return sigma;
  }

  /** Stretch of a wavenumber, see {@link WavenumberInterval#index}. */
  int interval(double wavenumber) {
    return WavenumberInterval.index(wavenumber * diagonal);
  }

  double diagonal() {
    return diagonal;
  }

  /**
   * The block of the stretch that holds a wavenumber, with at least these modes.
   *
   * <p>In a stretch the modes are rounded up to a class, a fixed wavenumber of the plate common to
   * both directions: plates of this size but another material or air then mostly meet the same
   * block, and the number of Gauss points (so the last bits) depends on the class alone.
   */
  RadiationBlock block(double wavenumber, int modesAlong, int modesAcross) {
    int index = interval(wavenumber);
    if (index == WavenumberInterval.SINGLE) {
      return cache.block(
          new RadiationCache.Key(length, width, index, wavenumber, modesAlong, modesAcross),
          WavenumberInterval.single(wavenumber * diagonal));
    }
    double reach = 1.0;
    while (rounded(reach, length) < modesAlong || rounded(reach, width) < modesAcross) {
      reach *= CLASS_STEP;
    }
    return cache.block(
        new RadiationCache.Key(
            length, width, index, 0.0, rounded(reach, length), rounded(reach, width)),
        WavenumberInterval.of(index));
  }

  private int rounded(double reach, double side) {
    return Math.max(1, (int) (reach * side / diagonal));
  }
}
