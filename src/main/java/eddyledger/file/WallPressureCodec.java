package eddyledger.file;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.Evidence;
import eddyledger.model.WallPressureChoice;
import java.util.Set;

/** A choice of wall-pressure spectrum: its id, or an object with low, high and the evidence. */
final class WallPressureCodec implements ValueCodec<WallPressureChoice> {
  static final WallPressureCodec WALL_PRESSURE = new WallPressureCodec();

  private static final String MODEL = "model";

  private WallPressureCodec() {}

  @Override
  public Set<String> keys() {
    return Set.of(
        MODEL, "low", "high", EvidenceCodec.GRADE, EvidenceCodec.KIND, EvidenceCodec.SOURCE);
  }

  @Override
  public WallPressureChoice read(JsonValue value) {
    if (!value.isObject()) {
      String model = value.text();
      return WallPressureChoice.of(model == null ? "" : model);
    }
    JsonObject object = value.object();
    String model = object.requiredText(MODEL);
    String low = object.text("low");
    String high = object.text("high");
    Evidence evidence = EvidenceCodec.read(object, EvidenceCodec.KIND);
    return new WallPressureChoice(model, low, high, evidence, object.extras());
  }

  @Override
  public ObjectNode write(WallPressureChoice value) {
    JsonBuilder builder =
        new JsonBuilder()
            .name(MODEL, value.model())
            .text("low", value.low())
            .text("high", value.high());
    EvidenceCodec.write(builder, value.evidence(), EvidenceCodec.KIND);
    return builder.with(value.extras());
  }

  @Override
  public JsonNode brief(ObjectNode full) {
    if (full.isEmpty()) {
      return MissingNode.getInstance();
    }
    return full.size() == 1 && full.has(MODEL) ? full.get(MODEL) : full;
  }
}
