package eddyledger.app;

import eddyledger.app.StateListener.Aspect;
import eddyledger.check.Finding;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.model.Vehicle;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The project on the desk: vehicle, file, history, last result and selection. {@link #apply} is the
 * only way to change the vehicle, and it keeps the history itself, so that undo cannot be
 * forgotten. Used on one thread, the window's event thread.
 */
public final class ProjectState {
  private final List<StateListener> listeners = new ArrayList<>();
  private EditHistory history = new EditHistory();
  private Vehicle vehicle;
  private Vehicle saved;
  private Path file;
  private long revision;
  private ComputedLedger result;
  private Ledger ledger;
  private Selection selection = new Selection("", "", "");
  private boolean selected;

  /** Nothing on the desk. */
  public ProjectState() {}

  /** Adds a listener. */
  public void listen(StateListener listener) {
    listeners.add(listener);
  }

  private void tell(Aspect aspect) {
    List.copyOf(listeners).forEach(listener -> listener.changed(aspect));
  }

  /** Puts a vehicle on the desk; a null file means that it was never saved. */
  public void put(Vehicle opened, Path from) {
    vehicle = opened;
    // an example or a new vehicle has no file yet, but nothing was done to it either
    saved = opened;
    file = from;
    history = new EditHistory();
    result = null;
    ledger = null;
    selected = false;
    selection = firstSelection();
    revision++;
    tell(Aspect.PROJECT);
  }

  /** Takes the project off the desk. */
  public void clear() {
    vehicle = null;
    saved = null;
    file = null;
    history = new EditHistory();
    result = null;
    ledger = null;
    revision++;
    tell(Aspect.PROJECT);
  }

  private Selection firstSelection() {
    String condition = vehicle.conditions().isEmpty() ? "" : vehicle.conditions().get(0).id();
    String receiver = vehicle.receivers().isEmpty() ? "" : vehicle.receivers().get(0).id();
    return new Selection(condition, receiver, vehicle.id());
  }

  /** Whether a project is on the desk. */
  public boolean open() {
    return vehicle != null;
  }

  /** The vehicle as it is now; null if none is open. */
  public Vehicle vehicle() {
    return vehicle;
  }

  /** The file it was read from or last saved to. */
  public Optional<Path> file() {
    return Optional.ofNullable(file);
  }

  /** Whether there is work that is in no file. */
  public boolean unsaved() {
    return vehicle != null && vehicle != saved && !vehicle.equals(saved);
  }

  /** Counts up with every change of the vehicle. */
  public long revision() {
    return revision;
  }

  /** Changes the vehicle; a change that changes nothing leaves no trace. */
  public void apply(Edit edit) {
    Vehicle after = edit.change().apply(vehicle);
    if (after == vehicle || after.equals(vehicle)) {
      return;
    }
    history.add(edit, vehicle, after);
    become(after);
  }

  /** Ends a run of edits that merge, for instance when a field is left. */
  public void endMerging() {
    history.close();
  }

  private void become(Vehicle other) {
    vehicle = other;
    revision++;
    tell(Aspect.VEHICLE);
    tell(Aspect.FILE);
  }

  /** What undo would take back. */
  public Optional<String> undoLabel() {
    return history.undoable().map(EditHistory.Step::label);
  }

  /** What redo would do again. */
  public Optional<String> redoLabel() {
    return history.redoable().map(EditHistory.Step::label);
  }

  /** Takes the last edit back, if there is one, and selects what it was about. */
  public void undo() {
    if (history.undoable().isPresent()) {
      EditHistory.Step step = history.undo();
      become(step.before());
      show(step.subject());
    }
  }

  /** Does the edit taken back last again, if there is one, and selects what it is about. */
  public void redo() {
    if (history.redoable().isPresent()) {
      EditHistory.Step step = history.redo();
      become(step.after());
      show(step.subject());
    }
  }

  private void show(String subject) {
    if (!subject.isEmpty()) {
      select(selection.on(subject));
    }
  }

  /** Notes that the vehicle was written to a file. */
  public void savedTo(Path to, Vehicle written) {
    file = to;
    saved = written;
    tell(Aspect.FILE);
  }

  /** What is looked at. */
  public Selection selection() {
    return selection;
  }

  /** Looks at something else. */
  public void select(Selection other) {
    if (!other.equals(selection)) {
      selected = true;
      selection = other;
      tell(Aspect.SELECTION);
    }
  }

  /** Takes a result; one of an older revision is dropped. */
  public void computed(ComputedLedger computed) {
    if (computed.revision() != revision) {
      return;
    }
    result = computed;
    computed.ledger().ifPresent(fresh -> ledger = fresh);
    tell(Aspect.LEDGER);
    if (!selected && computed.ledger().isPresent() && !ledger.sheets().isEmpty()) {
      ReceiverSheet worst = ledger.worst();
      select(selection.at(worst.condition().id(), worst.receiver().id()));
    }
  }

  /** The last result, perhaps of an older revision; empty if there never was one. */
  public Optional<Ledger> ledger() {
    return Optional.ofNullable(ledger);
  }

  /** The sheet looked at, of the last result. */
  public Optional<ReceiverSheet> sheet() {
    return ledger().flatMap(l -> l.sheet(selection.conditionId(), selection.receiverId()));
  }

  /** Whether the ledger shown is not the present vehicle's. */
  public boolean stale() {
    return vehicle != null && (result == null || ledger == null || ledger.vehicle() != vehicle);
  }

  /** Whether the present vehicle was tried and cannot be computed. */
  public boolean unusable() {
    return result != null && result.revision() == revision && result.ledger().isEmpty();
  }

  /** What was found about the vehicle last computed. */
  public List<Finding> findings() {
    return result == null ? List.of() : result.findings();
  }
}
