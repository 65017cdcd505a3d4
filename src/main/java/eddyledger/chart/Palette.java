package eddyledger.chart;

import eddyledger.ledger.State;
import java.awt.Color;
import java.util.List;

/**
 * The colours of window and pictures, once for light and once for dark. Neutral greys carry the
 * page; state and series colours are from the palette of Okabe and Ito, "Color universal design"
 * (2008, jfly.uni-koeln.de/color), with darker or lighter twins where text needs the contrast.
 */
public enum Palette {
  /** Dark ink on light paper. */
  LIGHT(
      new int[] {0xF1F2F3, 0xFFFFFF, 0xFFFFFF, 0x1C1F24, 0x59616B, 0x6E7681, 0xD9DCE0, 0xE8EAED},
      new int[] {0xE1EAF2, 0x0072B2, 0x8A929C, 0x2B3038},
      new int[] {0xB04A00, 0x855800, 0x00724F},
      new int[] {0x0072B2, 0x56B4E9, 0xCC79A7, 0xF0E442, 0x4B5561},
      new int[] {0xB9BFC7, 0xE3E5E8, 0xC9CED4}),
  /** Light ink on dark paper. */
  DARK(
      new int[] {0x17191C, 0x1F2226, 0x191B1F, 0xE9EBEE, 0xA3ABB5, 0x8B939E, 0x363B42, 0x2B2F35},
      new int[] {0x28394A, 0x56B4E9, 0x7B848F, 0xE9EBEE},
      new int[] {0xFF9457, 0xF2B632, 0x3DC79B},
      new int[] {0x2E93CF, 0x7CC6F0, 0xCC79A7, 0xD9CE45, 0x9AA4AF},
      new int[] {0x555D67, 0x3A4048, 0x4A515A});

  private final Color[] page;
  private final Color[] lively;
  private final Color[] stateText;
  private final List<Color> series;
  private final Color[] rest;

  Palette(int[] page, int[] lively, int[] stateText, int[] series, int[] rest) {
    this.page = colours(page);
    this.lively = colours(lively);
    this.stateText = colours(stateText);
    this.series = List.of(colours(series));
    this.rest = colours(rest);
  }

  private static Color[] colours(int[] values) {
    Color[] colours = new Color[values.length];
    for (int i = 0; i < values.length; i++) {
      colours[i] = new Color(values[i]);
    }
    return colours;
  }

  /** Whether it is the dark one. */
  public boolean dark() {
    return this == DARK;
  }

  /** Behind strip, status line and gaps. */
  public Color ground() {
    return page[0];
  }

  /** Behind ledger, picture and sheet. */
  public Color paper() {
    return page[1];
  }

  /** Behind what can be typed into. */
  public Color field() {
    return page[2];
  }

  /** First ink: what is read. */
  public Color ink() {
    return page[3];
  }

  /** Second ink: headers, units, origins. */
  public Color ink2() {
    return page[4];
  }

  /** Third ink: leader lines, the dash for no value. */
  public Color ink3() {
    return page[5];
  }

  /** Thin lines between regions. */
  public Color hairline() {
    return page[6];
  }

  /** Grid of pictures. */
  public Color grid() {
    return page[7];
  }

  /** Behind the selected row. */
  public Color selection() {
    return lively[0];
  }

  /** Links, focus, what is followed. */
  public Color accent() {
    return lively[1];
  }

  /** A bar of a band strip. */
  public Color bar() {
    return lively[2];
  }

  /** The highest bar of a band strip. */
  public Color peakBar() {
    return lively[3];
  }

  /** Text of a state; second ink if it is not known (null). */
  public Color stateText(State state) {
    return state == null
        ? ink2()
        : switch (state) {
          case OVER -> stateText[0];
          case TIGHT -> stateText[1];
          case INSIDE -> stateText[2];
        };
  }

  /** Mark of a state; third ink if it is not known (null). */
  public Color stateMark(State state) {
    return state == null
        ? ink3()
        : switch (state) {
          case OVER -> new Color(0xD55E00);
          case TIGHT -> new Color(0xE69F00);
          case INSIDE -> new Color(0x009E73);
        };
  }

  /** Colours of parts told apart, in the order they are given out. */
  public List<Color> series() {
    return series;
  }

  /** Behind the hatch of a leak. */
  public Color leak() {
    return rest[0];
  }

  /** All that is outside the section looked at. */
  public Color elsewhere() {
    return rest[1];
  }

  /** The smaller parts of the section looked at, together. */
  public Color remainder() {
    return rest[2];
  }
}
