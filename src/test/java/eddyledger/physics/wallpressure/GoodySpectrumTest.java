package eddyledger.physics.wallpressure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.physics.Remark;
import eddyledger.physics.flow.BoundaryLayer;
import org.junit.jupiter.api.Test;

class GoodySpectrumTest extends WallPressureSpectrumContract {
  @Override
  WallPressureSpectrum spectrum() {
    return new GoodySpectrum();
  }

  @Override
  BoundaryLayer layerInRange() {
    return layer(0.0, 42.6, 1.2);
  }

  @Test
  void risesWithTheSquareAndFallsWithTheFifthPower() {
    BoundaryLayer layer = layerInRange();
    assertThat(slope(layer, 1e-4)).isCloseTo(2.0, within(1e-2));
    assertThat(slope(layer, 1e7)).isCloseTo(-5.0, within(1e-2));
  }

  private double slope(BoundaryLayer layer, double frequency) {
    double ratio =
        spectrum().spectralDensity(frequency * 1.01, layer)
            / spectrum().spectralDensity(frequency, layer);
    return Math.log(ratio) / Math.log(1.01);
  }

  @Test
  void remarksAircraft() {
    BoundaryLayer layer = layer(10_700.0, 237.0, 25.0);
    assertThat(spectrum().remarks(layer))
        .hasSize(2)
        .allMatch(remark -> remark.kind() == Remark.Kind.OUT_OF_RANGE)
        .anyMatch(remark -> remark.text().contains("Mach number 0.79"))
        .anyMatch(
            remark ->
                remark.text().contains("momentum-thickness Reynolds number")
                    && remark.text().contains("1400 to 23000"));
  }

  @Test
  void remarksThinLayers() {
    assertThat(spectrum().remarks(layer(0.0, 15.0, 0.4))).hasSize(1);
  }
}
