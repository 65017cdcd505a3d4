package eddyledger.ledger;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.model.BandTable;
import eddyledger.model.ByCondition;
import eddyledger.model.InheritedSettings;
import eddyledger.model.JudgedBands;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Panel;
import eddyledger.model.Receiver;
import eddyledger.model.Settings;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import eddyledger.model.Zone;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Progress;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Laws that hold for every vehicle, on vehicles drawn at random. */
class LedgerLawsTest {
  private static final double TIGHT = 1.0e-12;

  static LongStream seeds() {
    return LongStream.rangeClosed(1, 10);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void vehiclesDrawnAtRandomAreWhole(long seed) {
    Ledger ledger = Ledger.of(RandomVehicle.of(seed));
    for (ReceiverSheet sheet : ledger.sheets()) {
      assertThat(sheet.rows())
          .as("seed %s", seed)
          .allMatch(row -> row.status() == Status.OK && row.level() > -100.0);
    }
    assertThat(RandomVehicle.of(seed)).isEqualTo(RandomVehicle.of(seed));
    assertThat(RandomVehicle.of(seed)).isNotEqualTo(RandomVehicle.of(seed + 1));
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void twiceThePiecesAddThreeDecibels(long seed) {
    Vehicle vehicle = RandomVehicle.of(seed);
    LedgerCache cache = new LedgerCache();
    Ledger once = ledger(vehicle, cache);
    Ledger twice = ledger(doubled(vehicle), cache);
    for (int i = 0; i < once.sheets().size(); i++) {
      Contributed before = once.sheets().get(i).flow();
      Contributed after = twice.sheets().get(i).flow();
      String what = "seed " + seed + ", " + once.sheets().get(i).title();
      assertThat(after.levelA() - before.levelA()).as(what).isCloseTo(3.0103, within(1.0e-6));
      Sheets.assertClose(
          after.meanSquares(), before.meanSquares().map(value -> 2.0 * value), TIGHT, what);
    }
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void piecesMayBeSplitOverTwoPanels(long seed) {
    Vehicle vehicle = doubled(RandomVehicle.of(seed));
    LedgerCache cache = new LedgerCache();
    Vehicle split = Edits.panels(vehicle, panel -> List.of(half(panel), half(second(panel))));
    // the second half of a panel is as near to a receiver as the first
    List<Receiver> receivers = vehicle.receivers().stream().map(it -> bothHalves(it)).toList();
    Ledger after = ledger(Edits.with(split, it -> it.receivers(receivers)), cache);
    Ledger before = ledger(vehicle, cache);
    for (int i = 0; i < before.sheets().size(); i++) {
      ReceiverSheet sheet = before.sheets().get(i);
      for (LedgerRow row : sheet.rows()) {
        if (row.kind() != RowKind.PANEL) {
          LedgerRow other = after.sheets().get(i).row(row.id(), row.way()).orElseThrow();
          Sheets.assertClose(
              other.meanSquares(), row.meanSquares(), TIGHT, "seed " + seed + ": " + row.id());
        }
      }
    }
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void orderOfPanelsAndSectionsDoesNotMatter(long seed) {
    Vehicle vehicle = RandomVehicle.of(seed);
    Ledger reversed = Ledger.of(Edits.reversed(vehicle));
    Sheets.assertClose(reversed, Ledger.of(vehicle), TIGHT, "seed " + seed);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void numberOfThreadsDoesNotChangeABit(long seed) {
    Vehicle vehicle = RandomVehicle.of(seed);
    Ledger one = Ledger.of(vehicle, LedgerOptions.plain().withThreads(1));
    for (int threads : new int[] {2, 4}) {
      Ledger many = Ledger.of(vehicle, LedgerOptions.plain().withThreads(threads));
      Sheets.assertSameBits(many, one, "seed " + seed + ", threads " + threads);
    }
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void orderOfConditionsDoesNotChangeABit(long seed) {
    Vehicle vehicle = RandomVehicle.of(seed);
    List<OperatingCondition> conditions = new ArrayList<>(vehicle.conditions());
    Collections.reverse(conditions);
    Vehicle reversed = Edits.with(vehicle, it -> it.conditions(conditions));
    Sheets.assertSameBits(Ledger.of(reversed), Ledger.of(vehicle), "seed " + seed);
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void moreAbsorptionNeverMakesItsOwnZoneLouder(long seed) {
    Vehicle vehicle = RandomVehicle.of(seed);
    LedgerCache cache = new LedgerCache();
    Ledger before = ledger(vehicle, cache);
    for (Receiver receiver : vehicle.receivers()) {
      Vehicle lined = Edits.zone(vehicle, receiver.zone(), zone -> moreAbsorption(zone));
      Ledger after = ledger(lined, cache);
      for (OperatingCondition condition : vehicle.conditions()) {
        double[] was = flow(before, condition, receiver);
        double[] is = flow(after, condition, receiver);
        for (int band = 0; band < Bands.COUNT; band++) {
          assertThat(is[band])
              .as("seed %s, %s at %s Hz", seed, receiver.id(), Bands.label(band))
              .isLessThan(was[band]);
        }
      }
    }
  }

  @ParameterizedTest(name = "seed {0}")
  @MethodSource("seeds")
  void anOverrideEqualToTheInheritedValueChangesNothing(long seed) {
    Vehicle vehicle = RandomVehicle.of(seed);
    Map<String, Settings> explicit = new LinkedHashMap<>();
    for (TreePath path : TreePath.of(vehicle)) {
      explicit.put(path.node().id(), explicit(vehicle, path));
    }
    Vehicle stated =
        Edits.panels(vehicle, panel -> List.of(panel.withSettings(explicit.get(panel.id()))));
    assertThat(stated).isNotEqualTo(vehicle);
    Sheets.assertSameBits(Ledger.of(stated), Ledger.of(vehicle), "seed " + seed);
  }

  private static Ledger ledger(Vehicle vehicle, LedgerCache cache) {
    return Ledger.of(vehicle, new LedgerOptions(2, Progress.NONE, cache));
  }

  private static Vehicle doubled(Vehicle vehicle) {
    return Edits.panels(vehicle, panel -> List.of(panel.withCount(2 * panel.count())));
  }

  private static Panel half(Panel panel) {
    return panel.withCount(panel.count() / 2);
  }

  private static Panel second(Panel panel) {
    return panel.withId(panel.id() + "-second");
  }

  private static Receiver bothHalves(Receiver receiver) {
    List<Receiver.DirectPath> paths = new ArrayList<>(receiver.direct());
    for (Receiver.DirectPath path : receiver.direct()) {
      String other = path.panel() + "-second";
      paths.add(new Receiver.DirectPath(other, path.distance(), path.extras()));
    }
    return new Receiver(receiver.id(), receiver.name(), receiver.zone(), paths, receiver.extras());
  }

  private static Zone moreAbsorption(Zone zone) {
    JudgedBands more =
        JudgedBands.of(
            BandTable.thirds(
                zone.absorptionArea().base().best().spectrum().map(area -> area + 0.7)));
    return SampleVehicle.zone(zone.id(), zone.volume(), zone.innerSurface(), more);
  }

  private static double[] flow(Ledger ledger, OperatingCondition condition, Receiver receiver) {
    return Sheets.sheet(ledger, condition.id(), receiver.id()).flow().meanSquares().toArray();
  }

  /** Every setting that holds at a node, set on the node itself, for each condition by itself. */
  private static Settings explicit(Vehicle vehicle, TreePath path) {
    InheritedSettings held = InheritedSettings.at(vehicle, path);
    return new Settings(
        fixed(held, Settings::construction),
        fixed(held, Settings::length),
        fixed(held, Settings::width),
        varying(vehicle, held, Settings::localSpeed),
        varying(vehicle, held, Settings::boundaryLayer),
        varying(vehicle, held, Settings::wallPressure),
        varying(vehicle, held, Settings::crossSpectrum),
        varying(vehicle, held, Settings::convectionRatio),
        varying(vehicle, held, Settings::lossFactor),
        fixed(held, Settings::layUp),
        fixed(held, Settings::zone),
        null);
  }

  private static <T> T fixed(InheritedSettings held, Function<Settings, T> setting) {
    return held.find(setting).map(it -> it.value()).orElse(null);
  }

  private static <T> ByCondition<T> varying(
      Vehicle vehicle, InheritedSettings held, Function<Settings, ByCondition<T>> setting) {
    Map<String, T> values = new LinkedHashMap<>();
    for (OperatingCondition condition : vehicle.conditions()) {
      held.find(setting, condition.id()).ifPresent(it -> values.put(condition.id(), it.value()));
    }
    return values.isEmpty() ? null : new ByCondition<>(null, values);
  }
}
