package eddyledger.ledger;

import eddyledger.quantity.BandSpectrum;

/**
 * One step of the account of a contribution.
 *
 * @param role what it does in the account
 * @param symbol its symbol
 * @param meaning what it is, in words
 * @param unit its unit; empty for a pure number
 * @param values its value per band; the same in all bands where it does not depend on frequency
 * @param varies whether it depends on the band
 * @param source where it was entered, then formula and publication; of a default the latter only
 * @param note that it is a default, what was filled in, what left its range; empty if nothing
 */
public record TraceStep(
    Role role,
    String symbol,
    String meaning,
    String unit,
    BandSpectrum values,
    boolean varies,
    String source,
    String note) {

  /** What a step does in the account. */
  public enum Role {
    /** A given or derived quantity that later steps use. */
    QUANTITY,
    /** The mean-square wall pressure, from which the product of the factors starts. */
    START,
    /** A factor; the start times all factors is the mean square at the receiver. */
    FACTOR,
    /** What comes out. */
    RESULT
  }

  /** A quantity that does not depend on the band. */
  static TraceStep quantity(
      String symbol, String meaning, String unit, double value, String source, String note) {
    return new TraceStep(
        Role.QUANTITY, symbol, meaning, unit, BandSpectrum.constant(value), false, source, note);
  }

  /** A step with a value per band. */
  static TraceStep banded(
      Role role,
      String symbol,
      String meaning,
      String unit,
      double[] values,
      String source,
      String note) {
    return new TraceStep(role, symbol, meaning, unit, BandSpectrum.of(values), true, source, note);
  }

  /** The value of a step that does not depend on the band. */
  public double value() {
    return values.value(0);
  }
}
