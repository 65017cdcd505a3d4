package eddyledger.physics.vibration;

import eddyledger.physics.wallpressure.ExponentialTerms;

/**
 * Joint acceptance in one direction of a mode sin(mπx/L) with a wall pressure whose coherence is a
 * sum of exponentials, in closed form.
 *
 * <p>Formula: j_m = (1/L²) ∬ sin(mπx/L) sin(mπx'/L) f(x − x') exp(−i k_c (x − x')) dx dx' = 2 Re
 * Σ_p A_p J_m((c_p + i k_c) L). With M = mπ, J_m(z) = z/(2(z² + M²)) + M² (1 − (−1)^m e^(−z))/(z² +
 * M²)². Near a removable pole z = isM, s = ±1, with δ = z − isM and φ(δ) = (δ − 1 + e^(−δ))/δ²: J_m
 * = [(δ + 3isM)/2 − M² φ(δ)]/(δ + 2isM)², used for |δ| &lt; M/2.
 *
 * <p>Symbols: L length of the plate in this direction, m; m number of half-waves; A_p, c_p, k_c
 * terms of the coherence, see {@link ExponentialTerms}. The joint acceptance of the plate mode is
 * the product j²_mn = j_m · j_n of both directions.
 *
 * <p>Source: derived from the definition (A. Powell, "On the response of structures to random
 * pressures and to jet noise in particular", in S. H. Crandall (ed.), Random Vibration, 1958, from
 * memory), by integration in closed form.
 *
 * <p>Range: any mode, length and terms with Re c_p &gt; 0. The n terms of a coherence of order n
 * cancel far from k_c: worst relative error about 1e-14 (n = 1), 1e-10 (2), 4e-8 (3), 2e-7 (5).
 *
 * <p>Dimensionless, per unit of mean-square pressure density, at most 1/2 (the mean square of the
 * mode shape); nothing per hertz.
 *
 * <p>Checked by {@code JointAcceptanceReferenceTest}.
 */
public final class JointAcceptance {
  private static final int TAYLOR_TERMS = 22;

  private JointAcceptance() {}

  /**
   * Joint acceptance of one mode.
   *
   * @param terms coherence in this direction
   * @param length L, m, above 0
   * @param mode m, 1 or more
   * @throws IllegalArgumentException if length or mode is out of its range
   */
  public static double of(ExponentialTerms terms, double length, int mode) {
    double[] into = new double[Require.atLeastOne(mode, "number of half-waves")];
    accumulate(terms, Require.positive(length, "length"), mode, mode, into);
    return into[mode - 1];
  }

  /**
   * Joint acceptance of the modes 1 to so many, with one complex exponential for each term.
   *
   * @param terms coherence in this direction
   * @param length L, m, above 0
   * @param modes how many, 1 or more
   * @return j_m at index m − 1, shape [modes]
   * @throws IllegalArgumentException if length or modes is out of its range
   */
  public static double[] all(ExponentialTerms terms, double length, int modes) {
    double[] into = new double[Require.atLeastOne(modes, "number of modes")];
    accumulate(terms, Require.positive(length, "length"), 1, modes, into);
    return into;
  }

  private static void accumulate(
      ExponentialTerms terms, double length, int first, int last, double[] into) {
    for (int p = 0; p < terms.count(); p++) {
      double x = terms.decayRe()[p] * length;
      double y = (terms.decayIm()[p] + terms.wavenumber()) * length;
      addTerm(2.0 * terms.amplitudeRe()[p], 2.0 * terms.amplitudeIm()[p], x, y, first, last, into);
    }
  }

  /** J_m(z) for one mode, as {real, imaginary}. */
  static double[] integral(int mode, double re, double im) {
    double[] real = new double[mode];
    double[] imaginary = new double[mode];
    addTerm(1.0, 0.0, re, im, mode, mode, real);
    addTerm(0.0, -1.0, re, im, mode, mode, imaginary);
    return new double[] {real[mode - 1], imaginary[mode - 1]};
  }

  /** Adds Re{A J_m(x + iy)} for the modes first to last; spelt out, as this is a hot loop. */
  private static void addTerm(
      double amplitudeRe,
      double amplitudeIm,
      double x,
      double y,
      int first,
      int last,
      double[] into) {
    double size = Math.exp(-x);
    double cos = Math.cos(y);
    double sin = Math.sin(y);
    double half = Math.sin(0.5 * y);
    double expRe = size * cos;
    double expIm = -size * sin;
    // 1 − e^(−z) without loss of digits at small z
    double evenRe = -Math.expm1(-x) * cos + 2.0 * half * half;
    for (int m = first; m <= last; m++) {
      double pole = m * Math.PI;
      double square = pole * pole;
      double away = Math.abs(y) - pole;
      boolean even = (m & 1) == 0;
      if (x * x + away * away < 0.25 * square) {
        double sign = even ? 1.0 : -1.0;
        into[m - 1] += nearPole(amplitudeRe, amplitudeIm, x, y, pole, sign * expRe, sign * expIm);
        continue;
      }
      double wRe = x * x - (y - pole) * (y + pole);
      double wIm = 2.0 * x * y;
      double d = 1.0 / (wRe * wRe + wIm * wIm);
      double iRe = wRe * d;
      double iIm = -wIm * d;
      double eRe = square * (even ? evenRe : 1.0 + expRe);
      double eIm = square * (even ? -expIm : expIm);
      // ½z + M²E/w, then once more over w
      double tRe = 0.5 * x + eRe * iRe - eIm * iIm;
      double tIm = 0.5 * y + eRe * iIm + eIm * iRe;
      double jRe = tRe * iRe - tIm * iIm;
      double jIm = tRe * iIm + tIm * iRe;
      into[m - 1] += amplitudeRe * jRe - amplitudeIm * jIm;
    }
  }

  /** Re{A J_m} by the form without a pole; (expRe, expIm) = e^(−δ). */
  private static double nearPole(
      double amplitudeRe,
      double amplitudeIm,
      double x,
      double y,
      double pole,
      double expRe,
      double expIm) {
    double signed = Math.copySign(pole, y);
    double dIm = y - signed;
    double phiRe;
    double phiIm;
    double magnitude = x * x + dIm * dIm;
    if (magnitude < 1.0) {
      phiRe = 0.0;
      phiIm = 0.0;
      for (int k = TAYLOR_TERMS - 1; k >= 0; k--) {
        // Horner for Σ (−δ)^k/(k + 2)!, scaled so that the last step gives ½
        double re = 1.0 - x * phiRe + dIm * phiIm;
        double im = -x * phiIm - dIm * phiRe;
        phiRe = re / (k + 2);
        phiIm = im / (k + 2);
      }
    } else {
      double nRe = x - 1.0 + expRe;
      double nIm = dIm + expIm;
      double sRe = x * x - dIm * dIm;
      double sIm = 2.0 * x * dIm;
      double d = 1.0 / (magnitude * magnitude);
      phiRe = (nRe * sRe + nIm * sIm) * d;
      phiIm = (nIm * sRe - nRe * sIm) * d;
    }
    double nRe = 0.5 * x - pole * pole * phiRe;
    double nIm = 0.5 * (dIm + 3.0 * signed) - pole * pole * phiIm;
    double f = dIm + 2.0 * signed;
    double wRe = x * x - f * f;
    double wIm = 2.0 * x * f;
    double d = 1.0 / (wRe * wRe + wIm * wIm);
    double jRe = (nRe * wRe + nIm * wIm) * d;
    double jIm = (nIm * wRe - nRe * wIm) * d;
    return amplitudeRe * jRe - amplitudeIm * jIm;
  }
}
