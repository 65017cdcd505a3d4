package eddyledger.physics.vibration;

/**
 * Reads the radiation efficiencies of one plate into one fluid, slice after slice from the highest
 * frequency down, so that the first slice in a stretch of wavenumbers needs the most modes of all
 * in it. For one thread.
 */
final class FaceRadiation {
  private final RadiationTable table;
  private final FluidFace fluid;
  private RadiationBlock block;
  private int interval = Integer.MIN_VALUE;
  private double[] sigma = new double[0];

  FaceRadiation(RadiationTable table, FluidFace fluid) {
    this.table = table;
    this.fluid = fluid;
  }

  /**
   * Reads σ at an angular frequency; {@link #row} then gives it.
   *
   * @param omega rad/s, not above the one before
   * @param modesAlong M, not above the one before
   * @param modesAcross N, not above the one before
   */
  void read(double omega, int modesAlong, int modesAcross) {
    double wavenumber = omega / fluid.soundSpeed();
    int index = table.interval(wavenumber);
    if (index != interval || index == WavenumberInterval.SINGLE) {
      block = table.block(wavenumber, modesAlong, modesAcross);
      interval = index;
    }
    int count = modesAcross * block.modesAlong();
    if (sigma.length < count) {
      sigma = new double[count];
    }
    block.combine(wavenumber, table.diagonal(), count, sigma);
  }

  /** Copies σ_mn of one n (from 0), m = 1 .. count. */
  void row(int n, int count, double[] into) {
    System.arraycopy(sigma, n * block.modesAlong(), into, 0, count);
  }

  /** ρc of the fluid, Pa s/m. */
  double impedance() {
    return fluid.impedance();
  }
}
