package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.app.ProjectState;
import eddyledger.ledger.Judgement;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.State;
import eddyledger.ledger.Status;
import eddyledger.ledger.Way;
import eddyledger.model.BandTable;
import eddyledger.model.Extras;
import eddyledger.model.JudgedBands;
import eddyledger.model.OtherSource;
import eddyledger.model.Settings;
import eddyledger.model.Vehicle;
import eddyledger.present.BandStrip.Fill;
import eddyledger.quantity.AWeighting;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Decibels;
import eddyledger.quantity.LevelText;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** What the lines of the ledger say. */
class LedgerLinesTest {
  private static final Ledger LEDGER = Ledger.of(Example.vehicle());
  private static final Ledger PARTIAL = Ledger.of(Example.without("crown-e"));

  private static LedgerPresenter presenter(Ledger ledger) {
    ProjectState state = Example.with(ledger);
    state.select(state.selection().at("cruise", "row-2"));
    LedgerPresenter presenter = new LedgerPresenter(state);
    presenter.openAll();
    return presenter;
  }

  private static LedgerLine line(LedgerPresenter presenter, String id) {
    return presenter.lines().stream().filter(it -> it.id().equals(id)).findFirst().orElseThrow();
  }

  private static LedgerRow row(Ledger ledger, String id) {
    return ledger.sheet("cruise", "row-2").orElseThrow().row(id, Way.ALL).orElseThrow();
  }

  @Test
  void aLineCarriesWhatTheLedgerSays() {
    LedgerLine line = line(presenter(LEDGER), "station-b");
    LedgerRow row = row(LEDGER, "station-b");
    double share = row.meanSquareA() / row(LEDGER, "quillon-82").meanSquareA();
    assertThat(line.depth()).isEqualTo(1);
    assertThat(line.name()).isEqualTo("Station B");
    assertThat(line.sum()).isTrue();
    assertThat(line.level()).isEqualTo(LevelText.text(row.levelA()));
    assertThat(line.share()).isEqualTo(LevelText.text(100.0 * share) + " %");
    assertThat(line.bar()).isEqualTo(share);
    assertThat(line.allowance()).isEqualTo("66.0");
    assertThat(line.verdict().state()).isEqualTo(State.OVER);
    assertThat(line.verdict().number())
        .isEqualTo(LevelText.text(row.judgement().margin()).replace("-", "\u2212"));
    assertThat(line.layUp()).isEmpty();
    assertThat(line.supplier()).isEmpty();
    for (int band = 0; band < 28; band++) {
      double weighted = row.levels().value(band) + AWeighting.weights().value(band);
      assertThat(line.strip().levels().value(band)).isEqualTo(weighted);
      assertThat(weighted).isLessThanOrEqualTo(line.strip().levels().value(line.strip().peak()));
    }
  }

  @Test
  void theTotalIsHeldAgainstItsTargetLessReserve() {
    LedgerLine total = presenter(LEDGER).lines().get(0);
    assertThat(total.name()).isEqualTo("Quillon 82");
    assertThat(total.allowance()).isEqualTo("75.0");
    assertThat(total.verdict().state()).isEqualTo(State.TIGHT);
    assertThat(total.share()).isEqualTo("100.0 %");
  }

  @Test
  void namesDoNotRepeatTheSectionsAbove() {
    LedgerPresenter presenter = presenter(LEDGER);
    LedgerLine crown = line(presenter, "crown-b-forward");
    assertThat(crown.name()).isEqualTo("Crown");
    assertThat(crown.fullName()).isEqualTo("Crown, station B forward");
    assertThat(crown.depth()).isEqualTo(3);
    assertThat(line(presenter, "station-b-forward").name()).isEqualTo("Into the forward cabin");
    assertThat(crown.text(LedgerColumn.NAME)).isEqualTo("Crown, station B forward");
    assertThat(line(presenter, "station-a").text(LedgerColumn.NAME)).isEqualTo("Station A, open");
  }

  @Test
  void massesAreOfTheSkinsAndSumUp() {
    LedgerPresenter presenter = presenter(LEDGER);
    // 2780 kg/m3 times 1.2 mm times 0.5 m times 0.18 m times 50 pieces
    assertThat(line(presenter, "crown-a").mass()).isEqualTo("15.0");
    assertThat(line(presenter, "window-panes-left-a").mass()).isEqualTo("6.1");
    VehicleFacts facts = VehicleFacts.of(LEDGER.vehicle(), null);
    double sum = 0.0;
    for (String id : List.of("station-a", "station-b", "station-c", "station-d", "station-e")) {
      sum += facts.of(id).mass().kilograms();
    }
    assertThat(facts.of("quillon-82").mass().kilograms()).isCloseTo(sum, within(1.0e-9));
    assertThat(facts.of("crown-a").mass().kilograms()).isCloseTo(15.012, within(1.0e-9));
    assertThat(line(presenter, LedgerLine.OTHER_SOURCES).mass()).isEmpty();
    assertThat(VehicleFacts.of(LEDGER.vehicle(), facts)).isSameAs(facts);
  }

