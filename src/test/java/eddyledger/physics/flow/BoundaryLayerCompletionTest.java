package eddyledger.physics.flow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.data.Percentage.withPercentage;

import eddyledger.physics.Remark;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class BoundaryLayerCompletionTest {
  private static final List<String> NAMES =
      List.of(
          "running length",
          "boundary-layer thickness",
          "displacement thickness",
          "momentum thickness",
          "wall shear stress");

  private static final EdgeFlow ROAD = EdgeFlow.of(StandardAtmosphere.at(0.0, 0.0), 40.0);

  static LongStream seeds() {
    // spread out, because the first draws of neighbouring seeds are alike
    return LongStream.range(200, 240).map(i -> i * 0x9E3779B97F4A7C15L);
  }

  static IntStream subsets() {
    return IntStream.range(1, 32);
  }

  private static EdgeFlow edge(Random random) {
    AirState air = StandardAtmosphere.at(12_000.0 * random.nextDouble(), 0.0);
    return EdgeFlow.of(air, air.soundSpeed() * (0.1 + 0.85 * random.nextDouble()));
  }

  private static double[] quantities(BoundaryLayer layer) {
    return new double[] {
      layer.runningLength().orElseThrow(),
      layer.thickness(),
      layer.displacementThickness(),
      layer.momentumThickness(),
      layer.wallShearStress()
    };
  }

  private static BoundaryLayerInput subset(double[] values, int bits) {
    Double[] given = new Double[5];
    for (int i = 0; i < 5; i++) {
      given[i] = (bits >> i & 1) == 1 ? (Double) values[i] : null;
    }
    return new BoundaryLayerInput(given[0], given[1], given[2], given[3], given[4]);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void anyOneQuantityGivesAllOthersBack(long seed) {
    Random random = new Random(seed);
    EdgeFlow edge = edge(random);
    double length = Math.pow(10.0, 6.0 + 2.5 * random.nextDouble()) / edge.speed() * 2e-5;
    double[] original =
        quantities(
            BoundaryLayerCompletion.complete(edge, BoundaryLayerInput.ofRunningLength(length)));
    for (int i = 0; i < 5; i++) {
      double[] back = quantities(BoundaryLayerCompletion.complete(edge, subset(original, 1 << i)));
      for (int j = 0; j < 5; j++) {
        assertThat(back[j])
            .as("%s from %s, seed %d", NAMES.get(j), NAMES.get(i), seed)
            .isCloseTo(original[j], withPercentage(1e-10));
      }
    }
  }

  @ParameterizedTest
  @MethodSource("subsets")
  void everySubsetIsCompletedAndNamesWhatItFilledIn(int bits) {
    // a layer that no single rule would give: thicker, fuller and rougher than the flat plate's
    double[] known = {1.5, 0.030, 0.0047, 0.0034, 2.4};
    BoundaryLayerInput input = subset(known, bits);
    BoundaryLayer layer = BoundaryLayerCompletion.complete(ROAD, input);
    double[] completed = quantities(layer);
    List<String> filledIn =
        layer.remarks().stream()
            .filter(remark -> remark.kind() == Remark.Kind.FILLED_IN)
            .map(Remark::text)
            .toList();
    assertThat(filledIn).hasSize(5 - Integer.bitCount(bits));
    for (int i = 0; i < 5; i++) {
      String name = NAMES.get(i);
      if ((bits >> i & 1) == 1) {
        assertThat(completed[i]).as("given %s", name).isEqualTo(known[i]);
        assertThat(filledIn).noneMatch(text -> text.startsWith(name));
      } else {
        // the layer is one that exists, so what is filled in lies near it
        assertThat(completed[i] / known[i]).as(name).isBetween(0.2, 15.0);
        assertThat(filledIn).anyMatch(text -> text.startsWith(name));
      }
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void thicknessesOfTheFlatPlateGiveNearlyItsFriction(long seed) {
    Random random = new Random(seed);
    double length = Math.pow(10.0, -0.7 + 2.7 * random.nextDouble());
    BoundaryLayer plate =
        BoundaryLayerCompletion.complete(ROAD, BoundaryLayerInput.ofRunningLength(length));
    double[] known = quantities(plate);
    for (int bits : new int[] {0b00110, 0b01010, 0b01100, 0b01110}) {
      BoundaryLayer layer = BoundaryLayerCompletion.complete(ROAD, subset(known, bits));
      boolean remarked = layer.remarks().stream().anyMatch(r -> r.text().contains("comes out low"));
      assertThat(remarked)
          .as("bits %d, seed %d", bits, seed)
          .isEqualTo(layer.momentumReynolds() > 3e4);
      // past the range of the friction formula its power law falls behind the flat plate's
      assertThat(layer.wallShearStress())
          .as("bits %d, seed %d", bits, seed)
          .isCloseTo(plate.wallShearStress(), withPercentage(remarked ? 22.0 : 6.0));
    }
  }

  @Test
  void withOneThicknessFrictionStaysAsGivenAndThicknessesFollowTheThickness() {
    BoundaryLayer alone =
        BoundaryLayerCompletion.complete(ROAD, BoundaryLayerInput.ofThickness(0.03));
    BoundaryLayer both =
        BoundaryLayerCompletion.complete(ROAD, new BoundaryLayerInput(2.0, 0.03, null, null, 1.7));
    assertThat(both.wallShearStress()).isEqualTo(1.7);
    assertThat(both.displacementThickness()).isEqualTo(alone.displacementThickness());
    assertThat(both.momentumThickness()).isEqualTo(alone.momentumThickness());
    assertThat(both.runningLength()).hasValue(2.0);
  }

  @Test
  void notesAThicknessAtOddsWithTheRunningLength() {
    assertThat(notes(new BoundaryLayerInput(0.3, 0.03, null, null, null)))
        .singleElement()
        .satisfies(text -> assertThat(text).contains("the given running length is 0.3 m"));
    assertThat(notes(new BoundaryLayerInput(20.0, 0.03, null, null, null))).hasSize(1);
    assertThat(notes(new BoundaryLayerInput(2.0, 0.03, null, null, null))).isEmpty();
    assertThat(notes(new BoundaryLayerInput(2.0, null, null, null, 1.7))).isEmpty();
  }

  private static List<String> notes(BoundaryLayerInput input) {
    return BoundaryLayerCompletion.complete(ROAD, input).remarks().stream()
        .filter(remark -> remark.kind() == Remark.Kind.NOTE)
        .map(Remark::text)
        .toList();
  }

  @Test
  void anUncompressedEdgeBarelyChangesTheAirAtTheWall() {
    BoundaryLayer layer =
        BoundaryLayerCompletion.complete(
            EdgeFlow.of(ROAD.air(), 3.0), BoundaryLayerInput.ofRunningLength(10.0));
    assertThat(layer.wallDensity()).isCloseTo(ROAD.air().density(), withPercentage(0.01));
    assertThat(layer.compressibleDisplacementThickness())
        .isCloseTo(layer.displacementThickness(), withPercentage(0.01));
  }

  @Test
  void remarksWhatLiesOutsideItsRange() {
    assertOutOfRange(new BoundaryLayerInput(null, null, 0.0061, 0.0025, null), "separation");
    assertOutOfRange(
        new BoundaryLayerInput(null, 0.1, 0.005, null, null), "displacement thickness");
    assertOutOfRange(new BoundaryLayerInput(null, 0.02, null, null, 0.4), "skin friction");
    assertOutOfRange(BoundaryLayerInput.ofRunningLength(0.1), "Reynolds number");
    assertThat(
            BoundaryLayerCompletion.complete(ROAD, BoundaryLayerInput.ofRunningLength(2.0))
                .remarks())
        .noneMatch(remark -> remark.kind() == Remark.Kind.OUT_OF_RANGE);
  }

  private static void assertOutOfRange(BoundaryLayerInput input, String word) {
    assertThat(BoundaryLayerCompletion.complete(ROAD, input).remarks())
        .anyMatch(
            remark -> remark.kind() == Remark.Kind.OUT_OF_RANGE && remark.text().contains(word));
  }

  @Test
  void refusesWhatNoLayerHas() {
    for (BoundaryLayerInput input :
        List.of(
            BoundaryLayerInput.ofRunningLength(1e-6),
            BoundaryLayerInput.ofThickness(1e-6),
            BoundaryLayerInput.ofThickness(1e6),
            BoundaryLayerInput.ofDisplacementThickness(1e-7),
            BoundaryLayerInput.ofMomentumThickness(1e-7),
            BoundaryLayerInput.ofWallShearStress(0.01),
            BoundaryLayerInput.ofWallShearStress(900.0))) {
      assertThatIllegalArgumentException()
          .as(input.toString())
          .isThrownBy(() -> BoundaryLayerCompletion.complete(ROAD, input))
          .withMessageContaining("turbulent boundary layer");
    }
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.0, -1.0, Double.NaN, Double.POSITIVE_INFINITY})
  void refusesInputsThatAreNoQuantity(double value) {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> BoundaryLayerInput.ofWallShearStress(value))
        .withMessageContaining("wall shear stress");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> BoundaryLayerInput.ofRunningLength(value))
        .withMessageContaining("running length");
  }

  @Test
  void refusesAnEmptyInput() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new BoundaryLayerInput(null, null, null, null, null))
        .withMessageContaining("needs one of");
  }
}
