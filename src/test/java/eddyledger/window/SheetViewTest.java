package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.Computation;
import eddyledger.app.ProjectState;
import eddyledger.app.Projects;
import eddyledger.chart.Palette;
import eddyledger.file.ProjectReader;
import eddyledger.model.TreeEdit;
import eddyledger.model.Vehicle;
import eddyledger.present.SheetPresenter;
import eddyledger.quantity.Progress;
import java.awt.event.KeyEvent;
import java.nio.file.Path;
import java.util.concurrent.atomic.AtomicInteger;
import javax.swing.JFrame;
import javax.swing.JTextField;
import org.assertj.swing.edt.GuiActionRunner;
import org.assertj.swing.fixture.FrameFixture;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** The sheet under real keys and a real mouse. */
@WindowTest
class SheetViewTest {
  private final Projects projects = new Projects(new ProjectReader());
  private final Vehicle example =
      projects.open(Path.of("examples", "quillon-82.eddyledger")).vehicle().orElseThrow();
  private final ProjectState state = new ProjectState();
  private final AtomicInteger traces = new AtomicInteger();
  private SheetView view;
  private FrameFixture window;

  @BeforeEach
  void open() {
    JFrame frame =
        GuiActionRunner.execute(
            () -> {
              Theme.install(Palette.LIGHT);
              SheetPresenter presenter = new SheetPresenter(state);
              state.put(example, null);
              state.select(state.selection().at("cruise", "row-2").on("crown-a"));
              view = new SheetView(presenter, traces::incrementAndGet);
              JFrame made = new JFrame("Sheet");
              made.getContentPane().add(view);
              made.setSize(370, 900);
              return made;
            });
    window = new FrameFixture(frame);
    window.show();
  }

  @AfterEach
  void close() {
    window.cleanUp();
  }

  private void compute() {
    GuiActionRunner.execute(
        () ->
            state.computed(
                new Computation(projects)
                    .compute(state.revision(), state.vehicle(), Progress.NONE)));
  }

  private Vehicle vehicle() {
    return GuiActionRunner.execute(state::vehicle);
  }

  @Test
  void typingOverASelectionIsOneStepAndKeepsFocusAndCaret() {
    window.textBox("sheet.length").focus().selectAll().enterText("0.65");
    window.robot().waitForIdle();
    assertThat(length()).isEqualTo(0.65);
    compute();
    window.textBox("sheet.length").requireText("0.65").requireFocused();
    JTextField field = (JTextField) window.textBox("sheet.length").target();
    assertThat(GuiActionRunner.execute(field::getCaretPosition)).isEqualTo(4);
    window.textBox("sheet.length").pressAndReleaseKeys(KeyEvent.VK_TAB);
    // the way back has come to be, and is next in reading order
    window.button("sheet.length.back").requireFocused();
    window.textBox("sheet.length").requireText("0.650");
    GuiActionRunner.execute(state::undo);
    assertThat(vehicle()).isEqualTo(example);
    window.textBox("sheet.length").requireText("0.500");
  }

  private Double length() {
    return TreeEdit.find(vehicle(), "crown-a").orElseThrow().node().settings().length();
  }

  @Test
  void escapeRestoresAndTheWayBackIsAButton() {
    window.textBox("sheet.length").focus().selectAll().enterText("0.7");
    window.textBox("sheet.length").pressAndReleaseKeys(KeyEvent.VK_ESCAPE);
    window.textBox("sheet.length").requireText("0.500");
    assertThat(vehicle()).isEqualTo(example);
    window.textBox("sheet.length").selectAll().enterText("0.7");
    window.textBox("sheet.length").pressAndReleaseKeys(KeyEvent.VK_ENTER);
    window.button("sheet.length.back").requireText("back to 0.500 m").click();
    assertThat(vehicle()).isEqualTo(example);
  }

  @Test
  void aThicknessTypedInInchesMakesTheFieldItsOwnWithoutLosingTheFocus() {
    window.textBox("sheet.thickness").focus().selectAll().enterText("0.063 in");
    window.textBox("sheet.thickness").requireText("0.063 in").requireFocused();
    window.textBox("sheet.thickness").pressAndReleaseKeys(KeyEvent.VK_ENTER);
    window.textBox("sheet.thickness").requireText("1.6002");
    GuiActionRunner.execute(state::undo);
    assertThat(vehicle()).isEqualTo(example);
  }

  @Test
  void addingATargetAddsItsLinesBelowTheFieldBeingTypedIn() {
    GuiActionRunner.execute(
        () -> {
          state.put(example.edit().targets(java.util.List.of()).build(), null);
          state.select(state.selection().on("quillon-82"));
        });
    window.textBox("sheet.target").focus().enterText("75.5");
    window.textBox("sheet.target").requireText("75.5").requireFocused();
    window.textBox("sheet.target.reserve").requireText("0.0");
    GuiActionRunner.execute(state::undo);
    assertThat(vehicle().targets()).isEmpty();
  }

  @Test
  void theMenuOfAFieldIsReachedByKeys() {
    GuiActionRunner.execute(() -> state.select(state.selection().at("hold", "row-2")));
    window.textBox("sheet.lossFactor").focus();
    window.robot().pressKey(KeyEvent.VK_SHIFT);
    window.robot().pressAndReleaseKeys(KeyEvent.VK_F10);
    window.robot().releaseKey(KeyEvent.VK_SHIFT);
    window.robot().waitForIdle();
    for (int i = 0; i < 3; i++) {
      window.robot().pressAndReleaseKeys(KeyEvent.VK_DOWN);
    }
    window.robot().pressAndReleaseKeys(KeyEvent.VK_ENTER);
    window.robot().waitForIdle();
    assertThat(TreeEdit.find(vehicle(), "crown-a").orElseThrow().node().settings().lossFactor())
        .matches(it -> it.overriddenIn("hold"));
  }

  @Test
  void aFieldIsReachedByItsKeyAndBroughtIntoSight() {
    GuiActionRunner.execute(() -> view.focusField("supplier"));
    window.robot().waitForIdle();
    window.comboBox("sheet.supplier").requireFocused();
    assertThat(
            GuiActionRunner.execute(
                () -> !window.comboBox("sheet.supplier").target().getVisibleRect().isEmpty()))
        .isTrue();
  }

  @Test
  void aChoiceIsMadeWithTheMouseAndTheAccountIsAskedFor() {
    window.comboBox("sheet.spectrum").selectItem("Goody");
    assertThat(TreeEdit.find(vehicle(), "crown-a").orElseThrow().node().settings().wallPressure())
        .isNotNull();
    compute();
    window.button("sheet.trace").focus().pressAndReleaseKeys(KeyEvent.VK_SPACE);
    assertThat(traces).hasValue(1);
  }
}
