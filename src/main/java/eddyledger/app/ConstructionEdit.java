package eddyledger.app;

import eddyledger.model.Construction;
import eddyledger.model.Held;
import eddyledger.model.InheritedSettings;
import eddyledger.model.Panel;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Settings;
import eddyledger.model.TreeEdit;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;

/**
 * Changes to the plate of one panel. Constructions are shared by panels; changing one panel's never
 * changes the others' unless that is asked for: the panel gets a copy of its own, named after it.
 */
public final class ConstructionEdit {
  private ConstructionEdit() {}

  private static FixedSlot<String> slot(String panel) {
    return new FixedSlot<>(
        panel, Settings::construction, (settings, id) -> settings.edit().construction(id).build());
  }

  /** The plate that holds on a panel; empty if none does or it is of another kind. */
  public static Optional<PlateConstruction> of(Vehicle vehicle, String panel) {
    return slot(panel).read(vehicle).flatMap(held -> byId(vehicle, held.value()));
  }

  private static Optional<PlateConstruction> byId(Vehicle vehicle, String id) {
    return vehicle.constructions().stream()
        .filter(it -> id.equals(it.id()))
        .filter(PlateConstruction.class::isInstance)
        .map(PlateConstruction.class::cast)
        .findFirst();
  }

  /** Ids of the panels that a construction holds on. */
  public static List<String> panelsOf(Vehicle vehicle, String construction) {
    return TreePath.of(vehicle).stream()
        .filter(path -> path.node() instanceof Panel)
        .filter(path -> holds(vehicle, path, construction))
        .map(path -> path.node().id())
        .toList();
  }

  private static boolean holds(Vehicle vehicle, TreePath path, String construction) {
    return InheritedSettings.at(vehicle, path)
        .find(Settings::construction)
        .map(Held::value)
        .filter(construction::equals)
        .isPresent();
  }

  /** The construction that a panel's own copy was made from; empty if it has no own copy. */
  public static Optional<PlateConstruction> original(Vehicle vehicle, String panel) {
    Optional<PlateConstruction> own =
        of(vehicle, panel).filter(plate -> panelsOf(vehicle, plate.id()).size() == 1);
    return own.flatMap(
        plate ->
            vehicle.constructions().stream()
                .filter(other -> CopyName.isCopy(plate.id(), other.id(), panel))
                .filter(PlateConstruction.class::isInstance)
                .map(PlateConstruction.class::cast)
                .findFirst());
  }

  /** The vehicle with the thickness of one panel's plate changed, m; all others stay. */
  public static Vehicle thickness(Vehicle vehicle, String panel, double thickness) {
    Optional<PlateConstruction> held = of(vehicle, panel);
    if (held.isEmpty() || held.get().thickness() == thickness) {
      return vehicle;
    }
    PlateConstruction plate = held.get();
    if (panelsOf(vehicle, plate.id()).size() <= 1) {
      return replaced(vehicle, CopyName.resized(plate, thickness));
    }
    String name = TreeEdit.find(vehicle, panel).orElseThrow().node().name();
    String id = CopyName.id(vehicle, plate.id(), panel);
    PlateConstruction copy = CopyName.copy(CopyName.resized(plate, thickness), id, name);
    List<Construction> all = new ArrayList<>(vehicle.constructions());
    all.add(copy);
    return slot(panel).write(vehicle.edit().constructions(all).build(), id);
  }

  /** The vehicle with the thickness changed, m, for every panel of the same construction. */
  public static Vehicle thicknessOfAll(Vehicle vehicle, String panel, double thickness) {
    return of(vehicle, panel)
        .filter(plate -> plate.thickness() != thickness)
        .map(plate -> replaced(vehicle, CopyName.resized(plate, thickness)))
        .orElse(vehicle);
  }

  private static Vehicle replaced(Vehicle vehicle, PlateConstruction plate) {
    UnaryOperator<Construction> swap = it -> it.id().equals(plate.id()) ? plate : it;
    return vehicle
        .edit()
        .constructions(vehicle.constructions().stream().map(swap).toList())
        .build();
  }

  /** The vehicle with a panel on the shared construction again, its own copy gone. */
  public static Vehicle back(Vehicle vehicle, String panel) {
    return original(vehicle, panel)
        .map(shared -> choose(vehicle, panel, shared.id()))
        .orElse(vehicle);
  }

  /**
   * The vehicle with another construction chosen on a panel, section or vehicle; a panel's own copy
   * that nobody uses any more goes with it.
   *
   * @param construction id; null to give the own choice back
   */
  public static Vehicle choose(Vehicle vehicle, String node, String construction) {
    FixedSlot<String> slot = slot(node);
    Optional<String> copy =
        original(vehicle, node).flatMap(it -> of(vehicle, node)).map(it -> it.id());
    Vehicle bare = slot.back(vehicle);
    boolean inherited =
        construction == null
            || slot.read(bare).map(Held::value).filter(construction::equals).isPresent();
    Vehicle chosen = inherited ? bare : slot.write(vehicle, construction);
    return copy.filter(id -> !named(chosen, id)).map(id -> without(chosen, id)).orElse(chosen);
  }

  private static boolean named(Vehicle vehicle, String construction) {
    return construction.equals(vehicle.settings().construction())
        || TreePath.of(vehicle).stream()
            .anyMatch(path -> construction.equals(path.node().settings().construction()));
  }

  private static Vehicle without(Vehicle vehicle, String construction) {
    List<Construction> rest =
        vehicle.constructions().stream().filter(it -> !it.id().equals(construction)).toList();
    return vehicle.edit().constructions(rest).build();
  }
}
