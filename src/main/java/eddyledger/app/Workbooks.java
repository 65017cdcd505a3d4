package eddyledger.app;

import eddyledger.check.Finding;
import eddyledger.file.BinaryFile;
import eddyledger.ledger.Ledger;
import eddyledger.quantity.Progress;
import eddyledger.workbook.BudgetWorkbook;
import eddyledger.workbook.WorkbookContent;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;

/** Writes budget workbooks. */
public final class Workbooks {
  /** With nothing to set. */
  public Workbooks() {}

  /**
   * Writes the budget workbook of a ledger.
   *
   * @param ledger what it holds
   * @param findings what reading and computing found, each once
   * @param out the file, in the format .xlsx whatever its name; replaced if there is one
   * @param progress told how far it is; may cancel
   * @throws WriteFailure if the file cannot be written; an old one is then as it was
   * @throws java.util.concurrent.CancellationException if it was cancelled; as above
   */
  public void write(Ledger ledger, List<Finding> findings, Path out, Progress progress) {
    try {
      Path folder = out.toAbsolutePath().getParent();
      if (folder != null && !Files.isDirectory(folder)) {
        throw new NoSuchFileException(folder.toString());
      }
      byte[] bytes = BudgetWorkbook.of(WorkbookContent.of(ledger, findings), progress);
      BinaryFile.replace(out, bytes);
    } catch (NoSuchFileException e) {
      throw new WriteFailure(
          out + " cannot be written: there is no such folder. Make it, or name another.", e);
    } catch (IOException e) {
      throw new WriteFailure(
          out
              + " cannot be written: "
              + e.getMessage()
              + ". Close it elsewhere, check your rights, or name another file.",
          e);
    }
  }
}
