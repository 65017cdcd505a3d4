package eddyledger.app;

import eddyledger.model.Vehicle;
import java.util.function.UnaryOperator;

/**
 * A change to the vehicle that can be undone.
 *
 * @param label what it does, as it follows "Undo": {@code thickness of Crown, station B}
 * @param mergeKey edits in a row of the same key count as one, as while typing; empty for none
 * @param subject id of the row it is about, selected again when it is undone; empty for none
 * @param change the change; pure
 */
public record Edit(String label, String mergeKey, String subject, UnaryOperator<Vehicle> change) {

  /** A change that never merges with another. */
  public static Edit of(String label, String subject, UnaryOperator<Vehicle> change) {
    return new Edit(label, "", subject, change);
  }
}
