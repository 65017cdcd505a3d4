package eddyledger.ledger;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.model.OperatingCondition;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The error findings of a description, to be asked which of them concern something that a level is
 * computed with. Immutable.
 */
final class LevelErrors {
  private final Map<String, List<Finding>> bySubject = new HashMap<>();
  private final Map<String, String> places = new HashMap<>();
  private final List<String> conditions;

  LevelErrors(Vehicle vehicle, List<Finding> findings) {
    for (Finding finding : findings) {
      // a faulty allowance is told of its section or panel, but changes no level of it
      boolean allowance = finding.place().startsWith("allowances[");
      if (finding.severity().atLeast(Severity.ERROR) && !allowance) {
        bySubject.computeIfAbsent(finding.subject(), id -> new ArrayList<>()).add(finding);
      }
    }
    places.put(vehicle.id(), "vehicle");
    TreePath.of(vehicle).forEach(path -> places.put(path.node().id(), path.place()));
    conditions = vehicle.conditions().stream().map(OperatingCondition::id).toList();
  }

  /** The first error about something that is used as a whole; empty if there is none. */
  Optional<Finding> about(String id) {
    return errors(id).stream().findFirst();
  }

  /** The first error about a property of a node of the tree; empty if there is none. */
  Optional<Finding> at(String node, String key) {
    String place = placeOf(node, key);
    return errors(node).stream().filter(finding -> within(finding.place(), place)).findFirst();
  }

  /**
   * The first error about a setting as it is used in a condition. An error about the override for
   * another condition is none; one about an override for a condition that is not described is,
   * since nobody knows which condition was meant.
   *
   * @param node id of the panel, section or vehicle that sets it, or of the panel that lacks it
   * @param key key of the setting
   * @param condition the condition
   * @param override whether the node's override for the condition is used
   */
  Optional<Finding> at(String node, String key, String condition, boolean override) {
    String place = placeOf(node, key);
    return errors(node).stream()
        .filter(finding -> within(finding.place(), place))
        .filter(
            finding -> {
              Optional<String> only = override(finding.place(), place + ".by_condition.");
              return override ? only.equals(Optional.of(condition)) : only.isEmpty();
            })
        .findFirst();
  }

  /** The condition whose override a place is in; empty if it is in none. */
  private Optional<String> override(String place, String overrides) {
    // ids may hold points, so that one can begin like another: the longest is meant
    return conditions.stream()
        .filter(condition -> within(place, overrides + condition))
        .max(Comparator.comparingInt(String::length));
  }

  private List<Finding> errors(String id) {
    return bySubject.getOrDefault(id, List.of());
  }

  private String placeOf(String node, String key) {
    return places.get(node) + "." + key;
  }

  private static boolean within(String place, String whole) {
    return place.startsWith(whole)
        && (place.length() == whole.length() || ".[".indexOf(place.charAt(whole.length())) >= 0);
  }
}
