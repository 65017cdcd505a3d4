package eddyledger.model;

/**
 * A panel given by measurement: the level difference between the wall pressure outside and the
 * zone.
 *
 * @param levelDifference outside wall-pressure band level less the level in the zone, of one piece,
 *     dB
 * @param absorptionArea absorption area of the receiving room of the measurement, m² per band; null
 *     if it was not stated: then the absorption area of the panel's zone is taken, as it is
 *     described in the condition, and absorption added to that zone does not lower the panel's
 *     diffuse sound; the check warns of it and the trace says it
 * @param extras unknown properties
 */
public record MeasuredPanel(
    JudgedBands levelDifference, JudgedBands absorptionArea, Extras extras) {}
