package eddyledger.chart;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.quantity.Bands;
import java.util.Arrays;
import java.util.Optional;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.plot.XYPlot;
import org.jfree.data.xy.DefaultXYDataset;

/**
 * The stack: what makes each band. A column is as high as its band's level in dB(A) and split by
 * the energies of the parts, so that heights of parts are shares and not decibels; a last column
 * stands for all bands.
 */
public final class StackPicture {
  /** Key of the series of levels, dB(A): 28 bands, then the overall level. */
  public static final String LEVEL = "level";

  /** Key of the series of what is allowed, dB(A): 28 bands, then the overall level. */
  public static final String ALLOWED = "allowed";

  /** So many bands lie under the words left of the last column. */
  private static final int LAST_BANDS = 4;

  private StackPicture() {}

  /** The picture of a sheet split into parts; dataset 0 holds levels, 1 what is allowed if any. */
  public static JFreeChart of(ReceiverSheet sheet, StackParts parts, ChartStyle style) {
    LedgerRow total = sheet.total();
    Optional<AllowedLine> allowed = AllowedLine.of(sheet);
    double overall = total.levelA();
    double[] levels = Energies.levelsA(total.meanSquares());
    double peak = Arrays.stream(levels).filter(Double::isFinite).max().orElse(Double.NaN);
    double highest = Double.isFinite(overall) ? overall : peak;
    LevelScale scale =
        LevelScale.below(highest, allowed.map(AllowedLine::overall).orElse(Double.NaN));
    String text = (parts.partial() ? LevelWords.AT_LEAST : "") + LevelWords.level(overall);
    double at = allowed.map(line -> scale.place(line.overall())).orElse(Double.NaN);
    StackLabels labels = new StackLabels(style, parts, allowed, text, at);
    BandAxis axis = new BandAxis(style, labels.after(), labels.before(lastBands(levels)), true);
    XYPlot plot = style.plot(axis, new LevelAxis(scale));
    boolean capped = allowed.map(AllowedLine::exceeded).orElse(false);
    plot.setDataset(0, dataset(LEVEL, levels, overall));
    plot.setRenderer(0, new StackColumns(style, axis, parts, labels, capped));
    allowed.ifPresent(
        line -> {
          plot.setDataset(1, dataset(ALLOWED, line.bands(), line.overall()));
          plot.setRenderer(1, new AllowedSteps(style, axis, line));
        });
    return style.chart(plot);
  }

  private static double lastBands(double[] levels) {
    return Arrays.stream(levels, Bands.COUNT - LAST_BANDS, Bands.COUNT)
        .filter(Double::isFinite)
        .max()
        .orElse(Double.NEGATIVE_INFINITY);
  }

  private static DefaultXYDataset dataset(String key, double[] bands, double overall) {
    double[] x = new double[Bands.COUNT + 1];
    double[] y = Arrays.copyOf(bands, Bands.COUNT + 1);
    for (int i = 0; i < x.length; i++) {
      x[i] = i;
    }
    y[Bands.COUNT] = overall;
    DefaultXYDataset dataset = new DefaultXYDataset();
    dataset.addSeries(key, new double[][] {x, y});
    return dataset;
  }
}
