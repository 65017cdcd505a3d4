package eddyledger.check;

import eddyledger.model.ByCondition;
import eddyledger.model.InheritedSettings;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Panel;
import eddyledger.model.Settings;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.util.List;
import java.util.function.Function;

/** Whether everything is there that a level needs. */
final class Completeness {
  private final Vehicle vehicle;
  private final Findings findings;

  private Completeness(Vehicle vehicle, Findings findings) {
    this.vehicle = vehicle;
    this.findings = findings;
  }

  static void check(Vehicle vehicle, Findings findings) {
    Completeness completeness = new Completeness(vehicle, findings);
    completeness.vehicle();
    for (TreePath path : TreePath.of(vehicle)) {
      if (path.node() instanceof Panel panel) {
        completeness.panel(panel, path);
      }
    }
  }

  private void vehicle() {
    List<TreePath> nodes = TreePath.of(vehicle);
    if (nodes.stream().noneMatch(path -> path.node() instanceof Panel)) {
      fatal("empty-vehicle", "tree", "The vehicle has no panel.", "Add at least one panel.");
    }
    if (vehicle.conditions().isEmpty()) {
      fatal(
          "no-condition",
          "conditions",
          "There is no operating condition.",
          "Add at least one, with its speed and the air outside.");
    }
    if (vehicle.receivers().isEmpty()) {
      fatal(
          "no-receiver",
          "receivers",
          "There is no receiver.",
          "Add at least one, with the zone it lies in.");
    }
    if (vehicle.targets().isEmpty()) {
      findings.add(
          Severity.NOTE,
          "no-target",
          "",
          "targets",
          "There is no target, so there are no margins.",
          "Add one per receiver and condition.");
    }
    if (vehicle.tightBand() != null) {
      findings.within(Limit.RESERVE, vehicle.tightBand(), "", "vehicle.tight_band_dB");
    }
  }

  private void fatal(String code, String place, String what, String remedy) {
    findings.add(Severity.FATAL, code, "", place, what, remedy);
  }

  private void panel(Panel panel, TreePath path) {
    InheritedSettings settings = InheritedSettings.at(vehicle, path);
    need(settings, Settings::zone, panel, path, "zone", "zone");
    needs(settings, Settings::localSpeed, panel, path, "local_speed", "local flow speed");
    needs(settings, Settings::boundaryLayer, panel, path, "boundary_layer", "boundary layer");
    if (panel.measured() == null) {
      need(settings, Settings::construction, panel, path, "construction", "construction");
      need(settings, Settings::length, panel, path, "length_m", "length along the flow");
      need(settings, Settings::width, panel, path, "width_m", "width across the flow");
      needs(settings, Settings::lossFactor, panel, path, "loss_factor", "damping loss factor");
    }
  }

  private <T> void need(
      InheritedSettings settings,
      Function<Settings, T> setting,
      Panel panel,
      TreePath path,
      String key,
      String name) {
    if (settings.find(setting).isEmpty()) {
      missing(panel, path, key, "The panel has no " + name + ".");
    }
  }

  private <T> void needs(
      InheritedSettings settings,
      Function<Settings, ByCondition<T>> setting,
      Panel panel,
      TreePath path,
      String key,
      String name) {
    for (OperatingCondition condition : vehicle.conditions()) {
      if (settings.find(setting, condition.id()).isEmpty()) {
        String where = " in condition \"" + condition.id() + "\".";
        missing(panel, path, key, "The panel has no " + name + where);
      }
    }
  }

  private void missing(Panel panel, TreePath path, String key, String what) {
    findings.add(
        Severity.ERROR,
        "missing-value",
        panel.id(),
        path.place() + "." + key,
        what,
        "Set it on the panel, or on a section above it.");
  }
}
