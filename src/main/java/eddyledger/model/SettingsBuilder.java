package eddyledger.model;

/**
 * A changeable copy of {@link Settings}; {@link #build()} makes the record. Null means: as above.
 */
public final class SettingsBuilder {
  private String construction;
  private Double length;
  private Double width;
  private ByCondition<EdgeSpeed> localSpeed;
  private ByCondition<LayerGiven> boundaryLayer;
  private ByCondition<WallPressureChoice> wallPressure;
  private ByCondition<CrossSpectrumChoice> crossSpectrum;
  private ByCondition<Judged> convectionRatio;
  private ByCondition<JudgedBands> lossFactor;
  private String layUp;
  private String zone;
  private String supplier;

  SettingsBuilder(Settings from) {
    construction = from.construction();
    length = from.length();
    width = from.width();
    localSpeed = from.localSpeed();
    boundaryLayer = from.boundaryLayer();
    wallPressure = from.wallPressure();
    crossSpectrum = from.crossSpectrum();
    convectionRatio = from.convectionRatio();
    lossFactor = from.lossFactor();
    layUp = from.layUp();
    zone = from.zone();
    supplier = from.supplier();
  }

  /** Sets the id of the construction. */
  public SettingsBuilder construction(String id) {
    construction = id;
    return this;
  }

  /** Sets the size along and across the flow, m. */
  public SettingsBuilder size(Double along, Double across) {
    length = along;
    width = across;
    return this;
  }

  /** Sets the local flow speed. */
  public SettingsBuilder localSpeed(ByCondition<EdgeSpeed> value) {
    localSpeed = value;
    return this;
  }

  /** Sets what is known of the boundary layer. */
  public SettingsBuilder boundaryLayer(ByCondition<LayerGiven> value) {
    boundaryLayer = value;
    return this;
  }

  /** Sets the choice of wall-pressure spectrum. */
  public SettingsBuilder wallPressure(ByCondition<WallPressureChoice> value) {
    wallPressure = value;
    return this;
  }

  /** Sets the choice of cross-spectrum. */
  public SettingsBuilder crossSpectrum(ByCondition<CrossSpectrumChoice> value) {
    crossSpectrum = value;
    return this;
  }

  /** Sets the convection speed over the local flow speed. */
  public SettingsBuilder convectionRatio(ByCondition<Judged> value) {
    convectionRatio = value;
    return this;
  }

  /** Sets the damping loss factor per band. */
  public SettingsBuilder lossFactor(ByCondition<JudgedBands> value) {
    lossFactor = value;
    return this;
  }

  /** Sets the id of the lay-up, or {@link Settings#NO_LAY_UP}. */
  public SettingsBuilder layUp(String id) {
    layUp = id;
    return this;
  }

  /** Sets the id of the zone. */
  public SettingsBuilder zone(String id) {
    zone = id;
    return this;
  }

  /** Sets the id of the supplier. */
  public SettingsBuilder supplier(String id) {
    supplier = id;
    return this;
  }

  /** The record. */
  public Settings build() {
    return new Settings(
        construction,
        length,
        width,
        localSpeed,
        boundaryLayer,
        wallPressure,
        crossSpectrum,
        convectionRatio,
        lossFactor,
        layUp,
        zone,
        supplier);
  }
}
