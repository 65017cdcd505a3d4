package eddyledger.workbook;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import eddyledger.check.Cautions;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.quantity.Progress;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.time.LocalDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.concurrent.CancellationException;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import org.apache.poi.openxml4j.exceptions.InvalidFormatException;
import org.apache.poi.openxml4j.opc.OPCPackage;
import org.apache.poi.openxml4j.opc.PackagePart;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** What stands in the workbook, how it is locked and set up, and that it is the same every time. */
class BudgetWorkbookTest {
  private static final List<String> SHEETS =
      List.of("summary", "ledger", "other sources", "assumptions", "panels", "flow", "revision");

  private static WorkbookContent faultyContent;
  private static Book example;
  private static Book faulty;

  @BeforeAll
  static void write() {
    example = Book.of(Budgets.content(Budgets.example()));
    faultyContent = Budgets.content(Budgets.faulty());
    faulty = Book.of(faultyContent);
  }

  private static List<String> texts(Book book, String sheet) {
    List<String> texts = new ArrayList<>();
    for (Row row : book.sheet(sheet)) {
      row.forEach(cell -> texts.add(Book.shown(cell).toString()));
    }
    return texts;
  }

  @Test
  void aPlainReaderOfArchivesCanReadIt() throws IOException {
    List<String> entries = new ArrayList<>();
    byte[] bytes = BudgetWorkbook.of(faultyContent, Progress.NONE);
    try (ZipInputStream zip = new ZipInputStream(new ByteArrayInputStream(bytes))) {
      for (ZipEntry entry = zip.getNextEntry(); entry != null; entry = zip.getNextEntry()) {
        entries.add(entry.getName());
        zip.readAllBytes();
      }
    }
    assertThat(entries).contains("xl/workbook.xml", "xl/worksheets/sheet1.xml");
  }

  @Test
  void theSheetsStandInOrder() {
    assertThat(IntStream.range(0, SHEETS.size()).mapToObj(example.workbook()::getSheetName))
        .isEqualTo(SHEETS);
    assertThat(example.workbook().getNumberOfSheets()).isEqualTo(SHEETS.size());
    assertThat(example.workbook().getActiveSheetIndex()).isZero();
  }

  @Test
  void theFirstSheetCarriesTheCautionsAndTheFindings() {
    assertThat(texts(example, "summary"))
        .anyMatch(text -> text.contains(Cautions.text()) && text.contains("model range"))
        .anyMatch(text -> text.contains("0 errors, 2 warnings, 4 notes"));
    assertThat(texts(faulty, "assumptions"))
        .contains("error")
        .anyMatch(text -> text.contains("nowhere"));
  }

  @Test
  void theStoredResultsAreTheLedgersOwnNumbers() {
    for (ReceiverSheet sheet : faultyContent.sheets()) {
      for (LedgerRow row : sheet.rows().subList(0, 30)) {
        if (row.way().text().equals("all")) {
          Row written = faulty.ledger("hold", sheet.receiver().id(), row.id(), null);
          assertThat(Book.bands(written)).isEqualTo(row.levels());
        }
      }
    }
  }

  @Test
  void textThatLooksLikeAFormulaStaysText() {
    List<Cell> hostile =
        faulty.cells().stream()
            .filter(cell -> cell.getCellType() == CellType.STRING)
            .filter(cell -> "=+-@".indexOf((cell.getStringCellValue() + " ").charAt(0)) >= 0)
            .toList();
    assertThat(hostile.stream().map(Cell::getStringCellValue).map(text -> text.charAt(0)))
        .contains('=', '+', '-', '@');
    assertThat(hostile).allMatch(cell -> ((XSSFCellStyle) cell.getCellStyle()).getQuotePrefixed());
  }

