package eddyledger.physics.flow;

/**
 * The air that the formulas of an incompressible layer are fed with: at the edge, at the reference
 * temperature and at the wall, all at the pressure of the edge.
 *
 * @param edge air at the edge
 * @param reference air whose density and viscosity go into the incompressible formulas
 * @param wall air at the wall
 */
record LayerAir(AirState edge, AirState reference, AirState wall) {
  /** A layer whose air is the same throughout. */
  static LayerAir uniform(AirState air) {
    return new LayerAir(air, air, air);
  }
}
