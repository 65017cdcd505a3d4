package eddyledger.chart;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Status;
import eddyledger.ledger.Way;
import java.util.ArrayList;
import java.util.List;

/**
 * One curve of the spectrum picture.
 *
 * @param role which row it is
 * @param row the row, all ways together
 */
record SpectrumCurve(Role role, LedgerRow row) {

  /** Which row a curve is. */
  enum Role {
    /** The total. */
    TOTAL,
    /** The section above the selected row. */
    SECTION,
    /** The selected row. */
    SELECTED
  }

  /** The curves for a selected row, the selected one last. */
  static List<SpectrumCurve> of(ReceiverSheet sheet, String selectedId) {
    LedgerRow selected = selected(sheet, selectedId);
    List<SpectrumCurve> curves = new ArrayList<>();
    if (selected.kind() != RowKind.TOTAL) {
      curves.add(new SpectrumCurve(Role.TOTAL, sheet.total()));
      sheet
          .row(selected.parent(), Way.ALL)
          .filter(row -> row.kind() == RowKind.SECTION)
          .ifPresent(row -> curves.add(new SpectrumCurve(Role.SECTION, row)));
    }
    curves.add(new SpectrumCurve(Role.SELECTED, selected));
    return curves;
  }

  /** Names of curves, without the section where that has a curve of its own. */
  static List<String> names(List<SpectrumCurve> curves) {
    String section =
        curves.stream()
            .filter(curve -> curve.role() == Role.SECTION)
            .map(curve -> curve.row().name())
            .findFirst()
            .orElse("");
    return curves.stream().map(curve -> ShortName.within(curve.row().name(), section)).toList();
  }

  /** The selected row; the total if there is no row of the id. */
  static LedgerRow selected(ReceiverSheet sheet, String selectedId) {
    return sheet.row(selectedId, Way.ALL).orElse(sheet.total());
  }

  /** Band levels, dB(A), shape [28]; NaN where missing. */
  double[] levelsA() {
    return Energies.levelsA(row.meanSquares());
  }

  /** Overall level as text, a lower bound marked as such. */
  String level() {
    double level = row.levelA();
    boolean bound = row.status() != Status.OK && Double.isFinite(level);
    return (bound ? LevelWords.AT_LEAST : "") + LevelWords.level(level);
  }
}
