package eddyledger.file;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.Evidence;
import eddyledger.model.Judged;
import java.util.Set;

/** A judged number: a plain number, or an object with best, low, high and the evidence. */
final class NumberCodec implements ValueCodec<Judged> {
  static final NumberCodec NUMBER = new NumberCodec();

  private static final String BEST = "best";

  private NumberCodec() {}

  @Override
  public Set<String> keys() {
    return Set.of(
        BEST, "low", "high", EvidenceCodec.GRADE, EvidenceCodec.KIND, EvidenceCodec.SOURCE);
  }

  @Override
  public Judged read(JsonValue value) {
    if (!value.isObject()) {
      Double plain = value.number();
      return Judged.of(plain == null ? Double.NaN : plain);
    }
    JsonObject object = value.object();
    JsonValue essence = object.essence(BEST);
    Double best = essence.number();
    if (best == null) {
      essence.missing();
    }
    Double low = object.number("low");
    Double high = object.number("high");
    Evidence evidence = EvidenceCodec.read(object, EvidenceCodec.KIND);
    return new Judged(best == null ? Double.NaN : best, low, high, evidence, object.extras());
  }

  @Override
  public ObjectNode write(Judged value) {
    JsonBuilder builder =
        new JsonBuilder()
            .number(BEST, value.best())
            .number("low", value.low())
            .number("high", value.high());
    EvidenceCodec.write(builder, value.evidence(), EvidenceCodec.KIND);
    return builder.with(value.extras());
  }

  @Override
  public JsonNode brief(ObjectNode full) {
    if (full.isEmpty()) {
      return MissingNode.getInstance();
    }
    return full.size() == 1 && full.has(BEST) ? full.get(BEST) : full;
  }
}
