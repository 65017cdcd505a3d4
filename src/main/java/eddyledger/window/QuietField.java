package eddyledger.window;

import java.awt.Insets;
import java.awt.dnd.DropTarget;
import java.awt.event.FocusEvent;
import java.awt.event.FocusListener;
import javax.swing.BorderFactory;
import javax.swing.JTextField;
import javax.swing.UIManager;

/**
 * A text field that looks like plain text while its value is inherited and it has not the focus,
 * and can be typed into all the same.
 */
final class QuietField extends JTextField {
  private boolean quiet;
  private boolean bare;

  QuietField() {
    setFont(Theme.body());
    addFocusListener(
        new FocusListener() {
          @Override
          public void focusGained(FocusEvent e) {
            dress();
          }

          @Override
          public void focusLost(FocusEvent e) {
            dress();
          }
        });
  }

  /** Whether it looks like plain text when it has not the focus. */
  void quiet(boolean value) {
    quiet = value;
    dress();
  }

  @Override
  public synchronized void setDropTarget(DropTarget target) {
    // a file that is dropped here is meant for the window
    super.setDropTarget(null);
  }

  private void dress() {
    boolean plain = quiet && !isFocusOwner();
    if (plain != bare) {
      bare = plain;
      Insets usual = UIManager.getBorder("TextField.border").getBorderInsets(this);
      setBorder(
          plain
              ? BorderFactory.createEmptyBorder(usual.top, usual.left, usual.bottom, usual.right)
              : UIManager.getBorder("TextField.border"));
    }
    setBackground(plain ? Theme.palette().paper() : Theme.palette().field());
    setForeground(plain ? Theme.palette().ink2() : Theme.palette().ink());
    repaint();
  }
}
