package eddyledger.model;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;

/** Changes to the tree of a vehicle; each gives a new vehicle and leaves the old one as it was. */
public final class TreeEdit {
  private TreeEdit() {}

  /** The way down to a node; empty if the tree has none of that id. */
  public static Optional<TreePath> find(Vehicle vehicle, String id) {
    return Optional.ofNullable(find(vehicle.tree(), id, List.of(), List.of()));
  }

  /** Looked for all the time: nothing is made of the nodes passed by. */
  private static TreePath find(
      List<Node> nodes, String id, List<Section> above, List<Integer> positions) {
    for (int i = 0; i < nodes.size(); i++) {
      Node node = nodes.get(i);
      TreePath found = null;
      if (node.id().equals(id)) {
        found = new TreePath(node, above, with(positions, i));
      } else if (node instanceof Section section && !section.children().isEmpty()) {
        found = find(section.children(), id, with(above, section), with(positions, i));
      }
      if (found != null) {
        return found;
      }
    }
    return null;
  }

  private static <T> List<T> with(List<T> some, T last) {
    List<T> more = new ArrayList<>(some);
    more.add(last);
    return more;
  }

  /** The vehicle with the node of an id changed; as it was if there is none. */
  public static Vehicle change(Vehicle vehicle, String id, UnaryOperator<Node> change) {
    return vehicle.edit().tree(changed(vehicle.tree(), id, change)).build();
  }

  /** The vehicle with the settings of a node, or of the vehicle itself, changed. */
  public static Vehicle settings(Vehicle vehicle, String id, UnaryOperator<Settings> change) {
    if (vehicle.id().equals(id)) {
      return vehicle.edit().settings(change.apply(vehicle.settings())).build();
    }
    return change(
        vehicle,
        id,
        node -> {
          Settings changed = change.apply(node.settings());
          return node instanceof Panel panel
              ? panel.withSettings(changed)
              : ((Section) node).withSettings(changed);
        });
  }

  /** The vehicle with a node put last into a section, or at the top under the vehicle's id. */
  public static Vehicle add(Vehicle vehicle, String parentId, Node node) {
    if (vehicle.id().equals(parentId)) {
      List<Node> top = new ArrayList<>(vehicle.tree());
      top.add(node);
      return vehicle.edit().tree(top).build();
    }
    return change(
        vehicle,
        parentId,
        parent -> {
          Section section = (Section) parent;
          List<Node> children = new ArrayList<>(section.children());
          children.add(node);
          return section.withChildren(children);
        });
  }

  /** The vehicle without a node and all below it. */
  public static Vehicle remove(Vehicle vehicle, String id) {
    return vehicle.edit().tree(without(vehicle.tree(), id)).build();
  }

  private static List<Node> changed(List<Node> nodes, String id, UnaryOperator<Node> change) {
    List<Node> result = new ArrayList<>(nodes.size());
    for (Node node : nodes) {
      if (node.id().equals(id)) {
        result.add(change.apply(node));
      } else if (node instanceof Section section) {
        List<Node> children = changed(section.children(), id, change);
        // what did not change stays the same object, so that snapshots share it
        result.add(same(children, section.children()) ? section : section.withChildren(children));
      } else {
        result.add(node);
      }
    }
    return result;
  }

  private static boolean same(List<Node> one, List<Node> other) {
    for (int i = 0; i < one.size(); i++) {
      if (one.get(i) != other.get(i)) {
        return false;
      }
    }
    return one.size() == other.size();
  }

  private static List<Node> without(List<Node> nodes, String id) {
    List<Node> result = new ArrayList<>();
    for (Node node : nodes) {
      if (!node.id().equals(id)) {
        result.add(
            node instanceof Section section
                ? section.withChildren(without(section.children(), id))
                : node);
      }
    }
    return result;
  }
}
