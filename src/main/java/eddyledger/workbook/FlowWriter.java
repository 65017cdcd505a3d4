package eddyledger.workbook;

import eddyledger.ledger.Contributed;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.workbook.Look.Emphasis;
import eddyledger.workbook.Look.Format;
import eddyledger.workbook.Look.Role;
import java.util.List;

/** Writes the flow over all panels, the total without the other sources. */
final class FlowWriter {
  private final Page page;

  FlowWriter(Page page) {
    this.page = page;
  }

  void write(Block block) {
    Contributed flow = block.sheet().flow();
    List<LedgerLine> top = block.top();
    BandSpectrum meanSquares = known(flow.meanSquares(), top);
    boolean whole = meanSquares.complete();
    int number = block.flow();
    LedgerFormulas formulas = new LedgerFormulas(number);
    LedgerLooks looks = new LedgerLooks(Emphasis.PLAIN, Role.RESULT);
    Line line = page.line(number);
    BlockWriter.names(line, block, Emphasis.PLAIN);
    line.text(LedgerColumns.NAME, "Flow over all panels", Look.of(Format.TEXT));
    line.text(LedgerColumns.ID, "", Look.of(Format.TEXT));
    line.text(LedgerColumns.KIND, "flow", Look.of(Format.TEXT));
    line.text(LedgerColumns.WAY, LedgerLooks.word(block.total().way()), Look.of(Format.TEXT));
    double levelA = whole ? flow.levelA() : Double.NaN;
    double level = whole ? flow.level() : Double.NaN;
    BlockWriter.overall(line, formulas, looks, Answer.level(levelA), Answer.level(level));
    line.formula(
        LedgerColumns.SHARE,
        formulas.share(block.total().number()),
        Results.share(levelA, block.total().row().levelA()),
        Look.of(Format.SHARE));
    JudgementWriter.none(line, looks);
    int contributions = top.stream().mapToInt(LedgerLine::contributions).sum();
    int lacking = top.stream().mapToInt(LedgerLine::lacking).sum();
    line.formula(
        LedgerColumns.STATUS,
        formulas.status(null, contributions, Answer.MISSING),
        Results.status(false, meanSquares, contributions, lacking, Answer.MISSING),
        Look.of(Format.TEXT));
    line.blank(LedgerColumns.REASON, Look.of(Format.WRAPPED));
    for (int band = 0; band < Bands.COUNT; band++) {
      line.formula(
          LedgerColumns.BAND + band,
          formulas.flowLevel(block, band),
          Results.band(meanSquares, band, Answer.MISSING),
          Look.of(Format.BAND));
      line.formula(
          LedgerColumns.ENERGY + band,
          formulas.flow(block, LedgerColumns.ENERGY + band),
          Answer.number(Results.energy(meanSquares, band)),
          Look.of(Format.ENERGY));
    }
    line.formula(
        LedgerColumns.LACKING,
        formulas.flow(block, LedgerColumns.LACKING),
        Answer.number((double) lacking),
        Look.of(Format.WHOLE));
  }

  /** The silence of a section without panels is no knowledge of a band. */
  private static BandSpectrum known(BandSpectrum meanSquares, List<LedgerLine> top) {
    double[] values = meanSquares.toArray();
    for (int band = 0; band < Bands.COUNT; band++) {
      int position = band;
      if (top.stream().noneMatch(line -> line.row().meanSquares().has(position))) {
        values[band] = Double.NaN;
      }
    }
    return BandSpectrum.of(values);
  }
}
