package eddyledger.ledger;

import eddyledger.ledger.Contribution.Part;
import eddyledger.model.Node;
import eddyledger.model.OperatingCondition;
import eddyledger.model.OtherSource;
import eddyledger.model.Panel;
import eddyledger.model.Receiver;
import eddyledger.model.Section;
import eddyledger.model.Vehicle;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Energy sums at every node of the tree at one receiver in one condition, under every choice of
 * models. The order of summation is that of the tree, so a sum is the same bits every time.
 */
final class TreeSum {
  private final Map<String, List<Contribution>> nodes = new LinkedHashMap<>();
  private final Map<OtherSource, Contribution> others;
  private final List<Contribution> totals;
  private final LedgerRun run;
  private final String condition;
  private final Receiver receiver;

  TreeSum(
      Vehicle vehicle,
      LedgerRun run,
      OperatingCondition condition,
      Receiver receiver,
      Map<OtherSource, Contribution> others) {
    this.run = run;
    this.condition = condition.id();
    this.receiver = receiver;
    this.others = others;
    vehicle.tree().forEach(this::collect);
    totals = new ArrayList<>();
    for (int c = 0; c < Choice.all().size(); c++) {
      List<Part> parts = parts(vehicle.tree(), c);
      others.forEach((source, contribution) -> parts.add(new Part(source.id(), contribution)));
      totals.add(Contribution.sum(parts));
    }
  }

  private void collect(Node node) {
    if (node instanceof Panel panel) {
      nodes.put(panel.id(), PanelShare.contributions(run, panel.id(), condition, receiver));
      return;
    }
    Section section = (Section) node;
    section.children().forEach(this::collect);
    List<Contribution> sums = new ArrayList<>();
    for (int c = 0; c < Choice.all().size(); c++) {
      sums.add(Contribution.sum(parts(section.children(), c)));
    }
    nodes.put(section.id(), sums);
  }

  private List<Part> parts(List<Node> children, int choice) {
    List<Part> parts = new ArrayList<>();
    for (Node child : children) {
      // the silence of an empty section is no knowledge of the bands its neighbours lack
      if (!empty(child)) {
        parts.add(new Part(child.id(), nodes.get(child.id()).get(choice)));
      }
    }
    return parts;
  }

  private static boolean empty(Node node) {
    return node instanceof Section section && section.children().stream().allMatch(TreeSum::empty);
  }

  /** The sum at a section, or the contribution of a panel, under the chosen models. */
  Contribution node(String id) {
    return nodes.get(id).get(0);
  }

  /** The total under a choice of models by its position. */
  Contribution total(int choice) {
    return totals.get(choice);
  }

  /** The other sources, in the order of the file. */
  Map<OtherSource, Contribution> others() {
    return others;
  }
}
