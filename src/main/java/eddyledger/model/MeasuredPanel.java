package eddyledger.model;

/**
 * A panel given by measurement: the level difference between the wall pressure outside and the
 * zone.
 *
 * @param levelDifference outside wall-pressure band level less the level in the zone, of one piece,
 *     dB
 * @param absorptionArea absorption area of the receiving room of the measurement, m² per band; null
 *     if it was measured in the zone as it is now
 * @param extras unknown properties
 */
public record MeasuredPanel(
    JudgedBands levelDifference, JudgedBands absorptionArea, Extras extras) {}
