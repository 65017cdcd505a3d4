package eddyledger.model;

/**
 * A plate of one isotropic material, simply supported at its edges, perhaps curved and under
 * in-plane tension.
 *
 * @param id identity
 * @param name name shown
 * @param thickness thickness, m
 * @param youngsModulus Young's modulus, Pa
 * @param density density, kg/m³
 * @param poissonRatio Poisson's ratio
 * @param radius radius of curvature about an axis along the panel's length, m; null if flat
 * @param tension in-plane tension; null if none
 * @param evidence where the values come from
 * @param extras unknown properties
 */
public record PlateConstruction(
    String id,
    String name,
    double thickness,
    double youngsModulus,
    double density,
    double poissonRatio,
    Double radius,
    Tension tension,
    Evidence evidence,
    Extras extras)
    implements Construction {

  @Override
  public double surfaceMass() {
    return density * thickness;
  }
}
