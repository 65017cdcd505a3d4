package eddyledger.model;

/**
 * A value with the place that sets it.
 *
 * @param <T> what the value is
 * @param value the value
 * @param holder id of the panel, section or vehicle that sets it
 * @param own whether the asking node sets it itself
 * @param override whether it is an override for the condition asked for
 */
public record Held<T>(T value, String holder, boolean own, boolean override) {}