  @Test
  void layUpAndSupplierAreInherited() {
    LedgerPresenter presenter = presenter(LEDGER);
    LedgerLine crown = line(presenter, "crown-a");
    assertThat(crown.layUp()).isEqualTo("Trim panel on 75 mm blanket, double wall");
    assertThat(crown.supplier()).isEqualTo("Panel-2");
    LedgerLine pane = line(presenter, "window-panes-left-a");
    assertThat(pane.layUp()).isEqualTo("Scratch pane 2 mm");
    assertThat(pane.supplier()).isEqualTo("Window-2");
    Vehicle bare =
        Example.panel(
            Example.vehicle(),
            "crown-a",
            p -> p.withSettings(p.settings().edit().layUp(Settings.NO_LAY_UP).build()));
    assertThat(VehicleFacts.of(bare, null).of("crown-a").layUp()).isEqualTo("none");
  }

  @Test
  void aMissingRowSaysWhyAndSumsAboveAreBounds() {
    LedgerPresenter presenter = presenter(PARTIAL);
    LedgerLine crown = line(presenter, "crown-e");
    assertThat(crown.level()).isEqualTo("\u2014");
    assertThat(crown.share()).isEmpty();
    assertThat(crown.mass()).isEqualTo("\u2014");
    assertThat(crown.strip().drawn()).isFalse();
    assertThat(crown.strip().reason()).isEqualTo("no construction");
    assertThat(crown.reason()).isEqualTo(row(PARTIAL, "crown-e").reason());
    LedgerLine section = line(presenter, "station-e");
    double known = row(PARTIAL, "station-e").levelA();
    assertThat(section.level()).isEqualTo("\u2265\u2009" + LevelText.text(known));
    assertThat(section.status()).isEqualTo(Status.PARTIAL);
    assertThat(section.mass()).startsWith("\u2265\u2009");
    assertThat(section.strip().drawn()).isTrue();
    LedgerLine total = presenter.lines().get(0);
    assertThat(total.verdict()).isEqualTo(new Verdict("", null, "not known"));
    assertThat(presenter.heading().share()).isEqualTo("Share of known");
    assertThat(presenter.heading().tip(LedgerColumn.SHARE))
        .isEqualTo(
            "Share of the A-weighted energy of the total as far as it is known: 1 of 61 missing");
    assertThat(line(presenter, "station-a").level()).doesNotContain("\u2265");
  }

  @Test
  void whereABandIsMissingTheReasonStandsInPlaceOfTheBars() {
    double[] levels = BandSpectrum.constant(50.0).toArray();
    levels[5] = Double.NaN;
    JudgedBands bands = JudgedBands.of(BandTable.thirds(BandSpectrum.of(levels)));
    List<OtherSource> sources =
        List.of(new OtherSource("pump", "Pump", "row-2", "cruise", bands, Extras.NONE));
    Vehicle vehicle = Example.vehicle().edit().otherSources(sources).build();
    LedgerPresenter presenter = presenter(Ledger.of(vehicle));
    LedgerLine pump = line(presenter, "pump");
    assertThat(pump.level()).isEqualTo("\u2014");
    assertThat(pump.status()).isEqualTo(Status.PARTIAL);
    assertThat(pump.strip().drawn()).isFalse();
    assertThat(pump.strip().reason()).startsWith("no value at 80 Hz");
    LedgerLine heading = line(presenter, LedgerLine.OTHER_SOURCES);
    assertThat(heading.strip().reason()).isEqualTo("bands are missing below");
    assertThat(heading.reason()).startsWith("Pump: no value at 80 Hz");
    // the flow noise has that band, so the total has a lower bound
    assertThat(presenter.lines().get(0).level()).startsWith("\u2265\u2009");
  }

