package eddyledger.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.State;
import eddyledger.ledger.Status;
import eddyledger.ledger.Way;
import eddyledger.quantity.AWeighting;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.awt.Color;
import java.awt.Font;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.entity.XYItemEntity;
import org.jfree.data.xy.XYDataset;
import org.junit.jupiter.api.Test;

/** The stack picture: what it holds, and what is seen of it. */
class StackPictureTest {
  private static final Font BODY = new Font(Font.SANS_SERIF, Font.PLAIN, 12);

  private static JFreeChart picture(ReceiverSheet sheet, String selected, Palette palette) {
    ChartStyle style = new ChartStyle(palette, BODY);
    return StackPicture.of(sheet, StackParts.of(sheet, selected), style);
  }

  private static SmallSheet halves() {
    return new SmallSheet()
        .panel("roof", SmallSheet.TOTAL, 1.0)
        .panel("door", SmallSheet.TOTAL, 1.0);
  }

  @Test
  void datasetsHoldLevelsAndWhatIsAllowed() throws IOException {
    ReceiverSheet sheet = ExampleLedger.ledger().sheet("hold", "row-2").orElseThrow();
    JFreeChart chart = picture(sheet, "crown-a", Palette.LIGHT);
    XYDataset levels = chart.getXYPlot().getDataset(0);
    XYDataset allowed = chart.getXYPlot().getDataset(1);
    LedgerRow total = sheet.total();
    assertThat((Object) levels.getSeriesKey(0)).isEqualTo(StackPicture.LEVEL);
    assertThat((Object) allowed.getSeriesKey(0)).isEqualTo(StackPicture.ALLOWED);
    assertThat(levels.getItemCount(0)).isEqualTo(Bands.COUNT + 1);
    for (int band = 0; band < Bands.COUNT; band++) {
      double weighted = total.levels().value(band) + AWeighting.weights().value(band);
      double moved = weighted + total.judgement().margin();
      assertThat(levels.getYValue(0, band)).isCloseTo(weighted, within(1.0e-12));
      assertThat(allowed.getYValue(0, band)).isCloseTo(moved, within(1.0e-12));
    }
    assertThat(levels.getYValue(0, Bands.COUNT)).isEqualTo(total.levelA());
    assertThat(allowed.getYValue(0, Bands.COUNT)).isEqualTo(total.judgement().allowance());
  }

  @Test
  void withoutATargetNothingIsAllowedOrForbidden() {
    JFreeChart chart = picture(halves().sheet(Status.OK), "roof", Palette.LIGHT);
    assertThat(chart.getXYPlot().getDatasetCount()).isEqualTo(1);
  }

  @Test
  void paperFollowsTheTheme() {
    for (Palette palette : Palette.values()) {
      JFreeChart chart = picture(halves().sheet(Status.OK), "roof", palette);
      assertThat(chart.getBackgroundPaint()).isEqualTo(palette.paper());
      assertThat(chart.getXYPlot().getBackgroundPaint()).isEqualTo(palette.paper());
      assertThat(chart.getXYPlot().getRangeGridlinePaint()).isEqualTo(palette.grid());
      BufferedImage image = PicturePanel.image(chart, 900, 300, 1.0);
      assertThat(new Color(image.getRGB(0, 0))).isEqualTo(palette.paper());
      assertThat(new Color(image.getRGB(899, 299))).isEqualTo(palette.paper());
    }
  }

  @Test
  void aColumnIsSplitByEnergyInTheColoursOfItsParts() {
    ReceiverSheet sheet = halves().sheet(Status.OK);
    JFreeChart chart = picture(sheet, SmallSheet.TOTAL, Palette.LIGHT);
    List<XYItemEntity> places = places(chart);
    // two parts in each of 28 bands and over all bands
    assertThat(places).hasSize(2 * (Bands.COUNT + 1));
    BufferedImage image = PicturePanel.image(chart, 900, 300, 1.0);
    Rectangle2D lower = places.get(0).getArea().getBounds2D();
    Rectangle2D upper = places.get(1).getArea().getBounds2D();
    assertThat(lower.getHeight()).isCloseTo(upper.getHeight(), within(1.0e-9));
    assertThat(lower.getMinY()).isCloseTo(upper.getMaxY(), within(1.0e-9));
    assertThat(colour(image, lower)).isEqualTo(Palette.LIGHT.series().get(0));
    assertThat(colour(image, upper)).isEqualTo(Palette.LIGHT.series().get(1));
  }

