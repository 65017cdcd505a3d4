package eddyledger.present;

import eddyledger.ledger.TraceStep;

/**
 * One number of the account, for the table of all numbers.
 *
 * @param stage name of the stage it belongs to
 * @param role start, factor, result, or empty
 * @param symbol its symbol
 * @param meaning what it is
 * @param value its value in the followed band, as text
 * @param unit its unit
 * @param banded whether it changes from band to band
 * @param source formula and publication, or where it was entered
 * @param note what was defaulted, filled in or left its range
 */
public record TraceNumber(
    String stage,
    String role,
    String symbol,
    String meaning,
    String value,
    String unit,
    boolean banded,
    String source,
    String note) {

  static TraceNumber of(String stage, TraceStep step, int band) {
    String role =
        switch (step.role()) {
          case QUANTITY -> "";
          case START -> "start";
          case FACTOR -> "factor";
          case RESULT -> "result";
        };
    return new TraceNumber(
        stage,
        role,
        step.symbol(),
        step.meaning(),
        Readable.plain(step.values().value(band)),
        step.unit(),
        step.varies(),
        step.source(),
        step.note().isEmpty() ? "" : Readable.sentence(step.note()));
  }
}
