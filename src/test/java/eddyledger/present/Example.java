package eddyledger.present;

import eddyledger.app.ComputedLedger;
import eddyledger.app.ProjectState;
import eddyledger.file.ProjectReader;
import eddyledger.ledger.Ledger;
import eddyledger.model.Allowance;
import eddyledger.model.Evidence;
import eddyledger.model.Extras;
import eddyledger.model.Node;
import eddyledger.model.Panel;
import eddyledger.model.PassRule;
import eddyledger.model.Rating;
import eddyledger.model.Section;
import eddyledger.model.Target;
import eddyledger.model.Vehicle;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;

/** The example on the desk, and variations of it. */
final class Example {
  private Example() {}

  static Vehicle vehicle() {
    try {
      Path file = Path.of("examples/quillon-82.eddyledger");
      return new ProjectReader().read(file).vehicle().orElseThrow();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** A vehicle on the desk with its result. */
  static ProjectState computed(Vehicle vehicle) {
    ProjectState state = new ProjectState();
    state.put(vehicle, null);
    compute(state);
    return state;
  }

  /** A vehicle on the desk with a result computed before. */
  static ProjectState with(Ledger ledger) {
    ProjectState state = new ProjectState();
    state.put(ledger.vehicle(), null);
    deliver(state, ledger);
    return state;
  }

  static void compute(ProjectState state) {
    deliver(state, Ledger.of(state.vehicle()));
  }

  static void deliver(ProjectState state, Ledger ledger) {
    state.computed(new ComputedLedger(state.revision(), Optional.of(ledger), List.of()));
  }

  /** The example without the construction of one panel, which then has no value. */
  static Vehicle without(String panelId) {
    return panel(
        vehicle(),
        panelId,
        panel -> panel.withSettings(panel.settings().edit().construction(null).build()));
  }

  /** One panel replaced. */
  static Vehicle panel(Vehicle vehicle, String id, UnaryOperator<Panel> change) {
    List<Node> tree = vehicle.tree().stream().map(node -> panel(node, id, change)).toList();
    return vehicle.edit().tree(tree).build();
  }

  private static Node panel(Node node, String id, UnaryOperator<Panel> change) {
    if (node instanceof Section section) {
      return section.withChildren(
          section.children().stream().map(child -> panel(child, id, change)).toList());
    }
    return node.id().equals(id) ? change.apply((Panel) node) : node;
  }

  static Target target(
      String id, List<String> receivers, Rating rating, double value, PassRule rule) {
    return new Target(
        id, id, "cruise", receivers, rating, value, 0.5, rule, Evidence.NONE, Extras.NONE);
  }

  static Allowance allowance(String node, double level) {
    return new Allowance(node, "row-2", "cruise", level, Evidence.NONE, Extras.NONE);
  }
}
