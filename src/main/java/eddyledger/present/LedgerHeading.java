package eddyledger.present;

/**
 * What stands over the ledger.
 *
 * @param title receiver and condition, short: "Row 2, Cruise"; empty if there is neither
 * @param note what the numbers are, or that they are old
 * @param stale whether the numbers are not those of the vehicle as it is now
 * @param share heading of the share column; it says if shares are only of what is known
 * @param shareTip what shares are of, in full
 * @param scale scale of the band strips
 */
public record LedgerHeading(
    String title, String note, boolean stale, String share, String shareTip, BandScale scale) {

  /** What a column holds, in full. */
  public String tip(LedgerColumn column) {
    return switch (column) {
      case NAME -> title + (title.isEmpty() ? "" : ", ") + note;
      case BANDS -> "A-weighted band levels, 25 Hz to 12.5 kHz, on one scale: " + scale.text();
      case LEVEL -> "A-weighted overall level, dB(A)";
      case SHARE -> shareTip;
      case ALLOWANCE -> "What the row may have, dB(A): its allowance, or the target less reserve";
      case MARGIN -> "Allowance less level, dB; positive is in hand";
      case LAY_UP -> "What lies between skin and cabin";
      case MASS ->
          "Mass of the skins alone, kg: surface mass times area times count; "
              + "lay-ups have no mass in the file";
      case SUPPLIER -> "Who answers for the panel";
    };
  }

  /** The heading of a column. */
  public String title(LedgerColumn column) {
    return column == LedgerColumn.SHARE ? share : column.title();
  }
}
