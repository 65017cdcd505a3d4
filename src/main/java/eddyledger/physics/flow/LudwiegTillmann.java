package eddyledger.physics.flow;

/**
 * Skin friction of an incompressible turbulent layer from its shape and momentum thickness.
 *
 * <p>Formula: C_f = 0.246 · 10^(−0.678 H) · Re_θ^(−0.268).
 *
 * <p>Symbols: C_f skin friction over the dynamic pressure at the edge; H = δ* / θ; Re_θ = U_e θ/ν.
 *
 * <p>Source: H. Ludwieg, W. Tillmann, NACA TM 1285 (1950), from memory.
 *
 * <p>Range: attached layers with and without pressure gradient, H up to about 2.4, Re_θ about 1e3
 * to 4e4; a shape outside is remarked by {@link BoundaryLayerCompletion}.
 *
 * <p>Checked by {@code BoundaryLayerReferenceTest}.
 */
final class LudwiegTillmann {
  private LudwiegTillmann() {}

  /** Skin friction C_f of a shape factor and a momentum-thickness Reynolds number. */
  static double skinFriction(double shapeFactor, double momentumReynolds) {
    return 0.246 * Math.pow(10.0, -0.678 * shapeFactor) * Math.pow(momentumReynolds, -0.268);
  }
}
