package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.MeasuredPanel;

/** The measurement of a panel. */
final class MeasuredCodec implements RecordCodec<MeasuredPanel> {
  static final MeasuredCodec MEASURED = new MeasuredCodec();

  private static final String LEVEL_DIFFERENCE = "level_difference_dB";
  private static final String ABSORPTION_AREA = "absorption_area_m2";

  private MeasuredCodec() {}

  @Override
  public MeasuredPanel read(JsonObject object) {
    return new MeasuredPanel(
        object.read(LEVEL_DIFFERENCE, BandsCodec.BANDS),
        object.read(ABSORPTION_AREA, BandsCodec.BANDS),
        object.extras());
  }

  @Override
  public ObjectNode write(MeasuredPanel measured) {
    return new JsonBuilder()
        .value(LEVEL_DIFFERENCE, measured.levelDifference(), BandsCodec.BANDS)
        .value(ABSORPTION_AREA, measured.absorptionArea(), BandsCodec.BANDS)
        .with(measured.extras());
  }
}