  @Test
  void restingOnAPartTellsBandLevelAndShare() {
    ReceiverSheet sheet = halves().sheet(Status.OK);
    List<XYItemEntity> places = places(picture(sheet, "door", Palette.LIGHT));
    assertThat(places.get(0).getToolTipText())
        .isEqualTo("Roof, 25 Hz: 60.0 dB(A), 50 % of the energy");
    assertThat(places.get(2 * 17 + 1).getToolTipText())
        .isEqualTo("Door, 1.25 kHz: 60.0 dB(A), 50 % of the energy");
    assertThat(places.get(2 * Bands.COUNT).getToolTipText())
        .isEqualTo("Roof, all bands: 74.5 dB(A), 50 % of the energy");
  }

  @Test
  void onlyColumnsOverWhatIsAllowedAreMarked() {
    Color mark = Palette.DARK.stateMark(State.OVER);
    ReceiverSheet over = halves().sheet(Status.OK, 76.0, State.OVER);
    ReceiverSheet tight = halves().sheet(Status.OK, 78.0, State.TIGHT);
    BufferedImage marked = PicturePanel.image(picture(over, "roof", Palette.DARK), 900, 300, 1.0);
    BufferedImage plain = PicturePanel.image(picture(tight, "roof", Palette.DARK), 900, 300, 1.0);
    assertThat(count(marked, mark)).isGreaterThan(29 * 10);
    assertThat(count(plain, mark)).isZero();
  }

  @Test
  void aMissingBandHasNoColumn() {
    double[] some = SmallSheet.energy(1.0).toArray();
    some[10] = Double.NaN;
    BandSpectrum lacking = BandSpectrum.of(some);
    ReceiverSheet sheet =
        new SmallSheet()
            .row("roof", SmallSheet.TOTAL, RowKind.PANEL, Way.ALL, lacking, Status.PARTIAL, "")
            .sheet(Status.PARTIAL, 75.0, null);
    JFreeChart chart = picture(sheet, "roof", Palette.LIGHT);
    XYDataset levels = chart.getXYPlot().getDataset(0);
    assertThat(levels.getYValue(0, 10)).isNaN();
    assertThat(levels.getYValue(0, Bands.COUNT)).isNaN();
    List<XYItemEntity> places = places(chart);
    assertThat(places).hasSize(Bands.COUNT - 1).noneMatch(place -> place.getItem() == 10);
    assertThat(places.get(0).getToolTipText()).endsWith("100 % of what is known");
    // without a column over all bands the part is named beside a sample of its fill
    BufferedImage image = PicturePanel.image(chart, 900, 300, 1.0);
    Color fill = Palette.LIGHT.series().get(0);
    BufferedImage right = image.getSubimage(700, 0, 200, 300);
    assertThat(count(right, fill)).isBetween(64L, 144L);
  }

  @Test
  void nothingKnownIsDrawnAsNothing() {
    ReceiverSheet sheet =
        new SmallSheet().missing("roof", SmallSheet.TOTAL, "no zone").sheet(Status.MISSING);
    assertThat(places(picture(sheet, "roof", Palette.LIGHT))).isEmpty();
  }

  @Test
  void everySizeCanBeDrawn() throws IOException {
    ReceiverSheet sheet = ExampleLedger.ledger().sheet("hold", "row-2").orElseThrow();
    JFreeChart chart = picture(sheet, "crown-a", Palette.LIGHT);
    for (int[] size : new int[][] {{40, 20}, {200, 90}, {3000, 1500}}) {
      BufferedImage image = PicturePanel.image(chart, size[0], size[1], 1.5);
      assertThat(image.getWidth()).isEqualTo(size[0] * 3 / 2);
      assertThat(image.getHeight()).isEqualTo(size[1] * 3 / 2);
    }
  }

  private static List<XYItemEntity> places(JFreeChart chart) {
    ChartRenderingInfo info = new ChartRenderingInfo();
    chart.createBufferedImage(900, 300, info);
    List<XYItemEntity> places = new ArrayList<>();
    for (Object entity : info.getEntityCollection().getEntities()) {
      if (entity instanceof XYItemEntity place) {
        places.add(place);
      }
    }
    return places;
  }

  private static Color colour(BufferedImage image, Rectangle2D place) {
    return new Color(image.getRGB((int) place.getCenterX(), (int) place.getCenterY()));
  }

  private static long count(BufferedImage image, Color colour) {
    long count = 0;
    for (int y = 0; y < image.getHeight(); y++) {
      for (int x = 0; x < image.getWidth(); x++) {
        count += image.getRGB(x, y) == colour.getRGB() ? 1 : 0;
      }
    }
    return count;
  }
}
