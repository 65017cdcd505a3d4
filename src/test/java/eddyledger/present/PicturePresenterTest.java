package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.ComputedLedger;
import eddyledger.app.Edit;
import eddyledger.app.NewVehicle;
import eddyledger.app.ProjectState;
import eddyledger.app.TreeEdits;
import eddyledger.chart.Picture;
import eddyledger.ledger.Ledger;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Which picture is shown, of what, and what is said where there is none. */
class PicturePresenterTest {
  private final ProjectState state = new ProjectState();
  private final PicturePresenter presenter = new PicturePresenter(state);

  private void compute() {
    state.computed(
        new ComputedLedger(state.revision(), Optional.of(Ledger.of(state.vehicle())), List.of()));
  }

  @Test
  void aVehicleWithoutPanelsSaysHowToMakeTheFirst() {
    state.put(NewVehicle.empty(), null);
    assertThat(presenter.sheet()).isEmpty();
    assertThat(presenter.absence()).contains("Add panel");
  }

  @Test
  void thePictureFollowsTheSelectionAndSaysWhenItIsOld() {
    state.put(NewVehicle.empty(), null);
    state.apply(TreeEdits.addPanel(state.vehicle(), "new-vehicle"));
    compute();
    state.select(state.selection().on("panel-1"));
    assertThat(presenter.row()).isEqualTo("panel-1");
    assertThat(presenter.subHeading()).contains("New panel").doesNotContain("before the last edit");
    state.apply(Edit.of("x", "", before -> before.edit().name("Other").build()));
    assertThat(presenter.subHeading()).endsWith("before the last edit");
  }

  @Test
  void aRowThatTheLedgerLacksYetLeavesTheTotal() {
    state.put(NewVehicle.empty(), null);
    state.apply(TreeEdits.addPanel(state.vehicle(), "new-vehicle"));
    compute();
    state.select(state.selection().on("panel-9"));
    assertThat(presenter.row()).isEqualTo("new-vehicle");
  }

  @Test
  void picturesChangeInTurn() {
    int[] drawn = {0};
    presenter.onChange(() -> drawn[0]++);
    Picture first = presenter.picture();
    presenter.next();
    assertThat(presenter.picture()).isNotEqualTo(first);
    presenter.next();
    assertThat(presenter.picture()).isEqualTo(first);
    presenter.choose(first);
    assertThat(drawn[0]).isEqualTo(2);
  }
}
