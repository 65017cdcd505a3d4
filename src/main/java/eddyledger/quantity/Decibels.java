package eddyledger.quantity;

/**
 * Levels and energies.
 *
 * <p>Formula: L = 10 lg(p²/p0²) dB with p² the mean-square pressure in Pa² and p0 = 20 µPa; L_W =
 * 10 lg(W/W0) dB with W0 = 1 pW; levels are summed as energies, L = 10 lg Σ 10^(L_i/10).
 *
 * <p>Source: ISO 1683 (reference values), ISO 80000-8. Checked by {@code LevelSumsReferenceTest}.
 */
public final class Decibels {
  /** Square of the reference pressure (20 µPa)², Pa². */
  public static final double P0_SQUARED = 4.0e-10;

  /** Reference sound power 1 pW, W. */
  public static final double W0 = 1.0e-12;

  private Decibels() {}

  /** Level of a mean-square pressure in Pa², dB re 20 µPa; minus infinity for 0. */
  public static double pressureLevel(double meanSquarePa2) {
    return 10.0 * Math.log10(meanSquarePa2 / P0_SQUARED);
  }

  /** Mean-square pressure in Pa² of a level in dB re 20 µPa. */
  public static double meanSquarePressure(double levelDb) {
    return P0_SQUARED * ratio(levelDb);
  }

  /** Level of a sound power in W, dB re 1 pW. */
  public static double powerLevel(double powerW) {
    return 10.0 * Math.log10(powerW / W0);
  }

  /** Energy ratio of a level difference: 10^(dB/10). */
  public static double ratio(double db) {
    return Math.pow(10.0, db / 10.0);
  }

  /** Level difference of an energy ratio: 10 lg(ratio). */
  public static double ofRatio(double ratio) {
    return 10.0 * Math.log10(ratio);
  }

  /** Energy sum of levels in dB; minus infinity for none; NaN if one of them is NaN. */
  public static double sum(double... levelsDb) {
    double sum = 0.0;
    for (double level : levelsDb) {
      sum += ratio(level);
    }
    return ofRatio(sum);
  }

  /** Energy mean of levels in dB; NaN for none or if one of them is NaN. */
  public static double mean(double... levelsDb) {
    return sum(levelsDb) - ofRatio(levelsDb.length);
  }
}
