package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.physics.wallpressure.ButterworthCrossSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Progress;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The sum over modes written out plainly, each face with its own exact radiation efficiency,
 * against the response that reads tables and lets the cabin's efficiency stand in for the outside's
 * far from resonance. Very light damping, so that the faces' air counts as much as it ever does.
 */
class TwoFacesTest {
  private static final FluidFace CABIN = new FluidFace(0.95, 345.0);
  private static final FluidFace OUTSIDE = new FluidFace(0.39, 297.0);
  private static final int[] BANDS = {9, 14, 18, 21};

  @ParameterizedTest
  @CsvSource({"0.002, 0.5, 0.18, 0.0014", "0.01, 0.35, 0.3, 0.002", "0.04, 0.5, 0.18, 0.0012"})
  void eachFaceDampsByItsOwnAir(double loss, double length, double width, double thickness) {
    Plate plate = Plate.isotropic(length, width, thickness, 7.1e10, 2780.0, 0.33);
    double[] losses = new double[Bands.COUNT];
    Arrays.fill(losses, loss);
    ButterworthCrossSpectrum cross = new ButterworthCrossSpectrum(2, 1, 0.116, 0.7);
    PanelCase panel =
        PanelCase.of(
            plate,
            losses,
            Optional.of(OUTSIDE),
            Optional.of(CABIN),
            List.of(cross),
            frequency -> 150.0);
    PanelTransfer transfer = new PanelResponse(new RadiationCache()).of(panel, Progress.NONE);
    double[] ones = new double[panel.slices().count()];
    Arrays.fill(ones, 1.0);
    double[] bands = transfer.bandPower(ones, 0);
    for (int band : BANDS) {
      double plain = plainPower(panel, loss, cross, band);
      assertThat(10.0 * Math.log10(bands[band] / plain))
          .as("band " + Bands.label(band))
          .isCloseTo(0.0, within(0.005));
    }
  }

  private static double plainPower(
      PanelCase panel, double loss, ButterworthCrossSpectrum cross, int band) {
    Plate plate = panel.plate();
    double limit = 2.0 * Bands.upper(band);
    limit = Math.max(limit, 3.0 * plate.modeFrequency(1, 1));
    int modes = 1;
    while (plate.modeFrequency(modes, 1) <= limit || plate.modeFrequency(1, modes) <= limit) {
      modes++;
    }
    double sum = 0.0;
    int perBand = panel.slices().perBand();
    for (int slice = band * perBand; slice < (band + 1) * perBand; slice++) {
      double omega = 2.0 * Math.PI * panel.slices().centre(slice);
      double[][] in = sigma(plate, omega / CABIN.soundSpeed(), modes);
      double[][] out = sigma(plate, omega / OUTSIDE.soundSpeed(), modes);
      for (int m = 1; m <= modes; m++) {
        for (int n = 1; n <= modes; n++) {
          if (plate.modeFrequency(m, n) > limit) {
            continue;
          }
          double square = plate.modeAngularFrequencySquared(m, n);
          double load =
              CABIN.impedance() * in[n - 1][m - 1] + OUTSIDE.impedance() * out[n - 1][m - 1];
          double eta = loss + load * omega / (plate.surfaceMass() * square);
          double resonance =
              ResonanceIntegral.over(
                  2.0 * Math.PI * panel.slices().lower(slice),
                  2.0 * Math.PI * panel.slices().upper(slice),
                  Math.sqrt(square),
                  eta);
          double joint =
              JointAcceptance.of(cross.alongFlow(omega, 150.0), plate.length(), m)
                  * JointAcceptance.of(cross.acrossFlow(omega, 150.0), plate.width(), n);
          sum += joint * in[n - 1][m - 1] * resonance;
        }
      }
    }
    double mass = plate.surfaceMass();
    return sum * CABIN.impedance() * plate.area() * 4.0 / (mass * mass * 2.0 * Math.PI);
  }

  private static double[][] sigma(Plate plate, double wavenumber, int modes) {
    return new MatrixRadiationEfficiency(plate.length(), plate.width())
        .efficiencies(wavenumber, modes, modes);
  }
}
