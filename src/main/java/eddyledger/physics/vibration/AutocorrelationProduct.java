package eddyledger.physics.vibration;

import java.util.Arrays;

/**
 * The matrix product behind {@link MatrixRadiationEfficiency}, prepared for one size of plate, a
 * set of modes and all wavenumbers up to a highest one. Holds scratch space: for one thread.
 *
 * <p>With t = u/a and s = v/b, σ/k² = (8ab/π) Σ_i Σ_j w_i ĝ_m(t_i) w_j ĝ_n(s_j) sinc(kR_ij), ĝ_m(t)
 * = ½[(1 − t) cos mπt + sin(mπt)/(mπ)].
 */
final class AutocorrelationProduct {
  /** 1/(2i + 1)! with alternating sign; to π/2 the last term is below rounding. */
  private static final double S3 = -1.0 / 6.0;

  private static final double S5 = 1.0 / 120.0;
  private static final double S7 = -1.0 / 5040.0;
  private static final double S9 = 1.0 / 362880.0;
  private static final double S11 = -1.0 / 39916800.0;
  private static final double S13 = 1.0 / 6227020800.0;
  private static final double S15 = -1.0 / 1307674368000.0;
  private static final double S17 = 1.0 / 355687428096000.0;
  private static final double S19 = -1.0 / 121645100408832000.0;
  private static final double S21 = 1.0 / 51090942171709440000.0;

  /** Adding and taking away 1.5 · 2^52 rounds to a whole number, and vectorises. */
  private static final double ROUND = 6755399441055744.0;

  /** π in two parts, the first with 33 bits, so that n times it is exact for n below a million. */
  private static final double PI_HIGH = 3.1415926534682512;

  private static final double PI_LOW = 1.2154201013012384e-10;

  private final double[][] radius;
  private final double[][] kernel;
  private final double[][] across;
  private final double[][] along;
  private final double[][] half;

  AutocorrelationProduct(
      GaussRules rules,
      double length,
      double width,
      double highestWavenumber,
      int modesAlong,
      int modesAcross) {
    GaussRules.Rule x =
        rules.forHalfPhase(0.5 * (highestWavenumber * length + modesAlong * Math.PI));
    GaussRules.Rule y =
        rules.forHalfPhase(0.5 * (highestWavenumber * width + modesAcross * Math.PI));
    int nx = x.nodes().length;
    int ny = y.nodes().length;
    radius = new double[ny][nx];
    for (int j = 0; j < ny; j++) {
      double v = width * y.nodes()[j];
      for (int i = 0; i < nx; i++) {
        double u = length * x.nodes()[i];
        radius[j][i] = Math.sqrt(u * u + v * v);
      }
    }
    kernel = new double[ny][nx];
    along = shapes(x, modesAlong, 1.0);
    across = transpose(shapes(y, modesAcross, 8.0 * length * width / Math.PI));
    half = new double[modesAcross][nx];
  }

  /** Weighted ĝ_m at the nodes, times a factor, shape [nodes][modes]. */
  private static double[][] shapes(GaussRules.Rule rule, int modes, double factor) {
    int points = rule.nodes().length;
    double[][] shapes = new double[points][modes];
    for (int i = 0; i < points; i++) {
      double t = rule.nodes()[i];
      double cosStep = Math.cos(Math.PI * t);
      double sinStep = Math.sin(Math.PI * t);
      double weight = 0.5 * factor * rule.weights()[i];
      double cos = 1.0;
      double sin = 0.0;
      for (int m = 1; m <= modes; m++) {
        double turned = cos * cosStep - sin * sinStep;
        sin = sin * cosStep + cos * sinStep;
        cos = turned;
        shapes[i][m - 1] = weight * ((1.0 - t) * cos + sin / (m * Math.PI));
      }
    }
    return shapes;
  }

  private static double[][] transpose(double[][] rows) {
    double[][] columns = new double[rows[0].length][rows.length];
    for (int i = 0; i < rows.length; i++) {
      for (int j = 0; j < columns.length; j++) {
        columns[j][i] = rows[i][j];
      }
    }
    return columns;
  }

  /** Fills [N][M] with σ_mn/k², m². */
  void fill(double wavenumber, double[][] into) {
    for (int j = 0; j < radius.length; j++) {
      sinc(wavenumber, radius[j], kernel[j]);
    }
    multiply(across, kernel, half);
    multiply(half, along, into);
  }

  /**
   * sin(kR)/(kR) by reduction to [−π/2, π/2] and a Taylor polynomial: vectorises, as sin does not.
   */
  private static void sinc(double wavenumber, double[] radius, double[] into) {
    for (int i = 0; i < radius.length; i++) {
      double x = wavenumber * radius[i];
      double n = (x * (1.0 / Math.PI) + ROUND) - ROUND;
      double y = (x - n * PI_HIGH) - n * PI_LOW;
      double parity = n - 2.0 * ((0.5 * n + ROUND) - ROUND);
      double z = y * y;
      double p = S15 + z * (S17 + z * (S19 + z * S21));
      p = S7 + z * (S9 + z * (S11 + z * (S13 + z * p)));
      p = y + y * z * (S3 + z * (S5 + z * p));
      into[i] = (1.0 - 2.0 * parity * parity) * p / x;
    }
  }

  /**
   * into = left · right; the inner size is a multiple of four. Rows keep one order of summation.
   */
  private static void multiply(double[][] left, double[][] right, double[][] into) {
    for (int r = 0; r < left.length; r++) {
      double[] factors = left[r];
      double[] sum = into[r];
      Arrays.fill(sum, 0.0);
      for (int k = 0; k < right.length; k += 4) {
        addFour(factors, k, right[k], right[k + 1], right[k + 2], right[k + 3], sum);
      }
    }
  }

  private static void addFour(
      double[] factors, int k, double[] r0, double[] r1, double[] r2, double[] r3, double[] sum) {
    double f0 = factors[k];
    double f1 = factors[k + 1];
    double f2 = factors[k + 2];
    double f3 = factors[k + 3];
    for (int c = 0; c < sum.length; c++) {
      sum[c] += f0 * r0[c] + f1 * r1[c] + f2 * r2[c] + f3 * r3[c];
    }
  }
}
