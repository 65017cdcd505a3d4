package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.ComputedLedger;
import eddyledger.app.Edit;
import eddyledger.app.ProjectState;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.State;
import eddyledger.ledger.TargetResult;
import eddyledger.model.PassRule;
import eddyledger.model.PassRule.Across;
import eddyledger.model.PassRule.Rounding;
import eddyledger.model.Rating;
import eddyledger.model.Target;
import eddyledger.model.Vehicle;
import eddyledger.quantity.LevelText;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;

/** What the target strip says. */
class TargetStripPresenterTest {
  private static final Ledger LEDGER = Ledger.of(Example.vehicle());

  private final ProjectState state = Example.with(LEDGER);
  private final TargetStripPresenter presenter = new TargetStripPresenter(state);

  private static TargetTile tile(TargetStripPresenter strip, String condition, String receiver) {
    return strip.tiles().stream()
        .filter(it -> it.conditionId().equals(condition) && it.receiverId().equals(receiver))
        .findFirst()
        .orElseThrow();
  }

  private static TargetTile first(Vehicle vehicle) {
    return tile(new TargetStripPresenter(Example.computed(vehicle)), "cruise", "row-2");
  }

  private static double level(Ledger ledger, String condition, String receiver) {
    return ledger.sheet(condition, receiver).orElseThrow().total().levelA();
  }

  private static Vehicle targets(Target... targets) {
    return Example.vehicle().edit().targets(List.of(targets)).build();
  }

  @Test
  void oneTilePerReceiverAndConditionInTheOrderOfTheFile() {
    assertThat(presenter.tiles().stream().map(it -> it.place() + " " + it.condition()))
        .containsExactly(
            "Row 2 Cruise",
            "Row 9 Cruise",
            "Row 16 Cruise",
            "Row 2 Holding",
            "Row 9 Holding",
            "Row 16 Holding");
    assertThat(presenter.message()).isEmpty();
  }

  @Test
  void aTileSaysLevelTargetMarginAndReserve() {
    TargetTile tile = tile(presenter, "cruise", "row-2");
    LedgerRow total = LEDGER.sheet("cruise", "row-2").orElseThrow().total();
    String level = LevelText.text(total.levelA());
    String margin = LevelText.text(total.judgement().margin());
    assertThat(total.judgement().state()).isEqualTo(State.TIGHT);
    assertThat(tile.level()).isEqualTo(level);
    assertThat(tile.bound()).isEmpty();
    assertThat(tile.verdict()).isEqualTo(new Verdict("+" + margin, State.TIGHT, "tight"));
    assertThat(tile.target()).isEqualTo("target 76.0");
    assertThat(tile.corner()).isEqualTo("reserve 1.0");
    assertThat(tile.spoken())
        .isEqualTo("Row 2, Cruise: " + level + " dB(A), tight by " + margin + " dB");
    assertThat(tile.tip())
        .startsWith(
            "Row 2, window seat",
            "Cruise, M 0.74 at 10 700 m",
            "target 76.0 dB(A), reserve 1.0 dB: 75.0 dB(A) allowed");
    assertThat(tile.stale()).isFalse();
  }

  @Test
  void theModelRangeHoldsEveryModelAndTheChosenOne() {
    TargetTile tile = tile(presenter, "cruise", "row-2");
    double low = level(LEDGER, "cruise", "row-2");
    double high = low;
    for (LedgerRow row : LEDGER.sheet("cruise", "row-2").orElseThrow().range()) {
      low = Math.min(low, row.levelA());
      high = Math.max(high, row.levelA());
    }
    assertThat(tile.range())
        .isEqualTo("models " + LevelText.text(low) + " to " + LevelText.text(high));
    assertThat(tile.scale().hasRange()).isTrue();
    assertThat(tile.scale().from()).isLessThanOrEqualTo(tile.scale().level());
    assertThat(tile.tip()).anyMatch(line -> line.contains("cross-spectrum of orders (1,1)"));
  }

  @Test
  void anotherTargetIsNamedWhereItCounts() {
    TargetResult speech = LEDGER.targets().get(LEDGER.targets().size() - 1);
    assertThat(speech.state()).isEqualTo(State.OVER);
    for (TargetTile tile : presenter.tiles()) {
      boolean counts =
          tile.conditionId().equals("cruise") && tile.receiverId().equals(speech.receiver());
      assertThat(tile.others())
          .as(tile.spoken())
          .isEqualTo(counts ? new TargetTile.OtherTarget(State.OVER, "SIL over") : null);
      assertThat(
              tile.tip().stream().anyMatch(it -> it.startsWith("Speech interference in cruise:")))
          .isEqualTo(tile.conditionId().equals("cruise"));
    }
  }

