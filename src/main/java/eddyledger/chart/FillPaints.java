package eddyledger.chart;

import java.awt.Paint;

/** The paints of the parts of the stack; the gutter of the ledger uses the same. */
public final class FillPaints {
  private final Palette palette;

  public FillPaints(Palette palette) {
    this.palette = palette;
  }

  /**
   * What a part is filled with.
   *
   * @param scale pixels of the device to one of the drawing, as in the transform of its graphics
   */
  public Paint of(StackFill fill, double scale) {
    return switch (fill.kind()) {
      case SERIES -> palette.series().get(fill.number());
      case REMAINDER -> palette.remainder();
      case LEAK -> Hatch.RISING.paint(palette.ink3(), palette.leak(), scale);
      case ELSEWHERE -> palette.elsewhere();
      case OTHER -> other(fill.number()).paint(palette.bar(), palette.paper(), scale);
    };
  }

  /** Whether the fill is hollow and needs an edge in the colour of the bars. */
  public boolean edged(StackFill fill) {
    return fill.kind() == StackFill.Kind.OTHER;
  }

  private static Hatch other(int number) {
    return switch (number) {
      case 0 -> Hatch.FALLING;
      case 1 -> Hatch.DOTS;
      default -> Hatch.RISING;
    };
  }
}
