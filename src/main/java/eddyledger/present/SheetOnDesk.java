package eddyledger.present;

import eddyledger.app.ProjectState;
import eddyledger.app.Selection;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Receiver;
import eddyledger.model.Vehicle;
import java.util.Optional;

/**
 * The sheet the desk looks at.
 *
 * @param sheet its rows; without numbers if there is no result for it
 * @param vehicle the vehicle its rows are of
 * @param counted whether there are numbers
 */
record SheetOnDesk(ReceiverSheet sheet, Vehicle vehicle, boolean counted) {

  /** The sheet of the selection; empty if nothing is open or there is no receiver or condition. */
  static Optional<SheetOnDesk> of(ProjectState state) {
    Selection at = state.selection();
    if (!state.open()) {
      return Optional.empty();
    }
    Optional<ReceiverSheet> sheet = state.sheet();
    if (sheet.isPresent()) {
      Vehicle computed = state.ledger().orElseThrow().vehicle();
      return sheet.map(it -> new SheetOnDesk(it, computed, true));
    }
    Vehicle now = state.vehicle();
    return BlankSheet.of(now, at.conditionId(), at.receiverId())
        .map(it -> new SheetOnDesk(it, now, false));
  }

  /** Whether another holds the very same rows. */
  boolean sameAs(SheetOnDesk other) {
    return other != null && sheet == other.sheet && vehicle == other.vehicle;
  }

  /** Why a number is not there yet. */
  static String why(ProjectState state) {
    return state.unusable() ? "cannot be computed, see findings" : "not computed yet";
  }

  /** Receiver and condition, short where that tells them apart: "Row 2, Cruise". */
  String title() {
    return place(vehicle, sheet.receiver()) + ", " + condition(vehicle, sheet.condition());
  }

  /** A receiver's name, short where that tells it apart. */
  static String place(Vehicle vehicle, Receiver receiver) {
    return ShortName.among(
        receiver.name(), vehicle.receivers().stream().map(Receiver::name).toList());
  }

  /** A condition's name, short where that tells it apart. */
  static String condition(Vehicle vehicle, OperatingCondition condition) {
    return ShortName.among(
        condition.name(), vehicle.conditions().stream().map(OperatingCondition::name).toList());
  }
}
