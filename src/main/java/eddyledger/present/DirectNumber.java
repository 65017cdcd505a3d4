package eddyledger.present;

import eddyledger.check.Limit;
import eddyledger.model.Vehicle;
import eddyledger.present.SheetField.Kind;
import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.function.UnaryOperator;

/** A number that stands on the row itself and is not inherited. */
final class DirectNumber extends Entry {
  private final Quantity quantity;
  private final Limit limit;
  private Function<SheetContext, Double> read = context -> null;
  private BiFunction<Vehicle, Double, Vehicle> write = (vehicle, value) -> vehicle;
  private UnaryOperator<Vehicle> clear;
  private Function<SheetContext, String> origin = context -> "set here";
  private String without = "";
  private Function<Vehicle, List<String>> places = vehicle -> List.of();

  DirectNumber(String key, String label, String what, Quantity quantity, Limit limit) {
    super(key, label, what);
    this.quantity = quantity;
    this.limit = limit;
  }

  /** How it is read (null where not given) and written. */
  DirectNumber on(
      Function<SheetContext, Double> reading, BiFunction<Vehicle, Double, Vehicle> writing) {
    read = reading;
    write = writing;
    return this;
  }

  /** How it is taken away, and in words what holds then. */
  DirectNumber clearedBy(UnaryOperator<Vehicle> clearing, String then) {
    clear = clearing;
    without = then;
    return this;
  }

  /** Where a value comes from that is not given here. */
  DirectNumber otherwise(Function<SheetContext, String> words) {
    origin = words;
    return this;
  }

  /** Where its findings are. */
  DirectNumber at(Function<Vehicle, List<String>> where) {
    places = where;
    return this;
  }

  @Override
  SheetField show(SheetContext context) {
    Unit unit = context.unit(key(), quantity);
    FieldBuilder field = new FieldBuilder(this, Kind.NUMBER).unit(unit, quantity);
    Double value = read.apply(context);
    if (value == null) {
      return field.origin(origin.apply(context), false).build();
    }
    return field
        .text(NumberText.text(value, quantity, unit))
        .origin(clear == null ? "" : "set here", true)
        .back(clear == null ? "" : without)
        .build();
  }

  @Override
  Outcome take(SheetContext context, String text) {
    if (text.isBlank() && clear != null) {
      return new Outcome.Change(clear);
    }
    NumberText.Read number = NumberText.read(text, quantity, context.unit(key(), quantity));
    if (!number.ok()) {
      return new Outcome.Refusal(number.fault());
    }
    double value = number.value();
    if (!limit.holds(value)) {
      return new Outcome.Refusal(Words.sentence(limit.what(value)) + " " + limit.remedy());
    }
    if (quantity == Quantity.COUNT && value != Math.rint(value)) {
      return new Outcome.Refusal("Type a whole number.");
    }
    return new Outcome.Change(vehicle -> write.apply(vehicle, value));
  }

  @Override
  Optional<UnaryOperator<Vehicle>> back(SheetContext context) {
    return Optional.ofNullable(clear);
  }

  @Override
  List<String> places(SheetContext context) {
    return places.apply(context.vehicle());
  }
}
