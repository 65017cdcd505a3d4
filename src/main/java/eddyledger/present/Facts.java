package eddyledger.present;

/**
 * What the ledger tells of a row besides its sound.
 *
 * @param layUp name of the lay-up; empty if there is none, and for sections
 * @param supplier name of the supplier; empty if there is none, and for sections
 * @param mass mass of the skin
 */
record Facts(String layUp, String supplier, Mass mass) {
  /** Of a row that is no part of the vehicle's skin. */
  static final Facts NONE = new Facts("", "", Mass.NONE);
}
