package eddyledger.model;

/**
 * What couples two zones: an opening, a door, a floor.
 *
 * @param id identity
 * @param name name shown
 * @param firstZone id of one zone
 * @param secondZone id of the other
 * @param area area, m²
 * @param transmissionLoss transmission loss per band, dB; null for an open passage (0 dB)
 * @param extras unknown properties
 */
public record Aperture(
    String id,
    String name,
    String firstZone,
    String secondZone,
    double area,
    JudgedBands transmissionLoss,
    Extras extras) {}
