package eddyledger.app;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import eddyledger.check.Finding;
import eddyledger.file.ProjectReader;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.State;
import eddyledger.model.Panel;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import eddyledger.quantity.AWeighting;
import java.io.IOException;
import java.nio.file.Path;
import java.time.Instant;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The examples are there, are what their cards say, and what the start page keeps of a project. */
class ExamplesTest {
  private final Examples examples = new Examples(new ProjectReader());

  @Test
  void everyExampleOpensUnderItsId() {
    assertThat(examples.list()).isNotEmpty();
    for (Example example : examples.list()) {
      OpenedProject opened = examples.open(example.id());
      assertThat(opened.findings()).isEmpty();
      assertThat(opened.vehicle().orElseThrow().id()).isEqualTo(example.id());
      assertThat(opened.vehicle().orElseThrow().name()).isEqualTo(example.title());
      assertThat(opened.file()).isEqualTo(Path.of(example.id() + ".eddyledger"));
    }
  }

  @Test
  void cardsSayWhatTheExamplesHold() {
    for (Example example : examples.list()) {
      Vehicle vehicle = examples.open(example.id()).vehicle().orElseThrow();
      long panels =
          TreePath.of(vehicle).stream().filter(path -> path.node() instanceof Panel).count();
      assertThat(example.holds())
          .isEqualTo(
              panels
                  + " panels, "
                  + vehicle.receivers().size()
                  + " seats, "
                  + vehicle.conditions().size()
                  + " conditions, "
                  + vehicle.targets().size()
                  + " targets");
    }
  }

  @Test
  void anUnknownExampleIsAFaultOfTheCaller() {
    assertThatThrownBy(() -> examples.text("../secret"))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void anExampleThatIsNowhereIsAFinding(@TempDir Path empty) throws IOException {
    Examples unpacked = new Examples(new ProjectReader(), empty);
    String id = unpacked.list().get(0).id();
    boolean packed = Examples.class.getResource("/examples/" + id + ".eddyledger") != null;
    OpenedProject opened = unpacked.open(id);
    if (packed) {
      assertThat(opened.vehicle()).isPresent();
      assertThat(unpacked.text(id)).isEqualTo(examples.text(id));
    } else {
      assertThat(opened.vehicle()).isEmpty();
      assertThat(opened.findings()).extracting(Finding::code).containsExactly("unreadable-file");
    }
  }

  @Test
  void theStartPageKeepsCountsAndTheWorstSeatsSpectrum() {
    Vehicle vehicle = examples.open("quillon-82").vehicle().orElseThrow();
    Ledger ledger = Ledger.of(vehicle);
    Instant now = Instant.parse("2026-12-01T09:14:00Z");
    RecentFile file = RecentFile.of(Path.of("x.eddyledger"), ledger, now);
    assertThat(file.description()).isEqualTo("Invented 82-seat twin-jet regional aircraft");
    assertThat(file.contributions()).isEqualTo(59 + 2);
    assertThat(file.targets()).isEqualTo(vehicle.targets().size());
    long over = ledger.targets().stream().filter(it -> it.state() == State.OVER).count();
    assertThat(file.over()).isEqualTo((int) over).isPositive();
    double expected = ledger.worst().total().levels().value(12) + AWeighting.weights().value(12);
    assertThat(file.levels().value(12)).isEqualTo(expected);
  }
}
