package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.ProjectState;
import eddyledger.ledger.Ledger;
import eddyledger.present.LedgerColumn;
import eddyledger.present.LedgerPresenter;
import java.util.Arrays;
import javax.swing.JTable;
import javax.swing.table.TableColumn;
import org.junit.jupiter.api.Test;

/** How the ledger's width is shared among its columns. */
class LedgerWidthsTest {
  private static final Ledger LEDGER = Ledger.of(Desk.example());

  private final ProjectState state = Desk.with(LEDGER);

  private int[] widths(int width) {
    LedgerPresenter presenter = new LedgerPresenter(state);
    JTable table = new JTable(new LedgerTableModel());
    LedgerWidths widths = new LedgerWidths(table);
    widths.show(presenter.heading(), presenter.lines());
    widths.fit(width);
    int[] preferred = new int[table.getColumnCount()];
    for (int i = 0; i < preferred.length; i++) {
      TableColumn column = table.getColumnModel().getColumn(i);
      preferred[i] = column.getPreferredWidth();
    }
    return preferred;
  }

  @Test
  void everyPixelHasItsColumn() {
    for (int width : new int[] {960, 1012, 1075, 1483, 1900}) {
      assertThat(Arrays.stream(widths(width)).sum()).as("at %d", width).isEqualTo(width);
    }
  }

  @Test
  void whereThereIsTooLittleRoomEveryColumnKeepsItsLeast() {
    int[] widths = widths(700);
    for (LedgerColumn column : LedgerColumn.values()) {
      assertThat(widths[column.ordinal()]).as(column.title()).isEqualTo(LedgerCells.least(column));
    }
  }

  @Test
  void aNameIsNeverFarFromItsNumbers() {
    assertThat(widths(1900)[LedgerColumn.NAME.ordinal()]).isEqualTo(380);
  }

  @Test
  void noRowIsCutAtTheLowerEdge() {
    assertThat(LedgerView.wholeRows(358)).isEqualTo(28 + 15 * 22);
    assertThat(LedgerView.wholeRows(379)).isEqualTo(28 + 15 * 22);
    assertThat(LedgerView.wholeRows(380)).isEqualTo(28 + 16 * 22);
    assertThat(LedgerView.wholeRows(0)).isEqualTo(28);
  }
}
