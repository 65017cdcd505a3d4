package eddyledger.window;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.awt.GraphicsEnvironment;
import java.awt.Rectangle;
import java.awt.event.WindowAdapter;
import java.awt.event.WindowEvent;
import javax.swing.JComponent;
import javax.swing.JFrame;
import javax.swing.JMenuBar;
import javax.swing.WindowConstants;

/** The window itself: where it stands, and that closing it asks about unsaved work. */
final class MainFrame extends JFrame {
  private static final long serialVersionUID = 1L;

  private final transient WindowMemory memory;

  MainFrame(WindowMemory memory) {
    this.memory = memory;
    setName("eddyledger");
    setMinimumSize(new Dimension(900, 560));
    setDefaultCloseOperation(WindowConstants.DO_NOTHING_ON_CLOSE);
    place();
  }

  private void place() {
    Rectangle screen = GraphicsEnvironment.getLocalGraphicsEnvironment().getMaximumWindowBounds();
    Rectangle kept = memory.bounds();
    if (kept != null && screen.intersects(kept)) {
      setBounds(kept.intersection(screen));
    } else {
      setBounds(centred(screen, Math.min(1440, screen.width), Math.min(900, screen.height)));
    }
    if (memory.maximized()) {
      setExtendedState(MAXIMIZED_BOTH);
    }
  }

  private static Rectangle centred(Rectangle screen, int width, int height) {
    return new Rectangle(
        screen.x + (screen.width - width) / 2,
        screen.y + (screen.height - height) / 2,
        width,
        height);
  }

  /** Puts the parts in. */
  void fill(JMenuBar menu, JComponent pages, JComponent status, Runnable closing) {
    setJMenuBar(menu);
    add(pages, BorderLayout.CENTER);
    add(status, BorderLayout.SOUTH);
    addWindowListener(
        new WindowAdapter() {
          @Override
          public void windowClosing(WindowEvent event) {
            closing.run();
          }
        });
  }

  /** Keeps where the window stands. */
  void remember() {
    boolean maximized = (getExtendedState() & MAXIMIZED_BOTH) == MAXIMIZED_BOTH;
    memory.maximized(maximized);
    if (!maximized) {
      memory.bounds(getBounds());
    }
  }
}
