package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.PassRule;
import eddyledger.model.PassRule.Across;
import eddyledger.model.PassRule.Rounding;
import eddyledger.model.Rating;
import eddyledger.model.Target;

/** A target with its pass rule. */
final class TargetCodec implements RecordCodec<Target> {
  static final TargetCodec TARGET = new TargetCodec();

  private static final String CONDITION = "condition";
  private static final String RECEIVERS = "receivers";
  private static final String RATING = "rating";
  private static final String VALUE = "value";
  private static final String RESERVE = "reserve_dB";
  private static final String PASS_RULE = "pass_rule";
  private static final String ROUNDING = "rounding";
  private static final String TOLERANCE = "tolerance_dB";
  private static final String ACROSS = "across";

  private TargetCodec() {}

  @Override
  public Target read(JsonObject object) {
    return new Target(
        object.text("id"),
        object.requiredText("name"),
        object.text(CONDITION),
        object.texts(RECEIVERS),
        object.choice(RATING, Rating.values(), Rating::text),
        object.requiredNumber(VALUE),
        object.numberOr(RESERVE, 0.0),
        rule(object),
        EvidenceCodec.read(object, EvidenceCodec.KIND),
        object.extras());
  }

  private static PassRule rule(JsonObject target) {
    JsonObject object = target.object(PASS_RULE);
    if (object == null) {
      return PassRule.PLAIN;
    }
    Rounding rounding = object.choice(ROUNDING, Rounding.values(), Rounding::text);
    double tolerance = object.numberOr(TOLERANCE, PassRule.PLAIN.tolerance());
    Across across = object.choice(ACROSS, Across.values(), Across::text);
    target.keep(PASS_RULE, object.extras());
    return new PassRule(
        rounding == null ? PassRule.PLAIN.rounding() : rounding,
        tolerance,
        across == null ? PassRule.PLAIN.across() : across);
  }

  @Override
  public ObjectNode write(Target target) {
    JsonBuilder builder =
        new JsonBuilder()
            .text("id", target.id())
            .name("name", target.name())
            .text(CONDITION, target.condition())
            .texts(RECEIVERS, target.receivers())
            .text(RATING, target.rating() == null ? null : target.rating().text())
            .number(VALUE, target.value())
            .number(RESERVE, target.reserve() == 0.0 ? null : target.reserve());
    if (!target.rule().equals(PassRule.PLAIN)) {
      builder.object(
          PASS_RULE,
          new JsonBuilder()
              .text(ROUNDING, target.rule().rounding().text())
              .number(TOLERANCE, target.rule().tolerance())
              .text(ACROSS, target.rule().across().text()));
    }
    EvidenceCodec.write(builder, target.evidence(), EvidenceCodec.KIND);
    return builder.with(target.extras());
  }
}
