package eddyledger.command;

import java.nio.file.Path;

/** Opens the program's window. */
public interface WindowStarter {
  /** Whether there is a display to open it on. */
  boolean possible();

  /**
   * Opens the window and waits until it is closed.
   *
   * @param file project to open in it; null for none
   */
  void open(Path file);
}
