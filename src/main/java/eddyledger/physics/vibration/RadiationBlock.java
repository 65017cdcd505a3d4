package eddyledger.physics.vibration;

import java.util.Arrays;

/**
 * σ/k² of one size of plate at the nodes of one stretch of wavenumbers.
 *
 * @param interval the stretch and its nodes
 * @param modesAlong M, the row length of each table
 * @param values σ_mn/k², m², at index (n − 1)M + m − 1, shape [nodes][modes]
 */
record RadiationBlock(WavenumberInterval interval, int modesAlong, double[][] values) {

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
    double[][] values = new double[interval.nodes().length][modesAlong * rows.length];
    for (int j = 0; j < values.length; j++) {
      product.fill(interval.nodes()[j] / diagonal, rows);
      for (int n = 0; n < rows.length; n++) {
        System.arraycopy(rows[n], 0, values[j], n * modesAlong, modesAlong);
      }
    }
    return new RadiationBlock(interval, modesAlong, values);
  }

  /** Size of the values, bytes. */
  static long bytes(RadiationCache.Key key, WavenumberInterval interval) {
    return 8L * interval.nodes().length * key.modesAlong() * key.modesAcross();
  }

  /**
   * Fills the first values with σ at a wavenumber of the stretch.
   *
   * @param wavenumber k, rad/m
   * @param diagonal R, m
   * @param count how many values, in the order of {@link #values}
   * @param into shape at least [count]
   */
  void combine(double wavenumber, double diagonal, int count, double[] into) {
    double[] weights = interval.weights(wavenumber * diagonal);
    double square = wavenumber * wavenumber;
    int nodes = weights.length;
    int start = nodes % 4;
    Arrays.fill(into, 0, count, 0.0);
    for (int j = 0; j < start; j++) {
      addOne(square * weights[j], values[j], count, into);
    }
    for (int j = start; j < nodes; j += 4) {
      addFour(square, weights, j, values, count, into);
    }
  }

  private static void addOne(double factor, double[] values, int count, double[] into) {
    for (int i = 0; i < count; i++) {
      into[i] += factor * values[i];
    }
  }

  private static void addFour(
      double square, double[] weights, int j, double[][] values, int count, double[] into) {
    double f0 = square * weights[j];
    double f1 = square * weights[j + 1];
    double f2 = square * weights[j + 2];
    double f3 = square * weights[j + 3];
    double[] v0 = values[j];
    double[] v1 = values[j + 1];
    double[] v2 = values[j + 2];
    double[] v3 = values[j + 3];
    for (int i = 0; i < count; i++) {
      into[i] += f0 * v0[i] + f1 * v1[i] + f2 * v2[i] + f3 * v3[i];
    }
  }
}
