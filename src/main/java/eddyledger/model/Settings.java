package eddyledger.model;

/**
 * What a vehicle, section or panel sets; it holds below the node until something lower sets it
 * again. Null means: as above.
 *
 * @param construction id of the construction
 * @param length size along the local flow, m
 * @param width size across it, m
 * @param localSpeed local flow speed
 * @param boundaryLayer what is known of the boundary layer
 * @param wallPressure choice of wall-pressure spectrum
 * @param crossSpectrum choice of cross-spectrum
 * @param convectionRatio convection speed over local flow speed
 * @param lossFactor damping loss factor per band, without radiation
 * @param layUp id of the lay-up; {@link #NO_LAY_UP} for a bare panel below a section with one
 * @param zone id of the zone it radiates into
 * @param supplier id of the supplier who answers for it
 */
public record Settings(
    String construction,
    Double length,
    Double width,
    ByCondition<EdgeSpeed> localSpeed,
    ByCondition<LayerGiven> boundaryLayer,
    ByCondition<WallPressureChoice> wallPressure,
    ByCondition<CrossSpectrumChoice> crossSpectrum,
    ByCondition<Judged> convectionRatio,
    ByCondition<JudgedBands> lossFactor,
    String layUp,
    String zone,
    String supplier) {

  /** Nothing is set. */
  public static final Settings NONE =
      new Settings(null, null, null, null, null, null, null, null, null, null, null, null);

  /** The word that takes an inherited lay-up away. */
  public static final String NO_LAY_UP = "none";

  /** A changeable copy. */
  public SettingsBuilder edit() {
    return new SettingsBuilder(this);
  }
}
