package eddyledger.quantity;

import java.util.List;
import java.util.OptionalDouble;

/**
 * The speech interference level, in its three band sets.
 *
 * <p>Formula: SIL = (1/N) Σ L_octave over the N octaves of the set, the plain mean of levels.
 *
 * <ul>
 *   <li>SIL: speech interference level, dB
 *   <li>L_octave: unweighted octave level, dB re 20 µPa; from thirds as their energy sum
 * </ul>
 *
 * <p>Source: Beranek, Noise and Vibration Control (1971), from memory; the four-band set as in
 * ANSI/ASA S12.2 and, from memory, ANSI/ASA S12.65. Not to be taken for the quantity of the same
 * name in ISO 9921, a speech level minus this mean.
 *
 * <p>Range: needs every octave of its set, and of an octave given in thirds every third. Where one
 * is missing there is no speech interference level; octaves outside the set do not matter.
 *
 * <p>Mean squares in octave bands, as levels; no weighting.
 *
 * <p>Checked by {@code OctaveRowsReferenceTest} and {@code SpeechInterferenceLevelTest}.
 */
public enum SpeechInterferenceLevel {
  /** Octaves 500, 1000 and 2000 Hz, also called preferred speech interference level. */
  THREE_BANDS_500_TO_2000("500", "1000", "2000"),
  /** Octaves 1000, 2000 and 4000 Hz, usual in aviation. */
  THREE_BANDS_1000_TO_4000("1000", "2000", "4000"),
  /** Octaves 500, 1000, 2000 and 4000 Hz. */
  FOUR_BANDS_500_TO_4000("500", "1000", "2000", "4000");

  private final List<String> octaves;

  SpeechInterferenceLevel(String... octaves) {
    this.octaves = List.of(octaves);
  }

  /** Nominal labels of the octaves it averages, in hertz. */
  public List<String> octaves() {
    return octaves;
  }

  /** Value in dB for unweighted third-octave levels in dB; empty if a third it needs is missing. */
  public OptionalDouble ofThirds(BandSpectrum levels) {
    return ofOctaves(Octaves.levels(levels));
  }

  /**
   * Value for unweighted octave levels.
   *
   * @param levels octave levels, dB, shape [9] in order of {@link Octaves#labels()}, NaN where
   *     missing
   * @return dB; empty if an octave it needs is missing
   * @throws IllegalArgumentException if there are not nine values
   */
  public OptionalDouble ofOctaves(double... levels) {
    if (levels.length != Octaves.COUNT) {
      throw new IllegalArgumentException(
          "there are " + Octaves.COUNT + " octaves, not " + levels.length);
    }
    double sum = 0.0;
    for (String octave : octaves) {
      sum += levels[Octaves.position(octave)];
    }
    return Double.isNaN(sum) ? OptionalDouble.empty() : OptionalDouble.of(sum / octaves.size());
  }
}
