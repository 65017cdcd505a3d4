package eddyledger.app;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.StateListener.Aspect;
import eddyledger.ledger.Ledger;
import eddyledger.model.Vehicle;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** Edits, undo and redo, merging, results of the past, unsaved work. */
class ProjectStateTest {
  private final ProjectState state = new ProjectState();
  private final List<Aspect> told = new ArrayList<>();

  @BeforeEach
  void open() {
    state.put(NewVehicle.empty(), null);
    state.listen(told::add);
  }

  private static Edit rename(String name, String mergeKey) {
    return new Edit(
        "name " + name, mergeKey, "new-vehicle", before -> before.edit().name(name).build());
  }

  private String name() {
    return state.vehicle().name();
  }

  @Test
  void anEditIsUndoneAndRedoneByName() {
    state.apply(rename("One", ""));
    state.apply(rename("Two", ""));
    assertThat(state.undoLabel()).contains("name Two");
    state.undo();
    assertThat(name()).isEqualTo("One");
    assertThat(state.undoLabel()).contains("name One");
    assertThat(state.redoLabel()).contains("name Two");
    state.redo();
    assertThat(name()).isEqualTo("Two");
    assertThat(state.redoLabel()).isEmpty();
  }

  @Test
  void undoGoesBackAsFarAsTheDayWent() {
    for (int i = 0; i < 2000; i++) {
      state.apply(rename("Name " + i, ""));
    }
    for (int i = 0; i < 2000; i++) {
      state.undo();
    }
    assertThat(name()).isEqualTo("New vehicle");
    assertThat(state.undoLabel()).isEmpty();
    state.undo();
    assertThat(name()).isEqualTo("New vehicle");
  }

  @Test
  void anEditAfterUndoForgetsWhatWasUndone() {
    state.apply(rename("One", ""));
    state.undo();
    state.apply(rename("Other", ""));
    assertThat(state.redoLabel()).isEmpty();
  }

  @Test
  void editsOfOneKeyAreOneStepUntilMergingEnds() {
    state.apply(rename("1", "field"));
    state.apply(rename("12", "field"));
    state.endMerging();
    state.apply(rename("123", "field"));
    state.undo();
    assertThat(name()).isEqualTo("12");
    state.undo();
    assertThat(name()).isEqualTo("New vehicle");
  }

  @Test
  void typingBackToTheOldTextLeavesNoStep() {
    state.apply(rename("1", "field"));
    state.apply(rename("New vehicle", "field"));
    assertThat(state.undoLabel()).isEmpty();
    assertThat(state.unsaved()).isFalse();
  }

  @Test
  void aChangeThatChangesNothingIsNoChange() {
    long before = state.revision();
    state.apply(rename("New vehicle", ""));
    assertThat(state.revision()).isEqualTo(before);
    assertThat(state.undoLabel()).isEmpty();
    assertThat(told).isEmpty();
  }

  @Test
  void undoSelectsWhatTheEditWasAbout() {
    state.apply(TreeEdits.addPanel(state.vehicle(), "new-vehicle"));
    state.apply(TreeEdits.addSection(state.vehicle(), "new-vehicle"));
    state.select(state.selection().on("new-vehicle"));
    state.undo();
    state.undo();
    assertThat(state.selection().rowId()).isEqualTo("panel-1");
  }

  @Test
  void unsavedWorkIsWorkThatTheFileLacks() {
    assertThat(state.unsaved()).isFalse();
    state.apply(rename("One", ""));
    assertThat(state.unsaved()).isTrue();
    state.savedTo(Path.of("one.eddyledger"), state.vehicle());
    assertThat(state.unsaved()).isFalse();
    assertThat(state.file()).contains(Path.of("one.eddyledger"));
    state.undo();
    assertThat(state.unsaved()).isTrue();
    state.redo();
    assertThat(state.unsaved()).isFalse();
  }

  @Test
  void workDoneWhileSavingIsStillUnsaved() {
    state.apply(rename("One", ""));
    Vehicle written = state.vehicle();
    state.apply(rename("Two", ""));
    state.savedTo(Path.of("one.eddyledger"), written);
    assertThat(state.unsaved()).isTrue();
  }

  @Test
  void aResultOfAnOlderRevisionIsDroppedAndTheOldOneStays() {
    state.apply(TreeEdits.addPanel(state.vehicle(), "new-vehicle"));
    ComputedLedger first = computed();
    state.computed(first);
    assertThat(state.stale()).isFalse();
    state.apply(rename("One", ""));
    assertThat(state.stale()).isTrue();
    assertThat(state.ledger()).containsSame(first.ledger().orElseThrow());
    ComputedLedger late = computed();
    state.apply(rename("Two", ""));
    state.computed(late);
    assertThat(state.ledger()).containsSame(first.ledger().orElseThrow());
    assertThat(state.stale()).isTrue();
  }

  private ComputedLedger computed() {
    return new ComputedLedger(state.revision(), Optional.of(Ledger.of(state.vehicle())), List.of());
  }

  @Test
  void aVehicleThatCannotBeComputedLeavesTheOldNumbersAndSaysSo() {
    state.apply(TreeEdits.addPanel(state.vehicle(), "new-vehicle"));
    state.computed(computed());
    state.apply(Edit.of("x", "", before -> before.edit().conditions(List.of()).build()));
    state.computed(new ComputedLedger(state.revision(), Optional.empty(), List.of()));
    assertThat(state.unusable()).isTrue();
    assertThat(state.stale()).isTrue();
    assertThat(state.ledger()).isPresent();
    state.undo();
    assertThat(state.unusable()).isFalse();
  }

  @Test
  void everyChangeIsTold() {
    state.apply(rename("One", ""));
    assertThat(told).containsExactly(Aspect.VEHICLE, Aspect.FILE);
    told.clear();
    state.select(state.selection().on("other"));
    state.select(state.selection().on("other"));
    assertThat(told).containsExactly(Aspect.SELECTION);
  }
}
