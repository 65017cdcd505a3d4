package eddyledger.window;

import java.awt.AWTEvent;
import java.awt.EventQueue;
import java.awt.Toolkit;

/** Lays itself over the event queue and tells of every event when it began and ended. */
final class EventWatch extends EventQueue {
  /** Told of an event once it was dealt with; on the event thread. */
  @FunctionalInterface
  interface Told {
    /** An event was dealt with from one time to another, both of {@link System#nanoTime()}. */
    void dispatched(long began, long ended, boolean nothingLeft);
  }

  private final Told told;

  EventWatch(Told told) {
    this.told = told;
    Toolkit.getDefaultToolkit().getSystemEventQueue().push(this);
  }

  @Override
  protected void dispatchEvent(AWTEvent event) {
    long began = System.nanoTime();
    super.dispatchEvent(event);
    // what was painted is on the screen only when the server has drawn it
    Toolkit.getDefaultToolkit().sync();
    told.dispatched(began, System.nanoTime(), peekEvent() == null);
  }

  /** Gives the queue back to the one below. */
  void end() {
    pop();
  }
}
