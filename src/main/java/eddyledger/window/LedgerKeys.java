package eddyledger.window;

import eddyledger.present.LedgerPresenter;
import java.awt.AWTKeyStroke;
import java.awt.KeyboardFocusManager;
import java.awt.event.ActionEvent;
import java.util.Set;
import java.util.function.IntConsumer;
import javax.swing.AbstractAction;
import javax.swing.JComponent;
import javax.swing.JTable;
import javax.swing.KeyStroke;

/** Keys of the ledger: up and down are the table's own. */
final class LedgerKeys {
  private final JTable table;

  private LedgerKeys(JTable table) {
    this.table = table;
  }

  /** Right opens or goes in, Left closes or goes out, Enter does either. */
  static void install(JTable table, LedgerPresenter presenter) {
    LedgerKeys keys = new LedgerKeys(table);
    keys.onRow("RIGHT", presenter::into);
    keys.onRow("LEFT", presenter::outOf);
    keys.onRow("ENTER", presenter::toggle);
    keys.always("ctrl RIGHT", presenter::openAll);
    keys.always("typed *", presenter::openAll);
    keys.always("ctrl LEFT", presenter::closeAll);
    keys.always("HOME", () -> presenter.select(0));
    keys.always("END", () -> presenter.select(table.getRowCount() - 1));
    // a table would keep the Tab key to itself
    table.setFocusTraversalKeys(
        KeyboardFocusManager.FORWARD_TRAVERSAL_KEYS, Set.of(AWTKeyStroke.getAWTKeyStroke("TAB")));
    table.setFocusTraversalKeys(
        KeyboardFocusManager.BACKWARD_TRAVERSAL_KEYS,
        Set.of(AWTKeyStroke.getAWTKeyStroke("shift TAB")));
  }

  private void onRow(String stroke, IntConsumer action) {
    always(
        stroke,
        () -> {
          int row = table.getSelectedRow();
          if (row >= 0) {
            action.accept(row);
          }
        });
  }

  private void always(String stroke, Runnable action) {
    table
        .getInputMap(JComponent.WHEN_ANCESTOR_OF_FOCUSED_COMPONENT)
        .put(KeyStroke.getKeyStroke(stroke), stroke);
    table
        .getActionMap()
        .put(
            stroke,
            new AbstractAction() {
              @Override
              public void actionPerformed(ActionEvent event) {
                action.run();
              }
            });
  }
}
