package eddyledger.check;

/**
 * Something the lead should know about the input or the result.
 *
 * @param severity how much it matters
 * @param code short name of the kind of finding, for instance {@code duplicate-id}
 * @param subject id of the panel, construction, zone or whatever is meant; empty if none
 * @param place where it stands in the project file, for instance {@code zones[0].volume_m3}
 * @param what what was found, with numbers and units
 * @param remedy what to do about it
 */
public record Finding(
    Severity severity, String code, String subject, String place, String what, String remedy) {

  /** The place with the subject, for tables. */
  public String where() {
    if (subject.isEmpty()) {
      return place;
    }
    return place.isEmpty() ? subject : place + " (" + subject + ")";
  }

  /** The finding as one readable paragraph. */
  public String text() {
    return severity.text() + " at " + where() + ": " + what + " " + remedy;
  }
}
