package eddyledger.window;

import eddyledger.chart.Palette;
import java.awt.Rectangle;
import java.awt.event.KeyEvent;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import javax.imageio.ImageIO;
import org.assertj.swing.edt.GuiActionRunner;

/**
 * Takes pictures of the window on the example: of the desk, the trace and the start page, light and
 * dark. Arguments: a folder, then sizes such as 1440x900.
 */
final class Screens {
  private Screens() {}

  public static void main(String[] arguments) throws Exception {
    Path folder = Path.of(arguments[0]);
    Files.createDirectories(folder);
    for (int i = 1; i < arguments.length; i++) {
      String[] size = arguments[i].split("x");
      for (Palette palette : Palette.values()) {
        take(folder, Integer.parseInt(size[0]), Integer.parseInt(size[1]), palette);
      }
    }
    System.exit(0);
  }

  private static void take(Path folder, int width, int height, Palette palette) throws Exception {
    String end = palette.name().toLowerCase() + "-" + width + "x" + height + ".png";
    Path copies = Files.createTempDirectory("screens");
    try (Harness harness = new Harness(width, height, palette)) {
      Path example = Harness.example(copies);
      save(harness, folder.resolve("start-" + end));
      harness.openByDialog(example);
      harness.clickTile("tile-cruise-row-2");
      harness.window.table("ledger").focus();
      harness.select("upper-side-left-a");
      save(harness, folder.resolve("desk-" + end));
      harness.press(KeyEvent.VK_P, KeyEvent.VK_CONTROL);
      save(harness, folder.resolve("spectrum-" + end));
      harness.press(KeyEvent.VK_F8);
      save(harness, folder.resolve("findings-" + end));
      harness.press(KeyEvent.VK_T, KeyEvent.VK_CONTROL);
      save(harness, folder.resolve("trace-" + end));
    }
  }

  private static void save(Harness harness, Path file) throws IOException {
    harness.settle();
    Rectangle bounds = GuiActionRunner.execute(() -> harness.window.target().getBounds());
    BufferedImage image;
    try {
      image = new java.awt.Robot().createScreenCapture(bounds);
    } catch (java.awt.AWTException e) {
      throw new IOException(e);
    }
    ImageIO.write(image, "png", file.toFile());
    System.out.println(file);
  }
}
