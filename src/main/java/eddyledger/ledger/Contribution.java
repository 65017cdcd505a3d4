package eddyledger.ledger;

import eddyledger.quantity.Bands;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A share of the mean-square pressure at a receiver, or the reason why there is none.
 *
 * @param meanSquares Pa² per band, shape [28], NaN where missing; not to be changed
 * @param status whether it is whole
 * @param reason why it is not; empty if it is
 */
record Contribution(double[] meanSquares, Status status, String reason) {
  private static final int REASONS_SHOWN = 3;

  /** A part of a sum with the id that stands for it in reasons. */
  record Part(String id, Contribution contribution) {}

  /** A value; partial if bands are missing. */
  static Contribution of(double[] meanSquares, String reasonIfBandsMissing) {
    List<String> missing = new ArrayList<>();
    for (int band = 0; band < Bands.COUNT; band++) {
      if (Double.isNaN(meanSquares[band])) {
        missing.add(Bands.label(band));
      }
    }
    if (missing.isEmpty()) {
      return new Contribution(meanSquares, Status.OK, "");
    }
    boolean none = missing.size() == Bands.COUNT;
    String reason =
        none
            ? "no band has a value: " + reasonIfBandsMissing
            : "no value at " + String.join(", ", missing) + " Hz: " + reasonIfBandsMissing;
    return new Contribution(meanSquares, none ? Status.MISSING : Status.PARTIAL, reason);
  }

  /** No value at all. */
  static Contribution none(Status status, String reason) {
    double[] missing = new double[Bands.COUNT];
    Arrays.fill(missing, Double.NaN);
    return new Contribution(missing, status, reason);
  }

  /**
   * The energy sum of parts. A missing part is never taken for zero: the sum says that it is
   * partial and names what is missing. Without parts the sum is zero.
   */
  static Contribution sum(List<Part> parts) {
    double[] sum = new double[Bands.COUNT];
    List<String> reasons = new ArrayList<>();
    boolean anything = parts.isEmpty();
    for (int band = 0; band < Bands.COUNT; band++) {
      int present = 0;
      for (Part part : parts) {
        double value = part.contribution().meanSquares()[band];
        if (!Double.isNaN(value)) {
          sum[band] += value;
          present++;
        }
      }
      if (present == 0 && !parts.isEmpty()) {
        sum[band] = Double.NaN;
      }
      anything |= present > 0;
    }
    for (Part part : parts) {
      if (part.contribution().status() != Status.OK) {
        reasons.add(part.id() + ": " + part.contribution().reason());
      }
    }
    if (reasons.isEmpty()) {
      return new Contribution(sum, Status.OK, "");
    }
    boolean failed = parts.stream().anyMatch(part -> part.contribution().status() == Status.FAILED);
    Status nothing = failed ? Status.FAILED : Status.MISSING;
    return new Contribution(sum, anything ? Status.PARTIAL : nothing, shorten(reasons));
  }

  private static String shorten(List<String> reasons) {
    int shown = Math.min(REASONS_SHOWN, reasons.size());
    String text = String.join("; ", reasons.subList(0, shown));
    int more = reasons.size() - shown;
    return more == 0 ? text : text + "; and " + more + " more";
  }
}
