package eddyledger.window;

import eddyledger.app.FaultReport;
import eddyledger.quantity.Progress;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.function.Consumer;
import javax.swing.SwingUtilities;
import javax.swing.SwingWorker;

/**
 * Runs work beside the event thread, shows how far it is, and can be cancelled.
 *
 * @param <T> what the work gives
 */
final class Work<T> implements Progress {
  /** Something that takes a while. */
  @FunctionalInterface
  interface Task<T> {
    T run(Progress progress);
  }

  private final String words;
  private final StatusView status;
  private final Dialogs dialogs;
  private final FaultReport faults;
  private volatile boolean cancelled;

  Work(String words, StatusView status, Dialogs dialogs, FaultReport faults) {
    this.words = words;
    this.status = status;
    this.dialogs = dialogs;
    this.faults = faults;
  }

  /** Starts it; what it gives is handed over on the event thread unless it failed. */
  void start(Task<T> task, Consumer<T> then) {
    status.begin(words, () -> cancelled = true);
    new SwingWorker<T, Void>() {
      @Override
      protected T doInBackground() {
        return task.run(Work.this);
      }

      @Override
      protected void done() {
        status.end();
        try {
          then.accept(get());
        } catch (InterruptedException e) {
          Thread.currentThread().interrupt();
        } catch (ExecutionException e) {
          failed(e.getCause());
        }
      }
    }.execute();
  }

  private void failed(Throwable cause) {
    if (cause instanceof CancellationException) {
      return;
    }
    if (cause instanceof eddyledger.app.WriteFailure) {
      dialogs.complain(words + " failed", cause.getMessage());
    } else {
      dialogs.complain(
          "Fault of the program",
          words + " failed, which is a fault of the program. " + faults.write(cause));
    }
  }

  @Override
  public void done(int steps, int of) {
    SwingUtilities.invokeLater(() -> status.progress(steps, of));
  }

  @Override
  public boolean cancelled() {
    return cancelled;
  }
}
