package eddyledger.present;

import eddyledger.app.RowEdit;
import eddyledger.model.Section;
import eddyledger.model.TreeEdit;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** What a row is called and where it stands. */
final class SheetRow {
  private static final String STEP = " › ";

  private SheetRow() {}

  /** Name of a panel, section, other source or the vehicle; empty if there is none of that id. */
  static String name(Vehicle vehicle, String id) {
    if (vehicle.id().equals(id)) {
      return vehicle.name();
    }
    Optional<String> source = RowEdit.source(vehicle, id).map(it -> it.name());
    return source.or(() -> TreeEdit.find(vehicle, id).map(it -> it.node().name())).orElse("");
  }

  /** The vehicle and the sections above a row; empty for the vehicle itself. */
  static String trail(Vehicle vehicle, String id) {
    List<String> names = new ArrayList<>();
    if (!vehicle.id().equals(id)) {
      names.add(vehicle.name());
    }
    TreeEdit.find(vehicle, id)
        .map(TreePath::sections)
        .orElse(List.of())
        .forEach((Section section) -> names.add(section.name()));
    return String.join(STEP, names);
  }
}
