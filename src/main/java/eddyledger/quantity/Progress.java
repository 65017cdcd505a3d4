package eddyledger.quantity;

import java.util.concurrent.CancellationException;

/** How long work tells how far it is, and learns that it should stop. */
public interface Progress {
  /** Nobody listens and nothing is ever cancelled. */
  Progress NONE =
      new Progress() {
        @Override
        public void done(int steps, int of) {}

        @Override
        public boolean cancelled() {
          return false;
        }
      };

  /** Tells that so many of so many steps are done. May be called from several threads. */
  void done(int steps, int of);

  /** Whether the work should stop. */
  boolean cancelled();

  /**
   * Stops the work if it was cancelled.
   *
   * @throws CancellationException if it was
   */
  default void check() {
    if (cancelled()) {
      throw new CancellationException("cancelled");
    }
  }
}
