package eddyledger.model;

import java.util.ArrayList;
import java.util.List;

/**
 * A node of the tree with the way down to it.
 *
 * @param node the node
 * @param sections the sections above it, outermost first
 * @param positions its position among its siblings, after those of the sections above it
 */
public record TreePath(Node node, List<Section> sections, List<Integer> positions) {
  public TreePath {
    sections = List.copyOf(sections);
    positions = List.copyOf(positions);
  }

  /** Every node of the vehicle's tree, parents before children, in the order of the file. */
  public static List<TreePath> of(Vehicle vehicle) {
    List<TreePath> all = new ArrayList<>();
    collect(vehicle.tree(), List.of(), List.of(), all);
    return all;
  }

  private static void collect(
      List<Node> nodes, List<Section> above, List<Integer> positions, List<TreePath> into) {
    for (int i = 0; i < nodes.size(); i++) {
      Node node = nodes.get(i);
      List<Integer> here = new ArrayList<>(positions);
      here.add(i);
      into.add(new TreePath(node, above, here));
      if (node instanceof Section section) {
        List<Section> below = new ArrayList<>(above);
        below.add(section);
        collect(section.children(), below, here, into);
      }
    }
  }

  /** Id of the section above the node, or the vehicle's id at the top. */
  public String parentId(Vehicle vehicle) {
    return sections.isEmpty() ? vehicle.id() : sections.get(sections.size() - 1).id();
  }

  /** Place in the project file, for instance {@code tree[0].children[2]}. */
  public String place() {
    StringBuilder place = new StringBuilder("tree[").append(positions.get(0)).append(']');
    for (int position : positions.subList(1, positions.size())) {
      place.append(".children[").append(position).append(']');
    }
    return place.toString();
  }
}
