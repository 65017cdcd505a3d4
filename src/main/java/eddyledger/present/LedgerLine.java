package eddyledger.present;

import eddyledger.ledger.Status;
import eddyledger.ledger.Way;

/**
 * One visible line of the ledger, ready to be shown.
 *
 * @param id id of the vehicle, section, panel or other source, or {@link #OTHER_SOURCES}
 * @param way by which way the sound comes in; all but {@link Way#ALL} are lines below their panel
 * @param depth how far it is indented, 0 for the vehicle
 * @param twig whether it has lines below it, and shows them
 * @param name its name, short where the section above says the rest
 * @param fullName its name in full
 * @param kind kind of the contribution in a word where it tells something, else empty
 * @param sum whether its numbers are sums of lines shown below it
 * @param ruled whether a hairline stands above it
 * @param strip its spectrum
 * @param level A-weighted overall level, dB(A); marked where it is a lower bound
 * @param status whether the level is whole
 * @param share share of the A-weighted energy, in per cent; empty if there is none
 * @param bar the same as a length, 0 to 1
 * @param allowance what it may have, dB(A); empty if nothing is set
 * @param verdict margin and state
 * @param layUp name of the lay-up; empty if there is none
 * @param mass mass of the skin, kg; empty where there is no skin
 * @param supplier name of the supplier; empty if there is none
 * @param reason in full why its number is not whole; empty if it is
 */
public record LedgerLine(
    String id,
    Way way,
    int depth,
    Twig twig,
    String name,
    String fullName,
    String kind,
    boolean sum,
    boolean ruled,
    BandStrip strip,
    String level,
    Status status,
    String share,
    double bar,
    String allowance,
    Verdict verdict,
    String layUp,
    String mass,
    String supplier,
    String reason) {
  /** Id of the heading over the other sources; no part of a vehicle can have it. */
  public static final String OTHER_SOURCES = "(other sources)";

  /** Whether a line can be opened. */
  public enum Twig {
    /** The lines below it are shown. */
    OPEN,
    /** The lines below it are hidden. */
    CLOSED,
    /** There is nothing below it. */
    LEAF
  }

  /** What tells this line from all others, whatever its numbers. */
  LineKey key() {
    return new LineKey(id, way);
  }

  /** Whether another line stands for the same thing at the same depth. */
  public boolean sameAs(LedgerLine other) {
    return key().equals(other.key()) && depth == other.depth;
  }

  /** The text of a column, for tooltips and screen readers. */
  public String text(LedgerColumn column) {
    return switch (column) {
      case NAME -> fullName + (kind.isEmpty() ? "" : ", " + kind) + twigText();
      case BANDS -> strip.drawn() ? LineWords.bands(this) : strip.reason();
      case LEVEL -> level + (level.equals(DeskNumbers.NONE) ? "" : " dB(A)");
      case SHARE -> share;
      case ALLOWANCE -> allowance;
      case MARGIN -> verdict.spoken();
      case LAY_UP -> layUp;
      case MASS -> mass;
      case SUPPLIER -> supplier;
    };
  }

  private String twigText() {
    return switch (twig) {
      case OPEN -> ", open";
      case CLOSED -> ", closed";
      case LEAF -> "";
    };
  }
}
