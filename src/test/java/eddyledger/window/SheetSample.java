package eddyledger.window;

import eddyledger.app.Computation;
import eddyledger.app.ComputedLedger;
import eddyledger.app.Edit;
import eddyledger.app.ProjectState;
import eddyledger.app.Projects;
import eddyledger.chart.Palette;
import eddyledger.file.ProjectReader;
import eddyledger.model.BandTable;
import eddyledger.model.ByCondition;
import eddyledger.model.JudgedBands;
import eddyledger.model.TreeEdit;
import eddyledger.model.Vehicle;
import eddyledger.present.SheetPresenter;
import eddyledger.quantity.Progress;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.File;
import java.nio.file.Path;
import java.util.function.Consumer;
import javax.imageio.ImageIO;
import javax.swing.JFrame;
import javax.swing.SwingUtilities;

/** Draws the sheet of several rows into pictures, to be looked at; arguments: a folder. */
public final class SheetSample {
  private static final int SETTLE_MS = 250;

  private final ProjectState state = new ProjectState();
  private final SheetPresenter presenter = new SheetPresenter(state);
  private final Computation computation = new Computation(new Projects(new ProjectReader()));
  private final File folder;
  private Vehicle vehicle;

  private SheetSample(File folder) {
    this.folder = folder;
  }

  /** Draws all. */
  public static void main(String[] arguments) throws Exception {
    SheetSample sample = new SheetSample(new File(arguments[0]));
    sample.vehicle =
        new Projects(new ProjectReader())
            .open(Path.of("examples", "quillon-82.eddyledger"))
            .vehicle()
            .orElseThrow();
    for (Palette palette : Palette.values()) {
      SwingUtilities.invokeAndWait(() -> Theme.install(palette));
      sample.draw("panel-" + palette, 760, it -> it.select("crown-a"));
      sample.draw("whole-" + palette, 1080, it -> it.select("crown-a"));
      sample.draw("own-" + palette, 1120, SheetSample::own);
      sample.draw("small-" + palette, 330, 630, SheetSample::own);
      sample.draw("bands-" + palette, 760, SheetSample::bands);
      sample.draw("faults-" + palette, 900, SheetSample::faults);
      sample.draw("section-" + palette, 560, it -> it.select("station-a"));
      sample.draw("vehicle-" + palette, 1080, it -> it.select("quillon-82"));
      sample.draw("source-" + palette, 760, it -> it.select("propulsion-row-2-cruise"));
    }
    sample.switched();
    System.exit(0);
  }

  private void select(String row) {
    state.select(state.selection().on(row));
  }

  private void type(String key, String text) {
    presenter.enter(key);
    presenter.type(key, text);
    presenter.leave(key);
  }

  private static void own(SheetSample it) {
    it.select("upper-side-left-a");
    it.type("thickness", "0.063 in");
    it.type("lossFactor", "0.045");
    it.type("displacementThickness", "6");
    it.type("allowance", "61,7");
    it.presenter.only("localSpeed");
    it.compute();
  }

  private static void faults(SheetSample it) {
    it.select("window-panes-left-a");
    it.type("lossFactor", "0.09");
    it.presenter.enter("length");
    it.presenter.type("length", "1,234");
  }

  private static void bands(SheetSample it) {
    it.select("crown-a");
    it.state.apply(
        Edit.of(
            "loss factor per band",
            "crown-a",
            vehicle ->
                TreeEdit.settings(
                    vehicle,
                    "crown-a",
                    settings ->
                        settings
                            .edit()
                            .lossFactor(
                                ByCondition.always(
                                    JudgedBands.of(BandTable.octaves("125", 0.02, 0.04, 0.06))))
                            .localSpeed(null)
                            .build())));
    it.presenter.link("thickness");
    it.state.apply(
        Edit.of(
            "no zone",
            "crown-a",
            vehicle ->
                TreeEdit.settings(
                    vehicle, "station-a", settings -> settings.edit().localSpeed(null).build())));
    it.compute();
  }

  private void compute() {
    ComputedLedger result = computation.compute(state.revision(), state.vehicle(), Progress.NONE);
    state.computed(result);
  }

  private void draw(String name, int height, Consumer<SheetSample> before) throws Exception {
    draw(name, 348, height, before);
  }

  private void draw(String name, int width, int height, Consumer<SheetSample> before)
      throws Exception {
    JFrame[] frame = new JFrame[1];
    SwingUtilities.invokeAndWait(
        () -> {
          state.put(vehicle, null);
          compute();
          state.select(state.selection().at("cruise", "row-2"));
          before.accept(this);
          frame[0] = new JFrame();
          frame[0].setUndecorated(true);
          frame[0].getRootPane().setWindowDecorationStyle(javax.swing.JRootPane.NONE);
          frame[0].getContentPane().add(new SheetView(presenter, () -> {}));
          frame[0].setSize(width, height);
          frame[0].setVisible(true);
        });
    Thread.sleep(SETTLE_MS);
    SwingUtilities.invokeAndWait(
        () -> {
          BufferedImage image = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
          Graphics2D g = image.createGraphics();
          frame[0].getContentPane().printAll(g);
          g.dispose();
          frame[0].dispose();
          save(image, name);
        });
  }

  /** The theme changes while the sheet is open. */
  private void switched() throws Exception {
    JFrame[] frame = new JFrame[1];
    SwingUtilities.invokeAndWait(
        () -> {
          Theme.install(Palette.LIGHT);
          own(this);
          frame[0] = new JFrame();
          frame[0].getContentPane().add(new SheetView(presenter, () -> {}));
          frame[0].setSize(348, 1000);
          frame[0].setVisible(true);
        });
    Thread.sleep(SETTLE_MS);
    SwingUtilities.invokeAndWait(() -> Theme.install(Palette.DARK));
    Thread.sleep(SETTLE_MS);
    SwingUtilities.invokeAndWait(
        () -> {
          BufferedImage image = new BufferedImage(348, 1000, BufferedImage.TYPE_INT_RGB);
          Graphics2D g = image.createGraphics();
          frame[0].getContentPane().printAll(g);
          g.dispose();
          frame[0].dispose();
          save(image, "switched");
        });
  }

  private void save(BufferedImage image, String name) {
    try {
      ImageIO.write(image, "png", new File(folder, name.toLowerCase() + ".png"));
    } catch (java.io.IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
  }
}
