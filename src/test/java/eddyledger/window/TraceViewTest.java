package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.chart.Palette;
import eddyledger.file.ProjectReader;
import eddyledger.ledger.Ledger;
import eddyledger.present.TraceAccount;
import java.awt.Component;
import java.awt.Container;
import java.awt.event.ActionEvent;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import javax.swing.AbstractButton;
import javax.swing.JComboBox;
import javax.swing.JTable;
import javax.swing.SwingUtilities;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The view of a trace: its controls do what they say, its rows can be read by a screen reader. */
@WindowTest
class TraceViewTest {
  private static Ledger ledger;

  @BeforeAll
  static void compute() throws Exception {
    ledger =
        Ledger.of(
            new ProjectReader()
                .read(Path.of("examples/quillon-82.eddyledger"))
                .vehicle()
                .orElseThrow());
    SwingUtilities.invokeAndWait(() -> Theme.install(Palette.LIGHT));
  }

  private static TraceAccount account(int band) {
    return TraceAccount.of(ledger, "crown-a", "cruise", "row-2", band).orElseThrow();
  }

  /** The component with a name below a container. */
  static Component find(Container below, String name) {
    for (Component child : below.getComponents()) {
      if (name.equals(child.getName())) {
        return child;
      }
      Component inner = child instanceof Container container ? find(container, name) : null;
      if (inner != null) {
        return inner;
      }
    }
    return null;
  }

  @Test
  void everyStageCanBeReadAloud() throws Exception {
    SwingUtilities.invokeAndWait(
        () -> {
          TraceView view = new TraceView(() -> {});
          TraceAccount account = account(16);
          view.show(account);
          for (int i = 1; i <= 9; i++) {
            Component row = find(view, "trace.stage." + i);
            assertThat(row.isFocusable()).isTrue();
            assertThat(row.getAccessibleContext().getAccessibleDescription())
                .isEqualTo(String.join(". ", account.stages().get(i - 1).lines()));
          }
          assertThat(find(view, "trace.total").getAccessibleContext().getAccessibleDescription())
              .isEqualTo(account.total().line());
          JTable table = (JTable) find(view, "trace.numbers");
          assertThat(table.getRowCount()).isEqualTo(account.numbers().size());
        });
  }

  @Test
  void choosingABandAsksForItOnceAndShowingDoesNot() throws Exception {
    SwingUtilities.invokeAndWait(
        () -> {
          List<Integer> asked = new ArrayList<>();
          TraceView view = new TraceView(() -> {});
          view.onBand(
              band -> {
                asked.add(band);
                view.show(account(band));
              });
          view.show(account(16));
          assertThat(asked).isEmpty();
          ((JComboBox<?>) find(view, "trace.band")).setSelectedIndex(10);
          assertThat(asked).containsExactly(10);
          TracePage page = (TracePage) find(view, "trace.stages");
          Component row = find(view, "trace.stage.4");
          page.getActionMap().get("RIGHT").actionPerformed(new ActionEvent(page, 0, ""));
          page.getActionMap().get("LEFT").actionPerformed(new ActionEvent(page, 0, ""));
          assertThat(asked).containsExactly(10, 11, 10);
          assertThat(find(view, "trace.stage.4")).isSameAs(row);
          view.show(account(27));
          page.getActionMap().get("RIGHT").actionPerformed(new ActionEvent(page, 0, ""));
          assertThat(asked).hasSize(3);
        });
  }

  @Test
  void backAndEscapeLeadBack() throws Exception {
    SwingUtilities.invokeAndWait(
        () -> {
          int[] back = new int[1];
          TraceView view = new TraceView(() -> back[0]++);
          view.show(account(16));
          ((AbstractButton) find(view, "trace.back")).doClick(0);
          view.getActionMap().get("back").actionPerformed(new ActionEvent(view, 0, ""));
          assertThat(back[0]).isEqualTo(2);
        });
  }

  @Test
  void rowsStandBelowOneAnotherAndHoldTheirWords() throws Exception {
    SwingUtilities.invokeAndWait(
        () -> {
          TracePage page = new TracePage();
          page.show(account(16), band -> {});
          for (int width : new int[] {1366, 1440}) {
            page.setSize(width, 2000);
            page.doLayout();
            int bottom = 0;
            for (Component row : page.getComponents()) {
              assertThat(row.getY()).isEqualTo(bottom);
              assertThat(row.getHeight()).isGreaterThanOrEqualTo(((TraceRow) row).heightFor(width));
              bottom += row.getHeight();
            }
            assertThat(bottom).isEqualTo(2000);
          }
        });
  }
}
