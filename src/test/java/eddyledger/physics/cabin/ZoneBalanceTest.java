package eddyledger.physics.cabin;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.physics.cabin.ZoneBalance.Coupling;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Laws that the power balance must keep for any cabin, on seeded random ones. */
class ZoneBalanceTest {
  private static final double IMPEDANCE = 413.3;

  /** A random cabin of one to eight zones, some pairs of them coupled. */
  private record Cabin(double[] absorption, List<Coupling> couplings) {
    static Cabin random(long seed) {
      Random random = new Random(seed);
      double[] absorption = random.doubles(1 + random.nextInt(8), 0.3, 6.0).toArray();
      List<Coupling> couplings = new ArrayList<>();
      for (int i = 0; i < absorption.length; i++) {
        for (int j = i + 1; j < absorption.length; j++) {
          if (random.nextInt(3) > 0) {
            couplings.add(new Coupling(i, j, 3.0 * random.nextDouble()));
          }
        }
      }
      return new Cabin(absorption, couplings);
    }

    int zones() {
      return absorption.length;
    }

    ZoneBalance balance() {
      return new ZoneBalance(absorption, couplings, IMPEDANCE);
    }

    Cabin withMoreAbsorption(int zone, double area) {
      double[] more = absorption.clone();
      more[zone] += area;
      return new Cabin(more, couplings);
    }

    /** The same cabin with zone i standing at order[i], its openings listed the other way round. */
    Cabin reordered(List<Integer> order) {
      double[] moved = new double[zones()];
      for (int i = 0; i < zones(); i++) {
        moved[order.get(i)] = absorption[i];
      }
      List<Coupling> turned = new ArrayList<>();
      for (Coupling c : couplings) {
        turned.add(0, new Coupling(order.get(c.second()), order.get(c.first()), c.area()));
      }
      return new Cabin(moved, turned);
    }
  }

