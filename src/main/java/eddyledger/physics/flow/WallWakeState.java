package eddyledger.physics.flow;

/**
 * One incompressible layer of the law of the wall with wake.
 *
 * @param speedRatio λ = U_e/u_τ
 * @param thickness δ, m
 * @param displacementThickness δ*, m
 * @param momentumThickness θ, m
 */
record WallWakeState(
    double speedRatio, double thickness, double displacementThickness, double momentumThickness) {}
