package eddyledger.app;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.file.ProjectReader;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.Way;
import eddyledger.quantity.Bands;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The example's ledger as a written file, read back by the rules of RFC 4180 alone: what a reader
 * who has nothing but the file can add up.
 */
class WrittenLedgerTest {
  /** Relative, in energy. */
  private static final double TIGHT = 1.0e-9;

  private static final List<String> LEVELS =
      Stream.concat(Stream.of("level_dBA", "level_dB"), Bands.labels().stream()).toList();

  private static List<Map<String, String>> rows;
  private static Ledger ledger;

  @BeforeAll
  static void write(@TempDir Path folder) throws IOException {
    Path example = Path.of("examples/quillon-82.eddyledger");
    ledger = Ledger.of(new Projects(new ProjectReader()).open(example).vehicle().orElseThrow());
    Path file = folder.resolve("ledger.csv");
    new Tables().writeLedger(ledger.sheets(), file);
    rows = records(Files.readString(file));
  }

  @Test
  void childrenSumToTheirParent() {
    int sums = 0;
    for (Map<String, String> parent : rows) {
      List<Map<String, String>> children =
          rows.stream()
              .filter(row -> sameSheet(row, parent))
              .filter(row -> row.get("parent_id").equals(parent.get("node_id")))
              .filter(row -> row.get("way").equals("all") && parent.get("way").equals("all"))
              .filter(row -> row.get("choice").equals(parent.get("choice")))
              .toList();
      if (!children.isEmpty()) {
        assertSums(parent, children);
        sums++;
      }
    }
    // the total of every sheet and every section below it
    long sections =
        rows.stream()
            .filter(row -> row.get("kind").equals("section") && row.get("way").equals("all"))
            .count();
    assertThat(sums).isEqualTo((int) (ledger.sheets().size() + sections));
    assertThat(sections).isPositive();
  }

  @Test
  void waysSumToAll() {
    int sums = 0;
    for (Map<String, String> all : rows) {
      List<Map<String, String>> ways =
          rows.stream()
              .filter(row -> sameSheet(row, all))
              .filter(row -> row.get("node_id").equals(all.get("node_id")))
              .filter(row -> !row.get("way").equals("all") && all.get("way").equals("all"))
              .toList();
      boolean ofPanels = List.of("section", "panel").contains(all.get("kind"));
      assertThat(ways.isEmpty()).as(all.toString()).isEqualTo(!ofPanels || !is(all, "way", "all"));
      if (!ways.isEmpty()) {
        assertSums(all, ways);
        sums++;
      }
    }
    assertThat(sums).isGreaterThan(60 * ledger.sheets().size());
  }

  @Test
  void everyCellOfALevelIsTheLedgersToTheLastDigit() {
    int at = 0;
    for (ReceiverSheet sheet : ledger.sheets()) {
      for (LedgerRow row : Stream.concat(sheet.rows().stream(), sheet.range().stream()).toList()) {
        Map<String, String> written = rows.get(at++);
        assertThat(written.get("node_id")).isEqualTo(row.id());
        assertThat(written.get("name")).isEqualTo(row.name());
        assertThat(written.get("reason")).isEqualTo(row.reason());
        assertThat(number(written, "level_dBA")).isEqualTo(row.levelA());
        assertThat(number(written, "level_dB")).isEqualTo(row.level());
        for (int band = 0; band < Bands.COUNT; band++) {
          assertThat(number(written, Bands.label(band))).isEqualTo(row.levels().value(band));
        }
      }
    }
    assertThat(rows).hasSize(at);
    assertThat(rows.stream().map(row -> row.get("way")).distinct())
        .containsExactly(Way.ALL.text(), Way.BOUNDARY_LAYER.text());
  }

  private static void assertSums(Map<String, String> whole, List<Map<String, String>> parts) {
    for (String column : LEVELS) {
      double sum = parts.stream().mapToDouble(part -> energy(part, column)).sum();
      double expected = energy(whole, column);
      assertThat(sum)
          .as("%s of %s", column, whole.get("node_id"))
          .isCloseTo(expected, within(TIGHT * expected));
    }
  }

  private static boolean sameSheet(Map<String, String> row, Map<String, String> other) {
    return is(row, "condition_id", other.get("condition_id"))
        && is(row, "receiver_id", other.get("receiver_id"));
  }

  private static boolean is(Map<String, String> row, String column, String value) {
    return row.get(column).equals(value);
  }

  private static double energy(Map<String, String> row, String column) {
    return Math.pow(10.0, number(row, column) / 10.0);
  }

  private static double number(Map<String, String> row, String column) {
    return Double.parseDouble(row.get(column));
  }

  /** The records by column: cells parted by commas, quoted where they must be, lines by CRLF. */
  private static List<Map<String, String>> records(String text) {
    assertThat(text).endsWith("\r\n");
    List<List<String>> lines = new ArrayList<>();
    List<String> cells = new ArrayList<>();
    StringBuilder cell = new StringBuilder();
    boolean quoted = false;
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (quoted && c == '"' && text.charAt(i + 1) == '"') {
        cell.append(c);
        i++;
      } else if (c == '"') {
        quoted = !quoted;
      } else if (!quoted && (c == ',' || text.startsWith("\r\n", i))) {
        cells.add(cell.toString());
        cell.setLength(0);
        if (c == '\r') {
          lines.add(cells);
          cells = new ArrayList<>();
          i++;
        }
      } else {
        cell.append(c);
      }
    }
    List<String> header = lines.get(0);
    return lines.stream().skip(1).map(line -> byColumn(header, line)).collect(Collectors.toList());
  }

  private static Map<String, String> byColumn(List<String> header, List<String> line) {
    assertThat(line).hasSameSizeAs(header);
    Map<String, String> row = new HashMap<>();
    for (int i = 0; i < line.size(); i++) {
      row.put(header.get(i), line.get(i));
    }
    return row;
  }
}
