package eddyledger.model;

import java.util.Set;

/**
 * A lay-up known by its insertion loss.
 *
 * @param id identity
 * @param name name shown
 * @param insertionLoss insertion loss per band, dB; may be negative where the lay-up resonates
 * @param baseSurfaceMass mass per area of the base it was measured on, kg/m²; null if not stated
 * @param includes what the table includes besides insertion; empty if only that
 * @param extras unknown properties
 */
public record TabulatedLayUp(
    String id,
    String name,
    JudgedBands insertionLoss,
    Double baseSurfaceMass,
    Set<TableContent> includes,
    Extras extras)
    implements LayUp {
  public TabulatedLayUp {
    includes = Set.copyOf(includes);
  }
}
