package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.ComputedLedger;
import eddyledger.app.Edit;
import eddyledger.app.ProjectState;
import eddyledger.ledger.Ledger;
import eddyledger.model.Vehicle;
import eddyledger.present.LedgerLine.Twig;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;

/** Opening, closing and selecting lines of the ledger. */
class LedgerPresenterTest {
  private static final Ledger LEDGER = Ledger.of(Example.vehicle());

  /** At this receiver nothing was allotted in this condition: the chain of the loudest panel. */
  private final ProjectState state = at(Example.with(LEDGER), "hold");

  private final LedgerPresenter presenter = new LedgerPresenter(state);

  private static ProjectState at(ProjectState state, String condition) {
    state.select(state.selection().at(condition, "row-2").on("quillon-82"));
    return state;
  }

  private int index(String id) {
    List<String> ids = presenter.lines().stream().map(LedgerLine::id).toList();
    return ids.indexOf(id);
  }

  private List<String> open() {
    return presenter.lines().stream()
        .filter(line -> line.twig() == Twig.OPEN)
        .map(LedgerLine::id)
        .toList();
  }

  private String selected() {
    return presenter.lines().get(presenter.selectedIndex()).id();
  }

  @Test
  void atFirstTheWayToTheWorstIsOpen() {
    assertThat(open()).containsExactly("quillon-82", "station-a", LedgerLine.OTHER_SOURCES);
    assertThat(presenter.lines().stream().map(LedgerLine::id).toList())
        .containsSubsequence("quillon-82", "station-a", "crown-a", "station-b", "station-e")
        .endsWith(LedgerLine.OTHER_SOURCES, "propulsion-row-2-hold", "systems-row-2-hold");
    LedgerPresenter cruise = new LedgerPresenter(at(Example.with(LEDGER), "cruise"));
    assertThat(cruise.lines().stream().filter(it -> it.twig() == Twig.OPEN).map(LedgerLine::id))
        .containsExactly("quillon-82", "station-e", LedgerLine.OTHER_SOURCES);
  }

  @Test
  void theWorstIsThePanelOfLeastMarginThenTheSectionThenTheLoudest() {
    presenter.jumpToWorst();
    assertThat(state.selection().rowId()).isEqualTo("crown-a");
    state.select(state.selection().at("cruise", "row-2"));
    presenter.jumpToWorst();
    assertThat(state.selection().rowId()).isEqualTo("station-e");
    Vehicle allotted =
        Example.vehicle()
            .edit()
            .allowances(
                List.of(
                    Example.allowance("station-e", 10.0),
                    Example.allowance("crown-a", 70.0),
                    Example.allowance("lower-side-left-d", 50.0)))
            .build();
    ProjectState other = at(Example.computed(allotted), "cruise");
    new LedgerPresenter(other).jumpToWorst();
    assertThat(other.selection().rowId()).isEqualTo("lower-side-left-d");
  }

  @Test
  void aLineOpensAndClosesInPlace() {
    int before = presenter.lines().size();
    presenter.toggle(index("station-c"));
    assertThat(presenter.lines().get(index("station-c")).twig()).isEqualTo(Twig.OPEN);
    assertThat(presenter.lines()).hasSize(before + 9);
    assertThat(presenter.lines().get(index("station-c") + 1).id()).isEqualTo("crown-c");
    presenter.toggle(index("station-c"));
    assertThat(presenter.lines()).hasSize(before);
    presenter.toggle(index("crown-a"));
    assertThat(presenter.lines()).hasSize(before);
  }

  @Test
  void rightGoesInAndLeftGoesOut() {
    presenter.select(index("station-b"));
    presenter.into(index("station-b"));
    assertThat(selected()).isEqualTo("station-b");
    presenter.into(index("station-b"));
    assertThat(selected()).isEqualTo("station-b-forward");
    presenter.outOf(index("station-b-forward"));
    assertThat(selected()).isEqualTo("station-b");
    presenter.outOf(index("station-b"));
    assertThat(open()).doesNotContain("station-b");
    presenter.outOf(index("station-b"));
    assertThat(selected()).isEqualTo("quillon-82");
    presenter.into(index("crown-a"));
    presenter.outOf(index("quillon-82"));
    assertThat(presenter.lines()).hasSize(1);
    presenter.outOf(0);
    assertThat(presenter.lines()).hasSize(1);
  }

  @Test
  void allOpenAndAllClosed() {
    presenter.openAll();
    assertThat(presenter.lines()).noneMatch(line -> line.twig() == Twig.CLOSED);
    assertThat(presenter.lines()).hasSize(59 + 9 + 1 + 1 + 2);
    presenter.select(index("crown-b-middle"));
    presenter.closeAll();
    assertThat(open()).containsExactly("quillon-82");
    assertThat(selected()).isEqualTo("station-b");
    assertThat(state.selection().rowId()).isEqualTo("station-b");
  }

