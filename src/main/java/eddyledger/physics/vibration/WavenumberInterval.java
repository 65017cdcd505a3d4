package eddyledger.physics.vibration;

/**
 * The fixed stretches of x = kR (R the diagonal of the plate) over which σ/k² is interpolated, and
 * the Chebyshev nodes in each.
 *
 * <p>Stretches: 0-1, 1-2, 2-4, 4-8, 8-16, then 16 long to 256. σ/k² is an entire function of k of
 * exponential type R, so the number of nodes needed depends on the length of the stretch only;
 * doubling at the low end keeps the relative error small although σ/k² falls as k⁴ there. Beyond
 * 256 a stretch would need more nodes than a computation has slices in it, and each wavenumber
 * stands for itself.
 *
 * @param nodes wavenumbers times R, shape [nodes]
 * @param middle middle of the stretch
 * @param halfLength half its length, 0 for a single wavenumber
 */
record WavenumberInterval(double[] nodes, double middle, double halfLength) {
  /** Index of a wavenumber that stands for itself. */
  static final int SINGLE = -1;

  private static final double END = 256.0;
  private static final double EVEN_FROM = 16.0;
  private static final int DOUBLINGS = 5;

  /** Relative error below 1e-6, mostly 1e-7, by comparison with the exact product. */
  private static final int[] COUNTS = {10, 8, 9, 10, 13, 19};

  /** Index of the stretch that holds x = kR, or {@link #SINGLE}. */
  static int index(double x) {
    if (x >= END) {
      return SINGLE;
    }
    if (x >= EVEN_FROM) {
      return DOUBLINGS - 1 + (int) (x / EVEN_FROM);
    }
    int index = 0;
    for (double upper = 1.0; x >= upper; upper *= 2.0) {
      index++;
    }
    return index;
  }

  /** The stretch of an index from {@link #index}, not for a single wavenumber. */
  static WavenumberInterval of(int index) {
    double lower;
    double upper;
    if (index >= DOUBLINGS) {
      lower = EVEN_FROM * (index - DOUBLINGS + 1);
      upper = lower + EVEN_FROM;
    } else {
      upper = 1 << index;
      lower = index == 0 ? 0.0 : 0.5 * upper;
    }
    int count = COUNTS[Math.min(index, COUNTS.length - 1)];
    double middle = 0.5 * (lower + upper);
    double halfLength = 0.5 * (upper - lower);
    double[] nodes = new double[count];
    for (int j = 0; j < count; j++) {
      nodes[j] = middle + halfLength * Math.cos(angle(j, count));
    }
    return new WavenumberInterval(nodes, middle, halfLength);
  }

  /** A single wavenumber times R. */
  static WavenumberInterval single(double x) {
    return new WavenumberInterval(new double[] {x}, x, 0.0);
  }

  /** Highest x of the stretch. */
  double upper() {
    return middle + halfLength;
  }

  /** Barycentric weights of the nodes for a value of x in the stretch, sum 1. */
  double[] weights(double x) {
    int count = nodes.length;
    double[] weights = new double[count];
    double sum = 0.0;
    for (int j = 0; j < count; j++) {
      double distance = x - nodes[j];
      if (distance == 0.0) {
        double[] one = new double[count];
        one[j] = 1.0;
        return one;
      }
      double sine = Math.sin(angle(j, count));
      weights[j] = ((j & 1) == 0 ? sine : -sine) / distance;
      sum += weights[j];
    }
    for (int j = 0; j < count; j++) {
      weights[j] /= sum;
    }
    return weights;
  }

  private static double angle(int node, int count) {
    return Math.PI * (2 * node + 1) / (2.0 * count);
  }
}
