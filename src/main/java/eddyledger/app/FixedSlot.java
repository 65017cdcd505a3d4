package eddyledger.app;

import eddyledger.model.Held;
import eddyledger.model.InheritedSettings;
import eddyledger.model.Settings;
import eddyledger.model.TreeEdit;
import eddyledger.model.Vehicle;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;

/**
 * A setting of a panel, section or vehicle that is the same in all conditions.
 *
 * @param <T> what the value is
 * @param node id of the panel, section or vehicle
 * @param get reads the setting; null where it is not set
 * @param put the settings with the setting changed; null takes it away
 */
public record FixedSlot<T>(
    String node, Function<Settings, T> get, BiFunction<Settings, T, Settings> put)
    implements Slot<T> {

  @Override
  public Optional<Held<T>> read(Vehicle vehicle) {
    if (vehicle.id().equals(node)) {
      return Optional.ofNullable(get.apply(vehicle.settings()))
          .map(value -> new Held<>(value, node, true, false));
    }
    return TreeEdit.find(vehicle, node)
        .flatMap(path -> InheritedSettings.at(vehicle, path).find(get));
  }

  @Override
  public Vehicle write(Vehicle vehicle, T value) {
    return TreeEdit.settings(vehicle, node, settings -> put.apply(settings, value));
  }

  @Override
  public Vehicle back(Vehicle vehicle) {
    return write(vehicle, null);
  }
}