  @Test
  void otherSourcesStandUnderAHeadingWithTheirSum() {
    LedgerPresenter presenter = presenter(LEDGER);
    LedgerLine heading = line(presenter, LedgerLine.OTHER_SOURCES);
    double propulsion = row(LEDGER, "propulsion-row-2-cruise").levelA();
    double systems = row(LEDGER, "systems-row-2-cruise").levelA();
    assertThat(heading.name()).isEqualTo("Other sources");
    assertThat(heading.ruled()).isTrue();
    assertThat(heading.depth()).isEqualTo(1);
    assertThat(heading.level()).isEqualTo(LevelText.text(Decibels.sum(propulsion, systems)));
    LedgerLine source = line(presenter, "propulsion-row-2-cruise");
    assertThat(source.depth()).isEqualTo(2);
    assertThat(source.strip().fill()).isEqualTo(Fill.HOLLOW);
    assertThat(heading.strip().fill()).isEqualTo(Fill.SOLID);
  }

  @Test
  void oneScaleHoldsTheLoudestBandOfTheSheet() {
    LedgerPresenter presenter = presenter(LEDGER);
    BandScale scale = presenter.heading().scale();
    double loudest =
        presenter.lines().stream()
            .mapToDouble(line -> line.strip().levels().value(line.strip().peak()))
            .max()
            .orElseThrow();
    assertThat(scale.top()).isBetween(loudest, loudest + 5.0);
    assertThat(scale.top() % 5.0).isZero();
    assertThat(scale.bottom()).isEqualTo(scale.top() - 45.0);
    assertThat(presenter.heading().tip(LedgerColumn.BANDS)).endsWith(": " + scale.text());
    BandScale usual = new BandScale(25.0, 70.0);
    assertThat(usual.text()).isEqualTo("25 to 70 dB(A)");
    assertThat(usual.height(47.5)).isEqualTo(0.5);
    assertThat(usual.height(10.0)).isZero();
    assertThat(usual.height(80.0)).isEqualTo(1.0);
    assertThat(usual.height(Double.NaN)).isNaN();
  }

  @Test
  void waysStandBelowAPanelThatHasMoreThanOne() {
    LedgerTree tree = new LedgerTree(withWays());
    LineWriter writer = new LineWriter(tree, VehicleFacts.of(LEDGER.vehicle(), null));
    LedgerNode both = tree.node(LineKey.all("both"));
    assertThat(both.children()).hasSize(2);
    LedgerLine leak = writer.line(both.children().get(1), false);
    assertThat(leak.name()).isEqualTo("Leak");
    assertThat(leak.fullName()).isEqualTo("Door, leak");
    assertThat(leak.way()).isEqualTo(Way.LEAK);
    assertThat(leak.depth()).isEqualTo(2);
    assertThat(leak.share()).isEqualTo("25.0 %");
    assertThat(leak.strip().fill()).isEqualTo(Fill.HATCHED);
    assertThat(writer.line(both, true).kind()).isEmpty();
    assertThat(writer.line(both, true).strip().fill()).isEqualTo(Fill.SOLID);
    LedgerNode seal = tree.node(LineKey.all("seal"));
    assertThat(seal.children()).isEmpty();
    assertThat(writer.line(seal, false).kind()).isEqualTo("leak");
    assertThat(writer.line(seal, false).strip().fill()).isEqualTo(Fill.HATCHED);
    assertThat(tree.node(LineKey.all(LedgerLine.OTHER_SOURCES))).isNull();
  }

  /** A door through which half of the energy comes by two ways, and a seal with the other half. */
  private static ReceiverSheet withWays() {
    List<LedgerRow> rows = new ArrayList<>();
    rows.add(made("all", "", "All", RowKind.TOTAL, Way.ALL, 4.0));
    rows.add(made("both", "all", "Door", RowKind.PANEL, Way.ALL, 2.0));
    rows.add(made("both", "all", "Door", RowKind.PANEL, Way.BOUNDARY_LAYER, 1.0));
    rows.add(made("both", "all", "Door", RowKind.PANEL, Way.ACOUSTIC, 0.0));
    rows.add(made("both", "all", "Door", RowKind.PANEL, Way.LEAK, 1.0));
    rows.add(made("seal", "all", "Seal", RowKind.PANEL, Way.ALL, 2.0));
    rows.add(made("seal", "all", "Seal", RowKind.PANEL, Way.BOUNDARY_LAYER, 0.0));
    rows.add(made("seal", "all", "Seal", RowKind.PANEL, Way.LEAK, 2.0));
    ReceiverSheet any = LEDGER.sheets().get(0);
    return new ReceiverSheet(any.condition(), any.receiver(), rows, List.of());
  }

  private static LedgerRow made(
      String id, String parent, String name, RowKind kind, Way way, double meanSquare) {
    return new LedgerRow(
        id,
        parent,
        parent.isEmpty() ? 0 : 1,
        name,
        kind,
        way,
        "chosen",
        BandSpectrum.constant(meanSquare),
        Judgement.NONE,
        Status.OK,
        "");
  }
}
