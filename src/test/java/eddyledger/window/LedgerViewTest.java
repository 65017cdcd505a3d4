package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.ProjectState;
import eddyledger.chart.Palette;
import eddyledger.chart.StackFill;
import eddyledger.chart.StackFill.Kind;
import eddyledger.ledger.Ledger;
import eddyledger.present.LedgerColumn;
import eddyledger.present.LedgerLine;
import eddyledger.present.LedgerPresenter;
import java.awt.Component;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.awt.event.InputEvent;
import java.awt.event.MouseEvent;
import java.awt.event.MouseListener;
import java.awt.image.BufferedImage;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import org.junit.jupiter.api.Test;

/** The table of the ledger: keys, clicks, selection, and what a screen reader is told. */
class LedgerViewTest {
  private static final Ledger LEDGER = Ledger.of(Desk.example());

  private final ProjectState state = Desk.with(LEDGER);

  private void with(Consumer<JTable> test) {
    state.select(state.selection().at("hold", "row-2").on("quillon-82"));
    Desk.onEvents(
        () -> {
          LedgerView view = new LedgerView(new LedgerPresenter(state));
          Desk.layOut(view, 1085, 300);
          test.accept((JTable) ((JScrollPane) view.getComponent(0)).getViewport().getView());
        });
  }

  private static List<String> ids(JTable table) {
    List<String> ids = new ArrayList<>();
    for (int row = 0; row < table.getRowCount(); row++) {
      ids.add(((LedgerLine) table.getValueAt(row, 0)).id());
    }
    return ids;
  }

  private static void select(JTable table, String id) {
    int row = ids(table).indexOf(id);
    table.setRowSelectionInterval(row, row);
  }

  /** Presses into the name column; the table's own listeners would need a display. */
  private static void press(JTable table, String id, int x, int count) {
    Rectangle cell = table.getCellRect(ids(table).indexOf(id), 0, true);
    MouseEvent event =
        new MouseEvent(
            table,
            MouseEvent.MOUSE_PRESSED,
            0L,
            InputEvent.BUTTON1_DOWN_MASK,
            x,
            cell.y + cell.height / 2,
            count,
            false,
            MouseEvent.BUTTON1);
    for (MouseListener listener : table.getMouseListeners()) {
      if (listener.getClass().getName().startsWith("eddyledger.")) {
        listener.mousePressed(event);
      }
    }
  }

  @Test
  void aSelectedLineIsFollowedByTheDeskAndTheOtherWayRound() {
    with(
        table -> {
          select(table, "crown-a");
          assertThat(state.selection().rowId()).isEqualTo("crown-a");
          assertThat(table.getSelectedRow()).isEqualTo(ids(table).indexOf("crown-a"));
          state.select(state.selection().on("crown-d-aft"));
          assertThat(ids(table).get(table.getSelectedRow())).isEqualTo("crown-d-aft");
        });
  }

  @Test
  void theChevronAndADoubleClickOpenAndClose() {
    with(
        table -> {
          int chevron = LedgerCells.NAME_START + 15 - 11;
          press(table, "station-b", chevron, 1);
          assertThat(ids(table)).contains("station-b-forward");
          press(table, "station-b", chevron + 30, 2);
          assertThat(ids(table)).doesNotContain("station-b-forward");
          press(table, "station-b", chevron + 30, 1);
          assertThat(ids(table)).doesNotContain("station-b-forward");
        });
  }

  @Test
  void keysWalkTheTree() {
    with(
        table -> {
          select(table, "station-c");
          Desk.press(table, "RIGHT");
          Desk.press(table, "RIGHT");
          assertThat(state.selection().rowId()).isEqualTo("crown-c");
          Desk.press(table, "DOWN");
          assertThat(state.selection().rowId()).isEqualTo("upper-side-left-c");
          Desk.press(table, "LEFT");
          assertThat(state.selection().rowId()).isEqualTo("station-c");
          Desk.press(table, "ENTER");
          assertThat(ids(table)).doesNotContain("crown-c");
          Desk.press(table, "HOME");
          assertThat(state.selection().rowId()).isEqualTo("quillon-82");
          Desk.press(table, "END");
          assertThat(state.selection().rowId()).isEqualTo("systems-row-2-hold");
          Desk.press(table, "ctrl RIGHT");
          assertThat(table.getRowCount()).isEqualTo(72);
          Desk.press(table, "ctrl LEFT");
          assertThat(table.getRowCount()).isEqualTo(7);
          Desk.press(table, "typed *");
          assertThat(table.getRowCount()).isEqualTo(72);
        });
  }

