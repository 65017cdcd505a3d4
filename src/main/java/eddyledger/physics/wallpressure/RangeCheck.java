package eddyledger.physics.wallpressure;

import eddyledger.physics.Remark;
import eddyledger.physics.Wording;
import java.util.List;

/** Words for a model that is used outside the range of its source. */
final class RangeCheck {
  private RangeCheck() {}

  /** Adds a remark if the value lies outside low to high. */
  static void add(
      List<Remark> remarks, String model, String quantity, double value, double low, double high) {
    if (!(value >= low && value <= high)) {
      String range = "; its range is " + Wording.number(low) + " to " + Wording.number(high);
      String use = model + " is used at " + quantity + " " + Wording.number(value);
      remarks.add(Remark.outOfRange(model + " outside its range of " + quantity, use + range));
    }
  }
}
