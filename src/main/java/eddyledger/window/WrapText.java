package eddyledger.window;

import java.awt.Dimension;
import java.awt.dnd.DropTarget;
import javax.swing.BorderFactory;
import javax.swing.JTextArea;
import javax.swing.SwingUtilities;
import javax.swing.text.DefaultCaret;

/** Text that wraps at its width and takes the height it needs; only to be read. */
final class WrapText extends JTextArea {
  private static final int TALL = 10_000;

  private final int usual;
  private int last;

  /** With the width taken for granted before it is laid out. */
  WrapText(int usualWidth) {
    usual = usualWidth;
    setEditable(false);
    setFocusable(false);
    setLineWrap(true);
    setWrapStyleWord(true);
    setOpaque(false);
    // an empty border of our own stays when the theme changes, none at all would not
    setBorder(BorderFactory.createEmptyBorder());
    setFont(Theme.small());
    // the caret would scroll the sheet to whatever text changed last
    DefaultCaret still = new DefaultCaret();
    still.setUpdatePolicy(DefaultCaret.NEVER_UPDATE);
    setCaret(still);
  }

  @Override
  public synchronized void setDropTarget(DropTarget target) {
    // a file that is dropped here is meant for the window
    super.setDropTarget(null);
  }

  @Override
  public Dimension getPreferredSize() {
    int width = getWidth() > 0 ? getWidth() : usual;
    int height = getHeight();
    // a text area says how high it is only once it has its width
    super.setBounds(getX(), getY(), width, TALL);
    Dimension wrapped = super.getPreferredSize();
    super.setBounds(getX(), getY(), width, height);
    return new Dimension(usual, wrapped.height);
  }

  @Override
  public Dimension getMinimumSize() {
    return new Dimension(0, getPreferredSize().height);
  }

  @Override
  public void setBounds(int x, int y, int width, int height) {
    super.setBounds(x, y, width, height);
    if (width != last) {
      last = width;
      SwingUtilities.invokeLater(this::revalidate);
    }
  }
}
