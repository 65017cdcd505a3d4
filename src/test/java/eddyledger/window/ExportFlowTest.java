package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.file.LedgerCsv;
import eddyledger.file.ProjectReader;
import eddyledger.ledger.Ledger;
import java.awt.event.KeyEvent;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Collectors;
import java.util.stream.StreamSupport;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.DataFormatter;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.ss.usermodel.Workbook;
import org.apache.poi.ss.usermodel.WorkbookFactory;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** What goes out of the window: tables and workbooks. */
@WindowTest
class ExportFlowTest extends WindowFlow {
  private Path example;

  @BeforeEach
  void open() throws IOException {
    example = Harness.example(folder);
    harness.openByDialog(example);
    harness.clickRow("upper-side-left-a");
  }

  @Test
  void theTableHoldsWhatTheLedgerHolds() throws IOException {
    harness.window.menuItem("menu.file").click();
    harness.window.menuItem("menu.file.csv").click();
    Path table = folder.resolve("out.csv");
    harness.type(table);
    harness.until("it is told", () -> hands.status().startsWith("Written: "));
    Ledger ledger = Ledger.of(new ProjectReader().read(example).vehicle().orElseThrow());
    assertThat(Files.readString(table)).isEqualTo(LedgerCsv.text(ledger.sheets()));
  }

  @Test
  void aWorkbookWrittenWhileOneTypesIsOfOneStateOfTheVehicle() throws IOException {
    Path workbook = folder.resolve("out.xlsx");
    harness.press(KeyEvent.VK_E, KeyEvent.VK_CONTROL);
    harness.type(workbook);
    hands.typeInto("name", "Zyx");
    harness.until("it is written", () -> Files.exists(workbook));
    harness.ready();
    assertThat(harness.row("upper-side-left-a")).contains("Zyx");
    try (Workbook book = WorkbookFactory.create(workbook.toFile())) {
      assertThat(numbers(book)).anyMatch(it -> near(it, 73.5)).anyMatch(it -> near(it, 61.0));
      DataFormatter shown = new DataFormatter();
      String all =
          StreamSupport.stream(book.spliterator(), false)
              .flatMap((Sheet sheet) -> StreamSupport.stream(sheet.spliterator(), false))
              .flatMap(row -> StreamSupport.stream(row.spliterator(), false))
              .map(shown::formatCellValue)
              .collect(Collectors.joining("|"));
      assertThat(all).contains("Upper side left, station A").doesNotContain("Zyx");
    }
  }

  private static boolean near(double value, double shown) {
    return Math.abs(value - shown) < 0.05;
  }

  private static java.util.List<Double> numbers(Workbook book) {
    return StreamSupport.stream(book.spliterator(), false)
        .flatMap((Sheet sheet) -> StreamSupport.stream(sheet.spliterator(), false))
        .flatMap(row -> StreamSupport.stream(row.spliterator(), false))
        .filter(
            cell ->
                cell.getCellType() == CellType.NUMERIC
                    || cell.getCellType() == CellType.FORMULA
                        && cell.getCachedFormulaResultType() == CellType.NUMERIC)
        .map(cell -> cell.getNumericCellValue())
        .toList();
  }
}
