package eddyledger.present;

import eddyledger.file.ProjectReader;
import eddyledger.ledger.Ledger;
import eddyledger.model.Vehicle;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;

/** The example of a regional aircraft, read anew and computed. */
final class Quillon {
  static final String CRUISE = "cruise";
  static final String HOLD = "hold";
  static final String ROW_2 = "row-2";

  private Quillon() {}

  static Vehicle vehicle() {
    try {
      return new ProjectReader()
          .read(Path.of("examples/quillon-82.eddyledger"))
          .vehicle()
          .orElseThrow();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static Ledger ledger() {
    return Ledger.of(vehicle());
  }
}
