package eddyledger.present;

import eddyledger.model.Vehicle;
import java.util.function.UnaryOperator;

/** What comes of something typed or chosen in a field. */
sealed interface Outcome {
  /** The vehicle changes. */
  record Change(UnaryOperator<Vehicle> change) implements Outcome {}

  /** It cannot be taken; the vehicle stays as it is. */
  record Refusal(String words) implements Outcome {}

  /** Only what is shown changes. */
  record Nothing() implements Outcome {}
}
