package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.EdgeSpeed.Way;
import eddyledger.model.Judged;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** A local flow speed: an object with one of four keys that tell how it is given. */
final class EdgeSpeedCodec implements ValueCodec<EdgeSpeed> {
  static final EdgeSpeedCodec SPEED = new EdgeSpeedCodec();

  private EdgeSpeedCodec() {}

  @Override
  public Set<String> keys() {
    return Stream.of(Way.values()).map(Way::key).collect(Collectors.toSet());
  }

  @Override
  public EdgeSpeed read(JsonValue value) {
    JsonObject object = value.object();
    List<Way> given =
        Stream.of(Way.values()).filter(way -> !object.value(way.key()).absent()).toList();
    Way way = given.isEmpty() ? Way.RATIO : given.get(0);
    Judged speed = object.read(way.key(), NumberCodec.NUMBER);
    if (given.size() != 1) {
      value.wholeFault(
          "one-of",
          given.isEmpty() ? "The local speed is missing." : "The local speed is given twice.",
          "Give one of speed_m_per_s, speed_ratio, pressure_coefficient and"
              + " pressure_coefficient_incompressible.");
      given.stream().skip(1).forEach(other -> object.value(other.key()).keep());
    }
    return new EdgeSpeed(way, speed == null ? Judged.of(Double.NaN) : speed, object.extras());
  }

  @Override
  public ObjectNode write(EdgeSpeed value) {
    return new JsonBuilder()
        .value(value.way().key(), value.value(), NumberCodec.NUMBER)
        .with(value.extras());
  }
}
