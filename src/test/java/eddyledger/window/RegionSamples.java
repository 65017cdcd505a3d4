package eddyledger.window;

import eddyledger.app.ComputedLedger;
import eddyledger.app.Edit;
import eddyledger.app.ProjectState;
import eddyledger.chart.Palette;
import eddyledger.file.ProjectReader;
import eddyledger.ledger.Ledger;
import eddyledger.model.Node;
import eddyledger.model.Panel;
import eddyledger.model.Section;
import eddyledger.model.Vehicle;
import eddyledger.present.LedgerPresenter;
import eddyledger.present.TargetStripPresenter;
import java.awt.BorderLayout;
import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Consumer;
import javax.imageio.ImageIO;
import javax.swing.JFrame;
import javax.swing.JPanel;
import javax.swing.SwingUtilities;

/**
 * Draws target strip and ledger of the example into a folder, to be looked at, and tells how long
 * painting takes: {@code RegionSamples FOLDER}. Needs a display.
 */
final class RegionSamples {
  private static final int[][] SIZES = {{1440, 548, 355}, {1366, 460, 337}};

  private RegionSamples() {}

  public static void main(String[] arguments) throws Exception {
    Path folder = Files.createDirectories(Path.of(arguments[0]));
    Vehicle vehicle = example();
    ProjectState whole = state(vehicle);
    ProjectState partial = state(without(vehicle, "crown-e"));
    partial.select(partial.selection().at("cruise", "row-16").on("crown-e"));
    for (Palette palette : Palette.values()) {
      SwingUtilities.invokeAndWait(() -> Theme.install(palette));
      for (int[] size : SIZES) {
        String look = palette.name().toLowerCase(Locale.ROOT) + "-" + size[0];
        whole.select(whole.selection().at("cruise", "row-2").on("upper-side-left-a"));
        draw(whole, size, folder.resolve("whole-" + look + ".png"), it -> {});
        draw(partial, size, folder.resolve("partial-" + look + ".png"), it -> {});
        ProjectState stale = state(vehicle);
        stale.apply(Edit.of("name", "", it -> it.edit().name("Quillon 83").build()));
        draw(stale, size, folder.resolve("stale-" + look + ".png"), it -> {});
        ProjectState first = new ProjectState();
        first.put(vehicle, null);
        draw(first, size, folder.resolve("first-" + look + ".png"), it -> {});
        ProjectState many = state(RegionVehicles.many(vehicle));
        draw(many, size, folder.resolve("many-" + look + ".png"), LedgerPresenter::openAll);
      }
    }
    System.exit(0);
  }

  private static Vehicle example() throws IOException {
    Path file = Path.of("examples/quillon-82.eddyledger");
    return new ProjectReader().read(file).vehicle().orElseThrow();
  }

  private static ProjectState state(Vehicle vehicle) {
    ProjectState state = new ProjectState();
    state.put(vehicle, null);
    Optional<Ledger> ledger = Optional.of(Ledger.of(vehicle));
    state.computed(new ComputedLedger(state.revision(), ledger, List.of()));
    return state;
  }

  private static Vehicle without(Vehicle vehicle, String panelId) {
    List<Node> tree = vehicle.tree().stream().map(node -> stripped(node, panelId)).toList();
    return vehicle.edit().tree(tree).build();
  }

  private static Node stripped(Node node, String panelId) {
    if (node instanceof Section section) {
      return section.withChildren(
          section.children().stream().map(child -> stripped(child, panelId)).toList());
    }
    Panel panel = (Panel) node;
    return panel.id().equals(panelId)
        ? panel.withSettings(panel.settings().edit().construction(null).build())
        : panel;
  }

  private static void draw(
      ProjectState state, int[] size, Path file, Consumer<LedgerPresenter> before)
      throws Exception {
    SwingUtilities.invokeAndWait(
        () -> {
          LedgerPresenter presenter = new LedgerPresenter(state);
          before.accept(presenter);
          JFrame frame = frame(state, presenter, size);
          SwingUtilities.invokeLater(
              () -> {
                save(frame, file);
                frame.dispose();
              });
        });
    SwingUtilities.invokeAndWait(() -> {});
  }

  private static JFrame frame(ProjectState state, LedgerPresenter presenter, int[] size) {
    JFrame frame = new JFrame();
    frame.setUndecorated(true);
    JPanel content = new JPanel(new BorderLayout());
    content.add(new TargetStripView(new TargetStripPresenter(state)), BorderLayout.NORTH);
    content.add(new LedgerView(presenter), BorderLayout.CENTER);
    JPanel aside = new JPanel();
    aside.setPreferredSize(new Dimension(size[2], 1));
    content.add(aside, BorderLayout.EAST);
    content.setPreferredSize(new Dimension(size[0], size[1]));
    frame.setContentPane(content);
    frame.pack();
    frame.setVisible(true);
    return frame;
  }

  private static void save(JFrame frame, Path file) {
    BufferedImage image =
        new BufferedImage(frame.getWidth(), frame.getHeight(), BufferedImage.TYPE_INT_RGB);
    long least = Long.MAX_VALUE;
    for (int i = 0; i < 30; i++) {
      Graphics2D g = image.createGraphics();
      long start = System.nanoTime();
      frame.getContentPane().paint(g);
      least = Math.min(least, System.nanoTime() - start);
      g.dispose();
    }
    System.out.printf(Locale.ROOT, "%s: painted in %.1f ms%n", file.getFileName(), least / 1e6);
    try {
      ImageIO.write(image, "png", new File(file.toString()));
    } catch (IOException e) {
      throw new IllegalStateException(e);
    }
  }
}
