package eddyledger.present;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Names of lines, short where the sections above say the rest. */
final class LineNames {
  private final Map<LedgerNode, Map<LedgerNode, String>> below = new HashMap<>();

  /** The name of a node. */
  String of(LedgerNode node) {
    if (node.above() == null) {
      return node.row().name();
    }
    return below.computeIfAbsent(node.above(), LineNames::children).get(node);
  }

  private static Map<LedgerNode, String> children(LedgerNode parent) {
    List<String> sections = new ArrayList<>();
    for (LedgerNode above = parent; above != null; above = above.above()) {
      sections.add(above.row().name());
    }
    List<String> siblings = parent.children().stream().map(it -> it.row().name()).toList();
    Map<String, Integer> counts = ShortName.counts(siblings, sections);
    Map<LedgerNode, String> names = new HashMap<>();
    for (LedgerNode child : parent.children()) {
      names.put(child, ShortName.within(child.row().name(), sections, counts));
    }
    return names;
  }
}
