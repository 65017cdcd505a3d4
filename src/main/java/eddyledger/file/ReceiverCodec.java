package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.Receiver;
import eddyledger.model.Receiver.DirectPath;

/** A place where a level is wanted. */
final class ReceiverCodec implements RecordCodec<Receiver> {
  static final ReceiverCodec RECEIVER = new ReceiverCodec();

  private static final String ZONE = "zone";
  private static final String DIRECT = "direct";

  private ReceiverCodec() {}

  @Override
  public Receiver read(JsonObject object) {
    return new Receiver(
        object.text("id"),
        object.requiredText("name"),
        object.text(ZONE),
        object.records(DIRECT, DirectCodec.DIRECT_PATH),
        object.extras());
  }

  @Override
  public ObjectNode write(Receiver receiver) {
    return new JsonBuilder()
        .text("id", receiver.id())
        .name("name", receiver.name())
        .text(ZONE, receiver.zone())
        .records(DIRECT, receiver.direct(), DirectCodec.DIRECT_PATH)
        .with(receiver.extras());
  }

  /** A line of sight from a panel. */
  private static final class DirectCodec implements RecordCodec<DirectPath> {
    static final DirectCodec DIRECT_PATH = new DirectCodec();

    private static final String PANEL = "panel";
    private static final String DISTANCE = "distance_m";

    @Override
    public DirectPath read(JsonObject object) {
      return new DirectPath(object.text(PANEL), object.requiredNumber(DISTANCE), object.extras());
    }

    @Override
    public ObjectNode write(DirectPath path) {
      return new JsonBuilder()
          .text(PANEL, path.panel())
          .number(DISTANCE, path.distance())
          .with(path.extras());
    }
  }
}
