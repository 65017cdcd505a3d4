package eddyledger.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Status;
import eddyledger.ledger.Way;
import eddyledger.quantity.AWeighting;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.awt.Font;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.JFreeChart;
import org.jfree.data.xy.XYDataset;
import org.junit.jupiter.api.Test;

/** The spectrum picture: which curves it has and what they hold. */
class SpectrumPictureTest {
  private static final ChartStyle STYLE =
      new ChartStyle(Palette.DARK, new Font(Font.SANS_SERIF, Font.PLAIN, 12));

  private static List<Object> keys(JFreeChart chart) {
    XYDataset curves = chart.getXYPlot().getDataset(0);
    List<Object> keys = new ArrayList<>();
    for (int i = 0; i < curves.getSeriesCount(); i++) {
      keys.add(curves.getSeriesKey(i));
    }
    return keys;
  }

  @Test
  void curvesOfAPanelASectionAndTheTotal() throws IOException {
    ReceiverSheet sheet = ExampleLedger.ledger().sheet("hold", "row-2").orElseThrow();
    JFreeChart panel = SpectrumPicture.of(sheet, "crown-a", STYLE);
    assertThat(keys(panel)).containsExactly("quillon-82", "station-a", "crown-a");
    assertThat(keys(SpectrumPicture.of(sheet, "station-a", STYLE)))
        .containsExactly("quillon-82", "station-a");
    assertThat(keys(SpectrumPicture.of(sheet, "propulsion-row-2-hold", STYLE)))
        .containsExactly("quillon-82", "propulsion-row-2-hold");
    assertThat(keys(SpectrumPicture.of(sheet, "quillon-82", STYLE))).containsExactly("quillon-82");
    assertThat(keys(SpectrumPicture.of(sheet, "nobody", STYLE))).containsExactly("quillon-82");
    LedgerRow crown = sheet.row("crown-a", Way.ALL).orElseThrow();
    for (int band = 0; band < Bands.COUNT; band++) {
      double weighted = crown.levels().value(band) + AWeighting.weights().value(band);
      assertThat(panel.getXYPlot().getDataset(0).getYValue(2, band))
          .isCloseTo(weighted, within(1.0e-12));
    }
    XYDataset allowed = panel.getXYPlot().getDataset(1);
    assertThat(allowed.getItemCount(0)).isEqualTo(Bands.COUNT);
    assertThat(allowed.getYValue(0, 12)).isEqualTo(AllowedLine.of(sheet).orElseThrow().bands()[12]);
    assertThat(panel.getBackgroundPaint()).isEqualTo(Palette.DARK.paper());
  }

  @Test
  void aMissingBandIsAGapAndNoTargetNoLine() {
    double[] some = SmallSheet.energy(1.0).toArray();
    some[10] = Double.NaN;
    BandSpectrum lacking = BandSpectrum.of(some);
    ReceiverSheet sheet =
        new SmallSheet()
            .panel("roof", SmallSheet.TOTAL, 1.0)
            .row("door", SmallSheet.TOTAL, RowKind.PANEL, Way.ALL, lacking, Status.PARTIAL, "")
            .sheet(Status.PARTIAL);
    JFreeChart chart = SpectrumPicture.of(sheet, "door", STYLE);
    XYDataset curves = chart.getXYPlot().getDataset(0);
    assertThat(curves.getYValue(1, 10)).isNaN();
    assertThat(curves.getYValue(1, 11)).isCloseTo(60.0, within(1.0e-9));
    assertThat(chart.getXYPlot().getDatasetCount()).isEqualTo(1);
    assertThat(chart.getXYPlot().getAnnotations()).isEmpty();
    assertThat(PicturePanel.image(chart, 900, 300, 1.0).getHeight()).isEqualTo(300);
  }

  @Test
  void aRowWithoutValueSaysWhy() throws IOException {
    ReceiverSheet sheet = ExampleLedger.without("crown-e").sheet("hold", "row-2").orElseThrow();
    JFreeChart chart = SpectrumPicture.of(sheet, "crown-e", STYLE);
    assertThat(chart.getXYPlot().getAnnotations()).hasSize(1);
    ReasonText text = (ReasonText) chart.getXYPlot().getAnnotations().get(0);
    assertThat(text.reason()).isEqualTo("The panel has no construction.");
    assertThat(PicturePanel.image(chart, 900, 300, 1.0).getHeight()).isEqualTo(300);
  }

  @Test
  void levelsOfCurvesSayWhenTheyAreLowerBounds() throws IOException {
    ReceiverSheet sheet = ExampleLedger.without("crown-e").sheet("hold", "row-2").orElseThrow();
    List<SpectrumCurve> curves = SpectrumCurve.of(sheet, "crown-e");
    assertThat(curves.get(1).level()).startsWith("\u2265").matches(".*\\d\\d\\.\\d");
    assertThat(curves.get(2).level()).isEqualTo("not known");
    assertThat(SpectrumCurve.of(sheet, "crown-a").get(2).level()).isEqualTo("63.2");
  }
}