  @Test
  void noFormulaHoldsTextOfUsersOrReachesOutside() {
    Set<String> known =
        Set.of(
            "IF",
            "ISNUMBER",
            "ISTEXT",
            "LOG10",
            "SUM",
            "SUMIF",
            "SUMIFS",
            "SUMPRODUCT",
            "COUNT",
            "ROW",
            "COUNTIF",
            "COUNTIFS",
            "AND",
            "OR",
            "INT",
            "MIN",
            "MAX",
            "INDEX",
            "MATCH",
            "LARGE");
    Set<String> used =
        faulty.formulas().stream()
            .map(Cell::getCellFormula)
            .flatMap(
                formula ->
                    Pattern.compile("([A-Z][A-Z0-9.]*)\\(")
                        .matcher(formula)
                        .results()
                        .map(found -> found.group(1)))
            .collect(Collectors.toSet());
    assertThat(used).isSubsetOf(known).contains("SUMPRODUCT", "LOG10", "SUMIF", "COUNTIFS");
    assertThat(faulty.formulas().stream().map(Cell::getCellFormula))
        .noneMatch(formula -> formula.contains("[") || formula.contains("Quillon"));
  }

  @Test
  void inputsAreOpenAndEverythingElseIsLocked() {
    for (String name : SHEETS) {
      assertThat(example.sheet(name).getProtect()).as(name).isTrue();
    }
    assertThat(example.formulas()).allMatch(cell -> cell.getCellStyle().getLocked());
    Row panel = example.ledger("cruise", "row-2", "crown-a", null);
    Row section = example.ledger("cruise", "row-2", "station-a", null);
    Row range = example.ledger("cruise", "row-2", "orders-1-1", null);
    assertThat(locked(panel, LedgerColumns.BAND)).isFalse();
    assertThat(locked(panel, LedgerColumns.ALLOWED)).isFalse();
    assertThat(locked(section, LedgerColumns.ALLOWED)).isFalse();
    assertThat(locked(section, LedgerColumns.BAND)).isTrue();
    assertThat(locked(range, LedgerColumns.BAND)).isTrue();
    assertThat(example.sheet("other sources").getRow(4).getCell(OthersPage.BAND).getCellStyle())
        .matches(style -> !style.getLocked());
  }

  private static boolean locked(Row row, int column) {
    return row.getCell(column).getCellStyle().getLocked();
  }

  @Test
  void whatOnlyTheProgramFollowsIsMarkedAndLocked() {
    Cell thickness = null;
    for (Row row : example.sheet("assumptions")) {
      if (Book.word(row, 0).equals("skin-1-2")) {
        thickness = row.getCell(3);
      }
    }
    assertThat(thickness).isNotNull();
    assertThat(thickness.getNumericCellValue()).isCloseTo(1.2, within(1.0e-12));
    XSSFCellStyle style = (XSSFCellStyle) thickness.getCellStyle();
    assertThat(style.getLocked()).isTrue();
    assertThat(style.getFillForegroundXSSFColor().getARGBHex()).isEqualTo("FF" + Palette.PROGRAM);
    XSSFCellStyle legend = example.sheet("summary").getRow(6).getCell(1).getCellStyle();
    assertThat(legend.getFillForegroundXSSFColor().getARGBHex()).isEqualTo("FF" + Palette.PROGRAM);
  }

  @Test
  void everySheetHasPanesAPageAndRepeatedHeaders() {
    for (String name : SHEETS) {
      XSSFSheet sheet = example.sheet(name);
      assertThat(sheet.getPaneInformation()).as(name).isNotNull();
      assertThat(sheet.getPrintSetup().getLandscape()).as(name).isTrue();
      assertThat(example.workbook().getPrintArea(example.workbook().getSheetIndex(sheet)))
          .as(name)
          .isNotBlank();
      assertThat(sheet.getFooter().getRight()).contains("&P", "&N");
      boolean repeats = !List.of("summary", "assumptions").contains(name);
      assertThat(sheet.getRepeatingRows() != null).as(name).isEqualTo(repeats);
    }
    assertThat(example.sheet("ledger").getRepeatingColumns()).isNotNull();
  }

