package eddyledger.ledger;

import eddyledger.physics.wallpressure.WallPressureSpectra;
import java.util.List;

/** The models that can be chosen, and what is computed with where nothing is chosen. */
public final class ModelDefaults {
  /**
   * A wall-pressure spectrum that can be chosen.
   *
   * @param id id in files, for instance {@code goody}
   * @param name name as in the literature
   * @param source publication
   */
  public record Spectrum(String id, String name, String source) {}

  private ModelDefaults() {}

  /** The wall-pressure spectra that can be chosen, in the order they are offered. */
  public static List<Spectrum> spectra() {
    return WallPressureSpectra.all().stream()
        .map(spectrum -> new Spectrum(spectrum.id(), spectrum.name(), spectrum.source()))
        .toList();
  }

  /** Id of the wall-pressure spectrum where none is chosen. */
  public static String spectrum() {
    return FlowLookup.SPECTRUM;
  }

  /** Convection speed over local flow speed where none is set. */
  public static double convectionRatio() {
    return PanelResolver.CONVECTION_RATIO;
  }
}
