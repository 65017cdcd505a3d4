package eddyledger.window;

import eddyledger.chart.Digits;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Insets;
import java.awt.geom.Line2D;
import javax.swing.BorderFactory;
import javax.swing.Icon;
import javax.swing.JButton;

/** A button that looks like a line of text; underlined under the mouse and with the focus. */
final class LinkButton extends JButton {
  private static final int GAP = 3;

  LinkButton(Icon icon, String text) {
    super(text, icon);
    setFont(Theme.small());
    setHorizontalAlignment(LEADING);
    setIconTextGap(GAP);
    setMargin(new Insets(0, 0, 0, 0));
    setBorder(BorderFactory.createEmptyBorder());
    setContentAreaFilled(false);
    setFocusPainted(false);
    setRolloverEnabled(true);
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    super.paintComponent(graphics);
    if (isFocusOwner() || getModel().isRollover()) {
      Graphics2D g = (Graphics2D) graphics.create();
      Digits.smooth(g);
      g.setColor(getForeground());
      double left = getIcon() == null ? 0.0 : getIcon().getIconWidth() + GAP;
      double right = Math.min(getWidth(), left + Digits.width(getFont(), getText()));
      double line = getHeight() / 2.0 + getFont().getSize() / 2.0 + 1.0;
      g.draw(new Line2D.Double(left, line, right, line));
      g.dispose();
    }
  }
}
