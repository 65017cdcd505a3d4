package eddyledger.window;

import java.awt.Dimension;
import javax.swing.JComponent;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;

/** Running text in several lines that can be selected, copied and read aloud. */
final class Wrapped {
  private static final int WIDTH = 440;
  private static final int TALLEST = 600;

  private Wrapped() {}

  /** The text as a component for a dialog; it scrolls if it is long. */
  static JComponent text(String text) {
    JTextArea area = new JTextArea(text);
    area.setLineWrap(true);
    area.setWrapStyleWord(true);
    area.setEditable(false);
    area.setOpaque(false);
    area.setFont(Theme.body());
    area.setSize(WIDTH, Short.MAX_VALUE);
    area.getAccessibleContext().setAccessibleName(text);
    int height = area.getPreferredSize().height;
    area.setPreferredSize(new Dimension(WIDTH, height));
    if (height <= TALLEST) {
      return area;
    }
    JScrollPane scroll = new JScrollPane(area);
    scroll.setPreferredSize(new Dimension(WIDTH + 20, TALLEST));
    return scroll;
  }
}
