package eddyledger.physics.wallpressure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.physics.ReferenceFile;
import eddyledger.physics.flow.AirState;
import eddyledger.physics.flow.BoundaryLayer;
import eddyledger.physics.flow.EdgeFlow;
import eddyledger.quantity.Decibels;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/**
 * Efimtsov's spectrum against a third party's table of one-third-octave levels of a cruising
 * fuselage.
 *
 * <p>Source: {@code Bies_TBL_Data.csv} of an open student thesis on fuselage noise (repository
 * garrrikkotua/bachelor_diploma), 29 bands from 31.5 Hz to 20 kHz, levels in dB re 20 µPa rounded
 * to 0.1 dB; a computed table. Its layer is not stated; the one here was fitted to it (δ = 0.19749
 * m, u_τ = 7.2509 m/s, ρ_w = 0.42044 kg/m³, Re_τ = 38 400), so that the test ties the shape over 29
 * bands and not the level. The table was made at nominal frequencies (at exact ones the differences
 * follow the rounding of the nominal values), so they are used here. Tolerance 0.05 dB: half of the
 * last digit printed.
 */
class EfimtsovTableReferenceTest {
  private static BoundaryLayer layer() {
    double delta = 0.19749;
    double friction = 7.2509;
    double density = 0.42044;
    double viscosity = friction * delta / 38_400.0;
    // the spectrum knows the edge only for its range; any cruise will do
    EdgeFlow edge = EdgeFlow.of(new AirState(220.0, 24_500.0), 239.0);
    return new BoundaryLayer(
        edge,
        delta,
        delta / 8.5,
        delta / 10.6,
        delta / 7.6,
        density * friction * friction,
        density,
        viscosity,
        OptionalDouble.empty(),
        List.of());
  }

  @Test
  void bandLevelsAgreeWithTable() {
    List<double[]> rows = ReferenceFile.csv("wallpressure/efimtsov-table.csv");
    BoundaryLayer layer = layer();
    EfimtsovSpectrum spectrum = new EfimtsovSpectrum();
    assertThat(rows).hasSize(29);
    for (int i = 0; i < rows.size(); i++) {
      double centre = rows.get(i)[0];
      double edge = Math.pow(10.0, 0.05);
      double meanSquare =
          LayerStates.integral(
              f -> spectrum.spectralDensity(f, layer), centre / edge, centre * edge, 1);
      assertThat(Decibels.pressureLevel(meanSquare))
          .as("%.0f Hz", centre)
          .isCloseTo(rows.get(i)[1], within(0.05));
    }
  }
}
