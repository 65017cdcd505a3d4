package eddyledger.present;

import eddyledger.app.ProjectState;
import eddyledger.app.StateListener.Aspect;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Receiver;
import java.util.List;

/**
 * The target strip: one tile per receiver and condition, of which the selected one rules the desk.
 * Used on the event thread.
 */
public final class TargetStripPresenter {
  private final ProjectState state;
  private final Listeners listeners = new Listeners();
  private List<TargetTile> tiles = List.of();

  /** Shows what is in the state, and follows it. */
  public TargetStripPresenter(ProjectState state) {
    this.state = state;
    write();
    state.listen(this::changed);
  }

  /** Calls back whenever there is something new to show. */
  public void onChange(Runnable listener) {
    listeners.add(listener);
  }

  private void changed(Aspect aspect) {
    if (aspect != Aspect.FILE) {
      write();
      listeners.tell();
    }
  }

  private void write() {
    tiles = state.open() ? new TileWriter(state).tiles() : List.of();
  }

  /** The tiles, conditions first, in the order of the file. */
  public List<TargetTile> tiles() {
    return tiles;
  }

  /** What stands in place of tiles where there are none; else empty. */
  public String message() {
    if (!state.open() || !tiles.isEmpty()) {
      return "";
    }
    return "No receiver in any condition yet: a level needs a place and a condition to be at.";
  }

  /** Position of the selected tile; -1 if there is none. */
  public int selectedIndex() {
    for (int i = 0; i < tiles.size(); i++) {
      if (tiles.get(i).selected()) {
        return i;
      }
    }
    return -1;
  }

  /** Selects a tile by its position. */
  public void choose(int index) {
    if (index >= 0 && index < tiles.size()) {
      TargetTile tile = tiles.get(index);
      state.select(state.selection().at(tile.conditionId(), tile.receiverId()));
    }
  }

  /** Selects the next receiver in the same condition; after the last the first. */
  public void nextReceiver() {
    if (state.open()) {
      List<String> ids = state.vehicle().receivers().stream().map(Receiver::id).toList();
      String next = next(ids, state.selection().receiverId());
      state.select(state.selection().at(state.selection().conditionId(), next));
    }
  }

  /** Selects the next condition at the same receiver; after the last the first. */
  public void nextCondition() {
    if (state.open()) {
      List<String> ids = state.vehicle().conditions().stream().map(OperatingCondition::id).toList();
      String next = next(ids, state.selection().conditionId());
      state.select(state.selection().at(next, state.selection().receiverId()));
    }
  }

  private static String next(List<String> ids, String id) {
    return ids.isEmpty() ? id : ids.get((ids.indexOf(id) + 1) % ids.size());
  }
}
