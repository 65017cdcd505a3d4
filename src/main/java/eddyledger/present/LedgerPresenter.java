package eddyledger.present;

import eddyledger.app.ProjectState;
import eddyledger.app.Selection;
import eddyledger.app.StateListener.Aspect;
import eddyledger.ledger.ReceiverSheet;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

/**
 * The ledger of the receiver and condition looked at: its visible lines, which of them are open,
 * and which one is selected. Rows stand in the order of the file, so nothing jumps while numbers
 * change. Used on the event thread.
 */
public final class LedgerPresenter {
  private final ProjectState state;
  private final Listeners listeners = new Listeners();
  private final OpenLines open = new OpenLines();
  private Optional<SheetOnDesk> desk = Optional.empty();
  private LedgerTree tree;
  private VehicleFacts facts;
  private List<LedgerNode> nodes = List.of();
  private List<LedgerLine> lines = List.of();
  private LedgerHeading heading;
  private LineKey selected = LineKey.all("");
  private boolean arranged;

  /** Shows what is in the state, and follows it. */
  public LedgerPresenter(ProjectState state) {
    this.state = state;
    open.reset();
    followSelection();
    rebuild();
    state.listen(this::changed);
  }

  /** Calls back whenever there is something new to show. */
  public void onChange(Runnable listener) {
    listeners.add(listener);
  }

  /** The visible lines, top to bottom; empty if nothing is open. */
  public List<LedgerLine> lines() {
    return lines;
  }

  /** What stands over the lines. */
  public LedgerHeading heading() {
    return heading;
  }

  /** The sheet the lines are of, for pictures; empty if there are no numbers yet. */
  public Optional<ReceiverSheet> sheet() {
    return desk.filter(SheetOnDesk::counted).map(SheetOnDesk::sheet);
  }

  /** Id of the row that the desk looks at. */
  public String selectedId() {
    return state.selection().rowId();
  }

  /** Position of the selected line; -1 if it is not in this ledger. */
  public int selectedIndex() {
    for (int i = 0; i < nodes.size(); i++) {
      if (nodes.get(i).key().equals(selected)) {
        return i;
      }
    }
    return -1;
  }

  private void changed(Aspect aspect) {
    switch (aspect) {
      case PROJECT -> {
        open.reset();
        arranged = false;
        followSelection();
      }
      case SELECTION -> followSelection();
      case VEHICLE, LEDGER -> {}
      case FILE -> {
        return;
      }
    }
    rebuild();
    listeners.tell();
  }

  private void followSelection() {
    String row = state.selection().rowId();
    if (!selected.id().equals(row)) {
      selected = LineKey.all(row);
    }
  }

  private void rebuild() {
    LedgerTree before = tree;
    Optional<SheetOnDesk> now = SheetOnDesk.of(state);
    boolean same = tree != null && now.isPresent() && now.get().sameAs(desk.orElse(null));
    desk = now;
    if (!same) {
      tree = desk.map(it -> new LedgerTree(it.sheet())).orElse(null);
      followNamesake(before);
      facts = desk.map(it -> VehicleFacts.of(it.vehicle(), facts)).orElse(null);
    }
    boolean opened = tree != null && (arrange() | reveal());
    heading = Headings.of(desk, tree, state);
    if (!same || opened) {
      write();
    }
  }

  private void followNamesake(LedgerTree before) {
    if (tree == null || before == null || tree.node(selected) != null) {
      return;
    }
    Namesake.of(before.node(selected), tree)
        .ifPresent(
            row -> {
              selected = LineKey.all(row.id());
              state.select(state.selection().on(row.id()));
            });
  }

  /** Before anything was opened or closed by hand, the way to the worst row is open. */
  private boolean arrange() {
    if (arranged) {
      return false;
    }
    open.open(tree.root());
    if (desk.orElseThrow().counted()) {
      arranged = true;
      new WorstLine(tree).find().ifPresent(open::show);
    }
    return true;
  }

  private boolean reveal() {
    LedgerNode node = tree.node(selected);
    return node != null && open.reveal(node);
  }

  private void write() {
    if (tree == null) {
      nodes = List.of();
      lines = List.of();
      return;
    }
    LineWriter writer = new LineWriter(tree, facts);
    nodes = open.visible(tree);
    lines = nodes.stream().map(node -> writer.line(node, open.isOpen(node))).toList();
  }

  /** Selects a line by its position. */
  public void select(int index) {
    if (index >= 0 && index < nodes.size()) {
      look(nodes.get(index));
    }
  }

  private void look(LedgerNode node) {
    selected = node.key();
    // the heading over other sources is no row of the file: the rest of the desk keeps its own
    boolean heads = selected.id().equals(LedgerLine.OTHER_SOURCES);
    Selection now = heads ? state.selection() : state.selection().on(selected.id());
    if (now.equals(state.selection())) {
      rebuild();
      listeners.tell();
    } else {
      state.select(now);
    }
  }

  /** Opens a closed line, closes an open one. */
  public void toggle(int index) {
    LedgerNode node = nodes.get(index);
    if (open.isOpen(node)) {
      open.close(node);
    } else {
      open.open(node);
    }
    reshaped();
  }

  /** Opens a closed line; of an open one selects the first line below it. */
  public void into(int index) {
    LedgerNode node = nodes.get(index);
    if (open.isOpen(node)) {
      select(index + 1);
    } else if (!node.children().isEmpty()) {
      toggle(index);
    }
  }

  /** Closes an open line; of any other selects the line above it in the tree. */
  public void outOf(int index) {
    LedgerNode node = nodes.get(index);
    if (open.isOpen(node)) {
      toggle(index);
    } else if (node.above() != null) {
      look(node.above());
    }
  }

  /** Opens everything. */
  public void openAll() {
    if (tree != null) {
      open.openAll(tree);
      reshaped();
    }
  }

  /** Closes everything below the vehicle. */
  public void closeAll() {
    if (tree != null) {
      open.closeAll(tree);
      reshaped();
    }
  }

  /** Selects the row that needs attention first, opening what is above it. */
  public void jumpToWorst() {
    if (tree != null) {
      new WorstLine(tree).find().ifPresent(this::look);
    }
  }

  /** Lines appeared or went; a selected one that went hands over to what hides it. */
  private void reshaped() {
    arranged = true;
    write();
    LedgerNode node = tree.node(selected);
    LedgerNode shown = node;
    while (shown != null && !nodes.contains(shown)) {
      shown = shown.above();
    }
    if (!Objects.equals(shown, node)) {
      look(shown);
    } else {
      listeners.tell();
    }
  }
}
