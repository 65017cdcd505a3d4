package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.ledger.Judgement;
import eddyledger.ledger.State;
import eddyledger.ledger.Status;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Numbers and names as the desk writes them. */
class DeskNumbersTest {

  @ParameterizedTest
  @CsvSource({
    "1.14, +1.1",
    "0.25, +0.3",
    "-0.7, \u22120.7",
    "-12.34, \u221212.3",
    // a margin shows as many decimals as its state needs
    "-0.04, \u22120.04",
    "-0.004, \u22120.004",
    "0.04, 0.0",
    "0.0, 0.0",
    "-1.0e-12, 0.0",
    "0.97, +0.97",
    "0.9999, +1.000",
    "1.0, +1.0"
  })
  void aMarginHasItsSignAndNeverSeemsOfAnotherState(double margin, String text) {
    assertThat(DeskNumbers.margin(margin, 1.0)).isEqualTo(text);
  }

  @Test
  void aLevelThatIsNotThereIsADash() {
    assertThat(DeskNumbers.level(Double.NaN)).isEqualTo("\u2014");
    assertThat(DeskNumbers.level(Double.NEGATIVE_INFINITY)).isEqualTo("\u2014");
    assertThat(DeskNumbers.level(Double.NaN, Status.PARTIAL)).isEqualTo("\u2014");
    assertThat(DeskNumbers.level(73.94, Status.PARTIAL)).isEqualTo("\u2265\u200973.9");
    assertThat(DeskNumbers.level(-3.25, Status.OK)).isEqualTo("\u22123.3");
  }

  @Test
  void aTraceOfSomethingIsNoShareOfZero() {
    assertThat(DeskNumbers.share(0.0004)).isEqualTo("<0.1 %");
    assertThat(DeskNumbers.share(0.0005)).isEqualTo("0.1 %");
    assertThat(DeskNumbers.share(0.0)).isEqualTo("0.0 %");
    assertThat(DeskNumbers.share(Double.NaN)).isEmpty();
  }

  @Test
  void anUnknownMassIsNotZero() {
    assertThat(DeskNumbers.mass(Mass.NONE)).isEmpty();
    assertThat(DeskNumbers.mass(Mass.UNKNOWN)).isEqualTo("\u2014");
    assertThat(DeskNumbers.mass(Mass.of(28.26))).isEqualTo("28.3");
    assertThat(DeskNumbers.mass(Mass.of(28.26).plus(Mass.UNKNOWN))).isEqualTo("\u2265\u200928.3");
  }

  @Test
  void aVerdictIsSpokenAfterTheStateThatWasJudged() {
    assertThat(verdict(-0.7, State.OVER, Status.OK).spoken()).isEqualTo("over by 0.7 dB");
    assertThat(verdict(1.1, State.INSIDE, Status.OK).spoken()).isEqualTo("inside by 1.1 dB");
    assertThat(verdict(-0.3, State.TIGHT, Status.OK).spoken())
        .isEqualTo("tight after the target's rule, margin \u22120.3 dB");
    Verdict bound = verdict(-1.2, State.OVER, Status.PARTIAL);
    assertThat(bound.number()).isEqualTo("\u2264\u2009\u22121.2");
    assertThat(bound.spoken()).isEqualTo("over by at least 1.2 dB");
    assertThat(verdict(0.5, null, Status.PARTIAL)).isEqualTo(new Verdict("", null, "not known"));
    assertThat(Verdict.of(Judgement.NONE, Status.OK, 1.0)).isEqualTo(Verdict.NONE);
  }

  private static Verdict verdict(double margin, State state, Status status) {
    return Verdict.of(new Judgement(76.0, 1.0, 75.0, margin, state), status, 1.0);
  }

  @Test
  void aNameIsShortWhereThatTellsItApart() {
    assertThat(ShortName.among("Row 2, window", List.of("Row 2, window", "Row 9, aisle")))
        .isEqualTo("Row 2");
    assertThat(ShortName.among("Row 2, window", List.of("Row 2, window", "Row 2, aisle")))
        .isEqualTo("Row 2, window");
    assertThat(ShortName.among(", odd", List.of(", odd"))).isEqualTo(", odd");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "Crown, station E; Crown",
        "Crown, station E aft; Crown",
        "Station E, aft cabin; Aft cabin",
        "Crown; Crown",
        "Station E; Station E"
      })
  void aNameDoesNotRepeatTheSectionItIsWithin(String name, String shown) {
    List<String> sections = List.of("Station E", "Quillon 82");
    assertThat(ShortName.within(name, sections, Map.of())).isEqualTo(shown);
    assertThat(ShortName.within(name, sections, Map.of(shown, 2))).isEqualTo(name);
  }

  @Test
  void theScaleOfATileIsClippedAndHasPlaces() {
    TileScale scale = TileScale.of(76.0, 75.0, 74.0, List.of(73.0, 90.0));
    assertThat(scale).isEqualTo(new TileScale(0.75, 0.625, 0.5, 0.375, 1.0));
    TileScale free = TileScale.of(Double.NaN, Double.NaN, 60.0, List.of());
    assertThat(free.hasTarget()).isFalse();
    assertThat(free.hasRange()).isFalse();
    assertThat(free.level()).isEqualTo(0.625);
  }
}
