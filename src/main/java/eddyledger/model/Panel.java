package eddyledger.model;

/**
 * A piece of the outside skin with one construction, one local flow and one transmission path into
 * one zone; or so many identical pieces.
 *
 * @param id identity
 * @param name name shown
 * @param count number of identical pieces, 1 or more
 * @param settings what it sets itself
 * @param measured a measurement that stands in place of the computation; null if it is computed
 * @param evidence how well the panel's contribution is founded
 * @param extras unknown properties
 */
public record Panel(
    String id,
    String name,
    int count,
    Settings settings,
    MeasuredPanel measured,
    Evidence evidence,
    Extras extras)
    implements Node {

  /** The same panel with another count. */
  public Panel withCount(int other) {
    return new Panel(id, name, other, settings, measured, evidence, extras);
  }

  /** The same panel under another id. */
  public Panel withId(String other) {
    return new Panel(other, name, count, settings, measured, evidence, extras);
  }

  /** The same panel with other settings. */
  public Panel withSettings(Settings others) {
    return new Panel(id, name, count, others, measured, evidence, extras);
  }

  /** The same panel under another name. */
  public Panel withName(String other) {
    return new Panel(id, other, count, settings, measured, evidence, extras);
  }
}
