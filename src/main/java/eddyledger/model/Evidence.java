package eddyledger.model;

/**
 * Where an entered value comes from.
 *
 * @param grade evidence grade, null if not stated
 * @param kind kind of value, null if not stated
 * @param source report, drawing or reason in words, null if not stated
 */
public record Evidence(EvidenceGrade grade, ValueKind kind, String source) {
  /** Nothing is stated. */
  public static final Evidence NONE = new Evidence(null, null, null);
}
