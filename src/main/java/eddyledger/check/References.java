package eddyledger.check;

import eddyledger.model.Allowance;
import eddyledger.model.Aperture;
import eddyledger.model.ByCondition;
import eddyledger.model.Node;
import eddyledger.model.OtherSource;
import eddyledger.model.Panel;
import eddyledger.model.Receiver;
import eddyledger.model.Settings;
import eddyledger.model.Target;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.util.Collection;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/** Every reference of a vehicle leads to something, and to something else than itself. */
final class References {
  private final Vehicle vehicle;
  private final Findings findings;
  private final Set<String> conditions;
  private final Set<String> zones;
  private final Set<String> receivers;
  private final Set<String> nodes;
  private final Set<String> panels;

  private References(Vehicle vehicle, Findings findings) {
    this.vehicle = vehicle;
    this.findings = findings;
    conditions = ids(vehicle.conditions().stream().map(it -> it.id()).toList());
    zones = ids(vehicle.zones().stream().map(it -> it.id()).toList());
    receivers = ids(vehicle.receivers().stream().map(it -> it.id()).toList());
    List<Node> all = TreePath.of(vehicle).stream().map(TreePath::node).toList();
    nodes = ids(all.stream().map(Node::id).toList());
    panels = ids(all.stream().filter(Panel.class::isInstance).map(Node::id).toList());
  }

  static void check(Vehicle vehicle, Findings findings) {
    References references = new References(vehicle, findings);
    references.cabin();
    references.results();
    references.settings(vehicle.settings(), vehicle.id(), "vehicle");
    for (TreePath path : TreePath.of(vehicle)) {
      references.settings(path.node().settings(), path.node().id(), path.place());
    }
  }

  private void cabin() {
    for (int i = 0; i < vehicle.apertures().size(); i++) {
      Aperture aperture = vehicle.apertures().get(i);
      String place = "apertures[" + i + "].zones";
      reference("zone", aperture.firstZone(), zones, aperture.id(), place + "[0]");
      reference("zone", aperture.secondZone(), zones, aperture.id(), place + "[1]");
      if (aperture.firstZone() != null && aperture.firstZone().equals(aperture.secondZone())) {
        findings.add(
            Severity.ERROR,
            "circular-reference",
            aperture.id(),
            place,
            "The aperture leads from zone \"" + aperture.firstZone() + "\" back into itself.",
            "Name two different zones.");
      }
    }
    for (int i = 0; i < vehicle.zones().size(); i++) {
      overrides(
          vehicle.zones().get(i).absorptionArea(),
          vehicle.zones().get(i).id(),
          "zones[" + i + "].absorption_area_m2");
    }
    for (int i = 0; i < vehicle.receivers().size(); i++) {
      Receiver receiver = vehicle.receivers().get(i);
      String place = "receivers[" + i + "]";
      reference("zone", receiver.zone(), zones, receiver.id(), place + ".zone");
      for (int k = 0; k < receiver.direct().size(); k++) {
        String panel = receiver.direct().get(k).panel();
        reference("panel", panel, panels, receiver.id(), place + ".direct[" + k + "].panel");
      }
    }
  }

  private void results() {
    for (int i = 0; i < vehicle.otherSources().size(); i++) {
      OtherSource source = vehicle.otherSources().get(i);
      String place = "other_sources[" + i + "]";
      reference("receiver", source.receiver(), receivers, source.id(), place + ".receiver");
      reference("condition", source.condition(), conditions, source.id(), place + ".condition");
    }
    for (int i = 0; i < vehicle.targets().size(); i++) {
      Target target = vehicle.targets().get(i);
      String place = "targets[" + i + "]";
      reference("condition", target.condition(), conditions, target.id(), place + ".condition");
      for (int k = 0; k < target.receivers().size(); k++) {
        String receiver = target.receivers().get(k);
        reference("receiver", receiver, receivers, target.id(), place + ".receivers[" + k + "]");
      }
    }
    for (int i = 0; i < vehicle.allowances().size(); i++) {
      Allowance allowance = vehicle.allowances().get(i);
      String place = "allowances[" + i + "]";
      String subject = allowance.node() == null ? "" : allowance.node();
      reference("section or panel", allowance.node(), nodes, subject, place + ".node");
      reference("receiver", allowance.receiver(), receivers, subject, place + ".receiver");
      reference("condition", allowance.condition(), conditions, subject, place + ".condition");
    }
  }

  private void settings(Settings settings, String id, String place) {
    optional(
        "construction",
        settings.construction(),
        ids(vehicle.constructions().stream().map(it -> it.id()).toList()),
        id,
        place + ".construction");
    if (!Settings.NO_LAY_UP.equals(settings.layUp())) {
      optional(
          "lay-up",
          settings.layUp(),
          ids(vehicle.layUps().stream().map(it -> it.id()).toList()),
          id,
          place + ".lay_up");
    }
    optional("zone", settings.zone(), zones, id, place + ".zone");
    optional(
        "supplier",
        settings.supplier(),
        ids(vehicle.suppliers().stream().map(it -> it.id()).toList()),
        id,
        place + ".supplier");
    overrides(settings.localSpeed(), id, place + ".local_speed");
    overrides(settings.boundaryLayer(), id, place + ".boundary_layer");
    overrides(settings.wallPressure(), id, place + ".wall_pressure");
    overrides(settings.crossSpectrum(), id, place + ".cross_spectrum");
    overrides(settings.convectionRatio(), id, place + ".convection_ratio");
    overrides(settings.lossFactor(), id, place + ".loss_factor");
  }

  private void overrides(ByCondition<?> value, String subject, String place) {
    if (value != null) {
      for (String id : value.overrides().keySet()) {
        reference("condition", id, conditions, subject, place + ".by_condition." + id);
      }
    }
  }

  private void optional(
      String what, String id, Collection<String> known, String subject, String place) {
    if (id != null) {
      reference(what, id, known, subject, place);
    }
  }

  private void reference(
      String what, String id, Collection<String> known, String subject, String place) {
    if (id == null) {
      findings.add(
          Severity.ERROR,
          "missing-value",
          subject,
          place,
          "The id of a " + what + " is missing.",
          "Enter it.");
    } else if (!known.contains(id)) {
      findings.add(
          Severity.ERROR,
          "missing-reference",
          subject,
          place,
          "There is no " + what + " \"" + id + "\"." + NearMiss.of(id, known),
          "Name one that the file describes, or describe it.");
    }
  }

  private static Set<String> ids(List<String> ids) {
    return ids.stream().filter(id -> id != null).collect(Collectors.toSet());
  }
}
