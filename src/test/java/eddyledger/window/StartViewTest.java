package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.Examples;
import eddyledger.app.RecentFile;
import eddyledger.chart.Palette;
import eddyledger.file.ProjectReader;
import eddyledger.present.StartPage;
import eddyledger.quantity.BandSpectrum;
import java.awt.event.ActionEvent;
import java.nio.file.Path;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import javax.swing.AbstractButton;
import javax.swing.JList;
import javax.swing.SwingUtilities;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The start page: keyboard and buttons do what they say. */
@WindowTest
class StartViewTest {
  private static final Instant NOW = Instant.parse("2026-12-01T09:30:00Z");
  private static final Path FIRST = Path.of("a.eddyledger").toAbsolutePath();
  private static final Path SECOND = Path.of("b.eddyledger").toAbsolutePath();

  private final List<String> done = new ArrayList<>();

  @BeforeAll
  static void theme() throws Exception {
    SwingUtilities.invokeAndWait(() -> Theme.install(Palette.LIGHT));
  }

  private final class Noted implements StartView.Actions {
    @Override
    public void open(Path file) {
      done.add("open " + file);
    }

    @Override
    public void openExample(String id) {
      done.add("example " + id);
    }

    @Override
    public void newEmpty() {
      done.add("new");
    }

    @Override
    public void chooseFile() {
      done.add("choose");
    }

    @Override
    public void forget(Path file) {
      done.add("forget " + file);
    }
  }

  private StartView view(Path... files) {
    List<RecentFile> recent = new ArrayList<>();
    for (Path file : files) {
      recent.add(new RecentFile(file, NOW, "Aircraft", 3, 0, 0, 1, 0, BandSpectrum.constant(40.0)));
    }
    StartView view = new StartView(new Noted());
    view.show(
        StartPage.of(
            recent, new Examples(new ProjectReader()).list(), NOW, ZoneOffset.UTC, file -> true));
    return view;
  }

  private static void press(JList<?> list, String key) {
    Object name = list.getInputMap().get(javax.swing.KeyStroke.getKeyStroke(key));
    list.getActionMap().get(name).actionPerformed(new ActionEvent(list, 0, key));
  }

  @Test
  void theListIsWorkedByKeyboard() throws Exception {
    SwingUtilities.invokeAndWait(
        () -> {
          JList<?> list = (JList<?>) TraceViewTest.find(view(FIRST, SECOND), "start.recent");
          assertThat(list.getSelectedIndex()).isZero();
          press(list, "ENTER");
          press(list, "DOWN");
          press(list, "ENTER");
          press(list, "DELETE");
          assertThat(done).containsExactly("open " + FIRST, "open " + SECOND, "forget " + SECOND);
        });
  }

  @Test
  void buttonsAndCards() throws Exception {
    SwingUtilities.invokeAndWait(
        () -> {
          StartView view = view();
          for (String name : List.of("start.new", "start.open", "start.example.quillon-82")) {
            ((AbstractButton) TraceViewTest.find(view, name)).doClick(0);
          }
          assertThat(done).containsExactly("new", "choose", "example quillon-82");
        });
  }

  @Test
  void theSelectionStaysAtItsPlaceWhenAFileIsForgotten() throws Exception {
    SwingUtilities.invokeAndWait(
        () -> {
          StartView view = view(FIRST, SECOND);
          JList<?> list = (JList<?>) TraceViewTest.find(view, "start.recent");
          list.setSelectedIndex(1);
          RecentFile left =
              new RecentFile(FIRST, NOW, "", 3, 0, 0, 1, 0, BandSpectrum.constant(40.0));
          view.show(StartPage.of(List.of(left), List.of(), NOW, ZoneOffset.UTC, file -> true));
          assertThat(list.getSelectedIndex()).isZero();
        });
  }
}
