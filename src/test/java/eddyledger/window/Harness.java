package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.Examples;
import eddyledger.app.FaultReport;
import eddyledger.app.Projects;
import eddyledger.app.RecentFiles;
import eddyledger.app.Tables;
import eddyledger.app.Workbooks;
import eddyledger.chart.Palette;
import eddyledger.file.ProjectReader;
import eddyledger.present.LedgerLine;
import java.awt.Component;
import java.awt.Container;
import java.awt.Dimension;
import java.awt.event.KeyEvent;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicReference;
import java.util.prefs.BackingStoreException;
import java.util.prefs.Preferences;
import javax.swing.JButton;
import javax.swing.JTable;
import org.assertj.swing.core.BasicRobot;
import org.assertj.swing.core.GenericTypeMatcher;
import org.assertj.swing.core.Robot;
import org.assertj.swing.data.TableCell;
import org.assertj.swing.edt.GuiActionRunner;
import org.assertj.swing.fixture.FrameFixture;
import org.assertj.swing.timing.Condition;
import org.assertj.swing.timing.Pause;
import org.assertj.swing.timing.Timeout;

/** The program's own window, driven by the keys and mouse of a robot. */
final class Harness implements AutoCloseable {
  private static final long PATIENCE_S = 30;

  private final Preferences store;
  private final Robot robot;
  private final AtomicReference<Throwable> fault = new AtomicReference<>();
  final FrameFixture window;
  private Application application;
  private volatile boolean closed;

  /** A window of a size, light, that remembers nothing of earlier ones. */
  Harness(int width, int height) {
    this(width, height, Palette.LIGHT);
  }

  Harness(int width, int height, Palette palette) {
    this(freshStore(palette));
    size(width, height);
  }

  /** A place for settings that nothing else has. */
  static Preferences freshStore(Palette palette) {
    Preferences fresh = Preferences.userRoot().node("eddyledger-test-" + System.nanoTime());
    new WindowMemory(fresh).palette(palette);
    return fresh;
  }

  /** A window as its settings say. */
  Harness(Preferences settings) {
    store = settings;
    robot = BasicRobot.robotWithNewAwtHierarchy();
    robot.settings().delayBetweenEvents(25);
    robot.settings().eventPostingDelay(70);
    robot.settings().timeoutToFindSubMenu(2000);
    Thread.setDefaultUncaughtExceptionHandler(
        (thread, thrown) -> {
          thrown.printStackTrace();
          fault.set(thrown);
        });
    ProjectReader reader = new ProjectReader();
    Services services =
        new Services(
            new Projects(reader),
            new Tables(),
            new Workbooks(),
            new RecentFiles(store.absolutePath().substring(1) + "/recent"),
            new Examples(reader),
            new FaultReport(),
            store);
    MainFrame frame =
        GuiActionRunner.execute(
            () -> {
              application = new Application(services, () -> closed = true);
              application.show(null);
              return application.frame();
            });
    window = new FrameFixture(robot, frame);
    robot.waitForIdle();
    // what has the focus within the window is the program's own choice
    until("the window has the keyboard", () -> window.target().isFocused());
  }

  private void size(int width, int height) {
    window.show(new Dimension(width, height));
    window.moveTo(new java.awt.Point(0, 0));
    until(
        "the window has its size",
        () -> {
          boolean sized = window.target().getSize().equals(new Dimension(width, height));
          if (!sized) {
            window.resizeTo(new Dimension(width, height));
          }
          return sized;
        });
    robot.waitForIdle();
    window.focus();
    until("the window has the keyboard", () -> window.target().isFocused());
  }

  Robot robot() {
    return robot;
  }

  Application application() {
    return application;
  }

  boolean closed() {
    return closed;
  }

  /** Presses a key while holding others, for instance Z while holding Ctrl. */
  void press(int key, int... held) {
    for (int hold : held) {
      robot.pressKey(hold);
    }
    robot.pressAndReleaseKey(key);
    for (int hold : held) {
      robot.releaseKey(hold);
    }
    robot.waitForIdle();
  }

  /** Waits until the numbers shown are those of the vehicle as it is. */
  void ready() {
    until("the ledger is computed", () -> window.label("status.ready").text().equals("Ready"));
    robot.waitForIdle();
  }

  /** Waits until something holds. */
  void until(String what, java.util.concurrent.Callable<Boolean> holds) {
    Pause.pause(
        new Condition(what) {
          @Override
          public boolean test() {
            Throwable thrown = fault.get();
            if (thrown != null) {
              throw new AssertionError("a fault of the program", thrown);
            }
            try {
              return holds.call();
            } catch (Exception e) {
              throw new AssertionError(what, e);
            }
          }
        },
        Timeout.timeout(PATIENCE_S, TimeUnit.SECONDS));
  }

  /** Opens a file by the menu key and the dialog. */
  void openByDialog(Path file) {
    press(KeyEvent.VK_O, KeyEvent.VK_CONTROL);
    until("the dialog is open", this::dialogOpen);
    type(file);
    until(
        "the desk shows", () -> window.target().getTitle().contains(file.getFileName().toString()));
    ready();
    openAllRows();
  }

  private boolean dialogOpen() {
    return GuiActionRunner.execute(
        () ->
            java.util.Arrays.stream(window.target().getOwnedWindows())
                .anyMatch(Component::isShowing));
  }

  /** Types a path into the file dialog that is open, and takes it. */
  void type(Path file) {
    var chooser = window.fileChooser("file-chooser");
    chooser.fileNameTextBox().setText(file.toAbsolutePath().toString());
    chooser.approve();
    robot.waitForIdle();
  }

