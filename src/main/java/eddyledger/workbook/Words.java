package eddyledger.workbook;

import eddyledger.model.BandTable;
import eddyledger.model.Evidence;
import eddyledger.model.Judged;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Octaves;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Values and where they come from, in words. */
final class Words {
  private static final int DIGITS = 4;

  private Words() {}

  /** The evidence grade; a dash if none is stated. */
  static String grade(Evidence evidence) {
    return evidence.grade() == null ? Answer.NOT_ASKED : evidence.grade().text();
  }

  /** The kind of value; a dash if none is stated. */
  static String kind(Evidence evidence) {
    return evidence.kind() == null ? Answer.NOT_ASKED : evidence.kind().text();
  }

  /** The source; a dash if none is stated. */
  static String source(Evidence evidence) {
    boolean none = evidence.source() == null || evidence.source().isEmpty();
    return none ? Answer.NOT_ASKED : evidence.source();
  }

  /** A number with four significant digits and its unit. */
  static String number(double value, String unit) {
    String digits =
        new BigDecimal(value)
            .round(new MathContext(DIGITS))
            .stripTrailingZeros()
            .toPlainString()
            .replace('-', '\u2212');
    return unit.isEmpty() ? digits : digits + " " + unit;
  }

  /** A judged number with its low and high. */
  static String judged(Judged judged, String unit) {
    String best = number(judged.best(), unit);
    if (judged.low() == null && judged.high() == null) {
      return best;
    }
    return best
        + " ("
        + number(judged.lowOrBest(), "")
        + " to "
        + number(judged.highOrBest(), "")
        + ")";
  }

  /** A band table as it was entered: band and value, in hertz and the unit. */
  static String table(BandTable table, String unit) {
    if (table.resolution() == BandTable.Resolution.SINGLE) {
      return numberOrMissing(table.values().get(0)) + unit(unit) + " in all bands";
    }
    List<String> labels =
        table.resolution() == BandTable.Resolution.OCTAVE ? Octaves.labels() : Bands.labels();
    int first = Math.max(0, labels.indexOf(table.first()));
    List<String> parts = new ArrayList<>();
    for (int i = 0; i < table.values().size() && first + i < labels.size(); i++) {
      parts.add(labels.get(first + i) + ": " + numberOrMissing(table.values().get(i)));
    }
    String kind = table.resolution().text().replace('-', ' ');
    String values = unit.isEmpty() ? "" : ", values in " + unit;
    return kind + " bands in Hz" + values + ": " + String.join(", ", parts);
  }

  private static String unit(String unit) {
    return unit.isEmpty() ? "" : " " + unit;
  }

  private static String numberOrMissing(Double value) {
    return value == null ? Answer.MISSING : number(value, "");
  }

  /** The 28 values of a table; none where the table is faulty. */
  static BandSpectrum spectrum(BandTable table) {
    try {
      return table.spectrum();
    } catch (IllegalArgumentException faulty) {
      double[] missing = new double[Bands.COUNT];
      Arrays.fill(missing, Double.NaN);
      return BandSpectrum.of(missing);
    }
  }
}
