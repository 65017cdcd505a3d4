package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.Zone;

/** A zone of the cabin. */
final class ZoneCodec implements RecordCodec<Zone> {
  static final ZoneCodec ZONE = new ZoneCodec();

  private static final String VOLUME = "volume_m3";
  private static final String INNER_SURFACE = "inner_surface_m2";
  private static final String ABSORPTION_AREA = "absorption_area_m2";

  private ZoneCodec() {}

  @Override
  public Zone read(JsonObject object) {
    return new Zone(
        object.text("id"),
        object.requiredText("name"),
        object.number(VOLUME),
        object.number(INNER_SURFACE),
        object.byCondition(ABSORPTION_AREA, BandsCodec.BANDS),
        object.extras());
  }

  @Override
  public ObjectNode write(Zone zone) {
    return new JsonBuilder()
        .text("id", zone.id())
        .name("name", zone.name())
        .number(VOLUME, zone.volume())
        .number(INNER_SURFACE, zone.innerSurface())
        .byCondition(ABSORPTION_AREA, zone.absorptionArea(), BandsCodec.BANDS)
        .with(zone.extras());
  }
}
