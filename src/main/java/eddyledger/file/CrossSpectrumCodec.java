package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.CrossSpectrumChoice;
import eddyledger.model.CrossSpectrumChoice.Rule;
import eddyledger.model.Evidence;
import eddyledger.model.Extras;
import eddyledger.model.Judged;
import java.util.Set;

/** A choice of cross-spectrum; what is left out is as in the default choice. */
final class CrossSpectrumCodec implements ValueCodec<CrossSpectrumChoice> {
  static final CrossSpectrumCodec CROSS_SPECTRUM = new CrossSpectrumCodec();

  private static final CrossSpectrumChoice USUAL = CrossSpectrumChoice.DEFAULT;
  private static final String ORDER_ALONG = "order_along";
  private static final String ORDER_ACROSS = "order_across";
  private static final String DECAY_ALONG = "decay_along";
  private static final String DECAY_ACROSS = "decay_across";
  private static final String FITTED_ALONG = "fitted_order_along";
  private static final String FITTED_ACROSS = "fitted_order_across";
  private static final String RULE = "rule";

  /** What stands for a value that is no object; its orders stop whatever uses it. */
  private static final CrossSpectrumChoice UNREAD =
      new CrossSpectrumChoice(
          0,
          0,
          USUAL.decayAlong(),
          USUAL.decayAcross(),
          0,
          0,
          USUAL.rule(),
          Evidence.NONE,
          Extras.NONE);

  private CrossSpectrumCodec() {}

  @Override
  public Set<String> keys() {
    return Set.of(
        ORDER_ALONG,
        ORDER_ACROSS,
        DECAY_ALONG,
        DECAY_ACROSS,
        FITTED_ALONG,
        FITTED_ACROSS,
        RULE,
        EvidenceCodec.GRADE,
        EvidenceCodec.KIND,
        EvidenceCodec.SOURCE);
  }

  @Override
  public CrossSpectrumChoice read(JsonValue value) {
    JsonObject object = value.object();
    if (!value.isObject() && !value.absent()) {
      return UNREAD;
    }
    Judged along = object.read(DECAY_ALONG, NumberCodec.NUMBER);
    Judged across = object.read(DECAY_ACROSS, NumberCodec.NUMBER);
    Rule rule = object.choice(RULE, Rule.values(), Rule::text);
    return new CrossSpectrumChoice(
        object.wholeOr(ORDER_ALONG, USUAL.orderAlong()),
        object.wholeOr(ORDER_ACROSS, USUAL.orderAcross()),
        along == null ? USUAL.decayAlong() : along,
        across == null ? USUAL.decayAcross() : across,
        object.wholeOr(FITTED_ALONG, USUAL.fittedOrderAlong()),
        object.wholeOr(FITTED_ACROSS, USUAL.fittedOrderAcross()),
        rule == null ? USUAL.rule() : rule,
        EvidenceCodec.read(object, EvidenceCodec.KIND),
        object.extras());
  }

  @Override
  public ObjectNode write(CrossSpectrumChoice value) {
    if (value.equals(UNREAD)) {
      return new JsonBuilder().with(Extras.NONE);
    }
    JsonBuilder builder =
        new JsonBuilder()
            .whole(ORDER_ALONG, value.orderAlong())
            .whole(ORDER_ACROSS, value.orderAcross())
            .value(DECAY_ALONG, value.decayAlong(), NumberCodec.NUMBER)
            .value(DECAY_ACROSS, value.decayAcross(), NumberCodec.NUMBER)
            .whole(FITTED_ALONG, value.fittedOrderAlong())
            .whole(FITTED_ACROSS, value.fittedOrderAcross())
            .text(RULE, value.rule().text());
    EvidenceCodec.write(builder, value.evidence(), EvidenceCodec.KIND);
    return builder.with(value.extras());
  }
}
