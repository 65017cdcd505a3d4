package eddyledger.present;

import eddyledger.model.ByCondition;
import eddyledger.model.Held;
import eddyledger.model.InheritedSettings;
import eddyledger.model.Section;
import eddyledger.model.Settings;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;

/** Tells in names, not ids, where a panel's settings are from. */
final class Where {
  private final InheritedSettings settings;
  private final String condition;
  private final Map<String, String> names = new HashMap<>();

  Where(Vehicle vehicle, TreePath path, String condition) {
    this.condition = condition;
    settings = InheritedSettings.at(vehicle, path);
    for (Section section : path.sections()) {
      names.put(section.id(), section.name());
    }
    names.put(vehicle.id(), "the vehicle");
  }

  /** The value of a setting that does not change with the condition. */
  <T> Optional<T> fixed(Function<Settings, T> setting) {
    return settings.find(setting).map(Held::value);
  }

  /** The value of a setting in the condition. */
  <T> Optional<T> varying(Function<Settings, ByCondition<T>> setting) {
    return settings.find(setting, condition).map(Held::value);
  }

  /** Where a setting that does not change with the condition is from. */
  <T> String ofFixed(Function<Settings, T> setting) {
    return words(settings.find(setting));
  }

  /** Where a setting is from in the condition. */
  <T> String ofVarying(Function<Settings, ByCondition<T>> setting) {
    return words(settings.find(setting, condition));
  }

  private <T> String words(Optional<Held<T>> held) {
    if (held.isEmpty()) {
      return "by default";
    }
    Held<T> value = held.get();
    String place =
        value.own() ? "set here" : "from " + names.getOrDefault(value.holder(), value.holder());
    return value.override() ? place + " for this condition" : place;
  }
}
