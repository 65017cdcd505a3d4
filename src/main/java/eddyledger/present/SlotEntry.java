package eddyledger.present;

import eddyledger.app.PartSlot;
import eddyledger.app.Slot;
import eddyledger.app.VaryingSlot;
import eddyledger.model.Held;
import eddyledger.model.Vehicle;
import eddyledger.present.SheetField.Only;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;

/**
 * A field over a slot: it knows where the value comes from and what would hold without it.
 *
 * @param <T> what the slot holds
 */
abstract class SlotEntry<T> extends Entry {
  private final Slot<T> slot;
  private final String place;

  /**
   * A field.
   *
   * @param slot where the value is held
   * @param place the value's property below the place of its holder in the project file
   */
  SlotEntry(String key, String label, String what, Slot<T> slot, String place) {
    super(key, label, what);
    this.slot = slot;
    this.place = place;
  }

  final Slot<T> slot() {
    return slot;
  }

  /** The value as words, as a way back would name it; empty if there is nothing to go back to. */
  abstract String words(SheetContext context, Optional<Held<T>> held);

  /** Origin, way back and switch for one condition. */
  final FieldBuilder mark(FieldBuilder field, SheetContext context) {
    Optional<Held<T>> held = slot.read(context.vehicle());
    boolean own = held.map(Held::own).orElse(false);
    field.origin(held.map(it -> origin(context, it)).orElse("not given"), own);
    field.only(only(context, held));
    if (own) {
      Vehicle without = slot.back(context.vehicle());
      String words = words(context.in(without), slot.read(without));
      boolean changes = !without.equals(context.vehicle());
      field.back(words.isEmpty() || !changes ? "" : "back to " + words);
    }
    return field;
  }

  private static String origin(SheetContext context, Held<?> held) {
    String only = "for " + context.conditionName() + " only";
    if (held.own()) {
      return held.override() ? only : "set here";
    }
    String holder = context.name(held.holder());
    return held.override() ? holder + ", " + only : holder;
  }

  private Optional<VaryingSlot<?>> varying() {
    if (slot instanceof VaryingSlot<T> whole) {
      return Optional.of(whole);
    }
    return slot instanceof PartSlot<?, T> part ? Optional.of(part.whole()) : Optional.empty();
  }

  private Only only(SheetContext context, Optional<Held<T>> held) {
    if (varying().isEmpty() || held.isEmpty() || context.vehicle().conditions().size() < 2) {
      return Only.NEVER;
    }
    boolean on = held.get().own() && held.get().override();
    return new Only("Only in " + context.conditionName(), on);
  }

  @Override
  Optional<UnaryOperator<Vehicle>> back(SheetContext context) {
    return Optional.of(slot::back);
  }

  @Override
  Optional<UnaryOperator<Vehicle>> only(SheetContext context) {
    boolean on = slot.read(context.vehicle()).map(it -> it.own() && it.override()).orElse(false);
    return varying().map(whole -> on ? whole::back : whole::onlyHere);
  }

  @Override
  List<String> places(SheetContext context) {
    String own = FindingPlaces.ofRow(context.vehicle(), context.row());
    String holder =
        slot.read(context.vehicle())
            .map(held -> FindingPlaces.ofRow(context.vehicle(), held.holder()))
            .orElse(own);
    return List.of(own + "." + place, holder + "." + place);
  }
}
