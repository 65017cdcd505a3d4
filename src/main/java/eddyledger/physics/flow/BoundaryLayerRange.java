package eddyledger.physics.flow;

import static eddyledger.physics.Wording.number;

import eddyledger.physics.Remark;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Ranges in which an attached turbulent layer without strong pressure gradient lies. */
final class BoundaryLayerRange {
  private BoundaryLayerRange() {}

  /** A remark for each quantity outside its range. Units as in {@link BoundaryLayer}. */
  static List<Remark> remarks(
      EdgeFlow edge,
      double delta,
      double displacement,
      double momentum,
      double stress,
      OptionalDouble length,
      double unitReynolds) {
    List<Remark> remarks = new ArrayList<>();
    double shape = displacement / momentum;
    check(remarks, "shape factor", shape, 1.15, 2.4, shape > 2.4 ? ": separation is likely" : "");
    check(remarks, "thickness over displacement thickness", delta / displacement, 3.0, 12.0, "");
    check(remarks, "skin friction", stress / edge.dynamicPressure(), 5e-4, 6e-3, "");
    if (length.isPresent()) {
      double reynolds = unitReynolds * length.getAsDouble();
      check(remarks, "Reynolds number of the running length", reynolds, 5e5, 1e9, "");
    }
    return remarks;
  }

  private static void check(
      List<Remark> remarks, String quantity, double value, double low, double high, String more) {
    if (value < low || value > high) {
      String range = " is outside " + number(low) + " to " + number(high);
      remarks.add(
          Remark.outOfRange(
              quantity + " out of range", quantity + " " + number(value) + range + more));
    }
  }
}
