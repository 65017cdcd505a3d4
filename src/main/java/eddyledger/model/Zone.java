package eddyledger.model;

/**
 * One air volume of the cabin, with its own level.
 *
 * @param id identity
 * @param name name shown
 * @param volume volume, m³; null if not stated
 * @param innerSurface area of its inner surface, m²; null if not stated
 * @param absorptionArea equivalent absorption area per band, m², without the open area of apertures
 * @param extras unknown properties
 */
public record Zone(
    String id,
    String name,
    Double volume,
    Double innerSurface,
    ByCondition<JudgedBands> absorptionArea,
    Extras extras) {}
