package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.bench.MadeUpVehicle;
import eddyledger.file.ProjectWriter;
import java.awt.event.KeyEvent;
import java.io.IOException;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

/** A vehicle that takes long to compute: cancelled, computed again, edited meanwhile. */
@WindowTest
class BigVehicleTest extends WindowFlow {
  private static final int PANELS = 300;

  private void open() throws IOException {
    Path file = folder.resolve("big.eddyledger");
    ProjectWriter.save(MadeUpVehicle.of(PANELS), file);
    harness.press(KeyEvent.VK_O, KeyEvent.VK_CONTROL);
    harness.type(file);
    harness.until("the desk shows", () -> hands.title().startsWith("big.eddyledger"));
  }

  @Test
  void aLongComputationIsCancelledAndComputedAgainAndOldNumbersStayMeanwhile() throws IOException {
    open();
    harness.until("cancelling is offered", () -> harness.shows("status.cancel"));
    harness.window.button("status.cancel").click();
    harness.until("it is cancelled", () -> hands.status().startsWith("Cancelled"));
    harness.untilHidden("status.cancel");
    assertThat(harness.row("made-up")).doesNotContainPattern("\\d\\d\\.\\d dB");
    harness.press(KeyEvent.VK_F5);
    harness.ready();
    String before = harness.row("made-up");
    assertThat(before).containsPattern("\\d\\d\\.\\d dB");

    // a setting of the whole vehicle touches every panel
    harness.clickRow("made-up");
    hands.typeInto("convectionRatio", "0.6");
    harness.until("cancelling is offered", () -> harness.shows("status.cancel"));
    assertThat(hands.status()).startsWith("Computing");
    assertThat(harness.row("made-up")).as("still legible").isEqualTo(before);
    assertThat(hands.ledgerHeading()).contains("earlier levels");
    harness.press(KeyEvent.VK_PERIOD, KeyEvent.VK_CONTROL);
    harness.until("it is cancelled", () -> hands.status().startsWith("Cancelled"));
    assertThat(harness.row("made-up")).isEqualTo(before);
    harness.press(KeyEvent.VK_F5);
    harness.ready();
    assertThat(harness.row("made-up")).isNotEqualTo(before);
    assertThat(hands.ledgerHeading()).doesNotContain("earlier levels");
  }
}