  @Test
  void aRowSelectedFromElsewhereIsScrolledTo() {
    List<JTable> kept = new ArrayList<>();
    with(
        table -> {
          kept.add(table);
          Desk.press(table, "ctrl RIGHT");
        });
    JTable table = kept.get(0);
    Desk.onEvents(
        () -> {
          Desk.layOut(table.getParent().getParent(), 1085, 300);
          assertThat(table.getVisibleRect().y).isZero();
          state.select(state.selection().on("lower-side-right-e"));
        });
    Desk.onEvents(
        () -> {
          Rectangle row = table.getCellRect(table.getSelectedRow(), 0, true);
          assertThat(table.getVisibleRect().y).isPositive();
          assertThat(table.getVisibleRect().contains(0, row.y, 1, row.height)).isTrue();
        });
  }

  @Test
  void cellsAreReadAsTheirTexts() {
    with(
        table -> {
          int row = ids(table).indexOf("crown-a");
          LedgerLine line = (LedgerLine) table.getValueAt(row, 0);
          assertThat(table.getAccessibleContext().getAccessibleName()).isEqualTo("Ledger");
          assertThat(spoken(table, row, LedgerColumn.NAME)).isEqualTo("Crown, station A");
          assertThat(spoken(table, row, LedgerColumn.LEVEL)).isEqualTo(line.level() + " dB(A)");
          assertThat(spoken(table, row, LedgerColumn.BANDS)).startsWith("highest at ");
          assertThat(spoken(table, 0, LedgerColumn.MARGIN)).startsWith("over by 0.");
          assertThat(spoken(table, row, LedgerColumn.MARGIN)).isEmpty();
        });
  }

  private static String spoken(JTable table, int row, LedgerColumn column) {
    Component cell =
        table.prepareRenderer(table.getCellRenderer(row, column.ordinal()), row, column.ordinal());
    return cell.getAccessibleContext().getAccessibleName();
  }

  @Test
  void cutTextIsInTheTooltip() {
    with(
        table -> {
          int row = ids(table).indexOf("crown-a");
          assertThat(tip(table, row, LedgerColumn.LAY_UP))
              .isEqualTo("Trim panel on 75 mm blanket, double wall");
          assertThat(tip(table, row, LedgerColumn.SUPPLIER)).isNull();
          assertThat(tip(table, row, LedgerColumn.NAME)).isEqualTo("Crown, station A");
          assertThat(tip(table, ids(table).indexOf("station-a"), LedgerColumn.NAME)).isNull();
        });
  }

  private static String tip(JTable table, int row, LedgerColumn column) {
    Rectangle cell = table.getCellRect(row, column.ordinal(), true);
    return table.getToolTipText(
        new MouseEvent(table, MouseEvent.MOUSE_MOVED, 0L, 0, cell.x + 9, cell.y + 9, 0, false));
  }

  @Test
  void theGutterCarriesTheFillOfTheRowsPart() {
    state.select(state.selection().at("hold", "row-2").on("quillon-82"));
    Desk.onEvents(
        () -> {
          LedgerPresenter presenter = new LedgerPresenter(state);
          List<LedgerLine> lines = presenter.lines();
          List<GutterMark> marks =
              new Gutter().marks(presenter.sheet(), presenter.selectedId(), lines);
          assertThat(marks).hasSameSizeAs(lines);
          assertThat(marks.get(0)).isNull();
          assertThat(marks.get(1).fill()).isEqualTo(new StackFill(Kind.SERIES, 0));
          assertThat(marks.get(1).joinedAbove()).isFalse();
          assertThat(marks.get(1).joinedBelow()).isTrue();
          assertThat(marks.get(2).fill()).isEqualTo(marks.get(1).fill());
          assertThat(marks.get(2).joinedAbove()).isTrue();
          assertThat(marks.get(lines.size() - 1).fill().kind()).isEqualTo(Kind.OTHER);
        });
  }

  @Test
  void theSelectedLineIsPaintedOnItsOwnGround() {
    with(
        table -> {
          select(table, "station-c");
          BufferedImage image = new BufferedImage(1085, 300, BufferedImage.TYPE_INT_RGB);
          Graphics2D g = image.createGraphics();
          table.paint(g);
          g.dispose();
          int y = table.getCellRect(table.getSelectedRow(), 0, true).y + 3;
          assertThat(image.getRGB(200, y) & 0xFFFFFF)
              .isEqualTo(Palette.LIGHT.selection().getRGB() & 0xFFFFFF);
          assertThat(image.getRGB(200, y + 22) & 0xFFFFFF)
              .isEqualTo(Palette.LIGHT.paper().getRGB() & 0xFFFFFF);
        });
  }
}