  /** Accessible name of the component of a name. */
  String spoken(String name) {
    return GuiActionRunner.execute(
        () -> {
          Component found =
              all(window.target()).stream()
                  .filter(c -> name.equals(c.getName()))
                  .findFirst()
                  .orElseThrow(() -> new AssertionError("no component " + name));
          return found.getAccessibleContext().getAccessibleName();
        });
  }

  /** Every component within a container, itself included. */
  static List<Component> all(Container container) {
    List<Component> found = new ArrayList<>();
    found.add(container);
    for (Component child : container.getComponents()) {
      if (child instanceof Container inner) {
        found.addAll(all(inner));
      } else {
        found.add(child);
      }
    }
    return found;
  }

  /** Selects a row as a click on it would. */
  void select(String rowId) {
    GuiActionRunner.execute(() -> application.select(rowId));
    robot.waitForIdle();
  }

  /** The text of every visible row of the ledger, cell after cell. */
  List<String> rows() {
    JTable table = window.table("ledger").target();
    return GuiActionRunner.execute(
        () -> {
          List<String> rows = new ArrayList<>();
          for (int row = 0; row < table.getRowCount(); row++) {
            List<String> cells = new ArrayList<>();
            for (int column = 0; column < table.getColumnCount(); column++) {
              Component cell =
                  table.prepareRenderer(table.getCellRenderer(row, column), row, column);
              cells.add(String.valueOf(cell.getAccessibleContext().getAccessibleName()));
            }
            rows.add(String.join(" | ", cells));
          }
          return rows;
        });
  }

  /** The text of the row of a panel, section or other source, by its id. */
  String row(String id) {
    return rows().get(position(id));
  }

  /** The band levels that a row's strip shows. */
  String strip(String id) {
    return line(id).strip().toString();
  }

  private LedgerLine line(String id) {
    JTable table = window.table("ledger").target();
    int position = position(id);
    return GuiActionRunner.execute(() -> (LedgerLine) table.getValueAt(position, 0));
  }

  private int position(String id) {
    JTable table = window.table("ledger").target();
    return GuiActionRunner.execute(
        () -> {
          for (int row = 0; row < table.getRowCount(); row++) {
            if (((LedgerLine) table.getValueAt(row, 0)).id().equals(id)) {
              return row;
            }
          }
          throw new AssertionError("the ledger shows no row " + id);
        });
  }

  /** Whether a component of a name is on the screen. */
  boolean shows(String name) {
    return GuiActionRunner.execute(
        () ->
            all(window.target()).stream().anyMatch(c -> name.equals(c.getName()) && c.isShowing()));
  }

  /** Waits until a component of a name is on the screen. */
  void untilShown(String name) {
    until(name + " shows", () -> shows(name));
  }

  /** Waits until no component of a name is on the screen. */
  void untilHidden(String name) {
    until(name + " is gone", () -> !shows(name));
  }

  /** Opens every section of the ledger, by its key. */
  void openAllRows() {
    window.table("ledger").focus();
    press(KeyEvent.VK_RIGHT, KeyEvent.VK_CONTROL);
  }

  /** Clicks a row of the ledger, on its name. */
  void clickRow(String id) {
    window.table("ledger").cell(TableCell.row(position(id)).column(0)).click();
    robot.waitForIdle();
  }

  /** Clicks a tile of the target strip. */
  void clickTile(String name) {
    robot.click(robot.finder().findByName(window.target(), name, TargetTileView.class, true));
    robot.waitForIdle();
  }

  /** What the selected tile of the target strip says. */
  String selectedTile() {
    return GuiActionRunner.execute(
        () ->
            all(window.target()).stream()
                .filter(TargetTileView.class::isInstance)
                .map(TargetTileView.class::cast)
                .filter(tile -> tile.tile().selected())
                .map(tile -> tile.getAccessibleContext().getAccessibleName())
                .findFirst()
                .orElseThrow());
  }

  /** The words of a menu entry after its menu was opened and closed again. */
  String menuText(String menu, String entry) {
    window.menuItem(menu).click();
    String text = window.menuItem(entry).target().getText();
    press(KeyEvent.VK_ESCAPE);
    return text;
  }

  /** Finds a button by its words. */
  GenericTypeMatcher<JButton> labelled(String words) {
    return new GenericTypeMatcher<>(JButton.class, true) {
      @Override
      protected boolean isMatching(JButton button) {
        return words.equals(button.getText());
      }
    };
  }

  /** Waits until everything is painted and the pointer rests where it disturbs nothing. */
  void settle() {
    java.awt.Point corner = window.target().getLocationOnScreen();
    robot.moveMouse(corner.x + 300, corner.y + 8);
    robot.waitForIdle();
    Pause.pause(400, TimeUnit.MILLISECONDS);
    robot.waitForIdle();
  }

  /** A copy of the example in a folder. */
  static Path example(Path folder) throws java.io.IOException {
    return Files.copy(
        Path.of("examples", "quillon-82.eddyledger"), folder.resolve("quillon-82.eddyledger"));
  }

  /** Ends the robot's work with a window that was closed by its user; settings are kept. */
  void leave() {
    window.cleanUp();
    Thread.setDefaultUncaughtExceptionHandler(null);
    assertThat(fault.get()).as("faults of the program").isNull();
  }

  @Override
  public void close() {
    window.cleanUp();
    Thread.setDefaultUncaughtExceptionHandler(null);
    try {
      store.removeNode();
    } catch (BackingStoreException e) {
      throw new AssertionError(e);
    }
    assertThat(fault.get()).as("faults of the program").isNull();
  }
}
