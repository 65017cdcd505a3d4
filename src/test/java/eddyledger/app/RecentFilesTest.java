package eddyledger.app;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.nio.file.Path;
import java.time.Instant;
import java.util.Arrays;
import java.util.List;
import java.util.prefs.Preferences;
import org.junit.jupiter.api.Test;

/** The list of files opened lately: its order, its length, and a store that is damaged. */
class RecentFilesTest {
  private static final Instant NOON = Instant.parse("2026-12-01T12:00:00Z");

  private final MemoryPreferences store = new MemoryPreferences();
  private final RecentFiles recent = new RecentFiles(store);

  private static RecentFile file(String name, int minutes) {
    double[] levels = new double[Bands.COUNT];
    Arrays.fill(levels, 61.3);
    levels[0] = Double.NaN;
    levels[1] = -4.5;
    return new RecentFile(
        Path.of("folder", name),
        NOON.plusSeconds(60L * minutes),
        "Regional aircraft",
        61,
        1,
        2,
        3,
        4,
        BandSpectrum.of(levels));
  }

  private List<String> names() {
    return recent.list().stream().map(it -> it.file().getFileName().toString()).toList();
  }

  @Test
  void anEntryComesBackAsItWas() {
    RecentFile file = file("a.eddyledger", 0);
    recent.add(file);
    assertThat(new RecentFiles(store).list()).containsExactly(file);
    assertThat(file.file()).isAbsolute();
    assertThat(file.targets()).isEqualTo(10);
  }

  @Test
  void theLatestStandsFirstAndNoFileTwice() {
    recent.add(file("a.eddyledger", 0));
    recent.add(file("b.eddyledger", 1));
    assertThat(names()).containsExactly("b.eddyledger", "a.eddyledger");
    recent.add(file("a.eddyledger", 2));
    assertThat(names()).containsExactly("a.eddyledger", "b.eddyledger");
  }

  @Test
  void onlyTheLatestTwelveAreKept() {
    for (int i = 0; i < 20; i++) {
      recent.add(file(i + ".eddyledger", i));
    }
    assertThat(names()).hasSize(12).startsWith("19.eddyledger").endsWith("8.eddyledger");
  }

  @Test
  void aForgottenFileIsOffTheList() {
    recent.add(file("a.eddyledger", 0));
    recent.add(file("b.eddyledger", 1));
    recent.forget(Path.of("folder", "other", "..", "b.eddyledger"));
    recent.forget(Path.of("nowhere.eddyledger"));
    assertThat(names()).containsExactly("a.eddyledger");
  }

  @Test
  void garbageIsLeftOutAndTheRestStays() {
    recent.add(file("a.eddyledger", 0));
    Preferences list = store.node("recent");
    list.node("7").put("file", "no-time.eddyledger");
    list.node("8").put("opened", NOON.toString());
    list.node("9").put("file", "bad-time.eddyledger");
    list.node("9").put("opened", "yesterday");
    list.node("x").put("file", "counts.eddyledger");
    list.node("x").put("opened", NOON.minusSeconds(60).toString());
    list.node("x").put("over", "many");
    list.node("x").put("tight", "-3");
    list.node("x").put("levels_dBA", "1,2,three");
    list.put("stray", "value");
    assertThat(names()).containsExactly("a.eddyledger", "counts.eddyledger");
    RecentFile counts = recent.list().get(1);
    assertThat(counts.targets()).isZero();
    assertThat(counts.description()).isEmpty();
    for (int band = 0; band < Bands.COUNT; band++) {
      assertThat(counts.levels().has(band)).isFalse();
    }
    recent.add(file("b.eddyledger", 3));
    assertThat(names()).containsExactly("b.eddyledger", "a.eddyledger", "counts.eddyledger");
  }

  @Test
  void singleLevelsThatCannotBeReadAreMissing() {
    recent.add(file("a.eddyledger", 0));
    String levels = "1.5,x,Infinity" + ",2".repeat(25);
    store.node("recent").node("0").put("levels_dBA", levels);
    BandSpectrum read = recent.list().get(0).levels();
    assertThat(read.value(0)).isEqualTo(1.5);
    assertThat(read.has(1)).isFalse();
    assertThat(read.has(2)).isFalse();
    assertThat(read.value(27)).isEqualTo(2.0);
  }

  @Test
  void aBrokenStoreGivesAnEmptyListAndNoFault() {
    recent.add(file("a.eddyledger", 0));
    store.breakDown();
    assertThat(recent.list()).isEmpty();
    recent.add(file("b.eddyledger", 1));
    recent.forget(Path.of("folder", "a.eddyledger"));
    assertThat(recent.list()).isEmpty();
  }

  @Test
  void aLongDescriptionIsCut() {
    RecentFile file =
        new RecentFile(
            Path.of("a"), NOON, "word\n".repeat(500), 0, 0, 0, 0, 0, BandSpectrum.constant(1.0));
    assertThat(file.description()).startsWith("word word").endsWith("…");
    assertThat(file.description().length()).isLessThanOrEqualTo(200);
  }
}
