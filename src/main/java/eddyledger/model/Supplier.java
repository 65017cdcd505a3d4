package eddyledger.model;

/**
 * A firm that answers for some panels.
 *
 * @param id identity
 * @param name name shown
 * @param extras unknown properties
 */
public record Supplier(String id, String name, Extras extras) {}
