package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.Allowance;

/** An allowance entered by hand. */
final class AllowanceCodec implements RecordCodec<Allowance> {
  static final AllowanceCodec ALLOWANCE = new AllowanceCodec();

  private static final String NODE = "node";
  private static final String RECEIVER = "receiver";
  private static final String CONDITION = "condition";
  private static final String LEVEL = "level_dBA";

  private AllowanceCodec() {}

  @Override
  public Allowance read(JsonObject object) {
    return new Allowance(
        object.text(NODE),
        object.text(RECEIVER),
        object.text(CONDITION),
        object.requiredNumber(LEVEL),
        EvidenceCodec.read(object, EvidenceCodec.KIND),
        object.extras());
  }

  @Override
  public ObjectNode write(Allowance allowance) {
    JsonBuilder builder =
        new JsonBuilder()
            .text(NODE, allowance.node())
            .text(RECEIVER, allowance.receiver())
            .text(CONDITION, allowance.condition())
            .number(LEVEL, allowance.level());
    EvidenceCodec.write(builder, allowance.evidence(), EvidenceCodec.KIND);
    return builder.with(allowance.extras());
  }
}
