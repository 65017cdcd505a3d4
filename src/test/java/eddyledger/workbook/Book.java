package eddyledger.workbook;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Progress;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Consumer;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** A workbook read for a test. */
final class Book {
  /** Stands in formula cells until something recalculates them. */
  static final double STALE = -999.0;

  private final XSSFWorkbook workbook;

  private Book(XSSFWorkbook workbook) {
    this.workbook = workbook;
  }

  static Book of(WorkbookContent content) {
    try {
      byte[] bytes = BudgetWorkbook.of(content, Progress.NONE);
      return new Book(new XSSFWorkbook(new ByteArrayInputStream(bytes)));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static Book read(Path file) {
    try {
      return new Book(new XSSFWorkbook(new ByteArrayInputStream(Files.readAllBytes(file))));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The workbook itself. */
  XSSFWorkbook workbook() {
    return workbook;
  }

  XSSFSheet sheet(String name) {
    return workbook.getSheet(name);
  }

  /** Every cell of every sheet. */
  List<Cell> cells() {
    List<Cell> cells = new ArrayList<>();
    for (Sheet sheet : workbook) {
      for (Row row : sheet) {
        row.forEach(cells::add);
      }
    }
    return cells;
  }

  List<Cell> formulas() {
    return cells().stream().filter(cell -> cell.getCellType() == CellType.FORMULA).toList();
  }

  /** Where a cell is. */
  static String place(Cell cell) {
    return cell.getSheet().getSheetName() + "!" + cell.getAddress();
  }

  /** What a cell shows: a number or a text; empty if it is blank. */
  static Object shown(Cell cell) {
    if (cell == null) {
      return "";
    }
    CellType type =
        cell.getCellType() == CellType.FORMULA
            ? cell.getCachedFormulaResultType()
            : cell.getCellType();
    return switch (type) {
      case NUMERIC -> cell.getNumericCellValue();
      case STRING -> cell.getStringCellValue();
      case BLANK -> "";
      default -> type + " in " + place(cell);
    };
  }

  /** What every formula shows, by place. */
  Map<String, Object> results() {
    Map<String, Object> results = new TreeMap<>();
    formulas().forEach(cell -> results.put(place(cell), shown(cell)));
    return results;
  }

  /** Makes every stored result wrong, changes what is asked for, and has it recalculated. */
  Book recalculated(Path folder, Consumer<Book> change) {
    formulas().forEach(cell -> cell.setCellValue(STALE));
    change.accept(this);
    Path file = folder.resolve("workbook.xlsx");
    try (OutputStream out = Files.newOutputStream(file)) {
      workbook.write(out);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    Book recalculated = read(new Office(folder).recalculated(file));
    assertThat(recalculated.cells().stream().map(Book::shown))
        .as("nothing is stale and nothing is an error")
        .noneMatch(shown -> shown.equals(STALE) || shown.toString().startsWith("ERROR"));
    return recalculated;
  }

  /** A row of the ledger sheet. */
  Row ledger(String condition, String receiver, String id, String way) {
    Row found = null;
    for (Row row : sheet(LedgerColumns.SHEET)) {
      boolean here =
          shown(row.getCell(LedgerColumns.CONDITION)).equals(condition)
              && shown(row.getCell(LedgerColumns.RECEIVER)).equals(receiver)
              && shown(row.getCell(LedgerColumns.ID)).equals(id)
              && (way == null || shown(row.getCell(LedgerColumns.WAY)).equals(way));
      if (here) {
        assertThat(found).as(id).isNull();
        found = row;
      }
    }
    assertThat(found).as(id).isNotNull();
    return found;
  }

  /** The band levels of a row; NaN where there is a word. */
  static BandSpectrum bands(Row row) {
    double[] levels = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      levels[band] = number(row, LedgerColumns.BAND + band);
    }
    return BandSpectrum.of(levels);
  }

  /** A number of a row; NaN where there is a word. */
  static double number(Row row, int column) {
    return shown(row.getCell(column)) instanceof Double number ? number : Double.NaN;
  }

  /** A word of a row. */
  static String word(Row row, int column) {
    return shown(row.getCell(column)).toString();
  }
}
