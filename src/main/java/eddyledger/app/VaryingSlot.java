package eddyledger.app;

import eddyledger.model.ByCondition;
import eddyledger.model.Held;
import eddyledger.model.InheritedSettings;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Settings;
import eddyledger.model.TreeEdit;
import eddyledger.model.Vehicle;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;

/**
 * A setting of a panel, section or vehicle in one condition.
 *
 * <p>Setting it changes what is seen and nothing else: where an override for the condition holds,
 * the override is changed (or the node gets one); where the value of all conditions holds, that one
 * is, and overrides that came from above are kept for their conditions.
 *
 * @param <T> what the value is
 * @param node id of the panel, section or vehicle
 * @param condition id of the condition
 * @param get reads the setting; null where it is not set
 * @param put the settings with the setting changed; null takes it away
 */
public record VaryingSlot<T>(
    String node,
    String condition,
    Function<Settings, ByCondition<T>> get,
    BiFunction<Settings, ByCondition<T>, Settings> put)
    implements Slot<T> {

  @Override
  public Optional<Held<T>> read(Vehicle vehicle) {
    return read(vehicle, condition);
  }

  private Optional<Held<T>> read(Vehicle vehicle, String inCondition) {
    if (vehicle.id().equals(node)) {
      ByCondition<T> own = get.apply(vehicle.settings());
      T value = own == null ? null : own.in(inCondition);
      return Optional.ofNullable(value)
          .map(it -> new Held<>(it, node, true, own.overriddenIn(inCondition)));
    }
    return TreeEdit.find(vehicle, node)
        .flatMap(path -> InheritedSettings.at(vehicle, path).find(get, inCondition));
  }

  private ByCondition<T> own(Vehicle vehicle) {
    Settings settings =
        vehicle.id().equals(node)
            ? vehicle.settings()
            : TreeEdit.find(vehicle, node).orElseThrow().node().settings();
    ByCondition<T> own = get.apply(settings);
    return own == null ? new ByCondition<>(null, Map.of()) : own;
  }

  private Vehicle put(Vehicle vehicle, T base, Map<String, T> overrides) {
    boolean nothing = base == null && overrides.isEmpty();
    ByCondition<T> own = nothing ? null : new ByCondition<>(base, overrides);
    return TreeEdit.settings(vehicle, node, settings -> put.apply(settings, own));
  }

  @Override
  public Vehicle write(Vehicle vehicle, T value) {
    if (read(vehicle).map(Held::override).orElse(false)) {
      return writeOnlyHere(vehicle, value);
    }
    Map<String, T> overrides = new LinkedHashMap<>(own(vehicle).overrides());
    for (OperatingCondition other : vehicle.conditions()) {
      read(vehicle, other.id())
          .filter(held -> held.override() && !held.own())
          .ifPresent(held -> overrides.put(other.id(), held.value()));
    }
    return put(vehicle, value, overrides);
  }

  /** The vehicle with the value set for this condition only. */
  public Vehicle writeOnlyHere(Vehicle vehicle, T value) {
    ByCondition<T> own = own(vehicle);
    Map<String, T> overrides = new LinkedHashMap<>(own.overrides());
    overrides.put(condition, value);
    return put(vehicle, own.base(), overrides);
  }

  /** The vehicle with the value that holds made special for this condition. */
  public Vehicle onlyHere(Vehicle vehicle) {
    return read(vehicle).map(held -> writeOnlyHere(vehicle, held.value())).orElse(vehicle);
  }

  @Override
  public Vehicle back(Vehicle vehicle) {
    ByCondition<T> own = own(vehicle);
    Map<String, T> overrides = new LinkedHashMap<>(own.overrides());
    if (overrides.remove(condition) != null) {
      return tidied(vehicle, own.base(), overrides);
    }
    return tidied(vehicle, null, overrides);
  }

  /** Without overrides that say what would hold without them. */
  private Vehicle tidied(Vehicle vehicle, T base, Map<String, T> overrides) {
    if (base != null) {
      return put(vehicle, base, overrides);
    }
    Vehicle bare = put(vehicle, null, Map.of());
    overrides
        .entrySet()
        .removeIf(
            entry ->
                read(bare, entry.getKey())
                    .map(held -> held.value().equals(entry.getValue()))
                    .orElse(false));
    return put(vehicle, null, overrides);
  }
}
