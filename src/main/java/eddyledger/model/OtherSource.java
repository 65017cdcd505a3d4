package eddyledger.model;

/**
 * A contribution that is not flow over a panel, entered for one receiver and condition.
 *
 * @param id identity
 * @param name name shown, for instance propulsion
 * @param receiver id of the receiver
 * @param condition id of the operating condition
 * @param levels unweighted band levels, dB re 20 µPa
 * @param extras unknown properties
 */
public record OtherSource(
    String id, String name, String receiver, String condition, JudgedBands levels, Extras extras) {}
