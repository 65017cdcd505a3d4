package eddyledger.present;

import eddyledger.app.Computation;
import eddyledger.app.ProjectState;
import eddyledger.app.Projects;
import eddyledger.file.ProjectReader;
import eddyledger.model.Panel;
import eddyledger.model.Section;
import eddyledger.model.Settings;
import eddyledger.model.TreeEdit;
import eddyledger.model.Vehicle;
import eddyledger.quantity.Progress;
import java.nio.file.Path;

/** The example vehicle on a desk, row 2 in cruise. */
final class ExampleDesk {
  private static final Projects PROJECTS = new Projects(new ProjectReader());
  private static final Vehicle EXAMPLE =
      PROJECTS.open(Path.of("examples", "quillon-82.eddyledger")).vehicle().orElseThrow();

  final ProjectState state = new ProjectState();
  final SheetPresenter sheet = new SheetPresenter(state);
  private final Computation computation = new Computation(PROJECTS);

  ExampleDesk() {
    this(EXAMPLE);
  }

  ExampleDesk(Vehicle vehicle) {
    state.put(vehicle, null);
    state.select(state.selection().at("cruise", "row-2"));
  }

  static Vehicle example() {
    return EXAMPLE;
  }

  ExampleDesk row(String id) {
    state.select(state.selection().on(id));
    return this;
  }

  ExampleDesk in(String condition) {
    state.select(state.selection().at(condition, "row-2"));
    return this;
  }

  ExampleDesk computed() {
    state.computed(computation.compute(state.revision(), state.vehicle(), Progress.NONE));
    return this;
  }

  SheetField field(String key) {
    return sheet.text().field(key).orElseThrow(() -> new AssertionError("no field " + key));
  }

  /** Types a text as a person does: enters the field, types letter by letter, leaves it. */
  void type(String key, String text) {
    sheet.enter(key);
    for (int end = 1; end <= text.length(); end++) {
      sheet.type(key, text.substring(0, end));
    }
    sheet.leave(key);
  }

  /** Chooses one of several. */
  void choose(String key, String id) {
    sheet.enter(key);
    sheet.type(key, id);
    sheet.leave(key);
  }

  Settings settings(String id) {
    return state.vehicle().id().equals(id)
        ? state.vehicle().settings()
        : TreeEdit.find(state.vehicle(), id).orElseThrow().node().settings();
  }

  Panel panel(String id) {
    return (Panel) TreeEdit.find(state.vehicle(), id).orElseThrow().node();
  }

  Section section(String id) {
    return (Section) TreeEdit.find(state.vehicle(), id).orElseThrow().node();
  }
}
