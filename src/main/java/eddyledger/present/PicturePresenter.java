package eddyledger.present;

import eddyledger.app.ProjectState;
import eddyledger.app.StateListener.Aspect;
import eddyledger.chart.Picture;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.model.TreePath;
import java.util.Optional;

/** Which picture of the selection is shown, and what stands over it. */
public final class PicturePresenter {
  private final ProjectState state;
  private Picture picture = Picture.STACK;
  private Runnable changed = () -> {};

  /** On a project's state. */
  public PicturePresenter(ProjectState state) {
    this.state = state;
    state.listen(
        aspect -> {
          if (aspect != Aspect.FILE) {
            changed.run();
          }
        });
  }

  /** Runs when the picture has to be drawn anew. */
  public void onChange(Runnable listener) {
    changed = listener;
  }

  /** The picture shown. */
  public Picture picture() {
    return picture;
  }

  /** Shows a picture. */
  public void choose(Picture other) {
    if (other != picture) {
      picture = other;
      changed.run();
    }
  }

  /** Shows the picture after this one, around the end. */
  public void next() {
    Picture[] all = Picture.values();
    choose(all[(picture.ordinal() + 1) % all.length]);
  }

  /** The sheet drawn; empty if there is none. */
  public Optional<ReceiverSheet> sheet() {
    return state.open() ? state.sheet() : Optional.empty();
  }

  /** Id of the row drawn: the one selected, or the total where the ledger has no such row yet. */
  public String row() {
    String id = state.selection().rowId();
    return sheet()
        .filter(sheet -> sheet.rows().stream().noneMatch(row -> row.id().equals(id)))
        .map(sheet -> sheet.total().id())
        .orElse(id);
  }

  /** The line beside the heading. */
  public String subHeading() {
    String words = sheet().map(sheet -> picture.subHeading(sheet, row())).orElse("");
    return state.stale() && !words.isEmpty() ? words + "; before the last edit" : words;
  }

  /** Why there is no picture. */
  public String absence() {
    if (state.open() && TreePath.of(state.vehicle()).isEmpty()) {
      return "No panel yet: Vehicle, Add panel (Ctrl+Shift+P) makes the first";
    }
    return state.open() && state.unusable()
        ? "No level yet: the findings say what is missing"
        : "No level yet";
  }
}
