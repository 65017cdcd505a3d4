package eddyledger.physics.wallpressure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import eddyledger.physics.ReferenceFile;
import eddyledger.physics.flow.BoundaryLayer;
import eddyledger.quantity.Decibels;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Point spectra against an independent computation of Goody (AIAA J. 42, 2004) and Efimtsov (Sov.
 * Phys. Acoust. 28, 1982; constants of NASA/CR-2005-213938), in {@code point-spectra.json}.
 *
 * <p>Three layers, 24 one-third-octave bands from 50 Hz to 10 kHz: spectral density, Pa²/Hz, at the
 * exact mid-band frequency, and mean square of the band, Pa². Required within 0.01 dB; both sides
 * have ten digits, so 1e-6 dB is checked.
 */
class PointSpectraReferenceTest {
  private static final double TOLERANCE_DB = 1e-6;

  static List<Arguments> casesAndModels() {
    List<Arguments> arguments = new ArrayList<>();
    for (JsonNode node : root().get("cases")) {
      for (String model : List.of("goody", "efimtsov")) {
        arguments.add(Arguments.of(node.get("name").asText(), model, node));
      }
    }
    return arguments;
  }

  private static JsonNode root() {
    return ReferenceFile.json("wallpressure/point-spectra.json");
  }

  @ParameterizedTest(name = "{0} {1}")
  @MethodSource("casesAndModels")
  void agreesWithIndependentComputation(String name, String model, JsonNode node) {
    BoundaryLayer layer = LayerStates.of(node.get("state"));
    WallPressureSpectrum spectrum = WallPressureSpectra.byId(model).orElseThrow();
    JsonNode frequencies = root().get("frequencies");
    JsonNode expected = node.get("models").get(model);
    assertThat(frequencies).hasSize(24);
    for (int i = 0; i < frequencies.size(); i++) {
      double centre = 1000.0 * Math.pow(10.0, 0.1 * (i - 13));
      assertThat(frequencies.get(i).asDouble()).isCloseTo(centre, within(1e-8 * centre));
      double density = spectrum.spectralDensity(centre, layer);
      double edge = Math.pow(10.0, 0.05);
      double band =
          LayerStates.integral(
              f -> spectrum.spectralDensity(f, layer), centre / edge, centre * edge, 1);
      assertThat(difference(density, expected.get("G_hz").get(i)))
          .as("%s, density at %.1f Hz", name, centre)
          .isCloseTo(0.0, within(TOLERANCE_DB));
      assertThat(difference(band, expected.get("band_ms").get(i)))
          .as("%s, band at %.1f Hz", name, centre)
          .isCloseTo(0.0, within(TOLERANCE_DB));
    }
  }

  private static double difference(double actual, JsonNode expected) {
    return Decibels.ofRatio(actual / expected.asDouble());
  }
}
