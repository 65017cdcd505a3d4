package eddyledger.present;

import eddyledger.model.Vehicle;
import java.util.Optional;

/** The time that a field has the focus: what it held before, what was typed, what was refused. */
final class SheetStay {
  private String key = "";
  private Vehicle before;
  private String typed;
  private String refusal = "";
  private int count;
  private boolean editing;

  /** The field is entered. */
  void begin(String field, Vehicle vehicle) {
    forget();
    key = field;
    before = vehicle;
  }

  /** The field is entered if it was not. */
  void ensure(String field, Vehicle vehicle) {
    if (!in(field)) {
      begin(field, vehicle);
    }
  }

  /** Whether it is a field's stay. */
  boolean in(String field) {
    return !key.isEmpty() && key.equals(field);
  }

  /** Nothing has the focus, or nothing was done there yet. */
  void forget() {
    key = "";
    before = null;
    typed = null;
    refusal = "";
    count++;
  }

  /** Notes what was typed and why it cannot be taken. */
  void note(String text, String refused) {
    typed = text;
    refusal = refused;
  }

  /** The vehicle when the field was entered. */
  Vehicle before() {
    return before;
  }

  /** What stands typed in a field, whether it could be taken or not. */
  Optional<String> typed(String field) {
    return in(field) ? Optional.ofNullable(typed) : Optional.empty();
  }

  /** Why what stands in a field cannot be taken. */
  Optional<String> refusal(String field) {
    return in(field) && !refusal.isEmpty() ? Optional.of(refusal) : Optional.empty();
  }

  /** The key that all edits of this stay share. */
  String mergeKey(String row) {
    return "sheet:" + row + ":" + key + ":" + count;
  }

  /** Whether the stay's own edit is being applied. */
  boolean editing() {
    return editing;
  }

  /** Applies an edit of the stay itself. */
  void during(Runnable edit) {
    editing = true;
    try {
      edit.run();
    } finally {
      editing = false;
    }
  }
}
