package eddyledger.app;

import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.State;
import eddyledger.ledger.TargetResult;
import eddyledger.ledger.Way;
import eddyledger.model.Vehicle;
import eddyledger.quantity.AWeighting;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.nio.file.Path;
import java.time.Instant;
import java.util.Objects;

/**
 * A project file that was opened lately, with what the start page shows of it without reading it.
 *
 * @param file the file, absolute
 * @param opened when it was last opened or saved
 * @param description what it describes, in a few words; may be empty
 * @param contributions how many contributions its ledger holds at one receiver
 * @param over targets that are missed
 * @param tight targets held by less than the tight band
 * @param inside targets held
 * @param unknown targets that cannot be judged
 * @param levels A-weighted band levels of the total with the least margin, dB(A); NaN where missing
 */
public record RecentFile(
    Path file,
    Instant opened,
    String description,
    int contributions,
    int over,
    int tight,
    int inside,
    int unknown,
    BandSpectrum levels) {
  private static final int LONGEST_DESCRIPTION = 200;

  public RecentFile {
    Objects.requireNonNull(opened, "opened");
    file = file.toAbsolutePath().normalize();
    description = shortened(description == null ? "" : description);
  }

  /**
   * What the start page keeps of a project.
   *
   * @param file its file
   * @param ledger its ledger
   * @param opened when it was opened or saved
   */
  public static RecentFile of(Path file, Ledger ledger, Instant opened) {
    ReceiverSheet sheet = ledger.worst();
    return new RecentFile(
        file,
        opened,
        description(ledger.vehicle()),
        (int) sheet.rows().stream().filter(RecentFile::contributes).count(),
        count(ledger, State.OVER),
        count(ledger, State.TIGHT),
        count(ledger, State.INSIDE),
        count(ledger, null),
        weighted(sheet.total().levels()));
  }

  private static boolean contributes(LedgerRow row) {
    boolean leaf = row.kind() == RowKind.PANEL || row.kind() == RowKind.OTHER;
    return leaf && row.way() == Way.ALL;
  }

  private static int count(Ledger ledger, State state) {
    return (int)
        ledger.targets().stream().map(TargetResult::state).filter(it -> it == state).count();
  }

  private static BandSpectrum weighted(BandSpectrum levels) {
    double[] weighted = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      weighted[band] = levels.value(band) + AWeighting.weights().value(band);
    }
    return BandSpectrum.of(weighted);
  }

  /** The vehicle's first clause of description, or its name. */
  private static String description(Vehicle vehicle) {
    String text = vehicle.description();
    if (text == null || text.isBlank()) {
      return vehicle.name();
    }
    return text.split("[.:;] |\\.$", 2)[0];
  }

  private static String shortened(String text) {
    String line = text.replaceAll("\\s+", " ").strip();
    return line.length() <= LONGEST_DESCRIPTION
        ? line
        : line.substring(0, LONGEST_DESCRIPTION - 1).stripTrailing() + "…";
  }

  /** How many targets there are. */
  public int targets() {
    return over + tight + inside + unknown;
  }
}
