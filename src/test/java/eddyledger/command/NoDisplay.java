package eddyledger.command;

import java.nio.file.Path;

/** A machine without a display. */
public final class NoDisplay implements WindowStarter {
  @Override
  public boolean possible() {
    return false;
  }

  @Override
  public void open(Path file) {
    throw new AssertionError("there is no display");
  }
}
