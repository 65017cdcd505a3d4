package eddyledger.physics.vibration;

import java.util.Arrays;

/**
 * σ/k² of one size of plate at the nodes of one stretch of wavenumbers.
 *
 * @param interval the stretch and its nodes
 * @param modesAlong M, the row length of each table
 * @param values σ_mn/k², m², at index (n − 1)M + m − 1, shape [nodes][modes]; in single precision,
 *     whose 6e-8 is far below the error of the interpolation, because these tables are what a
 *     computation keeps most of
 */
record RadiationBlock(WavenumberInterval interval, int modesAlong, float[][] values) {

  /** Computes a block. */
  static RadiationBlock of(GaussRules rules, RadiationCache.Key key, WavenumberInterval interval) {
    double diagonal = Math.sqrt(key.length() * key.length() + key.width() * key.width());
    int modesAlong = key.modesAlong();
    AutocorrelationProduct product =
        new AutocorrelationProduct(
            rules,
            key.length(),
            key.width(),
            interval.upper() / diagonal,
            modesAlong,
            key.modesAcross());
    double[][] rows = new double[key.modesAcross()][modesAlong];
    float[][] values = new float[interval.nodes().length][modesAlong * rows.length];
    for (int j = 0; j < values.length; j++) {
      product.fill(interval.nodes()[j] / diagonal, rows);
      for (int n = 0; n < rows.length; n++) {
        for (int m = 0; m < modesAlong; m++) {
          values[j][n * modesAlong + m] = (float) rows[n][m];
        }
      }
    }
    return new RadiationBlock(interval, modesAlong, values);
  }

  /** Size of the values, bytes. */
  static long bytes(RadiationCache.Key key, WavenumberInterval interval) {
    return 4L * interval.nodes().length * key.modesAlong() * key.modesAcross();
  }

  /** Weights of the nodes for a wavenumber k (rad/m) on a plate of a diagonal R (m), times k². */
  double[] weights(double wavenumber, double diagonal) {
    double[] weights = interval.weights(wavenumber * diagonal);
    double square = wavenumber * wavenumber;
    for (int j = 0; j < weights.length; j++) {
      weights[j] *= square;
    }
    return weights;
  }

  /**
   * Reads σ of a run of modes.
   *
   * @param weights from {@link #weights}
   * @param first index of the first one, in the order of {@link #values}
   * @param count how many
   * @param into filled from a position on
   * @param at that position
   */
  void combine(double[] weights, int first, int count, double[] into, int at) {
    int nodes = weights.length;
    int start = nodes % 4;
    Arrays.fill(into, at, at + count, 0.0);
    for (int j = 0; j < start; j++) {
      addOne(weights[j], values[j], first, count, into, at);
    }
    for (int j = start; j < nodes; j += 4) {
      addFour(weights, j, first, count, into, at);
    }
  }

  private static void addOne(
      double factor, float[] values, int first, int count, double[] into, int at) {
    for (int i = 0; i < count; i++) {
      into[at + i] += factor * values[first + i];
    }
  }

  private void addFour(double[] weights, int j, int first, int count, double[] into, int at) {
    double f0 = weights[j];
    double f1 = weights[j + 1];
    double f2 = weights[j + 2];
    double f3 = weights[j + 3];
    float[] v0 = values[j];
    float[] v1 = values[j + 1];
    float[] v2 = values[j + 2];
    float[] v3 = values[j + 3];
    for (int i = 0; i < count; i++) {
      int k = first + i;
      into[at + i] += f0 * v0[k] + f1 * v1[k] + f2 * v2[k] + f3 * v3[k];
    }
  }
}
