package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import eddyledger.physics.wallpressure.ButterworthCrossSpectrum;
import eddyledger.physics.wallpressure.SeparableCrossSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Progress;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Radiated power and mean-square velocity of three panels (side glass, aircraft bay under tension,
 * steel floor) in all 28 bands and for orders (1, 1), (2, 1) and (3, 2).
 *
 * <p>Source: {@code reference/panel-response.json}, independent computation of the published
 * formula with fine integration over frequency (its error is below 1e-6). W and (m/s)² at a wall
 * pressure of 1 Pa²/Hz. Tolerance 0.1 dB: what cutting a band into 6 or 12 slices may cost.
 */
class PanelResponseReferenceTest {
  private static final double TOLERANCE_DB = 0.1;

  static Stream<Arguments> cases() {
    return Reference.read("panel-response.json")
        .get("panels")
        .valueStream()
        .flatMap(
            panel ->
                panel
                    .get("results")
                    .valueStream()
                    .map(
                        result ->
                            Arguments.of(
                                panel.get("name").asText(),
                                result.get("order_x").asInt(),
                                result.get("order_y").asInt(),
                                panel,
                                result)));
  }

  @ParameterizedTest(name = "{0} orders {1}, {2}")
  @MethodSource("cases")
  void everyBandWithinATenthOfADecibel(
      String name, int orderAlong, int orderAcross, JsonNode panel, JsonNode result) {
    SeparableCrossSpectrum spectrum =
        new ButterworthCrossSpectrum(
            orderAlong,
            orderAcross,
            panel.get("alpha_x").asDouble(),
            panel.get("alpha_y").asDouble());
    PanelTransfer transfer = compute(panel, spectrum);
    double[] density = new double[transfer.slices().count()];
    Arrays.fill(density, panel.get("Gpp_Pa2_per_Hz").asDouble());
    compare(panel, result.get("W_band"), transfer.bandPower(density, 0), name + " power");
    compare(
        panel,
        result.get("v2_band"),
        transfer.bandMeanSquareVelocity(density, 0),
        name + " velocity");
  }

  private static PanelTransfer compute(JsonNode panel, SeparableCrossSpectrum spectrum) {
    JsonNode in = panel.get("inputs");
    double[] loss = Panels.loss(in.get("eta").asDouble());
    double speed = in.get("Uc").asDouble();
    FluidFace cabin = new FluidFace(panel.get("rho0").asDouble(), panel.get("c0").asDouble());
    PanelCase panelCase =
        PanelCase.of(
            Panels.plate(panel),
            loss,
            Optional.empty(),
            Optional.of(cabin),
            List.of(spectrum),
            f -> speed);
    return new PanelResponse(new RadiationCache()).of(panelCase, Progress.NONE);
  }

  private static void compare(JsonNode panel, JsonNode expected, double[] bands, String what) {
    JsonNode index = panel.get("band_index");
    assertThat(index).hasSize(Bands.COUNT);
    for (int i = 0; i < index.size(); i++) {
      int band = index.get(i).asInt() - Bands.FIRST_INDEX;
      double difference = 10.0 * Math.log10(bands[band] / expected.get(i).asDouble());
      assertThat(difference)
          .as("%s, band %s Hz, dB", what, Bands.label(band))
          .isBetween(-TOLERANCE_DB, TOLERANCE_DB);
    }
  }
}
