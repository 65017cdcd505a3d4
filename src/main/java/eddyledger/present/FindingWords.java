package eddyledger.present;

import eddyledger.check.Finding;
import eddyledger.model.Construction;
import eddyledger.model.LayUp;
import eddyledger.model.OperatingCondition;
import eddyledger.model.OtherSource;
import eddyledger.model.Receiver;
import eddyledger.model.Target;
import eddyledger.model.TreeEdit;
import eddyledger.model.Vehicle;
import eddyledger.model.Zone;
import java.util.List;
import java.util.Objects;
import java.util.function.Function;

/** What a finding says in the names the lead gave, instead of the ids of the project file. */
final class FindingWords {
  private FindingWords() {}

  /** The name of what a finding is about; empty if that has none, or the place is another's. */
  static String name(Vehicle vehicle, Finding finding) {
    String id = finding.subject();
    String place = finding.place();
    String list = place.substring(0, Math.max(0, place.indexOf('[')));
    return switch (list) {
      case "zones" -> name(vehicle.zones(), id, Zone::id, Zone::name);
      case "receivers" -> name(vehicle.receivers(), id, Receiver::id, Receiver::name);
      case "constructions" ->
          name(vehicle.constructions(), id, Construction::id, Construction::name);
      case "lay_ups" -> name(vehicle.layUps(), id, LayUp::id, LayUp::name);
      case "other_sources" -> name(vehicle.otherSources(), id, OtherSource::id, OtherSource::name);
      case "targets" -> name(vehicle.targets(), id, Target::id, Target::name);
      case "conditions" ->
          name(vehicle.conditions(), id, OperatingCondition::id, OperatingCondition::name);
      default -> TreeEdit.find(vehicle, id).map(path -> path.node().name()).orElse("");
    };
  }

  private static <T> String name(
      List<T> all, String id, Function<T, String> ids, Function<T, String> names) {
    return all.stream()
        .filter(it -> id.equals(ids.apply(it)))
        .map(names)
        .filter(Objects::nonNull)
        .findFirst()
        .orElse("");
  }

  /** A sentence with numbers as they are printed and conditions by their names. */
  static String sentence(Vehicle vehicle, String text) {
    String named = text;
    for (OperatingCondition condition : vehicle.conditions()) {
      String name = Readable.brief(condition.name());
      named = named.replace("condition \"" + condition.id() + "\"", "condition " + name);
    }
    return Readable.sentence(named);
  }
}
