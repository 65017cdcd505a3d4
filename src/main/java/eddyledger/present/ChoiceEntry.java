package eddyledger.present;

import eddyledger.app.Slot;
import eddyledger.model.Held;
import eddyledger.model.Vehicle;
import eddyledger.present.SheetField.Kind;
import eddyledger.present.SheetField.Option;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.function.UnaryOperator;

/**
 * One of several that is chosen.
 *
 * @param <T> what holds the choice
 */
final class ChoiceEntry<T> extends SlotEntry<T> {
  /**
   * How a choice sits in what holds it.
   *
   * @param <T> what holds it
   * @param id id of what is chosen
   * @param with the holder with another choice; null stands for no holder yet
   * @param options what can be chosen
   * @param otherwise id of what holds where nothing is chosen; empty if nothing
   */
  record ChoiceIn<T>(
      Function<T, String> id,
      BiFunction<T, String, T> with,
      Function<Vehicle, List<Option>> options,
      String otherwise) {}

  private final ChoiceIn<T> choice;

  ChoiceEntry(
      String key, String label, String what, Slot<T> slot, String place, ChoiceIn<T> choice) {
    super(key, label, what, slot, place);
    this.choice = choice;
  }

  @Override
  SheetField show(SheetContext context) {
    Optional<Held<T>> held = slot().read(context.vehicle());
    String id = held.map(it -> choice.id().apply(it.value())).orElse(choice.otherwise());
    FieldBuilder field = mark(new FieldBuilder(this, Kind.CHOICE), context);
    if (held.isEmpty() && !choice.otherwise().isEmpty()) {
      field.origin("default", false);
    }
    return field.choice(id, offered(context.vehicle(), id)).build();
  }

  /** What is offered, and what is chosen even if it is not. */
  private List<Option> offered(Vehicle vehicle, String id) {
    List<Option> options = new ArrayList<>(choice.options().apply(vehicle));
    if (options.stream().noneMatch(it -> it.id().equals(id))) {
      options.add(0, new Option(id, id.isEmpty() ? "not given" : id));
    }
    return options;
  }

  @Override
  String words(SheetContext context, Optional<Held<T>> held) {
    String id = held.map(it -> choice.id().apply(it.value())).orElse(choice.otherwise());
    if (id.isEmpty()) {
      return "";
    }
    return offered(context.vehicle(), id).stream()
        .filter(it -> it.id().equals(id))
        .map(Option::name)
        .findFirst()
        .orElse(id);
  }

  @Override
  Outcome take(SheetContext context, String id) {
    boolean known = offered(context.vehicle(), id).stream().anyMatch(it -> it.id().equals(id));
    String now = slot().read(context.vehicle()).map(it -> choice.id().apply(it.value())).orElse("");
    if (id.isEmpty() || !known || id.equals(now)) {
      return new Outcome.Nothing();
    }
    UnaryOperator<Vehicle> change =
        vehicle -> {
          T old = slot().read(vehicle).map(Held::value).orElse(null);
          return slot().write(vehicle, choice.with().apply(old, id));
        };
    return new Outcome.Change(change);
  }
}
