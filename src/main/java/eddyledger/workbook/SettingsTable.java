package eddyledger.workbook;

import eddyledger.ledger.TraceStep;
import eddyledger.model.ByCondition;
import eddyledger.model.CrossSpectrumChoice;
import eddyledger.model.Evidence;
import eddyledger.model.Held;
import eddyledger.model.InheritedSettings;
import eddyledger.model.Judged;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Panel;
import eddyledger.model.Settings;
import eddyledger.model.TreePath;
import eddyledger.workbook.Grid.Field;
import eddyledger.workbook.Look.Format;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.regex.Pattern;

/**
 * Writes the models and the flow as they were set: each value once for the place that sets it, with
 * its evidence and with how many panels, counted in every condition, it holds for.
 */
final class SettingsTable {
  private static final List<Field> FIELDS =
      List.of(
          Field.text("What is set"),
          Field.wide("Value", 3),
          Field.wide("Set by", 3),
          Field.derived("Panels times conditions", Format.COUNT),
          Field.text("Kind of value"),
          Field.text("Evidence grade"),
          Field.wide("Source and confidence", 4));

  /** How a step's source says where its value is set, before it names the publication. */
  private static final Pattern WHERE_SET = Pattern.compile("^(from|set on) [^;]*; ");

  private final Grid grid;
  private final WorkbookContent content;
  private final Map<Entry, Integer> entries = new LinkedHashMap<>();
  private final Map<String, String> publications = new LinkedHashMap<>();

  /** A value as one place sets it. */
  private record Entry(
      String what, String value, String holder, Evidence evidence, String spectrum) {}

  SettingsTable(Grid grid, WorkbookContent content) {
    this.grid = grid;
    this.content = content;
  }

  void write() {
    for (TreePath path : TreePath.of(content.vehicle())) {
      if (path.node() instanceof Panel panel) {
        for (OperatingCondition condition : content.vehicle().conditions()) {
          collect(path, panel, condition.id());
        }
      }
    }
    grid.table(
        "Models and flow as they were set",
        "Best estimate, with the least and the most it may be in brackets. What no place sets has"
            + " the program's default, and says so in each panel's account.",
        FIELDS);
    entries.forEach(this::row);
  }

  private void row(Entry entry, int panels) {
    String published = publications.get(entry.spectrum());
    String source = Words.source(entry.evidence());
    if (published != null) {
      source = source + "; published: " + published;
    }
    grid.row(
        FIELDS,
        List.of(
            Answer.words(entry.what()),
            Answer.words(entry.value()),
            Answer.words(entry.holder()),
            Answer.number((double) panels),
            Answer.words(Words.kind(entry.evidence())),
            Answer.words(Words.grade(entry.evidence())),
            Answer.words(source)));
  }

  private void collect(TreePath path, Panel panel, String condition) {
    InheritedSettings settings = InheritedSettings.at(content.vehicle(), path);
    find(settings, Settings::wallPressure, condition)
        .ifPresent(
            held -> {
              String model = held.value().model();
              String range =
                  held.value().low() == null && held.value().high() == null
                      ? ""
                      : " (" + held.value().low() + " to " + held.value().high() + ")";
              publication(panel, condition, model);
              add("wall-pressure spectrum", model + range, held, held.value().evidence(), model);
            });
    find(settings, Settings::crossSpectrum, condition).ifPresent(this::cross);
    find(settings, Settings::convectionRatio, condition)
        .ifPresent(
            held -> judged("convection speed over local flow speed", "", held, held.value()));
    find(settings, Settings::localSpeed, condition)
        .ifPresent(
            held ->
                judged(
                    "local flow, " + held.value().way().key().replace('_', ' '),
                    "",
                    held,
                    held.value().value()));
    find(settings, Settings::boundaryLayer, condition)
        .ifPresent(
            held -> {
              judged("running length", "m", held, held.value().runningLength());
              judged("boundary-layer thickness", "m", held, held.value().thickness());
              judged("displacement thickness", "m", held, held.value().displacementThickness());
              judged("momentum thickness", "m", held, held.value().momentumThickness());
              judged("wall shear stress", "Pa", held, held.value().wallShear());
            });
    find(settings, Settings::lossFactor, condition)
        .ifPresent(
            held ->
                add(
                    "damping loss factor",
                    Words.table(held.value().best(), ""),
                    held,
                    held.value().evidence(),
                    ""));
  }

  private void cross(Held<CrossSpectrumChoice> held) {
    CrossSpectrumChoice cross = held.value();
    String orders =
        "orders ("
            + cross.orderAlong()
            + ","
            + cross.orderAcross()
            + "), rates fitted at ("
            + cross.fittedOrderAlong()
            + ","
            + cross.fittedOrderAcross()
            + ") and carried by "
            + cross.rule().text();
    add("cross-spectrum", orders, held, cross.evidence(), "");
    add(
        "decay rate along the flow",
        Words.judged(cross.decayAlong(), ""),
        held,
        rate(cross, cross.decayAlong()),
        "");
    add(
        "decay rate across the flow",
        Words.judged(cross.decayAcross(), ""),
        held,
        rate(cross, cross.decayAcross()),
        "");
  }

  /** A rate without evidence of its own has that of the choice it belongs to. */
  private static Evidence rate(CrossSpectrumChoice cross, Judged rate) {
    return rate.evidence().equals(Evidence.NONE) ? cross.evidence() : rate.evidence();
  }

  private static <T> Optional<Held<T>> find(
      InheritedSettings settings, Function<Settings, ByCondition<T>> setting, String condition) {
    return settings.find(setting, condition);
  }

  private void judged(String what, String unit, Held<?> held, Judged judged) {
    if (judged != null) {
      add(what, Words.judged(judged, unit), held, judged.evidence(), "");
    }
  }

  private void add(String what, String value, Held<?> held, Evidence evidence, String spectrum) {
    String holder = held.override() ? held.holder() + ", for a condition" : held.holder();
    entries.merge(new Entry(what, value, holder, evidence, spectrum), 1, Integer::sum);
  }

  /** What the account of a panel says of where its spectrum was published. */
  private void publication(Panel panel, String condition, String model) {
    if (!publications.containsKey(model)) {
      new TraceValues(content.traces().of(panel.id(), condition))
          .step("Gpp")
          .map(TraceStep::source)
          .map(source -> WHERE_SET.matcher(source).replaceFirst(""))
          .ifPresent(source -> publications.put(model, source));
    }
  }
}
