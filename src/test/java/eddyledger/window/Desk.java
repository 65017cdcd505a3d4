package eddyledger.window;

import eddyledger.app.ComputedLedger;
import eddyledger.app.ProjectState;
import eddyledger.file.ProjectReader;
import eddyledger.ledger.Ledger;
import eddyledger.model.Vehicle;
import java.awt.Component;
import java.awt.Container;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javax.swing.JComponent;
import javax.swing.KeyStroke;
import javax.swing.SwingUtilities;

/** What tests of the window's regions share. */
final class Desk {
  private Desk() {}

  static Vehicle example() {
    try {
      Path file = Path.of("examples/quillon-82.eddyledger");
      return new ProjectReader().read(file).vehicle().orElseThrow();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** A vehicle on the desk with its result. */
  static ProjectState with(Ledger ledger) {
    ProjectState state = new ProjectState();
    state.put(ledger.vehicle(), null);
    Optional<Ledger> result = Optional.of(ledger);
    state.computed(new ComputedLedger(state.revision(), result, List.of()));
    return state;
  }

  /** Runs on the event thread, and hands on what fails there. */
  static void onEvents(Runnable work) {
    try {
      SwingUtilities.invokeAndWait(work);
      SwingUtilities.invokeAndWait(() -> {});
    } catch (InterruptedException e) {
      throw new IllegalStateException(e);
    } catch (java.lang.reflect.InvocationTargetException e) {
      if (e.getCause() instanceof Error error) {
        throw error;
      }
      throw new IllegalStateException(e.getCause());
    }
  }

  /** Gives a component a size and lays out whatever is in it, without a display. */
  static void layOut(Container component, int width, int height) {
    component.setSize(width, height);
    layOut(component);
  }

  private static void layOut(Container container) {
    container.doLayout();
    for (Component child : container.getComponents()) {
      if (child instanceof Container inner) {
        layOut(inner);
      }
    }
  }

  /** Does what a key does while the component has the focus. */
  static void press(JComponent component, String stroke) {
    KeyStroke key = KeyStroke.getKeyStroke(stroke);
    Object name = null;
    for (int when : new int[] {JComponent.WHEN_FOCUSED, 1}) {
      name = name == null ? component.getInputMap(when).get(key) : name;
    }
    SwingUtilities.notifyAction(
        component.getActionMap().get(name), key, event(component), component, 0);
  }

  private static java.awt.event.KeyEvent event(JComponent component) {
    return new java.awt.event.KeyEvent(
        component,
        java.awt.event.KeyEvent.KEY_PRESSED,
        0,
        0,
        0,
        java.awt.event.KeyEvent.CHAR_UNDEFINED);
  }
}
