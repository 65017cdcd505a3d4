package eddyledger.workbook;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.Way;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Decibels;
import eddyledger.quantity.OverallLevel;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.function.Consumer;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.Row;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Every formula recalculated by LibreOffice, whose stored results were made wrong before: it must
 * come to the ledger's own numbers, and follow what is changed.
 */
@Tag("office")
class WorkbookRecalculationTest {
  /** Agreement asked for, dB; what is met is better than 1e-6. */
  private static final double CLOSE = 0.01;

  private static final double STORED = 1.0e-6;
  private static final Consumer<Book> NOTHING = book -> {};

  private static WorkbookContent example;

  @TempDir private Path folder;

  @BeforeAll
  static void compute() {
    Office.assumeInstalled();
    example = Budgets.content(Budgets.example());
  }

  private Book assertStoredResultsAreRight(WorkbookContent content) {
    Book book = Book.of(content);
    Map<String, Object> stored = book.results();
    assertThat(stored).hasSizeGreaterThan(1000);
    Book recalculated = book.recalculated(folder, NOTHING);
    Map<String, Object> results = new LinkedHashMap<>();
    recalculated.cells().forEach(cell -> results.put(Book.place(cell), Book.shown(cell)));
    List<String> wrong = new ArrayList<>();
    stored.forEach(
        (place, value) -> {
          Object result = results.getOrDefault(place, "");
          boolean same =
              value instanceof Double number && result instanceof Double other
                  ? Math.abs(number - other) <= STORED * Math.max(1.0, Math.abs(number))
                  : value.equals(result);
          if (!same) {
            wrong.add(place + ": stored " + value + ", recalculated " + result);
          }
        });
    assertThat(wrong).isEmpty();
    return recalculated;
  }

  private static void assertAgrees(Book book, ReceiverSheet sheet, LedgerRow row, String way) {
    Row written = book.ledger(sheet.condition().id(), sheet.receiver().id(), row.id(), way);
    String what = sheet.title() + ", " + row.id();
    BandSpectrum levels = Book.bands(written);
    for (int band = 0; band < Bands.COUNT; band++) {
      assertNear(levels.value(band), row.levels().value(band), what);
    }
    assertNear(Book.number(written, LedgerColumns.LEVEL_A), finite(row.levelA()), what);
    assertNear(Book.number(written, LedgerColumns.LEVEL), finite(row.level()), what);
    assertNear(Book.number(written, LedgerColumns.MARGIN), finite(row.judgement().margin()), what);
    String state = row.judgement().judged() ? row.judgement().state().text() : null;
    if (state != null) {
      assertThat(Book.word(written, LedgerColumns.STATE)).as(what).isEqualTo(state);
    }
  }

  private static double finite(double level) {
    return Double.isInfinite(level) ? Double.NaN : level;
  }

  private static void assertNear(double actual, double expected, String what) {
    if (Double.isNaN(expected)) {
      assertThat(actual).as(what).isNaN();
    } else {
      assertThat(actual).as(what).isCloseTo(expected, within(CLOSE));
    }
  }

  @Test
  void theExampleComesToTheLedgersNumbers() {
    Book book = assertStoredResultsAreRight(example);
    for (ReceiverSheet sheet : example.sheets()) {
      for (LedgerRow row : sheet.rows()) {
        if (row.way() == Way.ALL) {
          assertAgrees(book, sheet, row, null);
        }
      }
    }
  }

  @Test
  void missingPartsMakeTotalsPartialAndNeverZeroDecibels() {
    WorkbookContent faulty = Budgets.content(Budgets.faulty());
    Book book = assertStoredResultsAreRight(faulty);
    for (ReceiverSheet sheet : faulty.sheets()) {
      sheet.rows().stream()
          .filter(row -> row.way() == Way.ALL)
          .forEach(row -> assertAgrees(book, sheet, row, null));
      Row total = book.ledger("hold", sheet.receiver().id(), faulty.vehicle().id(), null);
      assertThat(Book.word(total, LedgerColumns.STATUS)).startsWith("partial: ");
      Row failed = book.ledger("hold", sheet.receiver().id(), Budgets.FAILED, null);
      assertThat(Book.word(failed, LedgerColumns.STATUS)).isEqualTo("failed");
      assertThat(Book.word(failed, LedgerColumns.REASON)).contains("nowhere");
      assertThat(Book.word(failed, LedgerColumns.NAME)).isEqualTo(Budgets.HOSTILE);
      assertThat(Book.word(failed, LedgerColumns.BAND)).isEqualTo("failed");
    }
  }

