package eddyledger.model;

/**
 * The share of a target handed to a section or panel, entered by hand.
 *
 * @param node id of the section or panel
 * @param receiver id of the receiver
 * @param condition id of the operating condition
 * @param level A-weighted level the node may contribute, dB(A)
 * @param evidence who agreed it, and how
 * @param extras unknown properties
 */
public record Allowance(
    String node,
    String receiver,
    String condition,
    double level,
    Evidence evidence,
    Extras extras) {}
