package eddyledger.physics.cabin;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import eddyledger.physics.Remark;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Where a zone stops being diffuse, and what is said about it; what is refused. */
class DiffuseZoneRemarksTest {
  @Test
  void aVeryAbsorbentZoneIsRemarkedUpon() {
    assertThat(Sabine.remark(Sabine.DIFFUSE_LIMIT)).isEmpty();
    Remark remark = Sabine.remark(0.55).orElseThrow();
    assertThat(remark.kind()).isEqualTo(Remark.Kind.OUT_OF_RANGE);
    assertThat(remark.text()).contains("0.55").contains("0.4");
  }

  @Test
  void aBandBelowTheSchroederFrequencyIsRemarkedUpon() {
    assertThat(SchroederFrequency.remark(327.0, 327.0)).isEmpty();
    Remark remark = SchroederFrequency.remark(125.9, 326.6).orElseThrow();
    assertThat(remark.kind()).isEqualTo(Remark.Kind.OUT_OF_RANGE);
    assertThat(remark.text()).contains("126 Hz").contains("327 Hz");
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.0, -1.0, Double.NaN})
  void refusesWhatIsNotPositive(double value) {
    assertThatThrownBy(() -> Sabine.reverberationTime(value, 1.0))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("volume");
    assertThatThrownBy(() -> Sabine.reverberationTime(3.0, value))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("absorption area");
    assertThatThrownBy(() -> Sabine.absorptionArea(3.0, value))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("reverberation time");
    assertThatThrownBy(() -> Sabine.meanAbsorption(1.0, value))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("surface");
    assertThatThrownBy(() -> SchroederFrequency.ofReverberationTime(value, 1.0))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("volume");
  }
}
