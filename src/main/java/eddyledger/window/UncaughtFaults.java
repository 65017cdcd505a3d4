package eddyledger.window;

import eddyledger.app.FaultReport;
import java.util.concurrent.atomic.AtomicBoolean;
import javax.swing.JOptionPane;
import javax.swing.SwingUtilities;

/** Tells the user of a fault of the program that nothing else caught; the project stays open. */
final class UncaughtFaults implements Thread.UncaughtExceptionHandler {
  private final FaultReport reports;
  private final AtomicBoolean telling = new AtomicBoolean();

  UncaughtFaults(FaultReport reports) {
    this.reports = reports;
  }

  @Override
  public void uncaughtException(Thread thread, Throwable fault) {
    String where = reports.write(fault);
    // one dialog at a time: a fault in painting would otherwise bury the screen
    if (telling.compareAndSet(false, true)) {
      SwingUtilities.invokeLater(
          () -> {
            JOptionPane.showMessageDialog(
                null,
                Wrapped.text(
                    "Something went wrong inside the program. Your work is still here: save it. "
                        + where),
                "Fault of the program",
                JOptionPane.ERROR_MESSAGE);
            telling.set(false);
          });
    }
  }
}
