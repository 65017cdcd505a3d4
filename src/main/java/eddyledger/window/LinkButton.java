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

  private String[] texts = {};

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

  /** Shows the first text that fits its width; the last one if none does. */
  void texts(String... longestFirst) {
    texts = longestFirst.clone();
    fit(getWidth());
  }

  private void fit(int width) {
    double left = getIcon() == null ? 0.0 : getIcon().getIconWidth() + GAP;
    String fitting = texts[texts.length - 1];
    for (int i = texts.length - 1; i >= 0; i--) {
      if (width <= 0 || left + Digits.width(getFont(), texts[i]) <= width) {
        fitting = texts[i];
      }
    }
    if (!fitting.equals(getText())) {
      setText(fitting);
    }
  }

  @Override
  public void setBounds(int x, int y, int width, int height) {
    super.setBounds(x, y, width, height);
    if (texts.length > 0) {
      fit(width);
    }
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
