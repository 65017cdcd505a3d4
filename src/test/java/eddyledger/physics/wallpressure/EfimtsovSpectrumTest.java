package eddyledger.physics.wallpressure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.physics.Remark;
import eddyledger.physics.flow.BoundaryLayer;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class EfimtsovSpectrumTest extends WallPressureSpectrumContract {
  @Override
  WallPressureSpectrum spectrum() {
    return new EfimtsovSpectrum();
  }

  @Override
  BoundaryLayer layerInRange() {
    return layer(10_700.0, 237.0, 15.0);
  }

  @Test
  void isFlatAtLowAndFallsWithTenThirdsAtHighFrequency() {
    BoundaryLayer layer = layerInRange();
    assertThat(slope(layer, 1e-3)).isCloseTo(0.0, within(1e-3));
    assertThat(slope(layer, 1e8)).isCloseTo(-10.0 / 3.0, within(1e-2));
  }

  private double slope(BoundaryLayer layer, double frequency) {
    double ratio =
        spectrum().spectralDensity(frequency * 1.01, layer)
            / spectrum().spectralDensity(frequency, layer);
    return Math.log(ratio) / Math.log(1.01);
  }

  @Test
  void remarksRoadVehicles() {
    assertThat(spectrum().remarks(layer(0.0, 42.6, 1.2)))
        .hasSize(2)
        .allMatch(remark -> remark.kind() == Remark.Kind.OUT_OF_RANGE)
        .anyMatch(remark -> remark.text().contains("Mach number 0.12"))
        .anyMatch(remark -> remark.text().contains("running-length Reynolds number"));
  }

  @Test
  void saysNothingOfARunningLengthThatIsNotKnown() {
    BoundaryLayer known = layer(0.0, 42.6, 1.2);
    BoundaryLayer unknown =
        new BoundaryLayer(
            known.edge(),
            known.thickness(),
            known.displacementThickness(),
            known.momentumThickness(),
            known.compressibleDisplacementThickness(),
            known.wallShearStress(),
            known.wallDensity(),
            known.wallKinematicViscosity(),
            OptionalDouble.empty(),
            known.remarks());
    assertThat(spectrum().remarks(unknown))
        .singleElement()
        .satisfies(remark -> assertThat(remark.text()).contains("Mach number"));
  }
}
