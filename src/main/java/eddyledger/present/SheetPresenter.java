package eddyledger.present;

import eddyledger.app.Edit;
import eddyledger.app.ProjectState;
import eddyledger.app.Selection;
import eddyledger.app.StateListener.Aspect;
import eddyledger.check.Finding;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.Trace;
import eddyledger.model.Vehicle;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.UnaryOperator;

/**
 * The sheet: the form of the selected row. It turns the project's state into {@link SheetText}, and
 * what is typed and chosen into edits or messages. Used on one thread.
 *
 * <p>While a field has the focus its edits count as one step of undo; what was typed but cannot be
 * taken stays in the field with a message, and the vehicle keeps the last value that could; when
 * the field is left so, it holds again what it held before.
 */
public final class SheetPresenter {
  private final ProjectState state;
  private final List<Runnable> listeners = new ArrayList<>();
  private final Map<String, Unit> units = new HashMap<>();
  private final SheetStay stay = new SheetStay();
  private boolean allPanels;
  private Selection looked = new Selection("", "", "");

  /** Over a project's state. */
  public SheetPresenter(ProjectState state) {
    this.state = state;
    state.listen(this::changed);
  }

  /** Learns of every change of the text. */
  public void listen(Runnable listener) {
    listeners.add(listener);
  }

  private void changed(Aspect aspect) {
    if (aspect == Aspect.FILE) {
      return;
    }
    Selection now = state.open() ? state.selection() : new Selection("", "", "");
    boolean otherRow = aspect == Aspect.PROJECT || !now.rowId().equals(looked.rowId());
    boolean otherVehicle = aspect == Aspect.VEHICLE && !stay.editing();
    if (otherRow) {
      allPanels = false;
    }
    if (otherRow || otherVehicle || !now.equals(looked)) {
      // what was being typed is out of date: an undo, an edit from elsewhere, another row
      stay.forget();
      units.remove(SpeedEntry.KEY);
    }
    looked = now;
    if (!stay.editing()) {
      // whoever edits from here tells once, when all is done
      tell();
    }
  }

  private void tell() {
    List.copyOf(listeners).forEach(Runnable::run);
  }

  private SheetContext context() {
    Optional<Trace> trace =
        state
            .ledger()
            .flatMap(
                (Ledger ledger) ->
                    ledger.trace(
                        state.selection().rowId(),
                        state.selection().conditionId(),
                        state.selection().receiverId()));
    String late = state.unusable() ? "not computed" : "computing";
    String pending = state.stale() ? late : "";
    return new SheetContext(
        state.vehicle(), state.selection(), state.sheet(), trace, pending, units, allPanels);
  }

  /** The sheet as it stands now. */
  public SheetText text() {
    return state.open()
        ? new SheetTexts(context(), state.findings(), stay).text()
        : SheetText.EMPTY;
  }

  private Optional<Entry> entry(String key) {
    if (!state.open()) {
      return Optional.empty();
    }
    return SheetEntries.of(context()).stream()
        .flatMap(group -> group.entries().stream())
        .filter(entry -> entry.key().equals(key))
        .findFirst();
  }

  /** The field on the present sheet that a finding is about; empty if none is. */
  public Optional<String> fieldOf(Finding finding) {
    if (!state.open()) {
      return Optional.empty();
    }
    SheetContext context = context();
    String condition = context.selection().conditionId();
    return SheetEntries.of(context).stream()
        .flatMap(group -> group.entries().stream())
        .filter(entry -> FindingPlaces.meets(finding, entry.places(context), condition))
        .map(Entry::key)
        .findFirst();
  }

  /** A field was entered: what is done there until it is left is one step of undo. */
  public void enter(String key) {
    if (state.open()) {
      stay.begin(key, state.vehicle());
    }
  }

  /** Something was typed or chosen in a field; a field not entered yet is entered. */
  public void type(String key, String text) {
    Optional<Entry> entry = entry(key);
    if (entry.isEmpty()) {
      return;
    }
    stay.ensure(key, state.vehicle());
    if (text.isBlank()) {
      // perhaps on the way to another number: what an empty field means is decided when it is left
      stay.note(text, "");
    } else {
      take(entry.get(), text);
    }
    tell();
  }

  private void take(Entry entry, String text) {
    Outcome outcome = entry.take(context(), text);
    stay.note(text, outcome instanceof Outcome.Refusal refusal ? refusal.words() : "");
    if (outcome instanceof Outcome.Change change) {
      apply(entry, stay.mergeKey(state.selection().rowId()), change.change());
      Unit shown = units.get(entry.key());
      if (shown != null && !entry.fits(context(), shown)) {
        units.remove(entry.key());
      }
    }
  }

  private void apply(Entry entry, String mergeKey, UnaryOperator<Vehicle> change) {
    String id = state.selection().rowId();
    String label = entry.what() + " of " + SheetRow.name(state.vehicle(), id);
    stay.during(() -> state.apply(new Edit(label, mergeKey, id, change)));
  }

  /** What was typed stands and is a step of its own: Enter. */
  public void commit(String key) {
    if (stay.in(key)) {
      leave(key);
      enter(key);
    }
  }

  /** A field was left. */
  public void leave(String key) {
    if (stay.in(key)) {
      if (stay.typed(key).filter(String::isBlank).isPresent()) {
        entry(key).ifPresent(entry -> take(entry, ""));
      }
      if (stay.refusal(key).isPresent()) {
        // the beginning of what could not be taken is not what was meant
        restore(key);
      }
      stay.forget();
      state.endMerging();
      tell();
    }
  }

  /** Takes back all that was done in a field since it was entered. */
  public void escape(String key) {
    if (stay.in(key) && state.open()) {
      restore(key);
      stay.begin(key, state.vehicle());
      tell();
    }
  }

  private void restore(String key) {
    Vehicle before = stay.before();
    String mergeKey = stay.mergeKey(state.selection().rowId());
    entry(key).ifPresent(entry -> apply(entry, mergeKey, vehicle -> before));
  }

  /** Gives a field's own value back. */
  public void back(String key) {
    once(key, entry -> entry.back(context()).map(Outcome.Change::new));
  }

  /** Makes a field's value special for the condition, or no longer. */
  public void only(String key) {
    once(key, entry -> entry.only(context()).map(Outcome.Change::new));
  }

  /** Does what the small switch under a field says. */
  public void link(String key) {
    if (key.equals("thickness")) {
      allPanels = !allPanels;
      stay.forget();
      tell();
    } else {
      once(key, entry -> Optional.of(entry.link(context())));
    }
  }

  /** Shows a field in another unit, or gives it in another way. */
  public void unit(String key, String symbol) {
    for (Unit unit : Unit.values()) {
      if (unit.symbol().equals(symbol)) {
        once(key, entry -> Optional.of(entry.unit(context(), unit)));
        units.put(key, unit);
      }
    }
    tell();
  }

  private void once(String key, Function<Entry, Optional<? extends Outcome>> what) {
    stay.forget();
    state.endMerging();
    entry(key)
        .ifPresent(
            entry ->
                what.apply(entry)
                    .filter(Outcome.Change.class::isInstance)
                    .map(Outcome.Change.class::cast)
                    .ifPresent(change -> apply(entry, "", change.change())));
    tell();
  }
}
