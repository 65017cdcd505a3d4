package eddyledger.check;

import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.regex.Pattern;

/** Every id of a vehicle: well formed, and only once without regard to case. */
final class Identities {
  private static final Pattern WELL_FORMED = Pattern.compile("[A-Za-z0-9][A-Za-z0-9._-]{0,63}");

  private record Entry(String id, String place) {}

  private Identities() {}

  static void check(Vehicle vehicle, Findings findings) {
    Map<String, Entry> seen = new HashMap<>();
    for (Entry entry : entries(vehicle)) {
      String id = entry.id() == null ? "" : entry.id();
      if (!WELL_FORMED.matcher(id).matches()) {
        findings.add(
            Severity.FATAL,
            "bad-id",
            "",
            entry.place(),
            id.isEmpty() ? "The id is missing." : "The id \"" + id + "\" cannot be used.",
            "An id has 1 to 64 letters, digits, points, underscores or hyphens and begins with a"
                + " letter or digit.");
        continue;
      }
      Entry first = seen.putIfAbsent(id.toLowerCase(Locale.ROOT), entry);
      if (first != null) {
        findings.add(
            Severity.FATAL,
            "duplicate-id",
            id,
            entry.place(),
            "The id \""
                + id
                + "\" stands already at "
                + first.place()
                + " (as \""
                + first.id()
                + "\").",
            "Give one of the two another id; upper and lower case do not tell ids apart.");
      }
    }
  }

  private static List<Entry> entries(Vehicle vehicle) {
    List<Entry> entries = new ArrayList<>();
    entries.add(new Entry(vehicle.id(), "vehicle.id"));
    add(entries, "conditions", vehicle.conditions().stream().map(it -> it.id()).toList());
    add(entries, "zones", vehicle.zones().stream().map(it -> it.id()).toList());
    add(entries, "apertures", vehicle.apertures().stream().map(it -> it.id()).toList());
    add(entries, "receivers", vehicle.receivers().stream().map(it -> it.id()).toList());
    add(entries, "constructions", vehicle.constructions().stream().map(it -> it.id()).toList());
    add(entries, "lay_ups", vehicle.layUps().stream().map(it -> it.id()).toList());
    add(entries, "suppliers", vehicle.suppliers().stream().map(it -> it.id()).toList());
    add(entries, "other_sources", vehicle.otherSources().stream().map(it -> it.id()).toList());
    add(entries, "targets", vehicle.targets().stream().map(it -> it.id()).toList());
    for (TreePath path : TreePath.of(vehicle)) {
      entries.add(new Entry(path.node().id(), path.place() + ".id"));
    }
    return entries;
  }

  private static void add(List<Entry> entries, String group, List<String> ids) {
    for (int i = 0; i < ids.size(); i++) {
      entries.add(new Entry(ids.get(i), group + "[" + i + "].id"));
    }
  }
}
