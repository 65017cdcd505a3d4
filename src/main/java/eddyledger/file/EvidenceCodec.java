package eddyledger.file;

import eddyledger.model.Evidence;
import eddyledger.model.EvidenceGrade;
import eddyledger.model.ValueKind;

/** Where a value comes from: three keys among those of the value's own object. */
final class EvidenceCodec {
  /** The key of the kind of value. */
  static final String KIND = "kind";

  /** The key of the kind of value where {@link #KIND} says something else. */
  static final String VALUE_KIND = "value_kind";

  static final String GRADE = "grade";
  static final String SOURCE = "source";

  private EvidenceCodec() {}

  static Evidence read(JsonObject object, String kindKey) {
    Evidence evidence =
        new Evidence(
            object.choice(GRADE, EvidenceGrade.values(), EvidenceGrade::text),
            object.choice(kindKey, ValueKind.values(), ValueKind::text),
            object.text(SOURCE));
    return evidence.equals(Evidence.NONE) ? Evidence.NONE : evidence;
  }

  static void write(JsonBuilder builder, Evidence evidence, String kindKey) {
    builder
        .text(GRADE, evidence.grade() == null ? null : evidence.grade().text())
        .text(kindKey, evidence.kind() == null ? null : evidence.kind().text())
        .text(SOURCE, evidence.source());
  }
}
