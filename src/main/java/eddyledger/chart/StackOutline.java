package eddyledger.chart;

import eddyledger.quantity.BandSpectrum;

/**
 * The outline of the selected row in the stack: from the bottom of a part up by its own energy.
 *
 * @param label name of the selected row
 * @param part position of the part at whose bottom it begins
 * @param meanSquares unweighted mean squares of the selected row, Pa² per band, NaN where missing
 * @param energyA sum of its A-weighted mean squares over the bands that have a value, Pa²
 */
public record StackOutline(String label, int part, BandSpectrum meanSquares, double energyA) {}
