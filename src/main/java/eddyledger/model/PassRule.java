package eddyledger.model;

/**
 * How a level is judged against its target.
 *
 * @param rounding how the judged level is rounded first
 * @param tolerance how far the rounded level may pass the target, dB
 * @param across what counts where a target names several receivers
 */
public record PassRule(Rounding rounding, double tolerance, Across across) {
  /** Not rounded, no tolerance, the worst receiver counts. */
  public static final PassRule PLAIN = new PassRule(Rounding.NONE, 0.0, Across.WORST);

  /** Rounding of the judged level. */
  public enum Rounding {
    /** Not rounded. */
    NONE("none", 0.0),
    /** To a tenth of a decibel. */
    TENTH("0.1", 0.1),
    /** To a whole decibel. */
    WHOLE("1", 1.0);

    private final String text;
    private final double step;

    Rounding(String text, double step) {
      this.text = text;
      this.step = step;
    }

    /** The word used in files. */
    public String text() {
      return text;
    }

    /** The level rounded, halves up. */
    public double apply(double level) {
      return step == 0.0 ? level : Math.floor(level / step + 0.5) * step;
    }
  }

  /** What counts where a target names several receivers. */
  public enum Across {
    /** The worst receiver. */
    WORST("worst"),
    /** The energy mean of the receivers. */
    ENERGY_MEAN("energy-mean");

    private final String text;

    Across(String text) {
      this.text = text;
    }

    /** The word used in files. */
    public String text() {
      return text;
    }
  }
}
