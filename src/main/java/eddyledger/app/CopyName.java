package eddyledger.app;

import eddyledger.model.Construction;
import eddyledger.model.OtherSource;
import eddyledger.model.PlateConstruction;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.math.BigDecimal;
import java.util.HashSet;
import java.util.Locale;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Ids and names of constructions that were copied for one panel, or changed in thickness. */
final class CopyName {
  private static final int LONGEST_ID = 64;
  private static final int ROOM_FOR_NUMBER = 4;

  private CopyName() {}

  /** An id of a copy that the vehicle does not use yet: construction, hyphen, panel. */
  static String id(Vehicle vehicle, String construction, String panel) {
    return free(vehicle, plain(construction, panel));
  }

  private static String plain(String construction, String panel) {
    return shortened(construction + "-" + panel);
  }

  private static String shortened(String id) {
    return id.substring(0, Math.min(id.length(), LONGEST_ID - ROOM_FOR_NUMBER));
  }

  /** Whether an id is that of a copy of a construction for a panel. */
  static boolean isCopy(String id, String construction, String panel) {
    String plain = plain(construction, panel);
    return !id.equals(construction)
        && id.startsWith(plain)
        && id.substring(plain.length()).matches("(-\\d{1,3})?");
  }

  private static Set<String> ids(Vehicle vehicle) {
    Set<String> ids = new HashSet<>();
    ids.add(vehicle.id());
    vehicle.conditions().forEach(it -> ids.add(it.id()));
    vehicle.zones().forEach(it -> ids.add(it.id()));
    vehicle.apertures().forEach(it -> ids.add(it.id()));
    vehicle.receivers().forEach(it -> ids.add(it.id()));
    vehicle.constructions().stream().map(Construction::id).forEach(ids::add);
    vehicle.layUps().forEach(it -> ids.add(it.id()));
    vehicle.suppliers().forEach(it -> ids.add(it.id()));
    vehicle.otherSources().stream().map(OtherSource::id).forEach(ids::add);
    vehicle.targets().forEach(it -> ids.add(it.id()));
    TreePath.of(vehicle).forEach(path -> ids.add(path.node().id()));
    Set<String> lower = new HashSet<>();
    ids.forEach(id -> lower.add(id == null ? "" : id.toLowerCase(Locale.ROOT)));
    return lower;
  }

  /** An id that starts so and that the vehicle does not use yet. */
  static String free(Vehicle vehicle, String wanted) {
    Set<String> taken = ids(vehicle);
    String plain = shortened(wanted);
    String id = plain;
    for (int i = 2; taken.contains(id.toLowerCase(Locale.ROOT)); i++) {
      id = plain + "-" + i;
    }
    return id;
  }

  /** The plate in another thickness, m; a thickness in millimetres in its name follows. */
  static PlateConstruction resized(PlateConstruction plate, double thickness) {
    Pattern old =
        Pattern.compile("(?<![\\d.,])" + Pattern.quote(millimetres(plate.thickness())) + "(?!\\w)");
    String name =
        plate.name() == null
            ? null
            : old.matcher(plate.name())
                .replaceAll(Matcher.quoteReplacement(millimetres(thickness)));
    return plate(plate, plate.id(), name, thickness);
  }

  /** The plate under another id, its name followed by the panel's in brackets. */
  static PlateConstruction copy(PlateConstruction plate, String id, String panelName) {
    String name = plate.name() == null ? id : plate.name();
    return plate(plate, id, name + " (" + panelName + ")", plate.thickness());
  }

  private static PlateConstruction plate(
      PlateConstruction like, String id, String name, double thickness) {
    return new PlateConstruction(
        id,
        name,
        thickness,
        like.youngsModulus(),
        like.density(),
        like.poissonRatio(),
        like.radius(),
        like.tension(),
        like.evidence(),
        like.extras());
  }

  private static String millimetres(double metres) {
    BigDecimal value = BigDecimal.valueOf(metres).movePointRight(3).stripTrailingZeros();
    return value.toPlainString() + " mm";
  }
}
