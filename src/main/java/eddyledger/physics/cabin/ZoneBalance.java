package eddyledger.physics.cabin;

import java.util.List;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.CholeskyDecomposition;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * Mean-square pressure of the diffuse fields in coupled zones per sound power let into one of them,
 * in one band. Immutable.
 *
 * <p>Formula: for every zone i, (A_i + Σ_j S_ij τ_ij) p²_i − Σ_j S_ij τ_ij p²_j = 4 ρ0 c0 W_i, that
 * is M p² = 4 ρ0 c0 W.
 *
 * <ul>
 *   <li>p²_i: mean-square pressure in zone i, space average, Pa²
 *   <li>A_i: absorption area of zone i (surfaces, seats, people), m²; an opening to another zone is
 *       no part of it
 *   <li>S_ij τ_ij: area of the opening or wall between zones i and j times its diffuse transmission
 *       coefficient, m²; τ = 1 for an open aperture
 *   <li>W_i: sound power let into zone i, W
 *   <li>ρ0 c0: characteristic impedance of the cabin air, Pa s/m
 * </ul>
 *
 * <p>Source: power balance of diffuse fields with one-sided intensity p²/(4 ρ0 c0); textbook, for
 * example Kuttruff, Room Acoustics (from memory). The matrix is symmetric and diagonally dominant,
 * so it is factored once (Cholesky) and its inverse, all entries of which are positive or zero,
 * answers every pair of zones.
 *
 * <p>Range: diffuse zones, see {@link Sabine} and {@link SchroederFrequency}. Zones that are linked
 * must absorb something between them. Rounding grows with the ratio of coupling to absorption:
 * about 1e-16 times that ratio, relative.
 *
 * <p>One-sided mean squares and powers of a band, no densities.
 *
 * <p>Checked by {@code CabinReferenceTest} and {@code ZoneBalanceTest}.
 */
public final class ZoneBalance {
  /**
   * An opening or a wall between two zones.
   *
   * @param first position of one zone
   * @param second position of the other zone
   * @param area area times transmission coefficient S τ, m²
   */
  public record Coupling(int first, int second, double area) {}

  private final double[][] meanSquarePerWatt;
  private final double characteristicImpedance;

  /**
   * Balances the zones.
   *
   * @param absorptionAreas absorption area A_i of each zone, m², shape [zones]
   * @param couplings openings and walls between zones; several between the same two add up
   * @param characteristicImpedance ρ0 c0 of the cabin air, Pa s/m
   * @throws IllegalArgumentException if there is no zone, an absorption area is negative or not
   *     finite, zones linked with one another absorb nothing, a coupling is negative, not finite,
   *     or not between two different zones, or the impedance is not positive
   */
  public ZoneBalance(
      double[] absorptionAreas, List<Coupling> couplings, double characteristicImpedance) {
    int zones = absorptionAreas.length;
    if (zones == 0) {
      throw new IllegalArgumentException("a cabin needs at least one zone");
    }
    if (!(characteristicImpedance > 0.0) || Double.isInfinite(characteristicImpedance)) {
      throw new IllegalArgumentException(
          "the characteristic impedance must be positive, not " + characteristicImpedance);
    }
    for (int i = 0; i < zones; i++) {
      requireArea(absorptionAreas[i], "the absorption area of zone " + i);
    }
    for (Coupling coupling : couplings) {
      requireCoupling(coupling, zones);
    }
    requireAbsorption(absorptionAreas, couplings);
    this.characteristicImpedance = characteristicImpedance;
    meanSquarePerWatt = inverse(absorptionAreas, couplings, 4.0 * characteristicImpedance);
  }

  /** Number of zones. */
  public int zones() {
    return meanSquarePerWatt.length;
  }

  /** Characteristic impedance ρ0 c0 of the cabin air, Pa s/m. */
  public double characteristicImpedance() {
    return characteristicImpedance;
  }

  /**
   * Mean-square pressure in a zone per watt let into a zone (the same or another), Pa²/W: 4 ρ0 c0
   * (M⁻¹)_ij. Exactly the same with the two zones exchanged.
   *
   * @throws IndexOutOfBoundsException if there is no such zone
   */
  public double meanSquarePerWatt(int receivingZone, int sourceZone) {
    return meanSquarePerWatt[receivingZone][sourceZone];
  }

  private static double[][] inverse(double[] absorption, List<Coupling> couplings, double factor) {
    int zones = absorption.length;
    double[][] balance = new double[zones][zones];
    for (int i = 0; i < zones; i++) {
      balance[i][i] = absorption[i];
    }
    for (Coupling coupling : couplings) {
      balance[coupling.first()][coupling.first()] += coupling.area();
      balance[coupling.second()][coupling.second()] += coupling.area();
      balance[coupling.first()][coupling.second()] -= coupling.area();
      balance[coupling.second()][coupling.first()] -= coupling.area();
    }
    // no absolute threshold: a very dull and a very live cabin differ by the scale of their areas
    RealMatrix inverse =
        new CholeskyDecomposition(
                new Array2DRowRealMatrix(balance, false),
                CholeskyDecomposition.DEFAULT_RELATIVE_SYMMETRY_THRESHOLD,
                0.0)
            .getSolver()
            .getInverse();
    double[][] perWatt = new double[zones][zones];
    for (int i = 0; i < zones; i++) {
      for (int j = 0; j < zones; j++) {
        perWatt[i][j] = factor * 0.5 * (inverse.getEntry(i, j) + inverse.getEntry(j, i));
      }
    }
    return perWatt;
  }

  private static void requireArea(double area, String what) {
    if (!(area >= 0.0) || Double.isInfinite(area)) {
      throw new IllegalArgumentException(what + " must not be negative: " + area + " m²");
    }
  }

  private static void requireCoupling(Coupling coupling, int zones) {
    for (int zone : new int[] {coupling.first(), coupling.second()}) {
      if (zone < 0 || zone >= zones) {
        throw new IllegalArgumentException("a coupling names zone " + zone + ", not one of them");
      }
    }
    if (coupling.first() == coupling.second()) {
      throw new IllegalArgumentException(
          "a coupling joins zone " + coupling.first() + " with itself");
    }
    requireArea(
        coupling.area(),
        "the coupling between zones " + coupling.first() + " and " + coupling.second());
  }

  /** Power let into zones that absorb nothing and are linked with none that does has no balance. */
  private static void requireAbsorption(double[] absorption, List<Coupling> couplings) {
    boolean[] drained = new boolean[absorption.length];
    for (int i = 0; i < absorption.length; i++) {
      drained[i] = absorption[i] > 0.0;
    }
    boolean spreading = true;
    while (spreading) {
      spreading = false;
      for (Coupling coupling : couplings) {
        if (coupling.area() > 0.0 && drained[coupling.first()] != drained[coupling.second()]) {
          drained[coupling.first()] = true;
          drained[coupling.second()] = true;
          spreading = true;
        }
      }
    }
    for (int i = 0; i < drained.length; i++) {
      if (!drained[i]) {
        throw new IllegalArgumentException(
            "zone " + i + " and the zones linked with it have no absorption");
      }
    }
  }
}
