package eddyledger.chart;

import com.formdev.flatlaf.fonts.inter.FlatInterFont;
import eddyledger.ledger.ReceiverSheet;
import java.awt.Font;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
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
    return charts;
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
