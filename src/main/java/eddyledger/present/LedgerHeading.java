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
    String title, String note, boolean stale, String share, String shareTip, BandScale scale) {}
