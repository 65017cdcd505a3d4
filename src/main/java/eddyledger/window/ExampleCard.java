package eddyledger.window;

import eddyledger.app.Example;
import eddyledger.chart.Digits;
import eddyledger.chart.Palette;
import java.awt.BasicStroke;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Rectangle2D;
import java.awt.geom.RoundRectangle2D;
import javax.swing.JButton;

/** An example as a card with a drawing; a button like any other to keyboard and screen reader. */
final class ExampleCard extends JButton {
  private static final int HEIGHT = 84;
  private static final int ART = 148;
  private static final int ARC = 6;
  private static final int TEXT = ART + 16;

  private final transient Example example;

  ExampleCard(Example example) {
    super(example.title());
    this.example = example;
    setContentAreaFilled(false);
    setBorderPainted(false);
    setRolloverEnabled(true);
    setPreferredSize(new Dimension(456, HEIGHT));
    Theme.named(this, "start.example." + example.id(), "Open the example " + example.title());
    getAccessibleContext()
        .setAccessibleDescription(example.sentence() + ". " + example.holds() + ".");
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    Graphics2D g = (Graphics2D) graphics.create();
    Digits.smooth(g);
    Palette palette = Theme.palette();
    Shape card =
        new RoundRectangle2D.Double(0.5, 0.5, getWidth() - 1.0, getHeight() - 1.0, ARC, ARC);
    boolean lively = getModel().isRollover() || getModel().isPressed();
    g.setColor(lively ? palette.selection() : palette.paper());
    g.fill(card);
    Shape clip = g.getClip();
    g.clip(card);
    g.setColor(palette.ground());
    g.fillRect(0, 0, ART, getHeight());
    LineArt.paint(
        g, example.drawing(), new Rectangle2D.Double(10, 6, ART - 20.0, getHeight() - 12.0));
    g.setClip(clip);
    g.setStroke(new BasicStroke(isFocusOwner() ? 2f : 1f));
    g.setColor(isFocusOwner() ? palette.accent() : palette.hairline());
    g.draw(card);
    g.setFont(Theme.strong(13f));
    g.setColor(palette.ink());
    g.drawString(example.title(), TEXT, 29);
    g.setFont(Theme.body());
    double room = getWidth() - TEXT - 12.0;
    g.drawString(MarkupPainter.cut(Theme.body(), example.sentence(), room), TEXT, 48);
    g.setColor(palette.ink2());
    g.drawString(MarkupPainter.cut(Theme.body(), example.holds(), room), TEXT, 66);
    g.dispose();
  }
}
