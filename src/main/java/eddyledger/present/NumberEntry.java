package eddyledger.present;

import eddyledger.app.PartSlot;
import eddyledger.app.Slot;
import eddyledger.check.Limit;
import eddyledger.model.Held;
import eddyledger.model.Vehicle;
import eddyledger.present.SheetField.Kind;
import eddyledger.present.SheetField.Weight;
import java.util.Optional;

/**
 * A number that is typed.
 *
 * @param <T> what holds the number
 */
final class NumberEntry<T> extends SlotEntry<T> {
  private final NumberIn<T> number;

  NumberEntry(
      String key, String label, String what, Slot<T> slot, String place, NumberIn<T> number) {
    super(key, label, what, slot, place);
    this.number = number;
  }

  private Unit unit(SheetContext context) {
    return context.unit(key(), number.quantity());
  }

  @Override
  SheetField show(SheetContext context) {
    Unit unit = unit(context);
    Optional<Held<T>> held = slot().read(context.vehicle());
    FieldBuilder field =
        mark(new FieldBuilder(this, Kind.NUMBER), context).unit(unit, number.quantity());
    if (held.isPresent()) {
      T value = held.get().value();
      field.text(number.shown(value, unit)).tip(number.tip(value, unit));
      if (held.get().own()) {
        number.judged(value, unit).ifPresent(words -> doubt(field, words));
      }
      return field.build();
    }
    NumberIn.Fallback fallback = number.fallback(context);
    String words = context.stale() && fallback.computed() ? context.pending() : fallback.origin();
    return field
        .text(NumberText.text(fallback.value(), number.quantity(), unit, fallback.digits()))
        .origin(Double.isNaN(fallback.value()) ? "not given" : words, false)
        .weight(Weight.FAINT)
        .build();
  }

  /** Says of a judged number whether it lies between low and high. */
  static void doubt(FieldBuilder field, NumberIn.Range range) {
    if (range.outside()) {
      field
          .message(SheetMessage.warning("Outside low and high, " + range.words() + ", as judged."))
          .link("Drop low and high");
    } else {
      field.tip("low and high " + range.words());
    }
  }

  @Override
  String words(SheetContext context, Optional<Held<T>> held) {
    Unit unit = unit(context);
    if (held.isPresent()) {
      return withUnit(number.shown(held.get().value(), unit), unit);
    }
    NumberIn.Fallback fallback = number.fallback(context);
    if (fallback.computed()) {
      boolean layer =
          slot() instanceof PartSlot<?, T> part && part.whole().read(context.vehicle()).isPresent();
      return layer ? "worked out" : "";
    }
    return withUnit(NumberText.text(fallback.value(), number.quantity(), unit), unit);
  }

  private static String withUnit(String text, Unit unit) {
    return text.isEmpty() ? "" : (text + " " + unit.symbol()).strip();
  }

  @Override
  Outcome take(SheetContext context, String text) {
    if (text.isBlank() && number.clears()) {
      if (slot() instanceof PartSlot<?, T> part && part.last(context.vehicle())) {
        return new Outcome.Refusal("Give this or another quantity of the boundary layer.");
      }
      return new Outcome.Change(vehicle -> slot().write(vehicle, null));
    }
    NumberText.Read read = NumberText.read(text, number.quantity(), unit(context));
    if (!read.ok()) {
      return new Outcome.Refusal(read.fault());
    }
    Limit limit = number.limit();
    if (!limit.holds(read.value())) {
      return new Outcome.Refusal(Words.sentence(limit.what(read.value())) + " " + limit.remedy());
    }
    if (number.whole() && read.value() != Math.rint(read.value())) {
      return new Outcome.Refusal("Type a whole number.");
    }
    return new Outcome.Change(vehicle -> write(vehicle, read.value()));
  }

  private Vehicle write(Vehicle vehicle, double value) {
    // low, high and evidence of a value from above are not a judgement of this one
    T old = slot().read(vehicle).filter(Held::own).map(Held::value).orElse(null);
    return slot().write(vehicle, number.with(old, value));
  }

  @Override
  Outcome link(SheetContext context) {
    return slot()
        .read(context.vehicle())
        .map(held -> number.unjudged(held.value()))
        .<Outcome>map(bare -> new Outcome.Change(vehicle -> slot().write(vehicle, bare)))
        .orElse(new Outcome.Nothing());
  }
}
