package eddyledger.physics.wallpressure;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class WallPressureSpectraTest {
  @Test
  void idsAreUniqueAndFindTheirModel() {
    assertThat(WallPressureSpectra.all())
        .extracting(WallPressureSpectrum::id)
        .contains("goody", "efimtsov")
        .doesNotHaveDuplicates();
    assertThat(WallPressureSpectra.all())
        .allSatisfy(model -> assertThat(WallPressureSpectra.byId(model.id())).contains(model));
  }

  @Test
  void anUnknownIdFindsNothing() {
    assertThat(WallPressureSpectra.byId("no-such-model")).isEmpty();
  }
}
