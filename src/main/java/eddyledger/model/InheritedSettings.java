package eddyledger.model;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/**
 * The settings that hold at a node of the tree: its own, then those of the sections above it from
 * the nearest to the farthest, then the vehicle's.
 */
public final class InheritedSettings {
  private record Level(String id, Settings settings) {}

  private final List<Level> levels = new ArrayList<>();

  private InheritedSettings(Vehicle vehicle, TreePath path) {
    levels.add(new Level(path.node().id(), path.node().settings()));
    for (int i = path.sections().size() - 1; i >= 0; i--) {
      Section section = path.sections().get(i);
      levels.add(new Level(section.id(), section.settings()));
    }
    levels.add(new Level(vehicle.id(), vehicle.settings()));
  }

  /** The settings that hold at a node. */
  public static InheritedSettings at(Vehicle vehicle, TreePath path) {
    return new InheritedSettings(vehicle, path);
  }

  /** The nearest value of a setting that does not change with the condition. */
  public <T> Optional<Held<T>> find(Function<Settings, T> setting) {
    for (int i = 0; i < levels.size(); i++) {
      T value = setting.apply(levels.get(i).settings());
      if (value != null) {
        return Optional.of(new Held<>(value, levels.get(i).id(), i == 0, false));
      }
    }
    return Optional.empty();
  }

  /** The nearest value of a setting in a condition. */
  public <T> Optional<Held<T>> find(
      Function<Settings, ByCondition<T>> setting, String conditionId) {
    for (int i = 0; i < levels.size(); i++) {
      ByCondition<T> held = setting.apply(levels.get(i).settings());
      T value = held == null ? null : held.in(conditionId);
      if (value != null) {
        boolean override = held.overriddenIn(conditionId);
        return Optional.of(new Held<>(value, levels.get(i).id(), i == 0, override));
      }
    }
    return Optional.empty();
  }
}