  @Test
  void whatWasOpenedStaysOpenThroughResultsEditsAndOtherReceivers() {
    presenter.toggle(index("station-d"));
    presenter.toggle(index("station-a"));
    List<String> ids = presenter.lines().stream().map(LedgerLine::name).toList();
    state.apply(Edit.of("count", "crown-d-aft", LedgerPresenterTest::more));
    assertThat(presenter.lines().stream().map(LedgerLine::name).toList()).isEqualTo(ids);
    Example.compute(state);
    assertThat(presenter.lines().stream().map(LedgerLine::name).toList()).isEqualTo(ids);
    state.select(state.selection().at("cruise", "row-16"));
    assertThat(presenter.lines().stream().map(LedgerLine::name).toList()).isEqualTo(ids);
    state.put(Example.vehicle(), null);
    Example.deliver(state, Ledger.of(state.vehicle()));
    assertThat(open()).doesNotContain("station-d");
  }

  private static Vehicle more(Vehicle vehicle) {
    return Example.panel(vehicle, "crown-d-aft", panel -> panel.withCount(panel.count() + 1));
  }

  @Test
  void undoSelectsItsRowAndOpensTheWayToIt() {
    state.apply(Edit.of("count", "crown-d-aft", LedgerPresenterTest::more));
    assertThat(index("crown-d-aft")).isEqualTo(-1);
    state.undo();
    assertThat(selected()).isEqualTo("crown-d-aft");
    assertThat(open()).contains("station-d", "station-d-aft");
    presenter.closeAll();
    state.redo();
    assertThat(selected()).isEqualTo("crown-d-aft");
  }

  @Test
  void aRowThatIsNotInTheResultYetIsSelectedWhenItIs() {
    state.apply(
        Edit.of(
            "panel", "crown-new", it -> Example.panel(it, "crown-c", p -> p.withId("crown-new"))));
    state.select(state.selection().on("crown-new"));
    assertThat(presenter.selectedIndex()).isEqualTo(-1);
    Example.compute(state);
    assertThat(selected()).isEqualTo("crown-new");
  }

  @Test
  void closingOverTheSelectedLineSelectsWhatHidesIt() {
    presenter.select(index("crown-a"));
    presenter.toggle(index("station-a"));
    assertThat(state.selection().rowId()).isEqualTo("station-a");
    assertThat(open()).doesNotContain("station-a");
  }

  @Test
  void theHeadingOverOtherSourcesIsNoRowOfTheFile() {
    presenter.select(index("station-b"));
    presenter.select(index(LedgerLine.OTHER_SOURCES));
    assertThat(selected()).isEqualTo(LedgerLine.OTHER_SOURCES);
    assertThat(state.selection().rowId()).isEqualTo("station-b");
    state.select(state.selection().on("station-c"));
    assertThat(selected()).isEqualTo("station-c");
  }

  @Test
  void anOtherSourceIsFollowedToItsNamesake() {
    presenter.select(index("systems-row-2-hold"));
    state.select(state.selection().at("cruise", "row-16"));
    assertThat(state.selection().rowId()).isEqualTo("systems-row-16-cruise");
    assertThat(selected()).isEqualTo("systems-row-16-cruise");
  }

  @Test
  void oldNumbersStayAndAreMarked() {
    AtomicInteger told = new AtomicInteger();
    presenter.onChange(told::incrementAndGet);
    List<LedgerLine> lines = presenter.lines();
    assertThat(presenter.heading().stale()).isFalse();
    assertThat(presenter.heading().note()).isEqualTo("levels in dB(A)");
    state.apply(Edit.of("count", "", LedgerPresenterTest::more));
    assertThat(told).hasValue(1);
    assertThat(presenter.lines()).isEqualTo(lines);
    assertThat(presenter.heading().stale()).isTrue();
    assertThat(presenter.heading().note()).isEqualTo("earlier levels\u2026");
    state.computed(new ComputedLedger(state.revision(), Optional.empty(), List.of()));
    assertThat(presenter.heading().note()).isEqualTo("earlier, see findings");
  }

  @Test
  void beforeTheFirstResultTheRowsStandWithoutNumbers() {
    ProjectState blank = new ProjectState();
    LedgerPresenter ledger = new LedgerPresenter(blank);
    assertThat(ledger.lines()).isEmpty();
    assertThat(ledger.selectedIndex()).isEqualTo(-1);
    blank.put(Example.vehicle(), null);
    assertThat(ledger.sheet()).isEmpty();
    assertThat(ledger.heading().title()).isEqualTo("Row 2, Cruise");
    assertThat(ledger.heading().note()).isEqualTo("not computed yet");
    assertThat(ledger.lines()).hasSize(9);
    assertThat(ledger.lines()).allMatch(line -> line.level().equals("\u2014"));
    assertThat(ledger.lines()).allMatch(line -> line.strip().reason().isEmpty());
    Example.deliver(blank, Ledger.of(blank.vehicle()));
    assertThat(ledger.sheet()).isPresent();
    assertThat(ledger.lines().get(0).level()).isNotEqualTo("\u2014");
    blank.put(Example.vehicle().edit().conditions(List.of()).build(), null);
    assertThat(ledger.lines()).isEmpty();
    assertThat(ledger.heading().note()).isEqualTo("a receiver and a condition are needed");
    blank.clear();
    assertThat(ledger.heading().note()).isEmpty();
  }
}
