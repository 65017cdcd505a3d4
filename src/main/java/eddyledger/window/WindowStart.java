package eddyledger.window;

import eddyledger.command.WindowStarter;
import java.awt.AWTError;
import java.awt.GraphicsEnvironment;
import java.nio.file.Path;
import java.util.concurrent.CountDownLatch;
import java.util.function.Supplier;
import java.util.logging.Level;
import java.util.logging.Logger;
import javax.swing.SwingUtilities;

/** Opens the window on the event thread and waits for its end. */
public final class WindowStart implements WindowStarter {
  /** Held, else its level is forgotten: that a folder for settings was made is nobody's news. */
  private static final Logger SETTINGS_LOG = Logger.getLogger("java.util.prefs");

  private final Supplier<Services> services;

  /**
   * With what the window will work with; asked for only when it opens, so that the command line
   * does without.
   */
  public WindowStart(Supplier<Services> services) {
    this.services = services;
  }

  /**
   * Begins to load what a window needs, beside whatever the caller does before it opens one; does
   * nothing where there is no display.
   */
  public void prepare() {
    if (!possible()) {
      return;
    }
    smooth();
    Thread loading = new Thread(WindowStart::load, "window fonts");
    loading.setDaemon(true);
    loading.start();
  }

  private static void load() {
    try {
      Theme.loadFonts();
    } catch (AWTError | LinkageError e) {
      // the display cannot be used: opening the window meets the same, and says so
      return;
    }
  }

  /** Smooth text where the desktop does not ask for it; set before anything of the window loads. */
  private static void smooth() {
    if (System.getProperty("awt.useSystemAAFontSettings") == null) {
      System.setProperty("awt.useSystemAAFontSettings", "on");
    }
  }

  @Override
  public boolean possible() {
    return !GraphicsEnvironment.isHeadless();
  }

  @Override
  public void open(Path file) {
    SETTINGS_LOG.setLevel(Level.WARNING);
    smooth();
    CountDownLatch closed = new CountDownLatch(1);
    SwingUtilities.invokeLater(
        () -> {
          Services with = services.get();
          Thread.setDefaultUncaughtExceptionHandler(new UncaughtFaults(with.faults()));
          new Application(with, closed::countDown).show(file);
        });
    try {
      closed.await();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}