  @Test
  void everyHeaderOfANumberNamesItsUnit() {
    Row header = example.sheet("ledger").getRow(LedgerColumns.HEADER_ROW - 1);
    for (int column = LedgerColumns.LEVEL_A; column <= LedgerColumns.MARGIN; column++) {
      assertThat(Book.word(header, column)).matches(".*, (dB|dB\\(A\\)|%)");
    }
    for (int column = LedgerColumns.BAND; column <= LedgerColumns.LAST_BAND; column++) {
      assertThat(Book.word(header, column)).matches("[0-9.]+ Hz, dB");
    }
  }

  @Test
  void aTotalUnderAPartialSectionSaysSoOnTheFirstSheet() {
    assertThat(texts(faulty, "summary"))
        .contains("partial: 1 of 61 contributions lack bands")
        .contains("partial: 2 of 61 contributions lack bands")
        .contains("over");
    Row bare = faulty.ledger("hold", "row-2", "bare", null);
    assertThat(Book.word(bare, LedgerColumns.BAND)).isEqualTo("none");
    assertThat(Book.word(bare, LedgerColumns.REASON)).isEqualTo("holds no panel");
    assertThat(Book.word(bare, LedgerColumns.STATUS)).isEqualTo("ok");
  }

  @Test
  void waysAreToldApartByWordAndPattern() {
    Book ways = Book.of(Budgets.threeWays(faultyContent, "crown-a"));
    Row leak = ways.ledger("hold", "row-2", "crown-b-forward", "leak");
    Row acoustic = ways.ledger("hold", "row-2", "crown-b-forward", "acoustic share");
    Row all = ways.ledger("hold", "row-2", "crown-b-forward", "all");
    Row single = ways.ledger("hold", "row-2", "crown-a", "boundary layer");
    assertThat(
            List.of(leak, acoustic, all).stream()
                .map(row -> row.getCell(LedgerColumns.WAY).getCellStyle().getFillPattern()))
        .doesNotHaveDuplicates();
    assertThat(locked(leak, LedgerColumns.BAND)).isFalse();
    assertThat(locked(all, LedgerColumns.BAND)).isTrue();
    assertThat(locked(single, LedgerColumns.BAND)).isFalse();
    assertThat(all.getCell(LedgerColumns.BAND).getCellType()).isEqualTo(CellType.FORMULA);
  }

  @Test
  void theChangeLogStandsNewestFirstWithRealDates() {
    Row newest = example.sheet("revision").getRow(RevisionPage.HEADER_ROW);
    assertThat(newest.getCell(0).getLocalDateTimeCellValue())
        .isEqualTo(LocalDateTime.of(2026, 5, 18, 13, 30));
    assertThat(Book.word(newest, 6)).isEqualTo("Panel-2");
  }

  @Test
  void theSameContentGivesTheSameBytesTimeStampsAside() throws IOException, InvalidFormatException {
    assertThat(parts(BudgetWorkbook.of(faultyContent, Progress.NONE)))
        .isEqualTo(parts(BudgetWorkbook.of(faultyContent, Progress.NONE)));
  }

  private static Map<String, String> parts(byte[] bytes)
      throws IOException, InvalidFormatException {
    Map<String, String> parts = new TreeMap<>();
    try (OPCPackage file = OPCPackage.open(new ByteArrayInputStream(bytes))) {
      for (PackagePart part : file.getParts()) {
        String name = part.getPartName().getName();
        if (!name.equals("/docProps/core.xml")) {
          byte[] content = part.getInputStream().readAllBytes();
          parts.put(name, new String(content, StandardCharsets.UTF_8));
        }
      }
    }
    assertThat(parts).hasSizeGreaterThan(SHEETS.size());
    return parts;
  }

  @Test
  void writingCanBeCancelled() {
    Progress cancelled =
        new Progress() {
          private boolean stop;

          @Override
          public void done(int steps, int of) {
            assertThat(of).isEqualTo(3);
            stop = true;
          }

          @Override
          public boolean cancelled() {
            return stop;
          }
        };
    assertThatThrownBy(() -> BudgetWorkbook.of(faultyContent, cancelled))
        .isInstanceOf(CancellationException.class);
  }
}
