package eddyledger.app;

import eddyledger.file.LedgerCsv;
import eddyledger.file.TextFile;
import eddyledger.file.TraceCsv;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.Trace;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

/** Writes the ledger's tables as CSV files. */
public final class Tables {
  /** With nothing to set. */
  public Tables() {}

  /**
   * Writes sheets of a ledger as one table.
   *
   * @throws WriteFailure if the file cannot be written; an old one is then as it was
   */
  public void writeLedger(List<ReceiverSheet> sheets, Path file) {
    write(LedgerCsv.text(sheets), file);
  }

  /**
   * Writes the bands of a trace.
   *
   * @throws WriteFailure if the file cannot be written; an old one is then as it was
   */
  public void writeTrace(Trace trace, Path file) {
    write(TraceCsv.text(trace), file);
  }

  private static void write(String text, Path file) {
    try {
      TextFile.replace(file, text);
    } catch (IOException e) {
      throw WriteFailure.of(file, e);
    }
  }
}
