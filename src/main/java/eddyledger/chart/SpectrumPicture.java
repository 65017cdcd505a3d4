package eddyledger.chart;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.quantity.Bands;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.plot.XYPlot;
import org.jfree.data.xy.DefaultXYDataset;

/**
 * The spectrum: A-weighted band levels of the selected row, of the section above it and of the
 * total, with the allowed line. A missing band leaves a gap.
 */
public final class SpectrumPicture {
  private static final double SEEN_BELOW_PEAK = 35.0;
  private static final double DEEPEST = 70.0;
  private static final double EMPTY = 60.0;

  private SpectrumPicture() {}

  /**
   * The picture for a selected row; an id that is not in the sheet stands for the total. Dataset 0
   * holds the curves in dB(A) with row ids as keys, the selected row last; dataset 1 what is
   * allowed per band, if anything is.
   */
  public static JFreeChart of(ReceiverSheet sheet, String selectedId, ChartStyle style) {
    List<SpectrumCurve> curves = SpectrumCurve.of(sheet, selectedId);
    Optional<AllowedLine> allowed = AllowedLine.of(sheet);
    CurveLabels labels = new CurveLabels(style, curves, SpectrumCurve.names(curves));
    BandAxis axis = new BandAxis(style, labels.room(), 0.0, false);
    XYPlot plot = style.plot(axis, new LevelAxis(scale(curves, allowed)));
    LedgerRow selected = SpectrumCurve.selected(sheet, selectedId);
    DefaultXYDataset levels = new DefaultXYDataset();
    for (SpectrumCurve curve : curves) {
      levels.addSeries(curve.row().id(), series(curve.levelsA()));
    }
    plot.setDataset(0, levels);
    plot.setRenderer(0, new SpectrumCurves(style, axis, curves, labels));
    allowed.ifPresent(
        line -> {
          DefaultXYDataset dataset = new DefaultXYDataset();
          dataset.addSeries(StackPicture.ALLOWED, series(line.bands()));
          plot.setDataset(1, dataset);
          plot.setRenderer(1, new AllowedSteps(style, axis, line));
        });
    if (!Energies.known(selected)) {
      plot.addAnnotation(new ReasonText(style, axis, selected.reason()));
    }
    return style.chart(plot);
  }

  private static double[][] series(double[] levels) {
    double[] x = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      x[band] = band;
    }
    return new double[][] {x, levels};
  }

  /** Up to the highest curve, and down so far that the selected one is seen. */
  private static LevelScale scale(List<SpectrumCurve> curves, Optional<AllowedLine> allowed) {
    double highest = allowed.map(line -> peak(line.bands())).orElse(Double.NaN);
    for (SpectrumCurve curve : curves) {
      double peak = peak(curve.levelsA());
      highest = Double.isNaN(peak) || highest > peak ? highest : peak;
    }
    double top = Double.isNaN(highest) ? EMPTY : highest;
    double selected = peak(curves.get(curves.size() - 1).levelsA());
    double seen = Double.isNaN(selected) ? top : selected;
    return LevelScale.between(Math.max(seen - SEEN_BELOW_PEAK, top - DEEPEST), top);
  }

  private static double peak(double[] levels) {
    return Arrays.stream(levels).filter(Double::isFinite).max().orElse(Double.NaN);
  }
}