  @Test
  void threeWaysSumToTheirPanelAndUpTheTree() {
    WorkbookContent ways = Budgets.threeWays(example, "crown-a");
    Book book = assertStoredResultsAreRight(ways);
    for (ReceiverSheet sheet : ways.sheets()) {
      for (LedgerRow row : sheet.rows()) {
        if (!row.id().equals("crown-a")) {
          boolean other = row.parent().equals(ways.vehicle().id()) && row.depth() == 1;
          String way = other && row.way() == Way.ALL ? null : LedgerLooks.word(row.way());
          if (way != null && !row.parent().isEmpty()) {
            assertAgrees(book, sheet, row, way);
          }
        }
      }
    }
  }

  @Test
  void everyRatingAndPassRuleIsLive() {
    WorkbookContent judged = Budgets.content(Budgets.judgedInEveryWay());
    Book book = assertStoredResultsAreRight(judged);
    List<String> states = new ArrayList<>();
    for (TargetPlan.TargetLine line : BookPlan.of(judged).targets().lines()) {
      Row row = book.sheet("summary").getRow(line.first() - 1 + line.rows() - 1);
      assertNear(Book.number(row, TargetTable.LEVEL), line.result().level(), line.target().id());
      assertNear(Book.number(row, TargetTable.MARGIN), line.result().margin(), line.target().id());
      states.add(Book.word(row, TargetTable.STATE));
      assertThat(Book.word(row, TargetTable.STATE)).isEqualTo(line.result().state().text());
    }
    assertThat(states).hasSizeGreaterThan(30).contains("inside", "tight", "over");
  }

  @Test
  void totalsFollowTenChangedContributions() {
    long seed = 20261201L;
    Random random = new Random(seed);
    ReceiverSheet sheet = example.sheets().get(3);
    List<LedgerRow> panels =
        sheet.rows().stream()
            .filter(row -> row.way() == Way.ALL && sheet.children(row.id()).isEmpty())
            .filter(row -> !row.kind().text().equals("other"))
            .toList();
    Map<String, BandSpectrum> changed = new LinkedHashMap<>();
    Consumer<Book> change =
        book -> {
          for (int i = 0; i < 10; i++) {
            LedgerRow panel = panels.get(random.nextInt(panels.size()));
            int band = random.nextInt(Bands.COUNT);
            Row row = row(book, sheet, panel.id());
            row.getCell(LedgerColumns.BAND + band).setCellValue(60.0 + 25.0 * random.nextDouble());
            changed.put(panel.id(), Book.bands(row));
          }
        };
    Book book = Book.of(example).recalculated(folder, change);
    assertThat(changed).as("seed " + seed).hasSizeGreaterThan(7);
    LedgerRow total = sheet.total();
    double[] expected = energies(sheet, total, changed);
    double before = total.levelA();
    Row written = row(book, sheet, total.id());
    BandSpectrum levels = Book.bands(written);
    for (int band = 0; band < Bands.COUNT; band++) {
      double level = 10.0 * Math.log10(expected[band]);
      assertThat(levels.value(band)).as("seed " + seed).isCloseTo(level, within(CLOSE));
    }
    double after = OverallLevel.aWeighted(levels).orElseThrow();
    assertThat(Math.abs(after - before)).isGreaterThan(1.0);
    assertThat(Book.number(written, LedgerColumns.LEVEL_A)).isCloseTo(after, within(CLOSE));
    double margin = total.judgement().allowance() - after;
    assertThat(Book.number(written, LedgerColumns.MARGIN)).isCloseTo(margin, within(CLOSE));
    assertThat(Book.word(written, LedgerColumns.STATE)).isEqualTo("over");
    // the first sheet follows too: the fourth receiver and condition
    Row summary = book.sheet("summary").getRow(SummaryPlan.of(6).firstPair() - 1 + 3);
    assertThat(Book.number(summary, TargetTable.LEVEL)).isCloseTo(after, within(CLOSE));
    assertThat(Book.number(summary, TargetTable.MARGIN)).isCloseTo(margin, within(CLOSE));
  }

