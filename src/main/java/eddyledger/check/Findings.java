package eddyledger.check;

import eddyledger.model.BandTable;
import eddyledger.model.ByCondition;
import eddyledger.model.Judged;
import eddyledger.model.JudgedBands;
import java.util.ArrayList;
import java.util.List;
import java.util.function.BiConsumer;

/** Gathers findings while the parts of a model are gone through. Used by one thread. */
final class Findings {
  private final List<Finding> all = new ArrayList<>();

  List<Finding> all() {
    return all;
  }

  void add(
      Severity severity, String code, String subject, String place, String what, String remedy) {
    // a part whose id is missing is still named by its place
    all.add(new Finding(severity, code, subject == null ? "" : subject, place, what, remedy));
  }

  /** A number that must be there and lie within its limit. */
  void required(Limit limit, Double value, String subject, String place) {
    if (value == null) {
      add(Severity.ERROR, "missing-value", subject, place, "It is missing.", "Enter it.");
    } else {
      within(limit, value, subject, place);
    }
  }

  /** A number that lies within its limit if it is there. */
  void within(Limit limit, Double value, String subject, String place) {
    if (value != null && !limit.holds(value)) {
      add(
          Severity.ERROR,
          "absurd-value",
          subject,
          place,
          capital(limit.what(value)),
          limit.remedy());
    }
  }

  /** Best, low and high within the limit and in order. */
  void judged(Limit limit, Judged value, String subject, String place) {
    if (value == null) {
      return;
    }
    within(limit, value.best(), subject, place);
    within(limit, value.low(), subject, place + ".low");
    within(limit, value.high(), subject, place + ".high");
    if (value.lowOrBest() > value.best() || value.best() > value.highOrBest()) {
      add(
          Severity.ERROR,
          "low-above-high",
          subject,
          place,
          "Low, best and high are not in this order.",
          "Give low no greater than best, and high no less.");
    }
  }

  /** Every value of a band table within the limit. */
  void bands(Limit limit, JudgedBands value, String subject, String place) {
    if (value == null) {
      return;
    }
    table(limit, value.best(), subject, place);
    table(limit, value.low(), subject, place + ".low");
    table(limit, value.high(), subject, place + ".high");
  }

  private void table(Limit limit, BandTable table, String subject, String place) {
    if (table == null) {
      return;
    }
    if (table.values().isEmpty()) {
      add(
          Severity.ERROR,
          "spectrum-length",
          subject,
          place,
          "There is no value.",
          "Give 28 third-octave values, or octaves, or one number.");
    }
    for (int i = 0; i < table.values().size(); i++) {
      String valuePlace =
          table.resolution() == BandTable.Resolution.SINGLE ? place : place + ".values[" + i + "]";
      within(limit, table.values().get(i), subject, valuePlace);
    }
  }

  /** The base and every override of a value that may change with the condition. */
  <T> void each(ByCondition<T> value, String place, BiConsumer<T, String> check) {
    if (value == null) {
      return;
    }
    if (value.base() != null) {
      check.accept(value.base(), place);
    }
    value.overrides().forEach((id, held) -> check.accept(held, place + ".by_condition." + id));
  }

  private static String capital(String sentence) {
    return Character.toUpperCase(sentence.charAt(0)) + sentence.substring(1);
  }
}
