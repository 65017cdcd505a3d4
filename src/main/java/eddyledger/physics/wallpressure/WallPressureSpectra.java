package eddyledger.physics.wallpressure;

import java.util.List;
import java.util.Optional;

/** The wall-pressure spectra that can be chosen. */
public final class WallPressureSpectra {
  private static final List<WallPressureSpectrum> ALL =
      List.of(new GoodySpectrum(), new EfimtsovSpectrum());

  private WallPressureSpectra() {}

  /** All spectra, in the order in which they are offered. */
  public static List<WallPressureSpectrum> all() {
    return ALL;
  }

  /** The spectrum of an id such as {@code goody}. */
  public static Optional<WallPressureSpectrum> byId(String id) {
    return ALL.stream().filter(spectrum -> spectrum.id().equals(id)).findFirst();
  }
}
