package eddyledger.window;

/**
 * When what happened after a key was pressed, nanoseconds from the press.
 *
 * @param edited the change is made, and everything that shows it says "older"
 * @param delivered the new ledger begins to be handed to the presenters
 * @param presented presenters and views have taken it
 * @param row the panel's own row is painted with its new level
 * @param all nothing is left to be painted
 * @param paintedMeanwhile event thread's work while the ledger was computed: painting the old one
 */
public record EditTimes(
    long edited, long delivered, long presented, long row, long all, long paintedMeanwhile) {}
