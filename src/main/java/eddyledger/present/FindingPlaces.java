package eddyledger.present;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.model.TreeEdit;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.util.List;

/** Tells which findings belong to which field, by their places in the project file. */
final class FindingPlaces {
  private static final String BY_CONDITION = ".by_condition.";

  /** What is found about the layer as a whole stands under its thickness. */
  private static final String WHOLE_LAYER = "boundary_layer";

  private static final String FIRST_OF_LAYER = ".thickness_m";

  private FindingPlaces() {}

  /** The place of a panel, section, other source or the vehicle; empty if it is nowhere. */
  static String ofRow(Vehicle vehicle, String id) {
    if (vehicle.id().equals(id)) {
      return "vehicle";
    }
    for (int i = 0; i < vehicle.otherSources().size(); i++) {
      if (vehicle.otherSources().get(i).id().equals(id)) {
        return "other_sources[" + i + "]";
      }
    }
    return TreeEdit.find(vehicle, id).map(TreePath::place).orElse("");
  }

  /** Whether a finding is about a value, in a condition. */
  static boolean meets(Finding finding, List<String> places, String condition) {
    return places.stream().anyMatch(place -> meets(finding.place(), place, condition));
  }

  private static boolean meets(String found, String place, String condition) {
    // a part may stand directly below its value or below an override of it
    String plain = found;
    int special = found.indexOf(BY_CONDITION);
    if (special >= 0) {
      int end = special + BY_CONDITION.length() + condition.length();
      boolean here =
          found.startsWith(condition, special + BY_CONDITION.length())
              && (end == found.length() || ".[".indexOf(found.charAt(end)) >= 0);
      if (!here) {
        return false;
      }
      plain = found.substring(0, special) + found.substring(end);
    }
    if (place.endsWith(WHOLE_LAYER + FIRST_OF_LAYER)
        && plain.equals(place.substring(0, place.length() - FIRST_OF_LAYER.length()))) {
      return true;
    }
    return plain.startsWith(place)
        && (plain.length() == place.length() || ".[".indexOf(plain.charAt(place.length())) >= 0);
  }

  /** A finding as it stands under a field. */
  static SheetMessage message(Finding finding) {
    String remedy =
        finding.severity() == Severity.NOTE || finding.remedy().isEmpty()
            ? ""
            : " " + finding.remedy();
    return new SheetMessage(finding.severity(), Readable.sentence(finding.what() + remedy));
  }
}
