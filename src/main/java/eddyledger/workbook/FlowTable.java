package eddyledger.workbook;

import eddyledger.ledger.Trace;
import eddyledger.ledger.TraceStep;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Panel;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import eddyledger.quantity.Progress;
import eddyledger.workbook.Grid.Field;
import eddyledger.workbook.Look.Format;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;

/** Writes the sheet of the flow over every panel in every condition. */
final class FlowTable {
  static final String SHEET = "flow";

  /** Row of the header. */
  static final int HEADER_ROW = 3;

  private static final double MILLIMETRES = 1000.0;

  /** A number with its unit in what a step says of a quantity it filled in. */
  private static final Pattern FILLED_IN = Pattern.compile(" \\S+ \\S+ filled in ");

  /** How the source of a step says that its value was entered. */
  private static final String GIVEN = "as given";

  /** How a note begins that tells of a default. */
  private static final String DEFAULT = "default";

  private static final List<Field> FIELDS =
      List.of(
          Field.text("Panel"),
          Field.text("Name"),
          Field.text("Condition"),
          Field.derived("Local flow speed, m/s", Format.TWO),
          Field.derived("Local Mach number", Format.THREE),
          Field.derived("Dynamic pressure, Pa", Format.WHOLE),
          Field.derived("Boundary-layer thickness, mm", Format.TWO),
          Field.derived("Displacement thickness, mm", Format.TWO),
          Field.derived("Momentum thickness, mm", Format.TWO),
          Field.derived("Wall shear stress, Pa", Format.TWO),
          Field.derived("Friction velocity, m/s", Format.THREE),
          Field.derived("Convection speed ratio", Format.THREE),
          Field.text("Status"),
          Field.text("What leaves its range; why there is no value"));

  private static final List<String> SYMBOLS =
      List.of("Ue", "Me", "q", "delta", "delta*", "theta", "tau_w", "u_tau", "Uc/Ue");

  private final Grid grid;
  private final WorkbookContent content;
  private final Set<String> rules = new LinkedHashSet<>();
  private final List<Row> rows = new ArrayList<>();

  private record Row(List<Field> fields, List<Answer> answers) {}

  FlowTable(Page page, WorkbookContent content) {
    grid = new Grid(page);
    this.content = content;
  }

  void write(String title, Progress progress) {
    Vehicle vehicle = content.vehicle();
    for (TreePath path : TreePath.of(vehicle)) {
      if (path.node() instanceof Panel panel) {
        progress.check();
        for (OperatingCondition condition : vehicle.conditions()) {
          collect(panel, condition);
        }
      }
    }
    grid.title(
        title,
        rules.isEmpty()
            ? "As the levels were computed with; grey as given."
            : "As the levels were computed with; grey as given, white derived: "
                + String.join("; ", rules)
                + ".");
    grid.header(FIELDS);
    rows.forEach(row -> grid.row(row.fields(), row.answers()));
  }

  private void collect(Panel panel, OperatingCondition condition) {
    Optional<Trace> trace = content.traces().of(panel.id(), condition.id());
    TraceValues values = new TraceValues(trace);
    List<Field> fields = new ArrayList<>(FIELDS.subList(0, 3));
    List<Answer> answers = new ArrayList<>();
    answers.add(Answer.text(panel.id()));
    answers.add(Answer.text(panel.name()));
    answers.add(Answer.text(condition.id()));
    for (String symbol : SYMBOLS) {
      boolean length = symbol.startsWith("delta") || symbol.equals("theta");
      Field field = FIELDS.get(fields.size());
      Optional<TraceStep> step = values.step(symbol);
      boolean given = step.isPresent() && step.get().source().endsWith(GIVEN);
      fields.add(given ? field.given() : field);
      answers.add(values.value(symbol, length ? MILLIMETRES : 1.0));
    }
    fields.addAll(FIELDS.subList(fields.size(), FIELDS.size()));
    answers.add(Answer.words(trace.map(it -> it.status().text()).orElse("no receiver")));
    answers.add(Answer.text(notes(trace)));
    rows.add(new Row(fields, answers));
  }

  /** What is to be said of one panel; what holds for many is kept as a rule. */
  private String notes(Optional<Trace> trace) {
    Set<String> notes = new LinkedHashSet<>();
    if (trace.isPresent()) {
      if (!trace.get().reason().isEmpty()) {
        notes.add(trace.get().reason());
      }
      for (TraceStep step : trace.get().steps()) {
        if (step.role() == TraceStep.Role.START) {
          break;
        }
        if (FILLED_IN.matcher(step.note()).find()) {
          rules.add(FILLED_IN.matcher(step.note()).replaceAll(" filled in "));
        } else if (!step.note().isEmpty()) {
          boolean defaulted = step.note().startsWith(DEFAULT);
          notes.add(defaulted ? step.meaning() + ": " + step.note() : step.note());
        }
      }
    }
    return String.join("; ", notes);
  }
}
