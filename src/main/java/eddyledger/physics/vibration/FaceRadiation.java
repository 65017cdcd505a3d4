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
  private double[] weights;

  FaceRadiation(RadiationTable table, FluidFace fluid) {
    this.table = table;
    this.fluid = fluid;
  }

  /**
   * Turns to an angular frequency; {@link #read} then gives σ there.
   *
   * @param omega rad/s, not above the one before
   * @param modesAlong M, not above the one before
   * @param modesAcross N, not above the one before
   */
  void turnTo(double omega, int modesAlong, int modesAcross) {
    double wavenumber = omega / fluid.soundSpeed();
    int index = table.interval(wavenumber);
    if (index != interval || index == WavenumberInterval.SINGLE) {
      block = table.block(wavenumber, modesAlong, modesAcross);
      interval = index;
    }
    weights = block.weights(wavenumber, table.diagonal());
  }

  /** Reads σ_mn of one n (from 0), the modes m from one index (from 0) up to before another. */
  void read(int n, int from, int to, double[] into) {
    block.combine(weights, n * block.modesAlong() + from, to - from, into, from);
  }

  /** ρc of the fluid, Pa s/m. */
  double impedance() {
    return fluid.impedance();
  }
}
