package eddyledger.present;

/**
 * The mass of a panel's skin, or of the panels below a section.
 *
 * @param kilograms sum of the masses that are known, kg
 * @param known number of panels whose mass is known
 * @param missing number of panels whose mass is not known
 */
record Mass(double kilograms, int known, int missing) {
  /** Of no panel at all. */
  static final Mass NONE = new Mass(0.0, 0, 0);

  /** Of a panel whose mass is not known. */
  static final Mass UNKNOWN = new Mass(0.0, 0, 1);

  /** Of a panel of so many kilograms. */
  static Mass of(double kilograms) {
    return new Mass(kilograms, 1, 0);
  }

  /** Together with another. */
  Mass plus(Mass other) {
    return new Mass(kilograms + other.kilograms, known + other.known, missing + other.missing);
  }

  /** Whether there is no panel. */
  boolean none() {
    return known + missing == 0;
  }

  /** Whether there are panels, but nothing is known of their mass. */
  boolean unknown() {
    return known == 0 && missing > 0;
  }

  /** Whether every panel's mass is known. */
  boolean whole() {
    return missing == 0;
  }
}
