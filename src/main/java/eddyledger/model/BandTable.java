package eddyledger.model;

import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.OctaveTable;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;

/**
 * One value per band as it was entered: a single number for all bands, 28 one-third octaves, or a
 * row of octaves that is read linear in lg f between the octave centres and flat outside.
 *
 * @param resolution how it was entered
 * @param first nominal label of the first band; null for a single number
 * @param values values from the first band on, null where missing; exactly one for a single number
 * @param quantity what is stated, in words; null if the property says it all
 * @param unit unit as stated; null if the property says it all
 * @param extras unknown properties
 */
public record BandTable(
    Resolution resolution,
    String first,
    List<Double> values,
    String quantity,
    String unit,
    Extras extras) {

  /** How a band table was entered. */
  public enum Resolution {
    /** One number for all bands. */
    SINGLE("single"),
    /** All 28 one-third octaves. */
    THIRD_OCTAVE("third-octave"),
    /** Octaves from a first one on. */
    OCTAVE("octave");

    private final String text;

    Resolution(String text) {
      this.text = text;
    }

    /** The word used in files. */
    public String text() {
      return text;
    }
  }

  public BandTable {
    values = Collections.unmodifiableList(Arrays.asList(values.toArray(Double[]::new)));
  }

  /** One number for all bands. */
  public static BandTable single(double value) {
    return new BandTable(Resolution.SINGLE, null, List.of(value), null, null, Extras.NONE);
  }

  /** All 28 one-third octaves; NaN where a band is missing. */
  public static BandTable thirds(BandSpectrum spectrum) {
    Double[] values = new Double[Bands.COUNT];
    for (int i = 0; i < Bands.COUNT; i++) {
      values[i] = spectrum.has(i) ? spectrum.value(i) : null;
    }
    return new BandTable(
        Resolution.THIRD_OCTAVE, Bands.label(0), Arrays.asList(values), null, null, Extras.NONE);
  }

  /** Octaves from a first one on. */
  public static BandTable octaves(String first, Double... values) {
    return new BandTable(Resolution.OCTAVE, first, Arrays.asList(values), null, null, Extras.NONE);
  }

  /** Whether the 28 values are interpolated from octaves. */
  public boolean interpolated() {
    return resolution == Resolution.OCTAVE;
  }

  /**
   * The values in the 28 bands; NaN where missing.
   *
   * @throws IllegalArgumentException if the table has the wrong number of values or an unknown
   *     first band
   */
  public BandSpectrum spectrum() {
    return switch (resolution) {
      case SINGLE -> BandSpectrum.constant(values.get(0));
      case THIRD_OCTAVE -> BandSpectrum.of(numbers());
      case OCTAVE -> OctaveTable.startingAt(first, numbers()).thirds();
    };
  }

  private double[] numbers() {
    return values.stream().mapToDouble(value -> value == null ? Double.NaN : value).toArray();
  }
}
