package eddyledger.workbook;

import eddyledger.model.AirGiven;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Panel;
import eddyledger.model.TreePath;
import eddyledger.workbook.Grid.Field;
import eddyledger.workbook.Look.Format;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Writes the operating conditions. */
final class ConditionTable {
  private static final List<Field> FIELDS =
      List.of(
          Field.text("Condition"),
          Field.text("Name"),
          Field.text("Outside air, as given"),
          Field.derived("Speed, m/s", Format.TWO),
          Field.derived("Mach number", Format.THREE),
          Field.derived("Outside temperature, K", Format.TWO),
          Field.derived("Outside pressure, Pa", Format.WHOLE),
          Field.derived("Outside density, kg/m\u00b3", Format.THREE),
          Field.entered("Cabin temperature, K", Format.TWO),
          Field.entered("Cabin pressure, Pa", Format.WHOLE),
          Field.entered("Yaw, \u00b0", Format.TWO),
          Field.entered("Incidence, \u00b0", Format.TWO),
          Field.text("Occupied"),
          Field.text("What was given"));

  private final Grid grid;
  private final WorkbookContent content;

  ConditionTable(Grid grid, WorkbookContent content) {
    this.grid = grid;
    this.content = content;
  }

  void write() {
    grid.table("Operating conditions", "", FIELDS);
    content.vehicle().conditions().forEach(this::condition);
  }

  private void condition(OperatingCondition condition) {
    TraceValues values = values(condition);
    AirGiven cabin = condition.cabinAir();
    boolean byState = cabin != null && cabin.altitude() == null;
    grid.row(
        FIELDS,
        List.of(
            Answer.text(condition.id()),
            Answer.text(condition.name()),
            Answer.text(air(condition.outsideAir())),
            values.value("U", 1.0),
            values.value("M", 1.0),
            values.value("T", 1.0),
            values.value("p", 1.0),
            values.value("rho", 1.0),
            Answer.number(byState ? cabin.temperature() : null),
            Answer.number(byState ? cabin.pressure() : null),
            Answer.number(condition.yaw()),
            Answer.number(condition.incidence()),
            Answer.text(occupied(condition)),
            Answer.text(given(condition))));
  }

  /** The account of the first panel that has a value there. */
  private TraceValues values(OperatingCondition condition) {
    for (TreePath path : TreePath.of(content.vehicle())) {
      if (path.node() instanceof Panel panel) {
        TraceValues values = new TraceValues(content.traces().of(panel.id(), condition.id()));
        if (values.known()) {
          return values;
        }
      }
    }
    return new TraceValues(Optional.empty());
  }

  private static String occupied(OperatingCondition condition) {
    if (condition.occupied() == null) {
      return "not stated";
    }
    return condition.occupied() ? "yes" : "no";
  }

  private static String air(AirGiven air) {
    if (air == null) {
      return "not given";
    }
    if (air.altitude() == null) {
      return "temperature and pressure";
    }
    String altitude = "pressure altitude " + Words.number(air.altitude(), "m");
    return air.temperatureOffset() == null
        ? altitude
        : altitude + ", standard day " + Words.number(air.temperatureOffset(), "K");
  }

  private static String given(OperatingCondition condition) {
    List<String> words = new ArrayList<>();
    if (condition.mach() != null) {
      words.add("Mach number " + Words.number(condition.mach(), ""));
    }
    if (condition.speed() != null) {
      words.add("speed " + Words.number(condition.speed(), "m/s"));
    }
    AirGiven cabin = condition.cabinAir();
    if (cabin == null) {
      words.add("cabin air not given: 20 \u00b0C at the outside pressure");
    } else if (cabin.altitude() != null) {
      words.add("cabin air of " + air(cabin));
    }
    if (condition.skinTemperature() != null) {
      words.add("skins at " + Words.number(condition.skinTemperature(), "K"));
    }
    if (condition.interlayerTemperature() != null) {
      words.add("interlayers at " + Words.number(condition.interlayerTemperature(), "K"));
    }
    return String.join("; ", words);
  }
}
