package eddyledger.file;

import eddyledger.model.Settings;

/** What a vehicle, section or panel sets: keys among those of the node's own object. */
final class SettingsCodec {
  private static final String CONSTRUCTION = "construction";
  private static final String LENGTH = "length_m";
  private static final String WIDTH = "width_m";
  private static final String LOCAL_SPEED = "local_speed";
  private static final String BOUNDARY_LAYER = "boundary_layer";
  private static final String WALL_PRESSURE = "wall_pressure";
  private static final String CROSS_SPECTRUM = "cross_spectrum";
  private static final String CONVECTION_RATIO = "convection_ratio";
  private static final String LOSS_FACTOR = "loss_factor";
  private static final String LAY_UP = "lay_up";
  private static final String ZONE = "zone";
  private static final String SUPPLIER = "supplier";

  private SettingsCodec() {}

  static Settings read(JsonObject object) {
    return new Settings(
        id(object, CONSTRUCTION),
        object.number(LENGTH),
        object.number(WIDTH),
        object.byCondition(LOCAL_SPEED, EdgeSpeedCodec.SPEED),
        object.byCondition(BOUNDARY_LAYER, LayerCodec.LAYER),
        object.byCondition(WALL_PRESSURE, WallPressureCodec.WALL_PRESSURE),
        object.byCondition(CROSS_SPECTRUM, CrossSpectrumCodec.CROSS_SPECTRUM),
        object.byCondition(CONVECTION_RATIO, NumberCodec.NUMBER),
        object.byCondition(LOSS_FACTOR, BandsCodec.BANDS),
        id(object, LAY_UP),
        id(object, ZONE),
        id(object, SUPPLIER));
  }

  /**
   * The id of a key; null if it is absent. One that cannot be read is empty and leads nowhere, so
   * that the value of a section above does not silently take its place.
   */
  private static String id(JsonObject object, String key) {
    JsonValue value = object.value(key);
    String id = value.text();
    if (id != null && id.isBlank()) {
      value.keep();
    }
    return value.unread() ? "" : id;
  }

  static void write(JsonBuilder builder, Settings settings) {
    builder
        .name(CONSTRUCTION, settings.construction())
        .number(LENGTH, settings.length())
        .number(WIDTH, settings.width())
        .byCondition(LOCAL_SPEED, settings.localSpeed(), EdgeSpeedCodec.SPEED)
        .byCondition(BOUNDARY_LAYER, settings.boundaryLayer(), LayerCodec.LAYER)
        .byCondition(WALL_PRESSURE, settings.wallPressure(), WallPressureCodec.WALL_PRESSURE)
        .byCondition(CROSS_SPECTRUM, settings.crossSpectrum(), CrossSpectrumCodec.CROSS_SPECTRUM)
        .byCondition(CONVECTION_RATIO, settings.convectionRatio(), NumberCodec.NUMBER)
        .byCondition(LOSS_FACTOR, settings.lossFactor(), BandsCodec.BANDS)
        .name(LAY_UP, settings.layUp())
        .name(ZONE, settings.zone())
        .name(SUPPLIER, settings.supplier());
  }
}
