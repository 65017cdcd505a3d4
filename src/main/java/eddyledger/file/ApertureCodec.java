package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.Aperture;
import java.util.Arrays;
import java.util.List;

/** What couples two zones. */
final class ApertureCodec implements RecordCodec<Aperture> {
  static final ApertureCodec APERTURE = new ApertureCodec();

  private static final String ZONES = "zones";
  private static final String AREA = "area_m2";
  private static final String TRANSMISSION_LOSS = "transmission_loss_dB";
  private static final int PAIR = 2;

  private ApertureCodec() {}

  @Override
  public Aperture read(JsonObject object) {
    List<JsonValue> zones = object.value(ZONES).items();
    boolean pair = zones.size() == PAIR;
    if (!pair) {
      object
          .value(ZONES)
          .wholeFault(
              "aperture-zones",
              "An aperture joins two zones, and " + zones.size() + " are named.",
              "Name two.");
      object.value(ZONES).keep();
    }
    return new Aperture(
        object.text("id"),
        object.requiredText("name"),
        pair ? zones.get(0).text() : null,
        pair ? zones.get(1).text() : null,
        object.requiredNumber(AREA),
        object.read(TRANSMISSION_LOSS, BandsCodec.BANDS),
        object.extras());
  }

  @Override
  public ObjectNode write(Aperture aperture) {
    JsonBuilder builder = new JsonBuilder().text("id", aperture.id()).name("name", aperture.name());
    if (aperture.firstZone() != null || aperture.secondZone() != null) {
      builder.texts(ZONES, Arrays.asList(aperture.firstZone(), aperture.secondZone()));
    }
    return builder
        .number(AREA, aperture.area())
        .value(TRANSMISSION_LOSS, aperture.transmissionLoss(), BandsCodec.BANDS)
        .with(aperture.extras());
  }
}
