package eddyledger.app;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.model.Vehicle;
import eddyledger.quantity.Progress;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.Executor;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.function.Consumer;

/**
 * Computes in the background, always the newest vehicle: a newer one cancels the run of an older
 * one. Results are handed over on the thread of the given executor, the window's event thread.
 */
public final class Background implements AutoCloseable {
  /** Told how far the run is; on the event thread. */
  @FunctionalInterface
  public interface Meter {
    /** So many of so many panels are done. */
    void done(int steps, int of);
  }

  private final Computation computation;
  private final FaultReport faults;
  private final Executor events;
  private final Consumer<ComputedLedger> deliver;
  private final Meter meter;
  private final ExecutorService worker;
  private volatile Run running;

  /**
   * Nothing running.
   *
   * @param events runs what it is given on the event thread
   * @param deliver takes results, on the event thread
   * @param meter is told of progress, on the event thread
   */
  public Background(
      Computation computation,
      FaultReport faults,
      Executor events,
      Consumer<ComputedLedger> deliver,
      Meter meter) {
    this.computation = computation;
    this.faults = faults;
    this.events = events;
    this.deliver = deliver;
    this.meter = meter;
    this.worker =
        Executors.newSingleThreadExecutor(
            task -> {
              Thread thread = new Thread(task, "computation");
              thread.setDaemon(true);
              return thread;
            });
  }

  /** Computes a vehicle; whatever runs now is cancelled. */
  public void request(long revision, Vehicle vehicle) {
    cancel();
    Run run = new Run();
    running = run;
    worker.execute(() -> compute(run, revision, vehicle));
  }

  /** Cancels the run, if there is one. */
  public void cancel() {
    Run run = running;
    if (run != null) {
      run.cancelled = true;
    }
  }

  /** Whether a run is going on that was not cancelled. */
  public boolean busy() {
    Run run = running;
    return run != null && !run.cancelled && !run.finished;
  }

  private void compute(Run run, long revision, Vehicle vehicle) {
    ComputedLedger computed;
    try {
      run.check();
      computed = computation.compute(revision, vehicle, run);
    } catch (CancellationException e) {
      return;
    } catch (RuntimeException | Error e) {
      computed = new ComputedLedger(revision, Optional.empty(), List.of(fault(e)));
    } finally {
      run.finished = true;
    }
    ComputedLedger result = computed;
    events.execute(() -> deliver.accept(result));
  }

  private Finding fault(Throwable fault) {
    return new Finding(
        Severity.FATAL,
        "internal-fault",
        "",
        "",
        "The computation failed: this is a fault of the program, not of your input.",
        faults.write(fault));
  }

  @Override
  public void close() {
    cancel();
    worker.shutdownNow();
  }

  /** One run, with what tells it to stop. */
  private final class Run implements Progress {
    private volatile boolean cancelled;
    private volatile boolean finished;

    @Override
    public void done(int steps, int of) {
      events.execute(
          () -> {
            if (!cancelled && !finished) {
              meter.done(steps, of);
            }
          });
    }

    @Override
    public boolean cancelled() {
      return cancelled;
    }
  }
}
