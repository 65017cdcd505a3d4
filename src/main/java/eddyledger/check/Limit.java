package eddyledger.check;

import java.math.BigDecimal;

/**
 * Between which values a quantity of a vehicle is believable; outside it the entry is taken for a
 * slip, mostly of the unit. The limits are our own judgement, wide on purpose; no source.
 */
public enum Limit {
  /** Size of a panel. */
  SIZE("a size", 0.005, 40.0, "m", "millimetres typed as metres?"),
  /** Thickness of a plate. */
  THICKNESS("a thickness", 5.0e-5, 0.2, "m", "millimetres typed as metres?"),
  /** Young's modulus. */
  YOUNGS_MODULUS("a Young's modulus", 1.0e6, 1.5e12, "Pa", "gigapascals typed as pascals?"),
  /** Density of a solid. */
  DENSITY("a density", 5.0, 25000.0, "kg/m³", "grams per cubic centimetre typed?"),
  /** Poisson's ratio. */
  POISSON("a Poisson's ratio", 0.0, 0.499, "", "check the material."),
  /** Radius of curvature. */
  RADIUS("a radius", 0.05, 200.0, "m", "millimetres typed as metres?"),
  /** In-plane tension. */
  TENSION("a tension", 0.0, 1.0e7, "N/m", "check the unit."),
  /** A share of a whole. */
  SHARE("a share", 0.0, 1.0, "", "percent typed for a fraction?"),
  /** Speed of a vehicle or of the local flow. */
  SPEED("a speed", 1.0, 700.0, "m/s", "kilometres per hour or knots typed as metres per second?"),
  /** Mach number of the vehicle. */
  MACH("a Mach number", 0.003, 2.5, "", "a speed typed as a Mach number?"),
  /** Ratio of the local to the vehicle's speed. */
  SPEED_RATIO("a speed ratio", 0.05, 3.0, "", "a speed typed as a ratio?"),
  /** Pressure coefficient. */
  PRESSURE_COEFFICIENT("a pressure coefficient", -10.0, 1.0, "", "check its sign."),
  /** Pressure altitude. */
  ALTITUDE("an altitude", -500.0, 20000.0, "m", "feet typed as metres?"),
  /** Temperature of air or structure. */
  TEMPERATURE("a temperature", 150.0, 400.0, "K", "degrees Celsius typed as kelvin?"),
  /** Temperature offset from the standard day. */
  TEMPERATURE_OFFSET("a temperature offset", -80.0, 80.0, "K", "an absolute temperature typed?"),
  /** Static pressure. */
  PRESSURE("a pressure", 2000.0, 200000.0, "Pa", "hectopascals typed as pascals?"),
  /** Angle of the flow. */
  ANGLE("an angle", -180.0, 180.0, "°", "radians?"),
  /** Running length of a boundary layer. */
  RUNNING_LENGTH("a running length", 0.005, 1000.0, "m", "millimetres typed as metres?"),
  /** Any thickness of a boundary layer. */
  LAYER_THICKNESS("a boundary-layer thickness", 1.0e-5, 5.0, "m", "millimetres typed as metres?"),
  /** Wall shear stress. */
  WALL_SHEAR("a wall shear stress", 1.0e-3, 2000.0, "Pa", "check the unit."),
  /** Convection speed over local speed. */
  CONVECTION_RATIO("a convection ratio", 0.2, 1.2, "", "a speed typed as a ratio?"),
  /** Decay rate of the cross-spectrum. */
  DECAY("a decay rate", 1.0e-3, 10.0, "", "check the source."),
  /** Damping loss factor. */
  LOSS_FACTOR("a loss factor", 1.0e-5, 1.0, "", "percent typed for a fraction?"),
  /** Insertion loss, transmission loss or level difference. */
  LOSS("a loss", -40.0, 150.0, "dB", "check the sign and the unit."),
  /** Level of an other source or a target. */
  LEVEL("a level", -60.0, 180.0, "dB", "check the reference pressure, 20 µPa."),
  /** Reserve or tolerance. */
  RESERVE("a reserve or tolerance", 0.0, 30.0, "dB", "it is a difference of levels."),
  /** Volume of a zone. */
  VOLUME("a volume", 0.001, 1.0e5, "m³", "litres typed as cubic metres?"),
  /** Any area. */
  AREA("an area", 1.0e-6, 1.0e5, "m²", "square millimetres typed as square metres?"),
  /** Surface mass. */
  SURFACE_MASS("a surface mass", 0.01, 5000.0, "kg/m²", "check the unit."),
  /** Distance of a receiver from a panel. */
  DISTANCE("a distance", 0.01, 500.0, "m", "millimetres typed as metres?"),
  /** Number of identical pieces. */
  COUNT("a count", 1.0, 1.0e6, "", "give a whole number of pieces.");

  private final String name;
  private final double low;
  private final double high;
  private final String unit;
  private final String hint;

  Limit(String name, double low, double high, String unit, String hint) {
    this.name = name;
    this.low = low;
    this.high = high;
    this.unit = unit;
    this.hint = hint;
  }

  /** Whether a value is a number and between the limits. */
  public boolean holds(double value) {
    return value >= low && value <= high;
  }

  /** What is wrong with a value that does not hold, as a sentence. */
  public String what(double value) {
    if (Double.isNaN(value) || Double.isInfinite(value)) {
      return name + " is not a number.";
    }
    return name
        + " of "
        + text(value)
        + " is not between "
        + text(low)
        + " and "
        + text(high)
        + ".";
  }

  /** What to do about it, as a sentence. */
  public String remedy() {
    return "Correct it: " + hint;
  }

  private String text(double value) {
    String number =
        value == Math.rint(value) && Math.abs(value) < 1.0e7
            ? Long.toString((long) value)
            : BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
    return unit.isEmpty() ? number : number + " " + unit;
  }
}
