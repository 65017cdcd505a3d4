package eddyledger.chart;

import java.awt.BorderLayout;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import javax.accessibility.AccessibleContext;
import javax.swing.JPanel;
import org.jfree.chart.ChartPanel;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;

/**
 * Shows a picture at its own size: text is never stretched, nothing zooms, and what the pointer
 * rests on says its band, level and share.
 */
public final class PicturePanel extends JPanel {
  private static final int LARGEST = 9000;

  private final ChartPanel panel;

  /** An empty panel. */
  public PicturePanel() {
    super(new BorderLayout(), true);
    panel =
        new ChartPanel(
            null, 600, 240, 0, 0, LARGEST, LARGEST, false, false, false, false, false, true);
    panel.setPopupMenu(null);
    panel.setMouseZoomable(false);
    panel.setDomainZoomable(false);
    panel.setRangeZoomable(false);
    panel.setMouseWheelEnabled(false);
    panel.setOpaque(false);
    add(panel, BorderLayout.CENTER);
  }

  /**
   * Shows a picture.
   *
   * @param accessibleDescription what the picture says, for those who cannot see it
   */
  public void show(JFreeChart chart, String accessibleDescription) {
    panel.setChart(chart);
    panel.putClientProperty(AccessibleContext.ACCESSIBLE_NAME_PROPERTY, "Picture");
    panel.putClientProperty(
        AccessibleContext.ACCESSIBLE_DESCRIPTION_PROPERTY, accessibleDescription);
  }

  /** The picture shown, null if none is. */
  public JFreeChart chart() {
    return panel.getChart();
  }

  /**
   * The picture shown as an image. Arguments as for {@link #image(JFreeChart, int, int, double)}.
   *
   * @throws IllegalStateException if no picture is shown
   */
  public BufferedImage image(int width, int height, double scale) {
    if (chart() == null) {
      throw new IllegalStateException("no picture is shown");
    }
    return image(chart(), width, height, scale);
  }

  /**
   * A picture as an image for a file or another program.
   *
   * @param width width of the picture as on a screen of plain resolution, pixels
   * @param height height likewise
   * @param scale how many pixels of the image stand for one of the screen
   */
  public static BufferedImage image(JFreeChart chart, int width, int height, double scale) {
    BufferedImage image =
        new BufferedImage(
            (int) Math.round(width * scale),
            (int) Math.round(height * scale),
            BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.scale(scale, scale);
    ChartRenderingInfo nothingToHover = new ChartRenderingInfo(null);
    chart.draw(g, new Rectangle2D.Double(0, 0, width, height), nothingToHover);
    g.dispose();
    return image;
  }
}
