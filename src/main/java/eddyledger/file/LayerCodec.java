package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.LayerGiven;
import java.util.Set;

/** What is known of a boundary layer: an object with any of five keys. */
final class LayerCodec implements ValueCodec<LayerGiven> {
  static final LayerCodec LAYER = new LayerCodec();

  private static final String RUNNING_LENGTH = "running_length_m";
  private static final String THICKNESS = "thickness_m";
  private static final String DISPLACEMENT = "displacement_thickness_m";
  private static final String MOMENTUM = "momentum_thickness_m";
  private static final String WALL_SHEAR = "wall_shear_stress_Pa";

  private LayerCodec() {}

  @Override
  public Set<String> keys() {
    return Set.of(RUNNING_LENGTH, THICKNESS, DISPLACEMENT, MOMENTUM, WALL_SHEAR);
  }

  @Override
  public LayerGiven read(JsonValue value) {
    JsonObject object = value.object();
    return new LayerGiven(
        object.read(RUNNING_LENGTH, NumberCodec.NUMBER),
        object.read(THICKNESS, NumberCodec.NUMBER),
        object.read(DISPLACEMENT, NumberCodec.NUMBER),
        object.read(MOMENTUM, NumberCodec.NUMBER),
        object.read(WALL_SHEAR, NumberCodec.NUMBER),
        object.extras());
  }

  @Override
  public ObjectNode write(LayerGiven value) {
    return new JsonBuilder()
        .value(RUNNING_LENGTH, value.runningLength(), NumberCodec.NUMBER)
        .value(THICKNESS, value.thickness(), NumberCodec.NUMBER)
        .value(DISPLACEMENT, value.displacementThickness(), NumberCodec.NUMBER)
        .value(MOMENTUM, value.momentumThickness(), NumberCodec.NUMBER)
        .value(WALL_SHEAR, value.wallShear(), NumberCodec.NUMBER)
        .with(value.extras());
  }
}
