package eddyledger.physics.cabin;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import eddyledger.physics.cabin.ZoneBalance.Coupling;
import java.util.List;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Direct and diffuse part at a receiver: limits and laws. */
class ReceiverTransferTest {
  private static final double IMPEDANCE = 413.3;
  private static final ZoneBalance BALANCE =
      new ZoneBalance(new double[] {1.2, 2.0}, List.of(new Coupling(0, 1, 0.8)), IMPEDANCE);

  static LongStream seeds() {
    return LongStream.rangeClosed(1, 20);
  }

  @Test
  void atThePanelTheIntensityIsItsOwn() {
    assertThat(DirectField.meanSquarePerWatt(0.4, 0.0, IMPEDANCE))
        .isCloseTo(IMPEDANCE / 0.4, within(1e-10));
  }

  @Test
  void farAwayItSpreadsOverHalfASphere() {
    double near = DirectField.meanSquarePerWatt(0.4, 100.0, IMPEDANCE);
    double far = DirectField.meanSquarePerWatt(0.4, 200.0, IMPEDANCE);
    assertThat(far).isCloseTo(IMPEDANCE / (2.0 * Math.PI * 200.0 * 200.0), within(1e-5 * far));
    assertThat(near / far).isCloseTo(4.0, within(1e-4));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void theDirectPartFallsWithDistance(long seed) {
    Random random = new Random(seed);
    double area = 0.05 + random.nextDouble();
    double distance = 2.0 * random.nextDouble();
    double further = distance + 0.01 + random.nextDouble();
    assertThat(DirectField.meanSquarePerWatt(area, further, IMPEDANCE))
        .as("seed %d", seed)
        .isPositive()
        .isLessThan(DirectField.meanSquarePerWatt(area, distance, IMPEDANCE));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void onlyTheDiffusePartIsReducedAndOnlyBesideADirectPart(long seed) {
    Random random = new Random(seed);
    double absorption = random.nextDouble();
    double area = 0.05 + random.nextDouble();
    double distance = random.nextDouble();
    ReceiverTransfer receiver = new ReceiverTransfer(BALANCE, 1);
    double diffuse = BALANCE.meanSquarePerWatt(1, 1);
    assertThat(receiver.diffuse(1)).as("seed %d", seed).isEqualTo(diffuse);
    assertThat(receiver.diffuse(0)).as("seed %d", seed).isEqualTo(BALANCE.meanSquarePerWatt(1, 0));
    double direct = DirectField.meanSquarePerWatt(area, distance, IMPEDANCE);
    double both = receiver.withDirect(absorption, area, distance);
    assertThat(both - direct)
        .as("seed %d", seed)
        .isCloseTo(diffuse - absorption * diffuse, within(1e-12 * both));
  }

  @Test
  void aDeadZoneLeavesTheDirectPart() {
    ReceiverTransfer receiver = new ReceiverTransfer(BALANCE, 0);
    assertThat(receiver.withDirect(1.0, 0.4, 0.5))
        .isEqualTo(DirectField.meanSquarePerWatt(0.4, 0.5, IMPEDANCE));
  }

  @ParameterizedTest
  @ValueSource(doubles = {-0.01, 1.01, Double.NaN})
  void refusesAnImpossibleMeanAbsorption(double absorption) {
    ReceiverTransfer receiver = new ReceiverTransfer(BALANCE, 0);
    assertThatThrownBy(() -> receiver.withDirect(absorption, 0.4, 0.5))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("mean absorption");
  }

  @ParameterizedTest
  @ValueSource(ints = {-1, 2})
  void refusesAZoneThatIsNotThere(int zone) {
    assertThatThrownBy(() -> new ReceiverTransfer(BALANCE, zone))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("zone " + zone);
  }

  @Test
  void refusesImpossibleGeometryAndAir() {
    assertThatThrownBy(() -> DirectField.meanSquarePerWatt(0.0, 0.5, IMPEDANCE))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("area");
    assertThatThrownBy(() -> DirectField.meanSquarePerWatt(0.4, -0.5, IMPEDANCE))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("distance");
    assertThatThrownBy(() -> DirectField.meanSquarePerWatt(0.4, 0.5, Double.NaN))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("impedance");
  }
}
