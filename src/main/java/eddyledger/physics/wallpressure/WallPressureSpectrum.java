package eddyledger.physics.wallpressure;

import eddyledger.physics.Remark;
import eddyledger.physics.flow.BoundaryLayer;
import java.util.List;

/**
 * How strong the wall pressure is at a point under a turbulent boundary layer: one class for each
 * published model.
 */
public interface WallPressureSpectrum {
  /** Stable name for files and commands, lower case with hyphens. */
  String id();

  /** Name for people, as in the literature. */
  String name();

  /** Author, journal, volume, year. */
  String source();

  /** How far formula and constants were verified, in words. */
  String confidence();

  /**
   * Spectral density of the wall pressure: one-sided, per hertz, mean square, Pa²/Hz.
   *
   * @param frequencyHz frequency, Hz, above 0
   * @param layer the boundary layer
   */
  double spectralDensity(double frequencyHz, BoundaryLayer layer);

  /** Where the layer lies outside the model's range: which quantity, its value, the range. */
  List<Remark> remarks(BoundaryLayer layer);
}
