package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.ChangeEntry;
import java.time.DateTimeException;
import java.time.Instant;

/** A line of the change log. */
final class ChangeCodec implements RecordCodec<ChangeEntry> {
  static final ChangeCodec CHANGE = new ChangeCodec();

  private static final String WHEN = "when";
  private static final String WHO = "who";
  private static final String WHAT = "what";
  private static final String OLD = "old";
  private static final String NEW = "new";
  private static final String REASON = "reason";
  private static final String AGREED_WITH = "agreed_with";

  private ChangeCodec() {}

  @Override
  public ChangeEntry read(JsonObject object) {
    return new ChangeEntry(
        instant(object.value(WHEN)),
        object.requiredText(WHO),
        object.requiredText(WHAT),
        object.text(OLD),
        object.text(NEW),
        object.requiredText(REASON),
        object.text(AGREED_WITH),
        object.extras());
  }

  private static Instant instant(JsonValue value) {
    String text = value.text();
    if (text == null) {
      value.missing();
      return Instant.EPOCH;
    }
    try {
      if (text.endsWith("Z")) {
        return Instant.parse(text);
      }
    } catch (DateTimeException notAnInstant) {
      // told below, together with instants of another time zone
    }
    value.fault(
        "bad-instant",
        JsonValue.shownText(text) + " is no instant in universal time.",
        "Write it like 2026-03-31T14:05:00Z.");
    return Instant.EPOCH;
  }

  @Override
  public ObjectNode write(ChangeEntry entry) {
    return new JsonBuilder()
        .text(WHEN, entry.when().equals(Instant.EPOCH) ? null : entry.when().toString())
        .name(WHO, entry.who())
        .name(WHAT, entry.what())
        .text(OLD, entry.oldValue())
        .text(NEW, entry.newValue())
        .name(REASON, entry.reason())
        .text(AGREED_WITH, entry.agreedWith())
        .with(entry.extras());
  }
}
