package eddyledger.window;

import eddyledger.app.Background;
import eddyledger.app.Computation;
import eddyledger.app.ComputedLedger;
import eddyledger.app.Edit;
import eddyledger.app.ProjectState;
import eddyledger.app.RecentFile;
import eddyledger.app.StateListener.Aspect;
import eddyledger.chart.Palette;
import eddyledger.present.StartPage;
import eddyledger.present.WindowTitle;
import java.awt.CardLayout;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.time.ZoneId;
import java.util.List;
import javax.swing.JPanel;
import javax.swing.SwingUtilities;

/**
 * The program with its window: joins state, background computation and views. On the event thread.
 */
public final class Application {
  private static final String START = "start";
  private static final String DESK = "desk";
  private static final String TRACE = "trace";

  private final Services services;
  private final Runnable closed;
  private final ProjectState state = new ProjectState();
  private final WindowMemory memory;
  private final Background background;
  private final MainFrame frame;
  private final CardLayout cards = new CardLayout();
  private final JPanel pages = new JPanel(cards);
  private final DeskParts desk;
  private final StartView start;
  private final TraceGuide guide;
  private final FileCommands files;
  private final Menus menus;
  private String page = START;
  private Path remembered;

  /** Builds the window; {@link #show} shows it, and {@code closed} runs once it is closed. */
  public Application(Services services, Runnable closed) {
    this.services = services;
    this.closed = closed;
    memory = new WindowMemory(services.memory());
    Theme.install(memory.palette());
    frame = new MainFrame(memory);
    Dialogs dialogs = new Dialogs(frame);
    // before all that shows something: while views say "older", the numbers are on their way
    state.listen(this::recompute);
    desk = new DeskParts(state, memory, this::showTrace);
    guide = new TraceGuide(state, () -> page(DESK));
    files = new FileCommands(state, services, dialogs, desk.statusView());
    start = new StartView(new StartActions(files, services.recent(), this::refreshStart));
    background =
        new Background(
            new Computation(services.projects()),
            services.faults(),
            SwingUtilities::invokeLater,
            this::computed,
            this::progress);
    menus = new MenuContents(state, this).build(files);
    state.listen(this::changed);
    pages.add(start, START);
    pages.add(desk.view(), DESK);
    pages.add(guide.page(), TRACE);
    frame.fill(menus.bar(), pages, desk.statusView(), this::quit);
    frame.getRootPane().setTransferHandler(new FileDrop(files::open));
    refreshStart();
    page(START);
    retitle();
  }

  /** Shows the window, with a file opened if one is given. */
  public void show(Path file) {
    frame.setVisible(true);
    if (file != null) {
      files.open(file);
    }
  }

  private void changed(Aspect aspect) {
    switch (aspect) {
      case PROJECT -> {
        remembered = null;
        // what is there to be chosen from decides what the start page gives the focus to
        refreshStart();
        page(state.open() ? DESK : START);
      }
      case LEDGER -> {
        remember();
        retrace();
      }
      case SELECTION -> retrace();
      case FILE -> remember();
    }
    retitle();
    menus.refresh();
    desk.refresh();
  }

  private void recompute(Aspect aspect) {
    if (aspect == Aspect.PROJECT || aspect == Aspect.VEHICLE) {
      compute();
    }
  }

  private void retitle() {
    frame.setTitle(WindowTitle.of(state));
  }

  void compute() {
    desk.status().cancelled(false);
    if (state.open()) {
      background.request(state.revision(), state.vehicle());
      desk.statusView().begin("", this::cancel);
    } else {
      background.cancel();
      desk.statusView().end();
    }
  }

  void cancel() {
    background.cancel();
    desk.statusView().end();
    desk.status().cancelled(true);
    desk.refresh();
    menus.refresh();
  }

  boolean computing() {
    return background != null && background.busy();
  }

  private void progress(int steps, int of) {
    desk.status().computing(steps, of);
    desk.statusView().progress(steps, of);
    desk.statusView().refresh();
  }

  private void computed(ComputedLedger computed) {
    if (computed.revision() == state.revision()) {
      desk.statusView().end();
    }
    state.computed(computed);
  }

  /** Notes the file among those opened lately, once its levels are known. */
  private void remember() {
    Path file = state.file().orElse(null);
    if (file != null && !state.stale() && !file.equals(remembered)) {
      remembered = file;
      services.recent().add(RecentFile.of(file, state.ledger().orElseThrow(), Instant.now()));
    }
  }

  List<RecentFile> recent() {
    return services.recent().list();
  }

  private void refreshStart() {
    start.show(
        StartPage.of(
            services.recent().list(),
            services.examples().list(),
            Instant.now(),
            ZoneId.systemDefault(),
            Files::exists));
  }

  private void page(String name) {
    page = name;
    desk.statusView().setVisible(!name.equals(START));
    // the desk divides its height when it comes to be seen, so it must have its own by then
    frame.validate();
    cards.show(pages, name);
    if (name.equals(DESK)) {
      desk.toLedger();
    }
  }

  void showTrace() {
    guide.begin();
    page(TRACE);
    retrace();
    guide.focus();
  }

  private void retrace() {
    if (page.equals(TRACE) && !guide.show()) {
      page(DESK);
    }
  }

  void change(Edit edit) {
    state.apply(edit);
    state.select(state.selection().on(edit.subject()));
  }

  void select(String rowId) {
    state.select(state.selection().on(rowId));
  }

  MainFrame frame() {
    return frame;
  }

  DeskParts desk() {
    return desk;
  }

  void theme(Palette palette) {
    memory.palette(palette);
    Theme.install(palette);
    desk.refresh();
  }

  void showKeys() {
    Help.showKeys(frame, menus.commands());
  }

  void showCautions() {
    Help.showCautions(frame);
  }

  void quit() {
    files.afterUnsaved(
        () -> {
          desk.remember();
          frame.remember();
          background.close();
          frame.dispose();
          closed.run();
        });
  }
}
