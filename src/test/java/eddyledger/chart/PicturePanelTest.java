package eddyledger.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.Status;
import java.awt.Font;
import java.awt.event.MouseEvent;
import java.awt.image.BufferedImage;
import org.jfree.chart.ChartPanel;
import org.jfree.chart.JFreeChart;
import org.junit.jupiter.api.Test;

/** The component that shows a picture; it needs no display to be made. */
class PicturePanelTest {
  private static final ChartStyle STYLE =
      new ChartStyle(Palette.LIGHT, new Font(Font.SANS_SERIF, Font.PLAIN, 12));

  private static JFreeChart chart() {
    ReceiverSheet sheet = new SmallSheet().panel("roof", SmallSheet.TOTAL, 1.0).sheet(Status.OK);
    return StackPicture.of(sheet, StackParts.of(sheet, "roof"), STYLE);
  }

  @Test
  void nothingZoomsAndNoMenuPops() {
    PicturePanel panel = new PicturePanel();
    ChartPanel inner = (ChartPanel) panel.getComponent(0);
    assertThat(inner.isDomainZoomable()).isFalse();
    assertThat(inner.isRangeZoomable()).isFalse();
    assertThat(inner.isMouseWheelEnabled()).isFalse();
    assertThat(inner.getPopupMenu()).isNull();
    assertThat(inner.getMinimumDrawWidth()).isZero();
    assertThat(inner.getMinimumDrawHeight()).isZero();
    assertThat(inner.getMaximumDrawWidth()).isEqualTo(9000);
    assertThat(inner.getMaximumDrawHeight()).isEqualTo(9000);
    assertThat(panel.isDoubleBuffered()).isTrue();
  }

  @Test
  void aPictureShownIsDescribedAndCanBeExported() {
    PicturePanel panel = new PicturePanel();
    assertThat(panel.chart()).isNull();
    assertThatThrownBy(() -> panel.image(100, 50, 1.0)).isInstanceOf(IllegalStateException.class);
    JFreeChart chart = chart();
    panel.show(chart, "Roof makes it all.");
    assertThat(panel.chart()).isSameAs(chart);
    assertThat(panel.getComponent(0).getAccessibleContext().getAccessibleDescription())
        .isEqualTo("Roof makes it all.");
    assertThat(panel.image(300, 120, 2.0).getWidth()).isEqualTo(600);
  }

  @Test
  void restingOnTheColumnTellsWhatItIs() {
    PicturePanel panel = new PicturePanel();
    panel.show(chart(), "");
    panel.setSize(900, 300);
    panel.doLayout();
    ChartPanel inner = (ChartPanel) panel.getComponent(0);
    inner.paint(new BufferedImage(900, 300, BufferedImage.TYPE_INT_RGB).createGraphics());
    var rest = new MouseEvent(inner, 503, 0L, 0, 200, 280, 0, false);
    assertThat(inner.getToolTipText(rest)).startsWith("Roof, ").endsWith("100 % of the energy");
  }
}
