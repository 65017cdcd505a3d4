package eddyledger.chart;

import eddyledger.quantity.BandSpectrum;
import java.util.Set;

/**
 * One part of the stack.
 *
 * @param rowIds ids of all rows in it that have a value, sections and what is below them
 * @param label its name beside the picture
 * @param fill what it is filled with
 * @param meanSquares unweighted mean squares, Pa² per band; NaN where nothing in it has a value
 * @param energyA sum of its A-weighted mean squares over the bands that have a value, Pa²
 * @param share share of the energy known, A-weighted, 0 to 1
 * @param selected whether it holds the selected row
 */
public record StackPart(
    Set<String> rowIds,
    String label,
    StackFill fill,
    BandSpectrum meanSquares,
    double energyA,
    double share,
    boolean selected) {
  public StackPart {
    rowIds = Set.copyOf(rowIds);
  }
}
