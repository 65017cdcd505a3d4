package eddyledger.present;

import eddyledger.ledger.State;

/**
 * What comes out of all bands together, and how it stands.
 *
 * @param heading what is summed
 * @param allowance allowance and margin in words, or that there is none
 * @param margin the margin with sign and unit; empty if there is none
 * @param state its state; null if it is not known
 * @param judged whether there is an allowance to hold it against
 * @param share its share of the energy at the receiver, in words
 * @param level the A-weighted level with unit; a dash with the reason if there is none
 */
public record TraceTotal(
    String heading,
    String allowance,
    String margin,
    State state,
    boolean judged,
    String share,
    String level) {

  /** The word of the state. */
  public String stateWord() {
    return state == null ? "not known" : state.text();
  }

  /** All of it in one line of plain text. */
  public String line() {
    String judgement = judged ? allowance + " " + margin + " " + stateWord() : allowance;
    return heading + ": " + level + ". " + judgement + ". " + share + ".";
  }
}
