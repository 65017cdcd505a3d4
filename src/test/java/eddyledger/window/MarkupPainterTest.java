package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Font;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Lines are broken without losing a word. */
class MarkupPainterTest {
  private static final Font FONT = new Font(Font.SANS_SERIF, Font.PLAIN, 12);

  @Test
  void aShortLineStaysWhole() {
    assertThat(MarkupPainter.wrap(FONT, "a = 1,  b = 2", 500)).containsExactly("a = 1,  b = 2");
    assertThat(MarkupPainter.wrap(FONT, "", 500)).isEmpty();
  }

  @Test
  void numbersBreakBetweenNumbers() {
    String line = "U_{e} = 236.9 m/s,  M_{e} = 0.807,  q = 10.1 kPa";
    double width = MarkupPainter.width(FONT, "U_{e} = 236.9 m/s,  M_{e} = 0.807,") + 1;
    assertThat(MarkupPainter.wrap(FONT, line, width))
        .containsExactly("U_{e} = 236.9 m/s,  M_{e} = 0.807,", "q = 10.1 kPa");
  }

  @Test
  void sentencesBreakBetweenWordsAndFit() {
    String text = "Power meets the absorption of Underfloor, and passes on to Cabin, rows 1 to 6.";
    List<String> lines = MarkupPainter.wrap(FONT, text, 150);
    assertThat(lines).hasSizeGreaterThan(2);
    assertThat(String.join(" ", lines)).isEqualTo(text);
    assertThat(lines).allMatch(line -> MarkupPainter.width(FONT, line) <= 150);
  }

  @Test
  void aWordLongerThanTheLineIsNotLost() {
    assertThat(MarkupPainter.wrap(FONT, "incomprehensibilities", 10))
        .containsExactly("incomprehensibilities");
  }

  @Test
  void aTextIsCutWithAnEllipsis() {
    String cut = MarkupPainter.cut(FONT, "quillon-82-lighter-trim.eddyledger", 100);
    assertThat(cut).startsWith("quillon").endsWith("…");
    assertThat(MarkupPainter.width(FONT, cut)).isLessThanOrEqualTo(100);
    assertThat(MarkupPainter.cut(FONT, "short", 100)).isEqualTo("short");
  }
}
