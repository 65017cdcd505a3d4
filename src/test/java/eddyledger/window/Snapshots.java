package eddyledger.window;

import eddyledger.app.Examples;
import eddyledger.app.RecentFile;
import eddyledger.chart.Palette;
import eddyledger.file.ProjectReader;
import eddyledger.ledger.Ledger;
import eddyledger.present.StartPage;
import eddyledger.present.TraceAccount;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.image.BufferedImage;
import java.io.File;
import java.io.IOException;
import java.nio.file.Path;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Supplier;
import javax.imageio.ImageIO;
import javax.swing.JComponent;
import javax.swing.JFrame;
import javax.swing.SwingUtilities;

/**
 * Renders views into pictures, to be looked at by people. Needs a display.
 *
 * <p>Arguments: folder of the pictures.
 */
final class Snapshots {
  private final File folder;

  private Snapshots(File folder) {
    this.folder = folder;
  }

  public static void main(String[] arguments) throws Exception {
    Snapshots snapshots = new Snapshots(new File(arguments[0]));
    Ledger ledger =
        Ledger.of(
            new ProjectReader()
                .read(Path.of("examples", "quillon-82.eddyledger"))
                .vehicle()
                .orElseThrow());
    snapshots.trace(ledger, Palette.LIGHT, 1440, 960, "upper-side-left-a", false);
    snapshots.trace(ledger, Palette.DARK, 1366, 768, "lower-side-left-b", false);
    snapshots.trace(ledger, Palette.LIGHT, 1366, 768, "window-panes-left-a", true);
    snapshots.start(ledger, Palette.LIGHT, 1440, 900, true);
    snapshots.start(ledger, Palette.DARK, 1366, 768, true);
    snapshots.start(ledger, Palette.LIGHT, 1366, 768, false);
    System.exit(0);
  }

  private void trace(
      Ledger ledger, Palette palette, int width, int height, String panel, boolean numbers)
      throws Exception {
    int band = TraceAccount.loudestBand(ledger, panel, "cruise", "row-2");
    TraceAccount account = TraceAccount.of(ledger, panel, "cruise", "row-2", band).orElseThrow();
    String name = "trace-" + panel + (numbers ? "-numbers" : "") + "-" + width;
    snap(
        palette,
        width,
        height,
        name,
        () -> {
          TraceView view = new TraceView(() -> {});
          view.show(account);
          if (numbers) {
            click(view, "trace.show-numbers");
          }
          return view;
        });
  }

  private void start(Ledger ledger, Palette palette, int width, int height, boolean files)
      throws Exception {
    Instant now = Instant.parse("2026-12-01T09:30:00Z");
    Path folder = Path.of("/home/lead/Programmes/Quillon");
    List<RecentFile> recent = new ArrayList<>();
    long[] hoursAgo = {0, 24, 24 * 4, 24 * 12, 24 * 400};
    for (int i = 0; i < hoursAgo.length && files; i++) {
      RecentFile computed =
          RecentFile.of(
              folder.resolve(i == 0 ? "quillon-82.eddyledger" : "study-" + i + ".eddyledger"),
              ledger,
              now.minusSeconds(16 * 60 + hoursAgo[i] * 3600));
      recent.add(
          i == 1
              ? new RecentFile(
                  computed.file(), computed.opened(), "", 12, 1, 1, 3, 1, computed.levels())
              : computed);
    }
    StartPage page =
        StartPage.of(
            recent,
            new Examples(new ProjectReader()).list(),
            now,
            ZoneOffset.UTC,
            file -> !file.endsWith("study-3.eddyledger"));
    snap(
        palette,
        width,
        height,
        "start-" + width + (files ? "" : "-empty"),
        () -> {
          StartView view = new StartView(new NoActions());
          view.show(page);
          return view;
        });
  }

  /** Does nothing. */
  private static final class NoActions implements StartView.Actions {
    @Override
    public void open(Path file) {}

    @Override
    public void openExample(String id) {}

    @Override
    public void newEmpty() {}

    @Override
    public void chooseFile() {}

    @Override
    public void forget(Path file) {}
  }

  private static void click(JComponent view, String name) {
    for (Component child : view.getComponents()) {
      if (name.equals(child.getName())) {
        ((javax.swing.AbstractButton) child).doClick(0);
      } else if (child instanceof JComponent inner) {
        click(inner, name);
      }
    }
  }

  /** Shows a view in a frame of a size and writes what it paints. */
  void snap(Palette palette, int width, int height, String name, Supplier<JComponent> view)
      throws Exception {
    JFrame[] frame = new JFrame[1];
    SwingUtilities.invokeAndWait(
        () -> {
          Theme.install(palette);
          frame[0] = new JFrame("quillon-82.eddyledger – Eddyledger");
          frame[0].setContentPane(view.get());
          frame[0].setMinimumSize(new Dimension(width, height));
          frame[0].setSize(width, height);
          frame[0].setVisible(true);
        });
    Thread.sleep(700);
    SwingUtilities.invokeAndWait(
        () -> {
          BufferedImage image = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
          Component root = frame[0].getRootPane();
          root.printAll(image.createGraphics());
          frame[0].dispose();
          try {
            ImageIO.write(image, "png", new File(folder, name + ".png"));
          } catch (IOException e) {
            throw new IllegalStateException(e);
          }
        });
  }
}
