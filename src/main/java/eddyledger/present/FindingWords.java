package eddyledger.present;

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
import java.util.stream.Stream;

/** What a finding says in the names the lead gave, instead of the ids of the project file. */
final class FindingWords {
  private FindingWords() {}

  /** The name of what has an id; empty if nothing has it, or it has no name. */
  static String name(Vehicle vehicle, String id) {
    return Stream.of(
            TreeEdit.find(vehicle, id).map(path -> path.node().name()).orElse(""),
            name(vehicle.zones(), id, Zone::id, Zone::name),
            name(vehicle.receivers(), id, Receiver::id, Receiver::name),
            name(vehicle.constructions(), id, Construction::id, Construction::name),
            name(vehicle.layUps(), id, LayUp::id, LayUp::name),
            name(vehicle.otherSources(), id, OtherSource::id, OtherSource::name),
            name(vehicle.targets(), id, Target::id, Target::name),
            name(vehicle.conditions(), id, OperatingCondition::id, OperatingCondition::name))
        .filter(name -> !name.isEmpty())
        .findFirst()
        .orElse("");
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
