package eddyledger.present;

import eddyledger.model.Vehicle;
import eddyledger.present.SheetField.Kind;
import eddyledger.present.SheetField.Option;
import java.util.List;
import java.util.function.BiFunction;
import java.util.function.Function;

/** One of several, chosen on the row itself and not inherited. */
final class DirectChoice extends Entry {
  private final List<Option> options;
  private final Function<Vehicle, String> read;
  private final BiFunction<Vehicle, String, Vehicle> write;

  DirectChoice(
      String key,
      String label,
      String what,
      List<Option> options,
      Function<Vehicle, String> read,
      BiFunction<Vehicle, String, Vehicle> write) {
    super(key, label, what);
    this.options = options;
    this.read = read;
    this.write = write;
  }

  @Override
  SheetField show(SheetContext context) {
    return new FieldBuilder(this, Kind.CHOICE)
        .choice(read.apply(context.vehicle()), options)
        .origin("", true)
        .build();
  }

  @Override
  Outcome take(SheetContext context, String id) {
    boolean known = options.stream().anyMatch(it -> it.id().equals(id));
    return known ? new Outcome.Change(vehicle -> write.apply(vehicle, id)) : new Outcome.Nothing();
  }
}
