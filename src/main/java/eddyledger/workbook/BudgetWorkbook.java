package eddyledger.workbook;

import eddyledger.quantity.Progress;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import org.apache.commons.compress.archivers.zip.Zip64Mode;
import org.apache.poi.ss.usermodel.Name;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.xssf.streaming.SXSSFSheet;
import org.apache.poi.xssf.streaming.SXSSFWorkbook;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/**
 * Makes the budget workbook: the sheets summary, ledger, other sources, assumptions and revision,
 * with live formulas and the program's own values as their stored results.
 *
 * <p>The same content gives the same sheets, byte for byte; only time stamps differ.
 */
public final class BudgetWorkbook {
  /** Rows kept in memory; the rest waits in a temporary file. */
  private static final int WINDOW = 200;

  private BudgetWorkbook() {}

  /**
   * The workbook as a file in the format .xlsx.
   *
   * @param content what it holds
   * @param progress told after every receiver and condition of the ledger; may cancel
   * @throws IOException if the temporary files cannot be written
   * @throws java.util.concurrent.CancellationException if it was cancelled
   */
  public static byte[] of(WorkbookContent content, Progress progress) throws IOException {
    try (SXSSFWorkbook workbook = new SXSSFWorkbook(new XSSFWorkbook(), WINDOW)) {
      // entries marked as over 4 GB without need are refused by plain readers of archives
      workbook.setZip64Mode(Zip64Mode.AsNeeded);
      try {
        new BookWriter(workbook, content).write(progress);
        progress.check();
      } catch (RuntimeException e) {
        // else closing it would complain of rows that were never written
        flush(workbook);
        throw e;
      }
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      workbook.write(bytes);
      return bytes.toByteArray();
    }
  }

  private static void flush(SXSSFWorkbook workbook) throws IOException {
    for (Sheet sheet : workbook) {
      ((SXSSFSheet) sheet).flushRows();
    }
  }

  /** Gives a cell a name that formulas use. */
  static void name(XSSFWorkbook workbook, String name, String cells) {
    Name defined = workbook.createName();
    defined.setNameName(name);
    defined.setRefersToFormula(cells);
  }
}
