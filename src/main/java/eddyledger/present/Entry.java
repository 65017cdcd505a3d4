package eddyledger.present;

import eddyledger.model.Vehicle;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;

/** One field of the sheet: how it reads the vehicle and how it changes it. */
abstract class Entry {
  private final String key;
  private final String label;
  private final String what;

  /**
   * A field.
   *
   * @param key stable name
   * @param label what stands before it
   * @param what what an edit of it is called, as in "Undo thickness of Crown"
   */
  Entry(String key, String label, String what) {
    this.key = key;
    this.label = label;
    this.what = what;
  }

  final String key() {
    return key;
  }

  final String label() {
    return label;
  }

  final String what() {
    return what;
  }

  /** The field as it stands, without what is being typed. */
  abstract SheetField show(SheetContext context);

  /** Takes a text typed, or the id of what was chosen. */
  Outcome take(SheetContext context, String text) {
    return new Outcome.Refusal("This follows from other fields.");
  }

  /** Gives the own value back. */
  Optional<UnaryOperator<Vehicle>> back(SheetContext context) {
    return Optional.empty();
  }

  /** Makes the value special for the condition, or no longer. */
  Optional<UnaryOperator<Vehicle>> only(SheetContext context) {
    return Optional.empty();
  }

  /** What the small switch below it does. */
  Outcome link(SheetContext context) {
    return new Outcome.Nothing();
  }

  /** Shows it in another unit, or gives it in another way. */
  Outcome unit(SheetContext context, Unit unit) {
    return new Outcome.Nothing();
  }

  /** Whether it can be shown in a unit without being typed anew. */
  boolean fits(SheetContext context, Unit unit) {
    return true;
  }

  /** Places in the project file whose findings stand under it. */
  List<String> places(SheetContext context) {
    return List.of();
  }
}
