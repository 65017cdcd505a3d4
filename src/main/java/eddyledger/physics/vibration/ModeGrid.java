package eddyledger.physics.vibration;

import eddyledger.quantity.Bands;

/**
 * The modes of a plate that a computation over all bands needs, as rows of one n with m ascending;
 * in a row the frequency rises with m.
 *
 * <p>A band keeps all modes up to twice its upper edge, and at least up to three times the lowest
 * mode: those above still move the plate by their stiffness.
 */
final class ModeGrid {
  private static final double ABOVE_BAND = 2.0;
  private static final double ABOVE_FIRST = 3.0;

  private final double[][] squares;
  private final int modesAlong;
  private final double lowest;

  ModeGrid(Plate plate) {
    double first = Double.POSITIVE_INFINITY;
    // curvature can lift the modes of small n above those of larger n
    for (int n = 1; acrossAlone(plate, n) < first; n++) {
      first = Math.min(first, plate.modeAngularFrequencySquared(1, n));
    }
    lowest = Math.sqrt(first);
    double limit = limit(Bands.COUNT - 1);
    double square = limit * limit;
    int rows = 1;
    while (acrossAlone(plate, rows + 1) <= square) {
      rows++;
    }
    squares = new double[rows][];
    int longest = 0;
    for (int n = 1; n <= rows; n++) {
      int count = 0;
      while (plate.modeAngularFrequencySquared(count + 1, n) <= square) {
        count++;
      }
      double[] row = new double[count];
      for (int m = 1; m <= count; m++) {
        row[m - 1] = plate.modeAngularFrequencySquared(m, n);
      }
      squares[n - 1] = row;
      longest = Math.max(longest, count);
    }
    modesAlong = longest;
  }

  /** A bound from below for all modes of one n, rising with n. */
  private static double acrossAlone(Plate plate, int n) {
    double ky = n * Math.PI / plate.width();
    double y = ky * ky;
    return (plate.stiffnessAcross() * y + plate.tensionAcross()) * y / plate.surfaceMass();
  }

  private double limit(int band) {
    return Math.max(ABOVE_BAND * 2.0 * Math.PI * Bands.upper(band), ABOVE_FIRST * lowest);
  }

  /** ω² of the modes, rad²/s², at [n − 1][m − 1], rows of their own lengths. */
  double[][] squares() {
    return squares;
  }

  /** Longest row. */
  int modesAlong() {
    return modesAlong;
  }

  /** Angular frequency of the lowest mode, rad/s. */
  double lowest() {
    return lowest;
  }

  /** How many modes of each row a band keeps, shape [rows up to the last that has any]. */
  int[] kept(int band) {
    double limit = limit(band);
    int rows = squares.length;
    while (rows > 1 && below(squares[rows - 1], limit * limit) == 0) {
      rows--;
    }
    int[] kept = new int[rows];
    for (int n = 0; n < rows; n++) {
      kept[n] = below(squares[n], limit * limit);
    }
    return kept;
  }

  /** How many modes have their frequency in a band. */
  int inBand(int band) {
    double lower = 2.0 * Math.PI * Bands.lower(band);
    double upper = 2.0 * Math.PI * Bands.upper(band);
    int count = 0;
    for (double[] row : squares) {
      count += below(row, upper * upper) - below(row, lower * lower);
    }
    return count;
  }

  /** How many values of an ascending row are at most a limit. */
  static int below(double[] row, double limit) {
    int low = 0;
    int high = row.length;
    while (low < high) {
      int middle = (low + high) >>> 1;
      if (row[middle] <= limit) {
        low = middle + 1;
      } else {
        high = middle;
      }
    }
    return low;
  }
}
