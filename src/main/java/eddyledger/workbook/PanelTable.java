package eddyledger.workbook;

import eddyledger.model.Held;
import eddyledger.model.InheritedSettings;
import eddyledger.model.Panel;
import eddyledger.model.Settings;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import eddyledger.workbook.Grid.Field;
import eddyledger.workbook.Look.Format;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** Writes the sheet of panels: what every panel is made of and where it belongs. */
final class PanelTable {
  static final String SHEET = "panels";

  /** Row of the header. */
  static final int HEADER_ROW = 3;

  private static final double MILLIMETRES = 1000.0;

  private static final List<Field> FIELDS =
      List.of(
          Field.text("Panel"),
          Field.text("Name"),
          Field.text("Construction"),
          Field.entered("Length along the flow, mm", Format.WHOLE),
          Field.entered("Width across it, mm", Format.WHOLE),
          Field.entered("Identical pieces", Format.WHOLE),
          Field.derived("Area of all, m\u00b2", Format.THREE),
          Field.text("Evidence grade"),
          Field.wide("Lay-up, zone, supplier; source", 6));

  private final Grid grid;
  private final Vehicle vehicle;

  PanelTable(Page page, Vehicle vehicle) {
    grid = new Grid(page);
    this.vehicle = vehicle;
  }

  void write(String title) {
    grid.title(title, "What every panel is made of and where it belongs; grey as given.");
    grid.header(FIELDS);
    for (TreePath path : TreePath.of(vehicle)) {
      if (path.node() instanceof Panel panel) {
        panel(panel, InheritedSettings.at(vehicle, path));
      }
    }
  }

  private void panel(Panel panel, InheritedSettings settings) {
    Optional<Double> length = value(settings, Settings::length);
    Optional<Double> width = value(settings, Settings::width);
    boolean sized = length.isPresent() && width.isPresent();
    grid.row(
        FIELDS,
        List.of(
            Answer.text(panel.id()),
            Answer.text(panel.name()),
            Answer.text(construction(panel, settings)),
            Answer.number(length.map(it -> it * MILLIMETRES).orElse(null)),
            Answer.number(width.map(it -> it * MILLIMETRES).orElse(null)),
            Answer.number((double) panel.count()),
            sized
                ? Answer.number(panel.count() * length.get() * width.get())
                : Answer.words(Answer.NOT_ASKED),
            Answer.words(Words.grade(panel.evidence())),
            Answer.words(words(panel, settings))));
  }

  private static String construction(Panel panel, InheritedSettings settings) {
    return panel.measured() == null
        ? value(settings, Settings::construction).orElse("not set")
        : "measured level difference";
  }

  private static String words(Panel panel, InheritedSettings settings) {
    List<String> words = new ArrayList<>();
    words.add("lay-up " + value(settings, Settings::layUp).orElse(Settings.NO_LAY_UP));
    words.add("zone " + value(settings, Settings::zone).orElse("not set"));
    value(settings, Settings::supplier).ifPresent(supplier -> words.add("supplier " + supplier));
    if (panel.evidence().source() != null) {
      words.add(panel.evidence().source());
    }
    return String.join("; ", words);
  }

  private static <T> Optional<T> value(InheritedSettings settings, Function<Settings, T> setting) {
    return settings.find(setting).map(Held::value);
  }
}
