package eddyledger.ledger;

import eddyledger.ledger.ResolvedPanel.Failure;
import eddyledger.quantity.Progress;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicInteger;

/**
 * Computes panels in parallel. Each input is computed by itself, so the results do not depend on
 * the number of threads or on their order.
 */
final class PanelPool {
  private final LedgerOptions options;

  PanelPool(LedgerOptions options) {
    this.options = options;
  }

  /**
   * The outcome for every input; those known from the last run are not computed again.
   *
   * @throws CancellationException if the progress was cancelled
   */
  Map<PanelInput, PanelOutcome> compute(Collection<PanelInput> inputs) {
    Map<PanelInput, PanelOutcome> outcomes = new HashMap<>();
    List<PanelInput> open = new ArrayList<>();
    for (PanelInput input : inputs) {
      PanelResult known = options.cache().known(input);
      if (known != null) {
        outcomes.put(input, PanelOutcome.of(known));
      } else {
        open.add(input);
      }
    }
    if (!open.isEmpty()) {
      computeOpen(open, outcomes);
    }
    Map<PanelInput, PanelResult> used = new HashMap<>();
    outcomes.forEach(
        (input, outcome) -> {
          if (outcome.result() != null) {
            used.put(input, outcome.result());
          }
        });
    options.cache().keep(used);
    return outcomes;
  }

  private void computeOpen(List<PanelInput> open, Map<PanelInput, PanelOutcome> outcomes) {
    PanelPhysics physics =
        new PanelPhysics(options.cache().radiation(), cancelOnly(options.progress()));
    AtomicInteger done = new AtomicInteger();
    ExecutorService pool = Executors.newFixedThreadPool(Math.min(options.threads(), open.size()));
    try {
      List<Future<PanelOutcome>> futures = new ArrayList<>();
      for (PanelInput input : open) {
        futures.add(
            pool.submit(
                () -> {
                  options.progress().check();
                  PanelOutcome outcome = outcome(physics, input);
                  options.progress().done(done.incrementAndGet(), open.size());
                  return outcome;
                }));
      }
      for (int i = 0; i < open.size(); i++) {
        outcomes.put(open.get(i), get(futures.get(i)));
      }
    } finally {
      pool.shutdownNow();
    }
  }

  /** Bands of single panels are too small a step to be told of; that it was cancelled is not. */
  private static Progress cancelOnly(Progress progress) {
    return new Progress() {
      @Override
      public void done(int steps, int of) {}

      @Override
      public boolean cancelled() {
        return progress.cancelled();
      }
    };
  }

  /** An input that the formulas refuse stops its panel, not the run. */
  private static PanelOutcome outcome(PanelPhysics physics, PanelInput input) {
    try {
      return PanelOutcome.of(physics.compute(input));
    } catch (IllegalArgumentException e) {
      return PanelOutcome.failed(new Failure(Status.FAILED, e.getMessage()));
    }
  }

  private static PanelOutcome get(Future<PanelOutcome> future) {
    try {
      return future.get();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new CancellationException("interrupted");
    } catch (ExecutionException e) {
      if (e.getCause() instanceof RuntimeException cause) {
        throw cause;
      }
      throw new IllegalStateException(e.getCause());
    }
  }
}
