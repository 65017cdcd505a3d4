package eddyledger.window;

import eddyledger.app.NewVehicle;
import eddyledger.app.OpenedProject;
import eddyledger.app.ProjectState;
import eddyledger.app.SavedFile;
import eddyledger.app.WriteFailure;
import eddyledger.check.Finding;
import eddyledger.ledger.Ledger;
import eddyledger.model.Vehicle;
import java.nio.file.Path;
import java.util.stream.Collectors;

/** What the user can do with files: open, save, export, close; unsaved work is asked about. */
final class FileCommands {
  private static final String PROJECT = "eddyledger";
  private static final String PROJECT_WORDS = "Eddyledger project";

  private final ProjectState state;
  private final Services services;
  private final Dialogs dialogs;
  private final StatusView status;
  private SavedFile known;

  FileCommands(ProjectState state, Services services, Dialogs dialogs, StatusView status) {
    this.state = state;
    this.services = services;
    this.dialogs = dialogs;
    this.status = status;
  }

  /** Puts a vehicle without panels on the desk. */
  void newEmpty() {
    afterUnsaved(() -> state.put(NewVehicle.empty(), null));
  }

  /** Puts a copy of an example on the desk; it has no file until it is saved. */
  void openExample(String id) {
    afterUnsaved(
        () -> work("Opening", () -> services.examples().open(id), opened -> put(opened, null)));
  }

  /** Asks for a file and opens it. */
  void chooseFile() {
    afterUnsaved(
        () -> dialogs.open("Open a project", PROJECT_WORDS, PROJECT).ifPresent(this::read));
  }

  /** Opens a file. */
  void open(Path file) {
    afterUnsaved(() -> read(file));
  }

  private void read(Path file) {
    Path absolute = file.toAbsolutePath();
    dialogs.beginAt(absolute);
    work("Opening", () -> services.projects().open(absolute), opened -> put(opened, absolute));
  }

  private void put(OpenedProject opened, Path file) {
    if (opened.vehicle().isEmpty()) {
      dialogs.complain(
          "The file cannot be used",
          opened.findings().stream().map(Finding::text).collect(Collectors.joining("\n\n")));
      return;
    }
    known = file == null ? null : SavedFile.now(file);
    state.put(opened.vehicle().get(), file);
  }

  /** Saves to the project's own file, or asks for one. */
  void save() {
    save(() -> {});
  }

  private void save(Runnable then) {
    if (state.file().isEmpty()) {
      saveAs(then);
      return;
    }
    Path file = state.file().get();
    boolean changed = known != null && known.file().equals(file) && known.changedSince();
    if (!changed || dialogs.writeOverOthers(file)) {
      write(file, then);
    }
  }

  /** Asks for a file and saves to it. */
  void saveAs() {
    saveAs(() -> {});
  }

  private void saveAs(Runnable then) {
    String name =
        state
            .file()
            .map(file -> String.valueOf(file.getFileName()))
            .orElse(state.vehicle().id() + "." + PROJECT);
    dialogs
        .save("Save the project", PROJECT_WORDS, PROJECT, name)
        .ifPresent(file -> write(file, then));
  }

  private void write(Path file, Runnable then) {
    Vehicle snapshot = state.vehicle();
    try {
      services.projects().save(snapshot, file);
    } catch (WriteFailure e) {
      dialogs.complain("Not saved", e.getMessage());
      return;
    }
    known = SavedFile.now(file);
    state.savedTo(file, snapshot);
    then.run();
  }

  /** Asks for a file and writes the budget workbook. */
  void exportWorkbook() {
    state
        .ledger()
        .ifPresent(
            ledger ->
                dialogs
                    .save("Export the workbook", "Workbook", "xlsx", state.vehicle().id() + ".xlsx")
                    .ifPresent(file -> writeWorkbook(ledger, file)));
  }

  private void writeWorkbook(Ledger ledger, Path file) {
    var findings = state.findings();
    new Work<Path>("Writing the workbook", status, dialogs, services.faults())
        .start(
            progress -> {
              services.workbooks().write(ledger, findings, file, progress);
              return file;
            },
            written -> status.say("Written: " + written));
  }

  /** Asks for a file and writes the ledger of every receiver and condition as CSV. */
  void exportCsv() {
    state
        .ledger()
        .ifPresent(
            ledger ->
                dialogs
                    .save("Export the ledger", "CSV", "csv", state.vehicle().id() + ".csv")
                    .ifPresent(file -> writeCsv(ledger, file)));
  }

  private void writeCsv(Ledger ledger, Path file) {
    try {
      services.tables().writeLedger(ledger.sheets(), file);
      status.say("Written: " + file);
    } catch (WriteFailure e) {
      dialogs.complain("Not exported", e.getMessage());
    }
  }

  /** Takes the project off the desk. */
  void close() {
    afterUnsaved(state::clear);
  }

  /** Does something that would lose unsaved work, after the user decided about it. */
  void afterUnsaved(Runnable then) {
    if (!state.unsaved()) {
      then.run();
      return;
    }
    String name =
        state.file().map(file -> String.valueOf(file.getFileName())).orElse(state.vehicle().name());
    switch (dialogs.unsaved(name)) {
      case SAVE -> save(then);
      case DISCARD -> then.run();
      case CANCEL -> {}
    }
  }

  private <T> void work(
      String words, java.util.function.Supplier<T> task, java.util.function.Consumer<T> then) {
    new Work<T>(words, status, dialogs, services.faults()).start(progress -> task.get(), then);
  }
}
