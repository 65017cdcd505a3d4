package eddyledger.ledger;

import eddyledger.model.Node;
import eddyledger.model.Panel;
import eddyledger.model.Section;
import eddyledger.model.SettingsBuilder;
import eddyledger.model.Vehicle;
import eddyledger.model.VehicleBuilder;
import eddyledger.model.Zone;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.function.UnaryOperator;

/** Changes of a vehicle by one part, for tests that compare before and after. */
final class Edits {
  private Edits() {}

  static Vehicle with(Vehicle vehicle, Consumer<VehicleBuilder> change) {
    VehicleBuilder builder = vehicle.edit();
    change.accept(builder);
    return builder.build();
  }

  /** Every panel replaced by what the function makes of it. */
  static Vehicle panels(Vehicle vehicle, Function<Panel, List<Panel>> change) {
    return with(vehicle, it -> it.tree(each(vehicle.tree(), change)));
  }

  private static List<Node> each(List<Node> nodes, Function<Panel, List<Panel>> change) {
    List<Node> changed = new ArrayList<>();
    for (Node node : nodes) {
      if (node instanceof Section section) {
        changed.add(section.withChildren(each(section.children(), change)));
      } else {
        changed.addAll(change.apply((Panel) node));
      }
    }
    return changed;
  }

  /** One panel replaced. */
  static Vehicle panel(Vehicle vehicle, String id, UnaryOperator<Panel> change) {
    return panels(vehicle, panel -> List.of(panel.id().equals(id) ? change.apply(panel) : panel));
  }

  /** The settings of one panel changed. */
  static Vehicle settings(Vehicle vehicle, String id, Consumer<SettingsBuilder> change) {
    return panel(vehicle, id, panel -> settings(panel, change));
  }

  static Panel settings(Panel panel, Consumer<SettingsBuilder> change) {
    SettingsBuilder builder = panel.settings().edit();
    change.accept(builder);
    return panel.withSettings(builder.build());
  }

  /** One zone replaced. */
  static Vehicle zone(Vehicle vehicle, String id, UnaryOperator<Zone> change) {
    List<Zone> zones =
        vehicle.zones().stream()
            .map(zone -> zone.id().equals(id) ? change.apply(zone) : zone)
            .toList();
    return with(vehicle, it -> it.zones(zones));
  }

  /** The children of every section, and the top of the tree, in reverse order. */
  static Vehicle reversed(Vehicle vehicle) {
    return with(vehicle, it -> it.tree(reversed(vehicle.tree())));
  }

  private static List<Node> reversed(List<Node> nodes) {
    List<Node> reversed = new ArrayList<>();
    for (Node node : nodes) {
      reversed.add(
          0,
          node instanceof Section section
              ? section.withChildren(reversed(section.children()))
              : node);
    }
    return reversed;
  }
}
