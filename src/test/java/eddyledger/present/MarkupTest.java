package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.present.Markup.Place;
import eddyledger.present.Markup.Run;
import org.junit.jupiter.api.Test;

/** Formulas as runs and as plain text. */
class MarkupTest {
  @Test
  void marksStandLowerAndHigher() {
    assertThat(Markup.runs("q = ½ ρ_{e} U_{e}^{2}"))
        .containsExactly(
            new Run("q = ½ ρ", Place.LINE),
            new Run("e", Place.BELOW),
            new Run(" U", Place.LINE),
            new Run("e", Place.BELOW),
            new Run("2", Place.ABOVE));
  }

  @Test
  void plainTextKeepsTheMeaning() {
    assertThat(Markup.plain("q = ½ ρ_{e} U_{e}^{2}")).isEqualTo("q = ½ ρ_e U_e²");
    assertThat(Markup.plain("10^{−D/10}")).isEqualTo("10^(−D/10)");
    assertThat(Markup.plain("no marks")).isEqualTo("no marks");
    assertThat(Markup.plain("")).isEmpty();
  }

  @Test
  void whatIsNotClosedIsText() {
    assertThat(Markup.plain("a_{b")).isEqualTo("a_{b");
  }
}
