package eddyledger.model;

import java.util.List;

/**
 * The level that receivers must not pass in an operating condition.
 *
 * @param id identity
 * @param name name shown
 * @param condition id of the operating condition
 * @param receivers ids of the receivers, at least one
 * @param rating what is judged
 * @param value the level that must not be passed, in the rating's unit
 * @param reserve the part kept back, dB, 0 or more
 * @param rule how the level is judged
 * @param evidence where the target comes from
 * @param extras unknown properties
 */
public record Target(
    String id,
    String name,
    String condition,
    List<String> receivers,
    Rating rating,
    double value,
    double reserve,
    PassRule rule,
    Evidence evidence,
    Extras extras) {
  public Target {
    receivers = List.copyOf(receivers);
  }

  /** The target less its reserve. */
  public double allowed() {
    return value - reserve;
  }
}
