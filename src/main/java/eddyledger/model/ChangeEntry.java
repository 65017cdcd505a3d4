package eddyledger.model;

import java.time.Instant;

/**
 * One line of the change log. The log only grows.
 *
 * @param when instant of the change, UTC
 * @param who who made it
 * @param what what was changed: an id, a field, or a sentence
 * @param oldValue value before, null if none
 * @param newValue value after, null if none
 * @param reason why
 * @param agreedWith with whom it was agreed, null if nobody
 * @param extras unknown properties
 */
public record ChangeEntry(
    Instant when,
    String who,
    String what,
    String oldValue,
    String newValue,
    String reason,
    String agreedWith,
    Extras extras) {}
