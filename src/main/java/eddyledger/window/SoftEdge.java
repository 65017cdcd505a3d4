package eddyledger.window;

import java.awt.BorderLayout;
import java.awt.Color;
import java.awt.GradientPaint;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JViewport;

/** A scroll pane whose lower edge fades into the paper where the content goes on below it. */
final class SoftEdge extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final int FADE = 24;

  private final JScrollPane scroll;

  SoftEdge(JScrollPane scroll) {
    super(new BorderLayout());
    this.scroll = scroll;
    setOpaque(false);
    JViewport viewport = scroll.getViewport();
    // the edge stays where it is while the content moves
    viewport.setScrollMode(JViewport.SIMPLE_SCROLL_MODE);
    viewport.addChangeListener(event -> repaint());
    add(scroll);
  }

  @Override
  protected boolean isPaintingOrigin() {
    // the edge lies over the content, also when only a part of that is painted anew
    return true;
  }

  @Override
  protected void paintChildren(Graphics graphics) {
    super.paintChildren(graphics);
    JViewport viewport = scroll.getViewport();
    Rectangle view = viewport.getViewRect();
    if (viewport.getView() == null
        || view.y + view.height >= viewport.getView().getHeight()
        || !scroll.isShowing()) {
      return;
    }
    Graphics2D g = (Graphics2D) graphics;
    Color paper = Theme.palette().paper();
    Color clear = new Color(paper.getRGB() & 0xFFFFFF, true);
    int bottom = viewport.getY() + view.height;
    g.setPaint(new GradientPaint(0, bottom - FADE, clear, 0, bottom, paper));
    g.fillRect(viewport.getX(), bottom - FADE, view.width, FADE);
  }
}