  private static Row row(Book book, ReceiverSheet sheet, String id) {
    return book.ledger(sheet.condition().id(), sheet.receiver().id(), id, null);
  }

  /** Energies over that of 0 dB, summed by the test itself, with changed levels in place. */
  private static double[] energies(
      ReceiverSheet sheet, LedgerRow row, Map<String, BandSpectrum> changed) {
    double[] sum = new double[Bands.COUNT];
    List<LedgerRow> children = sheet.children(row.id());
    for (LedgerRow child : children) {
      double[] below = energies(sheet, child, changed);
      for (int band = 0; band < Bands.COUNT; band++) {
        sum[band] += below[band];
      }
    }
    if (children.isEmpty()) {
      BandSpectrum levels = changed.getOrDefault(row.id(), row.levels());
      for (int band = 0; band < Bands.COUNT; band++) {
        sum[band] = Decibels.ratio(levels.value(band));
      }
    }
    return sum;
  }

  @Test
  void whatIsFilledInOrTakenAwayMovesTheMarkers() {
    WorkbookContent faulty = Budgets.content(Budgets.faulty());
    Book book =
        Book.of(faulty)
            .recalculated(
                folder,
                it -> {
                  Row failed = it.ledger("hold", "row-9", Budgets.FAILED, null);
                  for (int band = 0; band < Bands.COUNT; band++) {
                    failed.getCell(LedgerColumns.BAND + band).setCellValue(70.0);
                  }
                  Row blanked = it.ledger("hold", "row-2", "crown-a", null);
                  Cell gone = blanked.getCell(LedgerColumns.BAND + 3);
                  blanked.removeCell(gone);
                  Row word = it.ledger("hold", "row-2", "crown-e", null);
                  word.getCell(LedgerColumns.BAND + 5).setCellValue("not tested");
                });
    Row filled = book.ledger("hold", "row-9", Budgets.FAILED, null);
    assertThat(Book.word(filled, LedgerColumns.STATUS)).isEqualTo("ok");
    assertThat(Book.word(filled, LedgerColumns.REASON)).isEmpty();
    assertThat(Book.word(book.ledger("hold", "row-9", "station-c", null), LedgerColumns.STATUS))
        .isEqualTo("ok");
    // the other source still lacks its band
    Row total = book.ledger("hold", "row-9", faulty.vehicle().id(), null);
    assertThat(Book.word(total, LedgerColumns.STATUS))
        .isEqualTo("partial: 1 of 61 contributions lack bands");
    Row blanked = book.ledger("hold", "row-2", "crown-a", null);
    assertThat(Book.word(blanked, LedgerColumns.STATUS))
        .isEqualTo("partial: 1 of 28 bands missing");
    assertThat(Book.word(blanked, LedgerColumns.LEVEL_A)).isEqualTo("n/a");
    Row above = book.ledger("hold", "row-2", "station-a", null);
    assertThat(Book.word(above, LedgerColumns.STATUS))
        .isEqualTo("partial: 1 of 9 contributions lack bands");
    double without = 0.0;
    for (LedgerRow child : faulty.sheets().get(0).children("station-a")) {
      if (!child.id().equals("crown-a")) {
        without += Decibels.ratio(child.levels().value(3));
      }
    }
    assertThat(Book.number(above, LedgerColumns.BAND + 3))
        .isCloseTo(10.0 * Math.log10(without), within(CLOSE));
    Row word = book.ledger("hold", "row-2", "crown-e", null);
    assertThat(Book.word(word, LedgerColumns.STATUS)).isEqualTo("partial: 1 of 28 bands missing");
  }
}