  @Test
  void ofAPartialTotalOnlyOneThingIsKnown() {
    Ledger ledger = Ledger.of(Example.without("crown-e"));
    TargetStripPresenter strip = new TargetStripPresenter(Example.with(ledger));
    TargetTile unknown = tile(strip, "cruise", "row-2");
    assertThat(unknown.bound()).isEqualTo("\u2265");
    assertThat(unknown.level()).isEqualTo(LevelText.text(level(ledger, "cruise", "row-2")));
    assertThat(unknown.verdict()).isEqualTo(new Verdict("", null, "not known"));
    assertThat(unknown.corner()).isEqualTo("1 of 61 missing");
    assertThat(unknown.range()).startsWith("models \u2265\u2009");
    assertThat(unknown.spoken()).endsWith("dB(A), not known, 1 of 61 missing");
    assertThat(unknown.tip())
        .containsSubsequence("1 of 61 missing", "Crown, station E: no construction");
    TargetTile over = tile(strip, "hold", "row-2");
    assertThat(over.verdict().state()).isEqualTo(State.OVER);
    assertThat(over.verdict().number()).startsWith("\u2264\u2009\u2212");
    assertThat(over.spoken()).contains("over by at least");
  }

  @Test
  void withoutATargetATileSaysSo() {
    TargetTile tile = first(targets());
    assertThat(tile.verdict()).isEqualTo(new Verdict("", null, "no target"));
    assertThat(tile.target()).isEmpty();
    assertThat(tile.corner()).isEmpty();
    assertThat(tile.scale().hasTarget()).isFalse();
    assertThat(tile.spoken()).endsWith(" dB(A), no target");
  }

  @Test
  void theTargetsOwnRuleJudges() {
    double level = level(LEDGER, "cruise", "row-2");
    PassRule rule = new PassRule(Rounding.TENTH, 0.5, Across.WORST);
    TargetTile tile =
        first(targets(Example.target("t", List.of("row-2"), Rating.OVERALL_A, level + 0.2, rule)));
    assertThat(tile.verdict()).isEqualTo(new Verdict("\u22120.3", State.TIGHT, "tight"));
    assertThat(tile.spoken()).contains("tight after the target's rule, margin \u22120.3 dB");
    assertThat(tile.tip())
        .contains("the level is judged rounded to 0.1 dB with a tolerance of 0.5 dB");
  }

  @Test
  void whereTheMeanCountsTheTileTellsOfItToo() {
    PassRule mean = new PassRule(Rounding.NONE, 0.0, Across.ENERGY_MEAN);
    List<String> all = List.of("row-2", "row-9", "row-16");
    TargetTile tile = first(targets(Example.target("t", all, Rating.OVERALL_A, 60.0, mean)));
    assertThat(tile.others()).isEqualTo(new TargetTile.OtherTarget(State.OVER, "mean over"));
    assertThat(tile.tip()).anyMatch(line -> line.endsWith("; the mean of 3 receivers counts"));
  }

  @Test
  void whileTheNumbersAreOldTheyStayAndAreMarked() {
    AtomicInteger told = new AtomicInteger();
    presenter.onChange(told::incrementAndGet);
    TargetTile before = tile(presenter, "cruise", "row-2");
    state.apply(Edit.of("name", "", it -> it.edit().name("other").build()));
    TargetTile stale = tile(presenter, "cruise", "row-2");
    assertThat(told).hasValue(1);
    assertThat(stale.stale()).isTrue();
    assertThat(stale.level()).isEqualTo(before.level());
    assertThat(stale.spoken()).isEqualTo(before.spoken() + ", being computed anew");
    Example.compute(state);
    assertThat(tile(presenter, "cruise", "row-2")).isEqualTo(before);
  }

  @Test
  void beforeTheFirstResultAndWhereThereIsNoneTheTilesSaySo() {
    ProjectState blank = new ProjectState();
    TargetStripPresenter strip = new TargetStripPresenter(blank);
    assertThat(strip.tiles()).isEmpty();
    assertThat(strip.message()).isEmpty();
    blank.put(Example.vehicle(), null);
    assertThat(strip.tiles()).hasSize(6);
    assertThat(strip.tiles().get(0).level()).isEqualTo("\u2014");
    assertThat(strip.tiles().get(0).counted()).isFalse();
    assertThat(strip.tiles().get(0).verdict().word()).isEqualTo("not computed yet");
    blank.computed(new ComputedLedger(blank.revision(), Optional.empty(), List.of()));
    assertThat(strip.tiles().get(0).spoken())
        .isEqualTo("Row 2, Cruise: cannot be computed, see findings");
    blank.put(Example.vehicle().edit().receivers(List.of()).build(), null);
    assertThat(strip.tiles()).isEmpty();
    assertThat(strip.message()).startsWith("No receiver in any condition yet");
  }

  @Test
  void aTileRulesTheDeskAndKeepsTheRow() {
    state.select(state.selection().on("crown-c"));
    presenter.choose(4);
    assertThat(presenter.selectedIndex()).isEqualTo(4);
    assertThat(presenter.tiles().get(4).selected()).isTrue();
    assertThat(state.selection().conditionId()).isEqualTo("hold");
    assertThat(state.selection().receiverId()).isEqualTo("row-9");
    assertThat(state.selection().rowId()).isEqualTo("crown-c");
    presenter.nextReceiver();
    assertThat(presenter.selectedIndex()).isEqualTo(5);
    presenter.nextReceiver();
    assertThat(presenter.selectedIndex()).isEqualTo(3);
    presenter.nextCondition();
    assertThat(presenter.selectedIndex()).isZero();
    presenter.choose(-1);
    presenter.choose(6);
    assertThat(presenter.selectedIndex()).isZero();
  }
}
