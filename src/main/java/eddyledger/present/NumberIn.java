package eddyledger.present;

import eddyledger.check.Limit;
import java.util.Optional;

/**
 * How a number sits in what holds it.
 *
 * @param <T> what holds it
 */
interface NumberIn<T> {
  /**
   * What is computed with where nothing is given.
   *
   * @param value the value; NaN if there is none
   * @param origin where it comes from
   * @param computed whether it comes out of the computation
   */
  record Fallback(double value, String origin, boolean computed) {
    /** Nothing is. */
    static final Fallback NONE = new Fallback(Double.NaN, "", false);

    /** Significant digits worth showing. */
    int digits() {
      return computed ? 4 : 6;
    }
  }

  /**
   * Low and high of a judged number.
   *
   * @param words both, with their unit
   * @param outside whether the best estimate lies outside them
   */
  record Range(String words, boolean outside) {}

  /** Its quantity. */
  Quantity quantity();

  /** Between which values it is believable. */
  Limit limit();

  /** Its text in a unit. */
  String shown(T holder, Unit unit);

  /** The holder with another number; null stands for no holder yet. */
  T with(T holder, double number);

  /** Low and high, if either was judged. */
  default Optional<Range> judged(T holder, Unit unit) {
    return Optional.empty();
  }

  /** The holder without low and high. */
  default T unjudged(T holder) {
    return holder;
  }

  /** More about it. */
  default String tip(T holder, Unit unit) {
    return "";
  }

  /** What is computed with where nothing is given. */
  default Fallback fallback(SheetContext context) {
    return Fallback.NONE;
  }

  /** Whether an empty field means: not given. */
  default boolean clears() {
    return false;
  }

  /** Whether only whole numbers are meant. */
  default boolean whole() {
    return quantity() == Quantity.COUNT;
  }
}
