package eddyledger.window;

import eddyledger.app.Examples;
import eddyledger.app.FaultReport;
import eddyledger.app.Projects;
import eddyledger.app.RecentFiles;
import eddyledger.app.Tables;
import eddyledger.app.Workbooks;
import eddyledger.file.ProjectReader;
import eddyledger.model.Vehicle;
import eddyledger.present.LedgerColumn;
import eddyledger.present.LedgerLine;
import java.awt.AWTException;
import java.awt.Component;
import java.awt.Container;
import java.awt.Robot;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import java.util.concurrent.FutureTask;
import java.util.prefs.BackingStoreException;
import java.util.prefs.Preferences;
import javax.swing.JLabel;
import javax.swing.JTable;
import javax.swing.SwingUtilities;
import javax.swing.table.TableCellRenderer;
import javax.swing.text.JTextComponent;

/**
 * The program's own window on a vehicle, for measuring how long a key takes from its press until
 * its effect is painted. Needs a display with a window manager.
 */
public final class MeasuredWindow implements AutoCloseable {
  private static final long PATIENCE_MS = 60_000;

  private final Preferences store =
      Preferences.userRoot().node("eddyledger-bench-" + System.nanoTime());
  private final Path file = Files.createTempFile("measured", ".eddyledger");
  private final Robot robot = new Robot();
  private final Application application;
  private final JTable table;
  private final JLabel ready;
  private final EventWatch watch;
  private final String panel;
  private volatile EditProbe probe;

  /** Opens the window on a vehicle and selects a panel of it. */
  public MeasuredWindow(Vehicle vehicle, String panel) throws IOException, AWTException {
    this.panel = panel;
    System.setProperty("awt.useSystemAAFontSettings", "on");
    ProjectReader reader = new ProjectReader();
    Projects projects = new Projects(reader);
    projects.save(vehicle, file);
    Services services =
        new Services(
            projects,
            new Tables(),
            new Workbooks(),
            new RecentFiles(store.absolutePath().substring(1) + "/recent"),
            new Examples(reader),
            new FaultReport(),
            store);
    application = onEvents(() -> new Application(services, () -> {}));
    table = (JTable) find("ledger");
    ready = (JLabel) find("status.ready");
    onEvents(
        () -> {
          application.show(file);
          return null;
        });
    await("the ledger", this::settled);
    onEvents(
        () -> {
          application.select(panel);
          TableCellRenderer own = table.getColumnModel().getColumn(at()).getCellRenderer();
          table.getColumnModel().getColumn(at()).setCellRenderer(noting(own));
          return null;
        });
    await("the panel's row", () -> row() >= 0);
    watch = new EventWatch(this::dispatched);
  }

  private static int at() {
    return LedgerColumn.LEVEL.ordinal();
  }

  private void dispatched(long began, long ended, boolean nothingLeft) {
    EditProbe now = probe;
    if (now != null) {
      now.dispatched(began, ended, nothingLeft);
    }
  }

  private TableCellRenderer noting(TableCellRenderer own) {
    return (of, value, selected, focused, row, column) -> {
      EditProbe now = probe;
      if (now != null && ((LedgerLine) value).id().equals(panel) && !level.equals(level(value))) {
        now.paintsRow();
      }
      return own.getTableCellRendererComponent(of, value, selected, focused, row, column);
    };
  }

  private String level = "";

  private static String level(Object line) {
    return ((LedgerLine) line).level();
  }

  private int row() {
    for (int i = 0; i < table.getRowCount(); i++) {
      if (((LedgerLine) table.getValueAt(i, 0)).id().equals(panel)) {
        return i;
      }
    }
    return -1;
  }

  /** Puts a text into a field of the sheet, waits for its numbers, and puts the caret into it. */
  public void stand(String field, String text, int caret) {
    await(field, () -> find(field).isShowing());
    JTextComponent input = (JTextComponent) onEvents(() -> find(field));
    onEvents(
        () -> {
          input.requestFocusInWindow();
          input.setText(text);
          return null;
        });
    await("the caret", input::isFocusOwner);
    await("the numbers", this::settled);
    onEvents(
        () -> {
          input.setCaretPosition(caret);
          return null;
        });
    robot.waitForIdle();
  }

  private boolean settled() {
    return ready.getText().equals("Ready") && table.getRowCount() > 1;
  }

  /** Presses and releases a key and follows what comes of it. */
  public EditTimes press(int key) throws InterruptedException {
    int row = onEvents(this::row);
    level = onEvents(() -> level(table.getValueAt(row, 0)));
    EditProbe now =
        new EditProbe(
            () -> !ready.getText().equals("Ready"),
            () -> !level.equals(level(table.getValueAt(row, 0))));
    probe = now;
    robot.keyPress(key);
    robot.keyRelease(key);
    try {
      return now.await();
    } finally {
      probe = null;
    }
  }

  private Component find(String name) {
    return find(application.frame(), name);
  }

  private static Component find(Container in, String name) {
    return Harness.all(in).stream()
        .filter(part -> name.equals(part.getName()))
        .findFirst()
        .orElseThrow(() -> new IllegalStateException("no component " + name));
  }

  private static void await(String what, Callable<Boolean> holds) {
    long end = System.currentTimeMillis() + PATIENCE_MS;
    while (!onEvents(holds)) {
      if (System.currentTimeMillis() > end) {
        throw new IllegalStateException("waited in vain: " + what);
      }
      java.util.concurrent.locks.LockSupport.parkNanos(5_000_000L);
    }
  }

  private static <T> T onEvents(Callable<T> work) {
    FutureTask<T> task = new FutureTask<>(work);
    SwingUtilities.invokeLater(task);
    try {
      return task.get();
    } catch (InterruptedException | java.util.concurrent.ExecutionException e) {
      throw new IllegalStateException(e);
    }
  }

  @Override
  public void close() throws IOException, BackingStoreException {
    onEvents(
        () -> {
          watch.end();
          application.frame().dispose();
          return null;
        });
    store.removeNode();
    Files.delete(file);
  }
}