  static LongStream seeds() {
    return LongStream.rangeClosed(1, 50);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void whatComesInIsAbsorbed(long seed) {
    Cabin cabin = Cabin.random(seed);
    ZoneBalance balance = cabin.balance();
    double[] powers = new Random(-seed).doubles(cabin.zones(), 0.0, 1e-3).toArray();
    double in = 0.0;
    double absorbed = 0.0;
    for (int i = 0; i < cabin.zones(); i++) {
      double meanSquare = 0.0;
      for (int j = 0; j < cabin.zones(); j++) {
        meanSquare += balance.meanSquarePerWatt(i, j) * powers[j];
      }
      in += powers[i];
      absorbed += cabin.absorption()[i] * meanSquare / (4.0 * IMPEDANCE);
    }
    assertThat(absorbed).as("seed %d", seed).isCloseTo(in, within(1e-12 * in));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void sourceAndReceiverMayChangePlaces(long seed) {
    Cabin cabin = Cabin.random(seed);
    ZoneBalance balance = cabin.balance();
    for (int i = 0; i < cabin.zones(); i++) {
      for (int j = 0; j < cabin.zones(); j++) {
        assertThat(balance.meanSquarePerWatt(i, j))
            .as("seed %d, zones %d and %d", seed, i, j)
            .isEqualTo(balance.meanSquarePerWatt(j, i))
            .isNotNegative()
            .isLessThanOrEqualTo(balance.meanSquarePerWatt(j, j) * (1.0 + 1e-12));
      }
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void moreAbsorptionLowersItsZoneAndRaisesNone(long seed) {
    Cabin cabin = Cabin.random(seed);
    Random random = new Random(-seed);
    int changed = random.nextInt(cabin.zones());
    ZoneBalance before = cabin.balance();
    ZoneBalance after = cabin.withMoreAbsorption(changed, 0.1 + random.nextDouble()).balance();
    assertThat(after.meanSquarePerWatt(changed, changed))
        .as("seed %d", seed)
        .isLessThan(before.meanSquarePerWatt(changed, changed));
    for (int i = 0; i < cabin.zones(); i++) {
      for (int j = 0; j < cabin.zones(); j++) {
        assertThat(after.meanSquarePerWatt(i, j))
            .as("seed %d, zones %d and %d", seed, i, j)
            .isLessThanOrEqualTo(before.meanSquarePerWatt(i, j) * (1.0 + 1e-12));
      }
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void theOrderOfTheZonesDoesNotMatter(long seed) {
    Cabin cabin = Cabin.random(seed);
    List<Integer> order = new ArrayList<>();
    for (int i = 0; i < cabin.zones(); i++) {
      order.add(i);
    }
    Collections.shuffle(order, new Random(-seed));
    ZoneBalance balance = cabin.balance();
    ZoneBalance reordered = cabin.reordered(order).balance();
    for (int i = 0; i < cabin.zones(); i++) {
      for (int j = 0; j < cabin.zones(); j++) {
        double value = balance.meanSquarePerWatt(i, j);
        assertThat(reordered.meanSquarePerWatt(order.get(i), order.get(j)))
            .as("seed %d, order %s, zones %d and %d", seed, order, i, j)
            .isCloseTo(value, within(1e-12 * balance.meanSquarePerWatt(i, i)));
      }
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void aHugeOpeningMakesTwoZonesOne(long seed) {
    Random random = new Random(seed);
    double first = 0.5 + random.nextDouble();
    double second = 0.5 + 4.0 * random.nextDouble();
    ZoneBalance balance =
        new ZoneBalance(new double[] {first, second}, List.of(new Coupling(0, 1, 1e7)), IMPEDANCE);
    double one = 4.0 * IMPEDANCE / (first + second);
    for (int i = 0; i < 2; i++) {
      for (int j = 0; j < 2; j++) {
        assertThat(balance.meanSquarePerWatt(i, j))
            .as("seed %d, zones %d and %d", seed, i, j)
            .isCloseTo(one, within(2e-6 * one));
      }
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void withoutCouplingEveryZoneStandsAlone(long seed) {
    Cabin cabin = Cabin.random(seed);
    ZoneBalance balance = new ZoneBalance(cabin.absorption(), List.of(), IMPEDANCE);
    for (int i = 0; i < cabin.zones(); i++) {
      double alone = 4.0 * IMPEDANCE / cabin.absorption()[i];
      for (int j = 0; j < cabin.zones(); j++) {
        assertThat(balance.meanSquarePerWatt(i, j))
            .as("seed %d, zones %d and %d", seed, i, j)
            .isCloseTo(i == j ? alone : 0.0, within(1e-12 * alone));
      }
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void openingsBetweenTheSameZonesAddUp(long seed) {
    Random random = new Random(seed);
    double[] absorption = {1.0 + random.nextDouble(), 1.0 + random.nextDouble()};
    double door = random.nextDouble();
    double gap = 0.1 * random.nextDouble();
    ZoneBalance two =
        new ZoneBalance(
            absorption, List.of(new Coupling(0, 1, door), new Coupling(1, 0, gap)), IMPEDANCE);
    ZoneBalance one =
        new ZoneBalance(absorption, List.of(new Coupling(1, 0, door + gap)), IMPEDANCE);
    double expected = one.meanSquarePerWatt(0, 1);
    assertThat(two.meanSquarePerWatt(0, 1))
        .as("seed %d", seed)
        .isCloseTo(expected, within(1e-12 * expected));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void aBareZoneIsDrainedThroughItsOpening(long seed) {
    Random random = new Random(seed);
    double absorption = 0.5 + random.nextDouble();
    double opening = 0.5 + random.nextDouble();
    ZoneBalance balance =
        new ZoneBalance(
            new double[] {0.0, absorption}, List.of(new Coupling(0, 1, opening)), IMPEDANCE);
    double series = 4.0 * IMPEDANCE * (1.0 / absorption + 1.0 / opening);
    assertThat(balance.meanSquarePerWatt(0, 0))
        .as("seed %d", seed)
        .isCloseTo(series, within(1e-12 * series));
  }
}
