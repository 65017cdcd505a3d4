package eddyledger.physics.flow;

import eddyledger.physics.Remark;
import eddyledger.physics.Wording;
import java.util.List;

/**
 * Skin friction of an incompressible turbulent layer from its shape and momentum thickness.
 *
 * <p>Formula: C_f = 0.246 · 10^(−0.678 H) · Re_θ^(−0.268).
 *
 * <p>Symbols: C_f skin friction over the dynamic pressure at the edge; H = δ* / θ; Re_θ = U_e θ/ν.
 *
 * <p>Source: H. Ludwieg, W. Tillmann, NACA TM 1285 (1950), from memory.
 *
 * <p>Range: attached layers with and without pressure gradient, H up to about 2.4 (remarked by
 * {@link BoundaryLayerCompletion}); Re_θ 500 to 3e4, where it stays within 6 % of a flat plate's
 * friction. Above, its power law falls too fast (16 % low at Re_θ = 1.4e5): remarked.
 *
 * <p>Checked by {@code BoundaryLayerReferenceTest}.
 */
final class LudwiegTillmann {
  private static final double LOWEST_REYNOLDS = 500.0;
  private static final double HIGHEST_REYNOLDS = 3.0e4;

  private LudwiegTillmann() {}

  /** Skin friction C_f of a shape factor and a momentum-thickness Reynolds number. */
  static double skinFriction(double shapeFactor, double momentumReynolds) {
    return 0.246 * Math.pow(10.0, -0.678 * shapeFactor) * Math.pow(momentumReynolds, -0.268);
  }

  /** A remark where the formula leaves its range, else none. */
  static List<Remark> remarks(double momentumReynolds) {
    if (momentumReynolds >= LOWEST_REYNOLDS && momentumReynolds <= HIGHEST_REYNOLDS) {
      return List.of();
    }
    return List.of(
        Remark.outOfRange(
            "friction after Ludwieg and Tillmann out of range",
            "friction after Ludwieg and Tillmann used at momentum-thickness Reynolds number "
                + Wording.number(momentumReynolds)
                + "; it holds from 500 to 30000 and comes out low above: give the wall shear stress"
                + " if it is known"));
  }
}
