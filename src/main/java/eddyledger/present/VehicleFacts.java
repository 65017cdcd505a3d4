package eddyledger.present;

import eddyledger.model.Construction;
import eddyledger.model.Held;
import eddyledger.model.InheritedSettings;
import eddyledger.model.LayUp;
import eddyledger.model.Panel;
import eddyledger.model.Section;
import eddyledger.model.Settings;
import eddyledger.model.Supplier;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;

/**
 * Lay-up, supplier and mass of every panel, and the masses of sections as sums. A panel's mass is
 * that of its skin: surface mass times length times width times count; what lies below the skin has
 * no mass in the file.
 */
final class VehicleFacts {
  private final Vehicle vehicle;
  private final Map<String, Facts> facts = new HashMap<>();
  private final Map<String, Construction> constructions = new HashMap<>();
  private final Map<String, String> layUps = new HashMap<>();
  private final Map<String, String> suppliers = new HashMap<>();

  /** The facts of a vehicle; those known before, if they are of the same. */
  static VehicleFacts of(Vehicle vehicle, VehicleFacts before) {
    return before != null && before.vehicle == vehicle ? before : new VehicleFacts(vehicle);
  }

  private VehicleFacts(Vehicle vehicle) {
    this.vehicle = vehicle;
    vehicle.constructions().forEach(it -> constructions.put(it.id(), it));
    for (LayUp layUp : vehicle.layUps()) {
      layUps.put(layUp.id(), layUp.name());
    }
    for (Supplier supplier : vehicle.suppliers()) {
      suppliers.put(supplier.id(), supplier.name());
    }
    layUps.put(Settings.NO_LAY_UP, "none");
    facts.put(vehicle.id(), Facts.NONE);
    for (TreePath path : TreePath.of(vehicle)) {
      if (path.node() instanceof Panel panel) {
        Facts own = of(panel, InheritedSettings.at(vehicle, path));
        facts.put(panel.id(), own);
        add(vehicle.id(), own.mass());
        for (Section section : path.sections()) {
          add(section.id(), own.mass());
        }
      }
    }
  }

  private void add(String sumId, Mass mass) {
    facts.merge(
        sumId,
        new Facts("", "", mass),
        (before, more) -> new Facts("", "", before.mass().plus(more.mass())));
  }

  private Facts of(Panel panel, InheritedSettings settings) {
    return new Facts(
        name(layUps, settings.find(Settings::layUp)),
        name(suppliers, settings.find(Settings::supplier)),
        mass(panel, settings));
  }

  private static String name(Map<String, String> names, Optional<Held<String>> held) {
    return held.map(it -> names.getOrDefault(it.value(), it.value())).orElse("");
  }

  private Mass mass(Panel panel, InheritedSettings settings) {
    Construction construction =
        value(settings, Settings::construction).map(constructions::get).orElse(null);
    Double length = value(settings, Settings::length).orElse(null);
    Double width = value(settings, Settings::width).orElse(null);
    if (construction == null || length == null || width == null) {
      return Mass.UNKNOWN;
    }
    return Mass.of(construction.surfaceMass() * length * width * panel.count());
  }

  private static <T> Optional<T> value(InheritedSettings settings, Function<Settings, T> which) {
    return settings.find(which).map(Held::value);
  }

  /** Margin below which a state is tight, dB. */
  double tightBand() {
    return vehicle.tightBandOrDefault();
  }

  /** The facts of a row; none if it is no part of the vehicle. */
  Facts of(String id) {
    return facts.getOrDefault(id, Facts.NONE);
  }
}
