package eddyledger.window;

import eddyledger.app.ProjectState;
import eddyledger.app.RecentFile;
import eddyledger.app.TreeEdits;
import eddyledger.chart.Palette;
import eddyledger.model.Panel;
import eddyledger.model.TreeEdit;
import java.util.List;
import javax.swing.JMenu;
import javax.swing.JMenuItem;

/** What stands in the menus, and the keys. */
final class MenuContents {
  private final ProjectState state;
  private final Application application;

  MenuContents(ProjectState state, Application application) {
    this.state = state;
    this.application = application;
  }

  Menus build(FileCommands files) {
    Menus menus = new Menus();
    file(menus, files);
    edit(menus);
    vehicle(menus);
    ledger(menus);
    view(menus);
    menus.add(
        "Help",
        'H',
        Command.of("help.keys", "Keys", "F1", application::showKeys),
        Command.of("help.cautions", "Cautions", "", application::showCautions));
    return menus;
  }

  private void file(Menus menus, FileCommands files) {
    JMenu menu =
        menus.add(
            "File",
            'F',
            Command.of("file.new", "New, empty", "ctrl N", files::newEmpty),
            Command.of("file.open", "Open…", "ctrl O", files::chooseFile),
            null,
            Command.of("file.save", "Save", "ctrl S", files::save, state::open),
            Command.of("file.saveas", "Save as…", "ctrl shift S", files::saveAs, state::open),
            null,
            Command.of(
                "file.workbook",
                "Export workbook…",
                "ctrl E",
                files::exportWorkbook,
                this::computed),
            Command.of("file.csv", "Export ledger as CSV…", "", files::exportCsv, this::computed),
            null,
            Command.of("file.close", "Close", "ctrl W", files::close, state::open),
            Command.of("file.quit", "Quit", "ctrl Q", application::quit));
    menus.addChanging(menu, 2, "Open recent", recent -> recent(recent, files));
  }

  private void recent(JMenu menu, FileCommands files) {
    List<RecentFile> entries = application.recent();
    if (entries.isEmpty()) {
      JMenuItem none = new JMenuItem("No file was opened yet");
      none.setEnabled(false);
      menu.add(none);
    }
    for (RecentFile entry : entries) {
      JMenuItem item = new JMenuItem(entry.file().toString());
      item.addActionListener(event -> files.open(entry.file()));
      menu.add(item);
    }
  }

  private boolean computed() {
    return state.open() && !state.stale();
  }

  private void edit(Menus menus) {
    menus.add(
        "Edit",
        'E',
        Command.worded(
            "edit.undo",
            () -> "Undo" + state.undoLabel().map(label -> " " + label).orElse(""),
            "ctrl Z",
            state::undo,
            () -> state.undoLabel().isPresent()),
        Command.worded(
            "edit.redo",
            () -> "Redo" + state.redoLabel().map(label -> " " + label).orElse(""),
            "ctrl Y",
            state::redo,
            () -> state.redoLabel().isPresent()));
  }

  private String row() {
    return state.selection().rowId();
  }

  private boolean nodeSelected() {
    return state.open() && TreeEdit.find(state.vehicle(), row()).isPresent();
  }

  private boolean panelSelected() {
    return state.open()
        && TreeEdit.find(state.vehicle(), row())
            .filter(path -> path.node() instanceof Panel)
            .isPresent();
  }

  private void vehicle(Menus menus) {
    menus.add(
        "Vehicle",
        'V',
        Command.of(
            "vehicle.panel",
            "Add panel",
            "ctrl shift P",
            () -> application.change(TreeEdits.addPanel(state.vehicle(), row())),
            state::open),
        Command.of(
            "vehicle.section",
            "Add section",
            "ctrl shift G",
            () -> application.change(TreeEdits.addSection(state.vehicle(), row())),
            state::open),
        Command.of(
            "vehicle.duplicate",
            "Duplicate panel",
            "ctrl D",
            () -> TreeEdits.duplicate(state.vehicle(), row()).ifPresent(application::change),
            this::panelSelected),
        Command.of(
            "vehicle.remove",
            "Remove",
            "ctrl DELETE",
            () -> TreeEdits.remove(state.vehicle(), row()).ifPresent(application::change),
            this::nodeSelected));
  }

  private void ledger(Menus menus) {
    menus.add(
        "Ledger",
        'L',
        Command.of(
            "ledger.trace",
            "Trace of this panel",
            "ctrl T",
            application::showTrace,
            this::panelSelected),
        null,
        Command.of(
            "ledger.worst", "Worst margin", "ctrl J", application.desk()::worst, this::hasLedger),
        Command.of(
            "ledger.receiver",
            "Next receiver",
            "F6",
            application.desk()::nextReceiver,
            state::open),
        Command.of(
            "ledger.condition",
            "Next condition",
            "F7",
            application.desk()::nextCondition,
            state::open),
        Command.of(
            "ledger.finding",
            "Next finding",
            "F8",
            () -> application.desk().finding(1),
            state::open),
        Command.of(
            "ledger.findingback",
            "Finding before",
            "shift F8",
            () -> application.desk().finding(-1),
            state::open),
        null,
        Command.of("ledger.compute", "Compute now", "F5", application::compute, state::open),
        Command.of(
            "ledger.cancel",
            "Cancel the computation",
            "ctrl PERIOD",
            application::cancel,
            application::computing));
  }

  private boolean hasLedger() {
    return state.ledger().isPresent();
  }

  private void view(Menus menus) {
    menus.add(
        "View",
        'I',
        Command.of(
            "view.picture",
            "Other picture",
            "ctrl P",
            application.desk()::nextPicture,
            this::hasLedger),
        null,
        Command.of(
            "view.ledger", "To the ledger", "ctrl 1", application.desk()::toLedger, state::open),
        Command.of(
            "view.sheet", "To the sheet", "ctrl 2", application.desk()::toSheet, state::open),
        Command.of(
            "view.wholeledger",
            "Ledger on the whole desk, and back",
            "ctrl shift 1",
            () -> application.desk().whole(DeskView.Region.LEDGER),
            state::open),
        Command.of(
            "view.wholesheet",
            "Sheet on the whole desk, and back",
            "ctrl shift 2",
            () -> application.desk().whole(DeskView.Region.SHEET),
            state::open),
        Command.of(
            "view.wholepicture",
            "Picture on the whole desk, and back",
            "ctrl shift 3",
            () -> application.desk().whole(DeskView.Region.PICTURE),
            state::open),
        Command.of(
            "view.findings", "Findings", "ctrl 4", application.desk()::toggleFindings, state::open),
        null,
        Command.of("view.light", "Light", "", () -> application.theme(Palette.LIGHT)),
        Command.of("view.dark", "Dark", "", () -> application.theme(Palette.DARK)));
  }
}
