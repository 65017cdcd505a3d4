package eddyledger.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.ledger.State;
import java.awt.Color;
import org.junit.jupiter.api.Test;

/**
 * Text can be read on what it stands on. Contrast ratio (L1 + 0.05) / (L2 + 0.05) with L = 0.2126 R
 * + 0.7152 G + 0.0722 B of the linear components; W3C, Web Content Accessibility Guidelines 2.1,
 * "relative luminance" and "contrast ratio". Success criterion 1.4.3 asks for 4.5 for text, 1.4.11
 * for 3 for marks.
 */
class PaletteContrastTest {
  private static final double TEXT = 4.5;

  private static double contrast(Color one, Color other) {
    double a = luminance(one);
    double b = luminance(other);
    return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
  }

  private static double luminance(Color colour) {
    return 0.2126 * linear(colour.getRed())
        + 0.7152 * linear(colour.getGreen())
        + 0.0722 * linear(colour.getBlue());
  }

  private static double linear(int component) {
    double c = component / 255.0;
    return c <= 0.03928 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
  }

  @Test
  void theFormulaGivesTheRatiosKnown() {
    assertThat(contrast(Color.BLACK, Color.WHITE)).isCloseTo(21.0, within(1.0e-9));
    assertThat(contrast(Color.RED, Color.RED)).isEqualTo(1.0);
    // the lightest grey that still passes on white
    assertThat(contrast(new Color(0x767676), Color.WHITE)).isCloseTo(4.54, within(0.005));
  }

  @Test
  void textCanBeReadOnPaper() {
    for (Palette palette : Palette.values()) {
      Color paper = palette.paper();
      assertThat(contrast(palette.ink(), paper)).as("ink, %s", palette).isGreaterThan(TEXT);
      assertThat(contrast(palette.ink2(), paper)).as("ink2, %s", palette).isGreaterThan(TEXT);
      assertThat(contrast(palette.ink3(), paper)).as("ink3, %s", palette).isGreaterThan(TEXT);
      assertThat(contrast(palette.accent(), paper)).as("accent, %s", palette).isGreaterThan(TEXT);
      for (State state : State.values()) {
        assertThat(contrast(palette.stateText(state), paper))
            .as("%s, %s", state, palette)
            .isGreaterThan(TEXT);
      }
    }
  }

  @Test
  void textCanBeReadOnTheSelectedRow() {
    for (Palette palette : Palette.values()) {
      Color behind = palette.selection();
      assertThat(contrast(palette.ink(), behind)).as("ink, %s", palette).isGreaterThan(TEXT);
      assertThat(contrast(palette.ink2(), behind)).as("ink2, %s", palette).isGreaterThan(TEXT);
    }
  }

  @Test
  void neighboursInTheStackAreToldApart() {
    for (Palette palette : Palette.values()) {
      for (int i = 1; i < palette.series().size(); i++) {
        Color one = palette.series().get(i - 1);
        Color other = palette.series().get(i);
        assertThat(contrast(one, other)).as("%d, %s", i, palette).isGreaterThan(1.3);
      }
    }
  }
}
