package eddyledger.physics.wallpressure;

import eddyledger.physics.Remark;
import java.util.List;
import java.util.Locale;

/** Words for a model that is used outside the range of its source. */
final class RangeCheck {
  private RangeCheck() {}

  /** Adds a remark if the value lies outside low to high. */
  static void add(
      List<Remark> remarks, String model, String quantity, double value, double low, double high) {
    if (!(value >= low && value <= high)) {
      remarks.add(
          Remark.outOfRange(
              String.format(
                  Locale.ROOT,
                  "%s is used at %s %.4g; its range is %.4g to %.4g",
                  model,
                  quantity,
                  value,
                  low,
                  high)));
    }
  }
}
