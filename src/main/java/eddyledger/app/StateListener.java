package eddyledger.app;

/** Learns of changes to the project's state. */
@FunctionalInterface
public interface StateListener {
  /** What changed. */
  enum Aspect {
    /** Another project stands on the desk, or none. */
    PROJECT,
    /** The vehicle was edited; numbers are stale until computed. */
    VEHICLE,
    /** There is a new result, or a reason why there is none. */
    LEDGER,
    /** Another row, receiver or condition is looked at. */
    SELECTION,
    /** The file, or whether there is unsaved work. */
    FILE
  }

  /** Called after the change, on the thread that made it. */
  void changed(Aspect aspect);
}
