package eddyledger.ledger;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import eddyledger.model.AirGiven;
import eddyledger.model.ByCondition;
import eddyledger.model.Judged;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Panel;
import eddyledger.model.SettingsBuilder;
import eddyledger.model.Vehicle;
import eddyledger.quantity.Progress;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CancellationException;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What was computed is kept, gives the same bits, and only what an edit touches is redone. */
class LedgerCacheTest {
  private static final Vehicle SAMPLE = SampleVehicle.vehicle();

  /** Five computed panels in two conditions. */
  private static final int ALL = 10;

  /** Notes what it is told. */
  private static final class Notes implements Progress {
    private final List<Integer> steps = Collections.synchronizedList(new ArrayList<>());
    private final List<Integer> totals = Collections.synchronizedList(new ArrayList<>());
    private final int cancelAfter;

    Notes(int cancelAfter) {
      this.cancelAfter = cancelAfter;
    }

    @Override
    public void done(int step, int of) {
      steps.add(step);
      totals.add(of);
    }

    @Override
    public boolean cancelled() {
      return steps.size() >= cancelAfter;
    }
  }

  static Stream<Arguments> edits() {
    return Stream.of(
        edit("nothing", 0, it -> it),
        edit("a name", 0, it -> Edits.with(it, with -> with.name("another"))),
        edit("a count", 0, it -> Edits.panel(it, "roof", panel -> panel.withCount(9))),
        edit("a lay-up", 0, it -> Edits.settings(it, "floor", with -> with.layUp("liner"))),
        edit("a zone", 0, it -> Edits.settings(it, "tail", with -> with.zone("rear"))),
        edit("no target", 0, it -> Edits.with(it, with -> with.targets(List.of()))),
        edit("a size", 2, it -> Edits.settings(it, "floor", with -> with.size(0.25, 0.2))),
        edit(
            "a condition's own value", 1, it -> Edits.settings(it, "tail", with -> oneRatio(with))),
        edit("a panel away", 0, it -> Edits.panels(it, panel -> allBut("roof", panel))),
        edit("a condition's cabin air", 5, LedgerCacheTest::warmerCabin));
  }

  private static Arguments edit(String what, int computed, UnaryOperator<Vehicle> change) {
    return Arguments.of(what, computed, change);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("edits")
  void onlyWhatAnEditTouchesIsComputed(String what, int computed, UnaryOperator<Vehicle> change) {
    LedgerCache cache = new LedgerCache();
    Notes cold = new Notes(Integer.MAX_VALUE);
    Ledger.of(SAMPLE, new LedgerOptions(2, cold, cache));
    assertThat(cold.totals).hasSize(ALL).containsOnly(ALL);
    Notes warm = new Notes(Integer.MAX_VALUE);
    Vehicle edited = change.apply(SAMPLE);
    Ledger after = Ledger.of(edited, new LedgerOptions(2, warm, cache));
    assertThat(warm.totals).hasSize(computed);
    assertThat(warm.totals).allMatch(total -> total == computed);
    Sheets.assertSameBits(after, Ledger.of(edited), what);
  }

  @Test
  void panelsAlikeAreComputedOnce() {
    Vehicle vehicle =
        Edits.panels(SAMPLE, panel -> List.of(panel, panel.withId(panel.id() + "-again")));
    Notes notes = new Notes(Integer.MAX_VALUE);
    Ledger.of(vehicle, new LedgerOptions(2, notes, new LedgerCache()));
    assertThat(notes.totals).hasSize(ALL).containsOnly(ALL);
  }

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 4})
  void progressReachesTheTotal(int threads) {
    Notes notes = new Notes(Integer.MAX_VALUE);
    Ledger.of(SAMPLE, new LedgerOptions(threads, notes, new LedgerCache()));
    assertThat(notes.steps)
        .containsExactlyInAnyOrderElementsOf(IntStream.rangeClosed(1, ALL).boxed().toList());
  }

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 4})
  void cancellingStopsTheRunAndSpoilsNothing(int threads) {
    LedgerCache cache = new LedgerCache();
    Notes notes = new Notes(1);
    LedgerOptions options = new LedgerOptions(threads, notes, cache);
    assertThatThrownBy(() -> Ledger.of(SAMPLE, options)).isInstanceOf(CancellationException.class);
    assertThat(notes.steps).hasSizeLessThan(ALL);
    Ledger after = Ledger.of(SAMPLE, new LedgerOptions(threads, Progress.NONE, cache));
    Sheets.assertSameBits(after, Ledger.of(SAMPLE), "after a cancelled run");
  }

  private static void oneRatio(SettingsBuilder settings) {
    settings.convectionRatio(new ByCondition<>(null, Map.of(SampleVehicle.ROAD, Judged.of(0.75))));
  }

  private static List<Panel> allBut(String id, Panel panel) {
    return panel.id().equals(id) ? List.of() : List.of(panel);
  }

  private static Vehicle warmerCabin(Vehicle vehicle) {
    OperatingCondition road = vehicle.conditions().get(0);
    OperatingCondition warmer =
        SampleVehicle.condition(
            road.id(), road.speed(), null, road.outsideAir(), AirGiven.of(301.15, 100_400.0));
    return Edits.with(vehicle, it -> it.conditions(List.of(warmer, vehicle.conditions().get(1))));
  }
}
