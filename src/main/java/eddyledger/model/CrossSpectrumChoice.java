package eddyledger.model;

/**
 * Which Butterworth orders the cross-spectrum has, with the decay rates and the orders they were
 * fitted to.
 *
 * @param orderAlong order along the flow, 1 to 5
 * @param orderAcross order across the flow, 1 to 5
 * @param decayAlong decay rate along the flow
 * @param decayAcross decay rate across the flow
 * @param fittedOrderAlong order the rate along the flow was fitted to
 * @param fittedOrderAcross order the rate across the flow was fitted to
 * @param rule how rates are carried to another order
 * @param evidence why it was chosen
 * @param extras unknown properties
 */
public record CrossSpectrumChoice(
    int orderAlong,
    int orderAcross,
    Judged decayAlong,
    Judged decayAcross,
    int fittedOrderAlong,
    int fittedOrderAcross,
    Rule rule,
    Evidence evidence,
    Extras extras) {

  /** The default: orders (2, 1), rates 0.116 and 0.7 fitted at order 1, used as published. */
  public static final CrossSpectrumChoice DEFAULT =
      new CrossSpectrumChoice(
          2,
          1,
          Judged.of(0.116),
          Judged.of(0.7),
          1,
          1,
          Rule.HALF_POWER_WIDTH,
          Evidence.NONE,
          Extras.NONE);

  /** How decay rates are carried from the order they were fitted to. */
  public enum Rule {
    /** As published: the half-power width in wavenumber stays. */
    HALF_POWER_WIDTH("half-power-width"),
    /** The correlation length stays. */
    CORRELATION_LENGTH("correlation-length");

    private final String text;

    Rule(String text) {
      this.text = text;
    }

    /** The word used in files. */
    public String text() {
      return text;
    }
  }

  /** The same decay rates at other orders under a rule. */
  public CrossSpectrumChoice at(int along, int across, Rule carried) {
    return new CrossSpectrumChoice(
        along,
        across,
        decayAlong,
        decayAcross,
        fittedOrderAlong,
        fittedOrderAcross,
        carried,
        evidence,
        extras);
  }
}
