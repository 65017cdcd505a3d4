package eddyledger.window;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.BooleanSupplier;

/** Follows one press of a key through the event thread until everything is painted. */
final class EditProbe {
  private static final long PATIENCE_S = 30;

  private final BooleanSupplier older;
  private final BooleanSupplier renewed;
  private final CountDownLatch done = new CountDownLatch(1);
  private final long pressed = System.nanoTime();
  private boolean painting;
  private long edited;
  private long delivered;
  private long presented;
  private long row;
  private long all;
  private long meanwhile;

  /**
   * Begins now; the key is pressed next.
   *
   * @param older whether the numbers shown are those before the edit; asked on the event thread
   * @param renewed whether the ledger's view holds the new level, painted or not; likewise
   */
  EditProbe(BooleanSupplier older, BooleanSupplier renewed) {
    this.older = older;
    this.renewed = renewed;
  }

  /** The row is being painted with its new level. */
  void paintsRow() {
    painting = true;
  }

  void dispatched(long began, long ended, boolean nothingLeft) {
    if (edited == 0) {
      edited = older.getAsBoolean() ? ended : 0;
    } else if (presented == 0) {
      if (renewed.getAsBoolean()) {
        delivered = began;
        presented = ended;
      } else {
        meanwhile += ended - began;
      }
    }
    if (painting && row == 0) {
      row = ended;
    }
    if (row != 0 && all == 0 && nothingLeft) {
      all = ended;
      done.countDown();
    }
  }

  EditTimes await() throws InterruptedException {
    if (!done.await(PATIENCE_S, TimeUnit.SECONDS)) {
      throw new IllegalStateException(
          "the row was not painted anew: edited " + (edited != 0) + ", shown " + (presented != 0));
    }
    return new EditTimes(
        edited - pressed,
        delivered - pressed,
        presented - pressed,
        row - pressed,
        all - pressed,
        meanwhile);
  }
}
