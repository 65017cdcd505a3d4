package eddyledger.chart;

import eddyledger.ledger.Judgement;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.State;
import eddyledger.ledger.Status;
import eddyledger.quantity.Bands;
import java.util.Arrays;
import java.util.Optional;

/**
 * What the total may have. Targets are overall levels; per band the line is the total's own
 * spectrum moved by its margin: what each band may have if the spectrum keeps its shape.
 */
public final class AllowedLine {
  private final LedgerRow total;

  private AllowedLine(LedgerRow total) {
    this.total = total;
  }

  /** The line of a sheet; empty if its total has no target. */
  public static Optional<AllowedLine> of(ReceiverSheet sheet) {
    LedgerRow total = sheet.total();
    return Double.isNaN(total.judgement().allowance())
        ? Optional.empty()
        : Optional.of(new AllowedLine(total));
  }

  /** The overall level allowed, dB(A). */
  public double overall() {
    return total.judgement().allowance();
  }

  /** What each band may have, dB(A), shape [28]; NaN where the total or its margin is missing. */
  public double[] bands() {
    double margin = total.judgement().margin();
    double[] levels = Energies.levelsA(total.meanSquares());
    return Double.isNaN(margin)
        ? filled(Double.NaN)
        : Arrays.stream(levels).map(level -> level + margin).toArray();
  }

  /** Words for the line over the bands. */
  public String words() {
    return total.status() == Status.OK
        ? "allowed, at this shape of spectrum"
        : "allowed, at the shape of what is known";
  }

  /** Words for the line at the overall level. */
  public String overallWords() {
    return "allowed " + LevelWords.level(overall());
  }

  /** Whether the level stands above the line and the target's pass rule finds it over. */
  public boolean exceeded() {
    Judgement judgement = total.judgement();
    return judgement.state() == State.OVER && judgement.margin() < 0.0;
  }

  /** How far every band stands above the line, dB; 0 if below it or not known. */
  double excess() {
    double margin = total.judgement().margin();
    return margin < 0.0 ? -margin : 0.0;
  }

  /** By how much the total is over, as "0.7 over"; empty if it is not. */
  public String excessWords() {
    if (total.judgement().state() != State.OVER) {
      return "";
    }
    String excess = LevelWords.level(-total.judgement().margin());
    return exceeded() && !excess.equals("0.0") ? excess + " over" : "over after its pass rule";
  }

  private static double[] filled(double value) {
    double[] values = new double[Bands.COUNT];
    Arrays.fill(values, value);
    return values;
  }
}
