package eddyledger.chart;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.quantity.Bands;
import java.awt.Font;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** Numbers, bands and names as the pictures write them. */
class LevelWordsTest {
  @Test
  void bandsAreWrittenShort() {
    assertThat(IntStream.range(0, Bands.COUNT).mapToObj(LevelWords::band))
        .containsExactly(
            "25", "31.5", "40", "50", "63", "80", "100", "125", "160", "200", "250", "315", "400",
            "500", "630", "800", "1k", "1.25k", "1.6k", "2k", "2.5k", "3.15k", "4k", "5k", "6.3k",
            "8k", "10k", "12.5k");
    assertThat(LevelWords.bandWithUnit(0)).isEqualTo("25 Hz");
    assertThat(LevelWords.bandWithUnit(1)).isEqualTo("31.5 Hz");
    assertThat(LevelWords.bandWithUnit(17)).isEqualTo("1.25 kHz");
    assertThat(LevelWords.bandWithUnit(26)).isEqualTo("10 kHz");
  }

  @Test
  void levelsHaveOneDecimalATrueMinusAndNoMinusZero() {
    assertThat(LevelWords.level(74.96)).isEqualTo("75.0");
    assertThat(LevelWords.level(-3.21)).isEqualTo("\u22123.2");
    assertThat(LevelWords.level(-0.04)).isEqualTo("0.0");
    assertThat(LevelWords.level(Double.NaN)).isEqualTo("not known");
    assertThat(LevelWords.level(Double.NEGATIVE_INFINITY)).isEqualTo("not known");
  }

  @Test
  void aTraceOfSomethingIsNotNothing() {
    assertThat(LevelWords.share(0.0)).isEqualTo("0 %");
    assertThat(LevelWords.share(0.0049)).isEqualTo("<1 %");
    assertThat(LevelWords.share(0.0051)).isEqualTo("1 %");
    assertThat(LevelWords.share(1.0)).isEqualTo("100 %");
  }

  @Test
  void namesLoseTheSectionTheyAreIn() {
    assertThat(ShortName.within("Crown, station E", "Station E")).isEqualTo("Crown");
    assertThat(ShortName.within("Crown, station E", "Station D")).isEqualTo("Crown, station E");
    assertThat(ShortName.within("Station E", "Station E")).isEqualTo("Station E");
  }

  @Test
  void longNamesAreCutToTheirRoom() {
    Font font = new Font(Font.SANS_SERIF, Font.PLAIN, 12);
    String name = "Air conditioning and systems";
    assertThat(Digits.fitted(font, name, 1000.0)).isEqualTo(name);
    String cut = Digits.fitted(font, name, 90.0);
    assertThat(cut).startsWith("Air c").endsWith("\u2026");
    assertThat(Digits.width(font, cut)).isLessThanOrEqualTo(90.0);
  }

  @Test
  void scalesGoByTensWithRoomAboveTheHighest() {
    double none = Double.NaN;
    assertThat(LevelScale.below(74.8, none).lower()).isEqualTo(30.0);
    assertThat(LevelScale.below(74.8, none).upper()).isBetween(79.0, 82.0);
    assertThat(LevelScale.below(81.0, 75.0).lower()).isEqualTo(40.0);
    assertThat(LevelScale.below(none, none).lower()).isEqualTo(20.0);
    // a target far above does not push the columns out of the picture
    assertThat(LevelScale.below(54.0, 110.0).lower()).isEqualTo(10.0);
    assertThat(LevelScale.below(54.0, 110.0).upper()).isGreaterThan(115.0);
    assertThat(LevelScale.below(none, 75.0).lower()).isEqualTo(30.0);
    assertThat(LevelScale.between(23.0, 70.0).lower()).isEqualTo(20.0);
    assertThat(new LevelScale(30.0, 80.0).place(55.0)).isEqualTo(0.5);
  }
}
