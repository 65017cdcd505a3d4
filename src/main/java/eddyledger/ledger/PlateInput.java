package eddyledger.ledger;

/**
 * A panel's plate as it is computed with.
 *
 * @param length size along the flow, m
 * @param width size across it, m
 * @param thickness thickness, m
 * @param youngsModulus Young's modulus, Pa
 * @param density density, kg/m³
 * @param poissonRatio Poisson's ratio
 * @param radius radius of curvature, m; infinite for a flat plate
 * @param tensionAlong in-plane tension along the length, N/m
 * @param tensionAcross in-plane tension across it, N/m
 */
record PlateInput(
    double length,
    double width,
    double thickness,
    double youngsModulus,
    double density,
    double poissonRatio,
    double radius,
    double tensionAlong,
    double tensionAcross) {}
