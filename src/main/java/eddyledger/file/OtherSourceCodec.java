package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.OtherSource;

/** A contribution that is not flow over a panel. */
final class OtherSourceCodec implements RecordCodec<OtherSource> {
  static final OtherSourceCodec OTHER_SOURCE = new OtherSourceCodec();

  private static final String RECEIVER = "receiver";
  private static final String CONDITION = "condition";
  private static final String LEVELS = "levels_dB";

  private OtherSourceCodec() {}

  @Override
  public OtherSource read(JsonObject object) {
    return new OtherSource(
        object.text("id"),
        object.requiredText("name"),
        object.text(RECEIVER),
        object.text(CONDITION),
        object.read(LEVELS, BandsCodec.BANDS),
        object.extras());
  }

  @Override
  public ObjectNode write(OtherSource source) {
    return new JsonBuilder()
        .text("id", source.id())
        .name("name", source.name())
        .text(RECEIVER, source.receiver())
        .text(CONDITION, source.condition())
        .value(LEVELS, source.levels(), BandsCodec.BANDS)
        .with(source.extras());
  }
}
