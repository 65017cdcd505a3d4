package eddyledger.window;

import java.nio.file.Path;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.api.io.TempDir;

/** Tests that share one window; each begins at the start page. */
@WindowTest
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
abstract class WindowFlow {
  @TempDir Path folder;
  Harness harness;
  Hands hands;

  @BeforeAll
  void openWindow() {
    harness = new Harness(1440, 900);
    hands = new Hands(harness);
  }

  @BeforeEach
  void beginAtTheStartPage() {
    hands.clearDesk();
  }

  @AfterAll
  void closeWindow() {
    if (harness != null) {
      harness.close();
    }
  }
}
