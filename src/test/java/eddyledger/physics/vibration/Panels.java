package eddyledger.physics.vibration;

import com.fasterxml.jackson.databind.JsonNode;
import eddyledger.physics.wallpressure.ButterworthCrossSpectrum;
import eddyledger.physics.wallpressure.SeparableCrossSpectrum;
import eddyledger.quantity.Bands;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** Panels that several tests use. */
final class Panels {
  static final FluidFace AIR = new FluidFace(1.2041, 343.21);

  private Panels() {}

  /** The plate of one entry of {@code reference/panel-response.json}. */
  static Plate plate(JsonNode panel) {
    JsonNode in = panel.get("inputs");
    return Plate.isotropic(
            in.get("a").asDouble(),
            in.get("b").asDouble(),
            in.get("h").asDouble(),
            in.get("E").asDouble(),
            in.get("rho").asDouble(),
            in.get("nu").asDouble())
        .withTension(in.get("Nx").asDouble(), in.get("Ny").asDouble());
  }

  static Plate glass() {
    return Plate.isotropic(0.9, 0.45, 0.00385, 70e9, 2500.0, 0.23);
  }

  static double[] loss(double value) {
    double[] loss = new double[Bands.COUNT];
    Arrays.fill(loss, value);
    return loss;
  }

  static SeparableCrossSpectrum orders(int along, int across) {
    return new ButterworthCrossSpectrum(along, across, 0.116, 0.7);
  }

  /** Air in the cabin, none outside, 28 m/s, as many slices as the order needs. */
  static PanelCase panelCase(Plate plate, double loss, SeparableCrossSpectrum... spectra) {
    return PanelCase.of(
        plate, loss(loss), Optional.empty(), Optional.of(AIR), List.of(spectra), f -> 28.0);
  }
}
