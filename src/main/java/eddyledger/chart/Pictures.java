package eddyledger.chart;

import eddyledger.ledger.ReceiverSheet;
import org.jfree.chart.JFreeChart;

/** Draws a kind of picture, so that whoever shows it need not know how each is made. */
public final class Pictures {
  private Pictures() {}

  /** Shows a picture of a sheet and a row of it in a panel. */
  public static void show(
      PicturePanel panel, Picture picture, ReceiverSheet sheet, String rowId, ChartStyle style) {
    JFreeChart chart =
        switch (picture) {
          case STACK -> StackPicture.of(sheet, StackParts.of(sheet, rowId), style);
          case SPECTRUM -> SpectrumPicture.of(sheet, rowId, style);
        };
    panel.show(chart, picture.description(sheet, rowId));
  }
}
