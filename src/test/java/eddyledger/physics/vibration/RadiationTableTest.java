package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The kept radiation efficiencies against the exact product, and their sharing. */
class RadiationTableTest {

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
  void agreesWithTheProductForAnySizeAndWavenumber(long seed) {
    Random random = new Random(seed);
    double a = 0.08 * Math.pow(30.0, random.nextDouble());
    double b = a * Math.pow(8.0, random.nextDouble() - 0.5);
    RadiationTable table = new RadiationCache().table(a, b);
    MatrixRadiationEfficiency exact = new MatrixRadiationEfficiency(a, b);
    double diagonal = Math.hypot(a, b);
    for (int i = 0; i < 25; i++) {
      double k = 0.05 * Math.pow(5000.0, random.nextDouble()) / diagonal;
      int along = 1 + random.nextInt(18);
      int across = 1 + random.nextInt(12);
      double[][] expected = exact.efficiencies(k, along, across);
      double[][] kept = table.efficiencies(k, along, across);
      double tolerance = k * diagonal < 0.5 ? 1e-5 : 1e-6;
      for (int n = 0; n < across; n++) {
        for (int m = 0; m < along; m++) {
          assertThat(kept[n][m])
              .as("seed %d, %s x %s m, k %s, mode %d, %d", seed, a, b, k, m + 1, n + 1)
              .isCloseTo(expected[n][m], within(tolerance * expected[n][m] + 1e-14));
        }
      }
    }
  }

  /** Beyond kR = 256 each wavenumber stands for itself, kept in single precision. */
  @Test
  void highWavenumbersAreTheProductItself() {
    RadiationCache cache = new RadiationCache();
    double k = 300.0 / Math.hypot(0.9, 0.45);
    double[][] kept = cache.table(0.9, 0.45).efficiencies(k, 5, 4);
    double[][] exact = new MatrixRadiationEfficiency(0.9, 0.45).efficiencies(k, 5, 4);
    for (int n = 0; n < 4; n++) {
      for (int m = 0; m < 5; m++) {
        assertThat(kept[n][m]).isCloseTo(exact[n][m], within(1e-7 * exact[n][m]));
      }
    }
    assertThat(cache.bytes()).isEqualTo(4 * 5 * 4);
  }

  @ParameterizedTest
  @CsvSource({
    "0.0, 0",
    "0.999, 0",
    "1.0, 1",
    "1.99, 1",
    "2.0, 2",
    "15.9, 4",
    "16.0, 5",
    "31.9, 5",
    "32.0, 6",
    "64.0, 8"
  })
  void stretchesFollowOneAnother(double x, int index) {
    assertThat(WavenumberInterval.index(x)).isEqualTo(index);
    WavenumberInterval interval = WavenumberInterval.of(index);
    assertThat(x).isBetween(interval.middle() - interval.halfLength(), interval.upper());
  }

  @Test
  void lastStretchEndsWhereSingleWavenumbersBegin() {
    assertThat(WavenumberInterval.of(WavenumberInterval.index(255.99)).upper()).isEqualTo(256.0);
    assertThat(WavenumberInterval.index(256.0)).isEqualTo(WavenumberInterval.SINGLE);
  }

  @Test
  void aNodeGivesItsOwnValue() {
    WavenumberInterval interval = WavenumberInterval.of(6);
    double[] weights = interval.weights(interval.nodes()[3]);
    for (int j = 0; j < weights.length; j++) {
      assertThat(weights[j]).isEqualTo(j == 3 ? 1.0 : 0.0);
    }
  }

  /** What was asked before, and for how many modes, must not show in the last bit. */
  @Test
  void valuesDoNotDependOnHistory() {
    double[][] fresh = new RadiationCache().table(0.7, 0.4).efficiencies(40.0, 9, 6);
    RadiationCache used = new RadiationCache();
    RadiationTable table = used.table(0.7, 0.4);
    table.efficiencies(39.0, 30, 20);
    table.efficiencies(41.0, 3, 2);
    table.efficiencies(80.0, 9, 6);
    assertThat(table.efficiencies(40.0, 9, 6)).isDeepEqualTo(fresh);
    RadiationCache forgetful = new RadiationCache(0);
    assertThat(forgetful.table(0.7, 0.4).efficiencies(40.0, 9, 6)).isDeepEqualTo(fresh);
    assertThat(forgetful.bytes()).isZero();
  }

  @Test
  void staysWithinItsBound() {
    RadiationCache cache = new RadiationCache(100_000);
    for (int i = 1; i <= 60; i++) {
      cache.table(0.5 + 0.01 * i, 0.4).efficiencies(10.0, 8, 8);
      assertThat(cache.bytes()).isBetween(1L, 100_000L);
    }
  }

  @Test
  void twoAirsShareOneBlock() {
    RadiationCache cache = new RadiationCache();
    RadiationTable table = cache.table(0.9, 0.45);
    double omega = 2.0 * Math.PI * 1000.0;
    table.efficiencies(omega / 343.2, 12, 6);
    long bytes = cache.bytes();
    table.efficiencies(omega / 330.0, 12, 6);
    assertThat(cache.bytes()).isEqualTo(bytes).isPositive();
  }

  @Test
  void threadsSeeTheSameBits() throws Exception {
    RadiationCache common = new RadiationCache();
    double[][] alone = new RadiationCache().table(0.6, 0.5).efficiencies(70.0, 14, 11);
    ExecutorService threads = Executors.newFixedThreadPool(4);
    try {
      List<Future<double[][]>> answers = new ArrayList<>();
      for (int i = 0; i < 16; i++) {
        answers.add(threads.submit(() -> common.table(0.6, 0.5).efficiencies(70.0, 14, 11)));
      }
      for (Future<double[][]> answer : answers) {
        assertThat(answer.get(20, TimeUnit.SECONDS)).isDeepEqualTo(alone);
      }
    } finally {
      threads.shutdownNow();
    }
  }

  @Test
  void argumentsMustMakeSense() {
    RadiationTable table = new RadiationCache().table(0.6, 0.5);
    assertThatIllegalArgumentException().isThrownBy(() -> table.efficiencies(0.0, 1, 1));
    assertThatIllegalArgumentException().isThrownBy(() -> table.efficiencies(1.0, 0, 1));
    assertThatIllegalArgumentException().isThrownBy(() -> new RadiationCache().table(0.0, 1.0));
    assertThatIllegalArgumentException().isThrownBy(() -> new RadiationCache(-1));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new MatrixRadiationEfficiency(1.0, 1.0).efficiencies(1.0, 1, 0));
  }
}
