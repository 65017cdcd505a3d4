package eddyledger.ledger;

import eddyledger.quantity.Progress;

/**
 * How a ledger is computed; none of it changes a number.
 *
 * @param threads threads that compute panels, 1 or more
 * @param progress who listens, and may cancel
 * @param cache what was computed before
 */
public record LedgerOptions(int threads, Progress progress, LedgerCache cache) {

  /** All processors, nobody listening, nothing computed before. */
  public static LedgerOptions plain() {
    return new LedgerOptions(
        Runtime.getRuntime().availableProcessors(), Progress.NONE, new LedgerCache());
  }

  /** The same with another number of threads. */
  public LedgerOptions withThreads(int other) {
    return new LedgerOptions(other, progress, cache);
  }
}
