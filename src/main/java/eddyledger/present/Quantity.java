package eddyledger.present;

import java.util.List;

/** What a number of the sheet is: its units, and how many decimals it shows at least. */
public enum Quantity {
  /** Size of a panel, m. */
  SIZE(3, Unit.METRE, Unit.MILLIMETRE, Unit.INCH, Unit.FOOT),
  /** Thickness of a plate, m. */
  THICKNESS(1, Unit.MILLIMETRE, Unit.METRE, Unit.INCH),
  /** Thickness of a boundary layer, m. */
  LAYER(1, Unit.MILLIMETRE, Unit.METRE, Unit.INCH, Unit.FOOT),
  /** Running length, m. */
  RUNNING_LENGTH(2, Unit.METRE, Unit.MILLIMETRE, Unit.INCH, Unit.FOOT),
  /** Local speed, in one of its ways; m/s, ratio or pressure coefficient. */
  LOCAL_SPEED(
      2,
      Unit.TIMES_SPEED,
      Unit.METRE_PER_SECOND,
      Unit.KILOMETRE_PER_HOUR,
      Unit.KNOT,
      Unit.MILE_PER_HOUR,
      Unit.FOOT_PER_SECOND,
      Unit.PRESSURE_COEFFICIENT,
      Unit.PRESSURE_COEFFICIENT_INCOMPRESSIBLE),
  /** Speed, m/s. */
  SPEED(
      1,
      Unit.METRE_PER_SECOND,
      Unit.KILOMETRE_PER_HOUR,
      Unit.KNOT,
      Unit.MILE_PER_HOUR,
      Unit.FOOT_PER_SECOND),
  /** Wall shear stress, Pa. */
  SHEAR(1, Unit.PASCAL),
  /** Damping loss factor. */
  LOSS_FACTOR(3, Unit.ONE, Unit.PERCENT),
  /** A ratio. */
  RATIO(2, Unit.ONE, Unit.PERCENT),
  /** A decay rate. */
  DECAY(3, Unit.ONE),
  /** Surface mass, kg/m². */
  SURFACE_MASS(2, Unit.SURFACE_MASS),
  /** A whole number of pieces or an order. */
  COUNT(0, Unit.ONE),
  /** A level or a level difference, dB. */
  LEVEL(1, Unit.DECIBEL),
  /** An A-weighted level, dB(A). */
  LEVEL_A(1, Unit.DECIBEL_A, Unit.DECIBEL);

  private final int decimals;
  private final List<Unit> units;

  Quantity(int decimals, Unit... units) {
    this.decimals = decimals;
    this.units = List.of(units);
  }

  /** Decimals shown at least, in the first unit. */
  public int decimals() {
    return decimals;
  }

  /** The units it can be typed and shown in, the usual one first. */
  public List<Unit> units() {
    return units;
  }

  /** The usual unit. */
  public Unit usual() {
    return units.get(0);
  }
}
