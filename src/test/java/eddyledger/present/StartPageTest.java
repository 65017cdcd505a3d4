package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.RecentFile;
import eddyledger.ledger.State;
import eddyledger.present.RecentLine.Count;
import eddyledger.quantity.BandSpectrum;
import java.nio.file.Path;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What the start page says of files opened lately. */
class StartPageTest {
  private static final Instant NOW = Instant.parse("2026-12-01T09:30:00Z");

  private static RecentLine line(int contributions, int[] counts, boolean exists) {
    RecentFile file =
        new RecentFile(
            Path.of("Programmes", "Quillon", "quillon-82.eddyledger"),
            NOW.minusSeconds(16 * 60),
            "Regional aircraft",
            contributions,
            counts[0],
            counts[1],
            counts[2],
            counts[3],
            BandSpectrum.constant(40.0));
    return StartPage.of(List.of(file), List.of(), NOW, ZoneOffset.UTC, path -> exists)
        .recent()
        .get(0);
  }

  @ParameterizedTest
  @CsvSource({
    "2026-12-01T09:14:00Z, today 09:14",
    "2026-12-01T00:00:00Z, today 00:00",
    "2026-11-30T23:59:00Z, yesterday",
    "2026-11-27T12:00:00Z, 27 November",
    "2026-01-03T12:00:00Z, 3 January",
    "2025-12-31T12:00:00Z, 31 December 2025",
    "2026-12-02T12:00:00Z, 2 December"
  })
  void whenAsOneSaysIt(Instant opened, String text) {
    LocalDate today = LocalDate.of(2026, 12, 1);
    assertThat(StartPage.when(opened, today, ZoneOffset.UTC)).isEqualTo(text);
  }

  @Test
  void todayIsTheReadersToday() {
    ZoneId tokyo = ZoneId.of("Asia/Tokyo");
    Instant late = Instant.parse("2026-11-30T16:00:00Z");
    assertThat(StartPage.when(late, LocalDate.of(2026, 12, 1), tokyo)).isEqualTo("today 01:00");
  }

  @Test
  void aLineTellsNameFolderContentAndStates() {
    RecentLine line = line(61, new int[] {1, 0, 3, 1}, true);
    assertThat(line.name()).isEqualTo("quillon-82.eddyledger");
    assertThat(line.folder()).isEqualTo("Programmes / Quillon");
    assertThat(line.when()).isEqualTo("today 09:14");
    assertThat(line.description()).isEqualTo("Regional aircraft, 61 contributions");
    assertThat(line.counts())
        .containsExactly(new Count(State.OVER, 1), new Count(State.INSIDE, 3), new Count(null, 1));
    assertThat(line.counts().stream().map(Count::text))
        .containsExactly("1 over", "3 inside", "1 not known");
    assertThat(line.spoken())
        .isEqualTo(
            "quillon-82.eddyledger. Programmes, Quillon. opened today 09:14."
                + " Regional aircraft, 61 contributions. 1 over. 3 inside. 1 not known");
    assertThat(line(1, new int[4], true).description()).endsWith("1 contribution");
  }

  @Test
  void aFileThatIsGoneSaysSoAndJudgesNothing() {
    RecentLine line = line(61, new int[] {1, 0, 3, 1}, false);
    assertThat(line.missing()).isTrue();
    assertThat(line.description()).isEqualTo("The file is no longer there.");
    assertThat(line.counts()).isEmpty();
  }

  @Test
  void aFileInTheRootHasNoFolder() {
    assertThat(StartPage.folder(Path.of("/x.eddyledger"))).isEmpty();
    assertThat(StartPage.folder(Path.of("x.eddyledger"))).isEmpty();
  }
}
