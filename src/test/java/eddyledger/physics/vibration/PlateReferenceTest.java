package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Modes and critical frequency of plates against handbooks.
 *
 * <p>Sources: M. Long, "Architectural Acoustics", table 9.1 (critical frequency times thickness, Hz
 * m; 10 %, as handbooks round speeds and stiffness each in their own way); A. W. Leissa, "Vibration
 * of Plates", NASA SP-160 (1969), table 4.1 (ωa²√(m''/D) of the plate supported on all edges, four
 * decimals, from memory); {@code reference/panel-response.json} (first modes of three panels, with
 * tension, 1e-9); counted modes of a side glass, and the shift of one mode by curvature,
 * independent computation.
 */
class PlateReferenceTest {

  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "steel,     210e9, 7850, 0.30, 12.4, 11.98",
    "aluminium,  71e9, 2700, 0.33, 12.0, 11.95",
    "glass,      70e9, 2500, 0.23, 12.7, 11.94",
  })
  void criticalFrequencyTimesThickness(
      String material, double e, double density, double nu, double handbook, double computed) {
    double thickness = 0.003;
    double product =
        Plate.isotropic(1.0, 1.0, thickness, e, density, nu).criticalFrequency(343.2) * thickness;
    assertThat(product).isCloseTo(handbook, Percentage.withPercentage(10.0));
    assertThat(product).isCloseTo(computed, Percentage.withPercentage(5.0));
  }

  @ParameterizedTest(name = "a/b = {0}")
  @CsvSource({
    "0.4, 11.4487, 16.1862, 24.0818, 35.1358, 41.0576, 45.7950",
    "1.0, 19.7392, 49.3480, 49.3480, 78.9568, 98.6960, 98.6960",
    "1.5, 32.0762, 61.6850, 98.6960, 111.0330, 128.3049, 177.6529",
    "2.5, 71.5564, 101.1634, 150.5115, 219.5987, 256.6097, 286.2185",
  })
  void simplySupportedPlate(
      double ratio, double k1, double k2, double k3, double k4, double k5, double k6) {
    double stiffness = 30.0;
    double mass = 4.0;
    double length = 0.7;
    Plate plate = Plate.uniform(length, length / ratio, stiffness, mass);
    List<Double> found = new ArrayList<>();
    for (int m = 1; m <= 8; m++) {
      for (int n = 1; n <= 8; n++) {
        found.add(plate.modeAngularFrequency(m, n) * length * length * Math.sqrt(mass / stiffness));
      }
    }
    found.sort(null);
    double[] table = {k1, k2, k3, k4, k5, k6};
    for (int i = 0; i < table.length; i++) {
      assertThat(found.get(i)).as("mode %d", i + 1).isCloseTo(table[i], within(1.5e-4 * table[i]));
    }
  }

  @Test
  void squarePlateFifthValue() {
    Plate plate = Plate.uniform(1.0, 1.0, 1.0, 1.0);
    assertThat(plate.modeAngularFrequency(2, 3)).isCloseTo(128.3, within(0.05));
  }

  @Test
  void firstModesOfThreePanels() {
    for (JsonNode panel : Reference.read("panel-response.json").get("panels")) {
      Plate plate = Panels.plate(panel);
      assertThat(plate.criticalFrequency(panel.get("c0").asDouble()))
          .isCloseTo(panel.get("fc_Hz").asDouble(), Percentage.withPercentage(1e-7));
      for (JsonNode mode : panel.get("first_modes")) {
        assertThat(plate.modeFrequency(mode.get(0).asInt(), mode.get(1).asInt()))
            .isCloseTo(mode.get(2).asDouble(), Percentage.withPercentage(1e-7));
      }
    }
  }

  @Test
  void modesOfTheSideGlassBelowTenKilohertz() {
    Plate glass = Plate.isotropic(0.9, 0.45, 0.00385, 70e9, 2500.0, 0.23);
    int count = 0;
    for (int m = 1; m < 100; m++) {
      for (int n = 1; n < 100; n++) {
        count += glass.modeFrequency(m, n) <= 10_000.0 ? 1 : 0;
      }
    }
    assertThat(count).isEqualTo(315);
    assertThat(glass.modeCountBelow(10_000.0)).isCloseTo(313.5, within(0.1));
    assertThat(glass.modalDensity() * 10_000.0).isCloseTo(335.0, within(0.5));
  }

  /**
   * A bay under cabin pressure, 542 Hz when flat, rises to 622 Hz by its curvature; the tension
   * that makes it 542 Hz is found first. 3 Hz, as the alloy is not stated.
   */
  @Test
  void curvatureLiftsTheThirdModeOfABay() {
    Plate slack = Plate.isotropic(0.5, 0.18, 0.0014, 72e9, 2700.0, 0.34);
    double missing = square(542.0) - square(slack.modeFrequency(3, 1));
    double ky = Math.PI / 0.18;
    double tension = 4.0 * Math.PI * Math.PI * missing * slack.surfaceMass() / (ky * ky);
    Plate flat = slack.withTension(0.0, tension);
    assertThat(flat.modeFrequency(3, 1)).isCloseTo(542.0, within(1e-6));
    assertThat(flat.withRadius(72e9, 2700.0, 1.45).modeFrequency(3, 1))
        .isCloseTo(622.0, within(3.0));
  }

  private static double square(double value) {
    return value * value;
  }
}
