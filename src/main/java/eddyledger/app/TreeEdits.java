package eddyledger.app;

import eddyledger.model.Allowance;
import eddyledger.model.Evidence;
import eddyledger.model.Extras;
import eddyledger.model.Node;
import eddyledger.model.Panel;
import eddyledger.model.Section;
import eddyledger.model.Settings;
import eddyledger.model.TreeEdit;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;

/** Edits of the tree itself: what is added and taken out, with ids that nothing else has. */
public final class TreeEdits {
  private TreeEdits() {}

  /** Adds a panel below a section, beside a panel, or at the top; it takes all from above. */
  public static Edit addPanel(Vehicle vehicle, String rowId) {
    String id = freeId(vehicle, "panel");
    Panel panel = new Panel(id, "New panel", 1, Settings.NONE, null, Evidence.NONE, Extras.NONE);
    return add(vehicle, rowId, panel, "new panel");
  }

  /** Adds a section below a section, beside a panel, or at the top. */
  public static Edit addSection(Vehicle vehicle, String rowId) {
    String id = freeId(vehicle, "section");
    Section section = new Section(id, "New section", Settings.NONE, List.of(), Extras.NONE);
    return add(vehicle, rowId, section, "new section");
  }

  private static Edit add(Vehicle vehicle, String rowId, Node node, String label) {
    String parent = parentFor(vehicle, rowId);
    return Edit.of(label, node.id(), before -> TreeEdit.add(before, parent, node));
  }

  /** Adds a copy of a panel beside it; empty if the row is no panel. */
  public static Optional<Edit> duplicate(Vehicle vehicle, String rowId) {
    return TreeEdit.find(vehicle, rowId)
        .map(TreePath::node)
        .filter(Panel.class::isInstance)
        .map(Panel.class::cast)
        .map(
            panel -> {
              Panel copy =
                  panel
                      .withId(freeId(vehicle, panel.id().replaceAll("-[0-9]+$", "")))
                      .withName(panel.name() + ", copy");
              return add(vehicle, rowId, copy, "copy of " + panel.name());
            });
  }

  /**
   * Takes a panel or section out, with all below it and the allowances handed to them; empty if the
   * row is neither.
   */
  public static Optional<Edit> remove(Vehicle vehicle, String rowId) {
    return TreeEdit.find(vehicle, rowId)
        .map(
            path ->
                Edit.of(
                    "removal of " + path.node().name(),
                    path.parentId(vehicle),
                    before -> without(before, rowId)));
  }

  private static Vehicle without(Vehicle before, String rowId) {
    Vehicle pruned = TreeEdit.remove(before, rowId);
    Set<String> gone = ids(before);
    gone.removeAll(ids(pruned));
    List<Allowance> kept =
        pruned.allowances().stream().filter(one -> !gone.contains(one.node())).toList();
    return pruned.edit().allowances(kept).build();
  }

  private static Set<String> ids(Vehicle vehicle) {
    Set<String> ids = new HashSet<>();
    TreePath.of(vehicle).forEach(path -> ids.add(path.node().id()));
    return ids;
  }

  private static String parentFor(Vehicle vehicle, String rowId) {
    return TreeEdit.find(vehicle, rowId)
        .map(path -> path.node() instanceof Section ? rowId : path.parentId(vehicle))
        .orElse(vehicle.id());
  }

  /** An id that begins with a stem and that nothing in the vehicle has, without regard to case. */
  public static String freeId(Vehicle vehicle, String stem) {
    Set<String> taken = new HashSet<>();
    taken.add(vehicle.id().toLowerCase(Locale.ROOT));
    ids(vehicle).forEach(id -> taken.add(id.toLowerCase(Locale.ROOT)));
    vehicle.zones().forEach(x -> taken.add(x.id().toLowerCase(Locale.ROOT)));
    vehicle.apertures().forEach(x -> taken.add(x.id().toLowerCase(Locale.ROOT)));
    vehicle.receivers().forEach(x -> taken.add(x.id().toLowerCase(Locale.ROOT)));
    vehicle.conditions().forEach(x -> taken.add(x.id().toLowerCase(Locale.ROOT)));
    vehicle.constructions().forEach(x -> taken.add(x.id().toLowerCase(Locale.ROOT)));
    vehicle.layUps().forEach(x -> taken.add(x.id().toLowerCase(Locale.ROOT)));
    vehicle.suppliers().forEach(x -> taken.add(x.id().toLowerCase(Locale.ROOT)));
    vehicle.targets().forEach(x -> taken.add(x.id().toLowerCase(Locale.ROOT)));
    vehicle.otherSources().forEach(x -> taken.add(x.id().toLowerCase(Locale.ROOT)));
    String start = stem.length() > 58 ? stem.substring(0, 58) : stem;
    int number = 1;
    while (taken.contains((start + "-" + number).toLowerCase(Locale.ROOT))) {
      number++;
    }
    return start + "-" + number;
  }
}
