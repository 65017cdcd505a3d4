package eddyledger.chart;

import com.formdev.flatlaf.fonts.inter.FlatInterFont;
import eddyledger.ledger.Judgement;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.Status;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.awt.Font;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javax.imageio.ImageIO;
import org.jfree.chart.JFreeChart;

/** Draws pictures of the example into a folder, to be looked at: {@code PictureSamples FOLDER}. */
final class PictureSamples {
  private static final int[][] SIZES = {{1030, 260}, {1400, 420}, {700, 240}};

  private PictureSamples() {}

  public static void main(String[] arguments) throws IOException {
    Path folder = Files.createDirectories(Path.of(arguments[0]));
    FlatInterFont.install();
    Font body = new Font(FlatInterFont.FAMILY, Font.PLAIN, 12);
    for (Palette palette : Palette.values()) {
      ChartStyle style = new ChartStyle(palette, body);
      for (Map.Entry<String, JFreeChart> chart : charts(style).entrySet()) {
        for (int[] size : SIZES) {
          for (int scale : new int[] {1, 2}) {
            String name =
                chart.getKey() + "-" + palette.name().toLowerCase() + "-" + size[0] + "x" + scale;
            BufferedImage image = PicturePanel.image(chart.getValue(), size[0], size[1], scale);
            ImageIO.write(image, "png", folder.resolve(name + ".png").toFile());
          }
        }
      }
    }
  }

  private static Map<String, JFreeChart> charts(ChartStyle style) throws IOException {
    ReceiverSheet hold = ExampleLedger.ledger().sheet("hold", "row-2").orElseThrow();
    ReceiverSheet cruise = ExampleLedger.ledger().sheet("cruise", "row-16").orElseThrow();
    ReceiverSheet missing =
        ExampleLedger.without("crown-e").sheet("cruise", "row-16").orElseThrow();
    Map<String, JFreeChart> charts = new LinkedHashMap<>();
    both(charts, "over-panel", hold, "upper-side-left-a", style);
    both(charts, "over-total", hold, "quillon-82", style);
    both(charts, "tight-section", cruise, "station-b", style);
    both(charts, "tight-other", cruise, "propulsion-row-16-cruise", style);
    both(charts, "small-panel", cruise, "lower-side-left-c", style);
    both(charts, "missing-panel", missing, "crown-e", style);
    both(charts, "missing-total", missing, "quillon-82", style);
    both(charts, "no-target", ExampleLedger.withoutTarget(cruise), "station-a", style);
    ReceiverSheet gap = withoutBand(cruise, Bands.position("200"));
    both(charts, "gap-panel", gap, "crown-e", style);
    return charts;
  }

  /** A sheet none of whose rows knows one band. */
  private static ReceiverSheet withoutBand(ReceiverSheet sheet, int band) {
    List<LedgerRow> rows = new ArrayList<>();
    for (LedgerRow row : sheet.rows()) {
      double[] values = row.meanSquares().toArray();
      values[band] = Double.NaN;
      Judgement known = row.judgement();
      Judgement judgement =
          new Judgement(known.target(), known.reserve(), known.allowance(), Double.NaN, null);
      rows.add(
          new LedgerRow(
              row.id(),
              row.parent(),
              row.depth(),
              row.name(),
              row.kind(),
              row.way(),
              row.choice(),
              BandSpectrum.of(values),
              judgement,
              Status.PARTIAL,
              "no value at 200 Hz"));
    }
    return new ReceiverSheet(sheet.condition(), sheet.receiver(), rows, List.of());
  }

  private static void both(
      Map<String, JFreeChart> charts,
      String name,
      ReceiverSheet sheet,
      String selected,
      ChartStyle style) {
    charts.put("stack-" + name, StackPicture.of(sheet, StackParts.of(sheet, selected), style));
    charts.put("spectrum-" + name, SpectrumPicture.of(sheet, selected, style));
  }
}
