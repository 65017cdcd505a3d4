package eddyledger.file;

import eddyledger.model.BandTable;
import eddyledger.model.BandTable.Resolution;
import eddyledger.model.ByCondition;
import eddyledger.model.Evidence;
import eddyledger.model.JudgedBands;
import eddyledger.quantity.Bands;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** Band values in every form that the file knows. */
final class RichValues {
  private RichValues() {}

  /** A plain number. */
  static ByCondition<JudgedBands> plain(double value) {
    return ByCondition.always(JudgedBands.of(BandTable.single(value)));
  }

  /** One number with everything that can stand beside it. */
  static JudgedBands single() {
    BandTable best =
        new BandTable(
            Resolution.SINGLE,
            null,
            List.of(0.5),
            "some quantity",
            "some unit",
            RichVehicle.extras("single"));
    return new JudgedBands(
        best, BandTable.single(0.25), BandTable.single(0.75), RichVehicle.evidence("单"));
  }

  /** Twenty-eight thirds, one of them missing, with low as thirds and high as octaves. */
  static JudgedBands thirds(double from) {
    return new JudgedBands(
        table(from, "thirds"),
        table(from * 0.5, "low thirds"),
        BandTable.octaves("63", from, null, from + 0.125),
        RichVehicle.evidence("report 12"));
  }

  private static BandTable table(double from, String note) {
    List<Double> values = new ArrayList<>(Collections.nCopies(Bands.COUNT, from));
    for (int i = 0; i < Bands.COUNT; i++) {
      values.set(i, from + i / 3.0);
    }
    values.set(7, null);
    return new BandTable(
        Resolution.THIRD_OCTAVE, "25", values, "level", "dB", RichVehicle.extras(note));
  }

  /** A row of octaves with a gap. */
  static JudgedBands octaves() {
    return new JudgedBands(
        BandTable.octaves("31.5", 0.01, 0.02, null, 0.04, 0.05, 0.06, 0.07, 0.08, 0.09),
        null,
        BandTable.single(0.1),
        Evidence.NONE);
  }
}
