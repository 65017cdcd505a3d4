package eddyledger.bench;

import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerCache;
import eddyledger.ledger.LedgerOptions;
import eddyledger.model.BandTable;
import eddyledger.model.ByCondition;
import eddyledger.model.JudgedBands;
import eddyledger.model.Node;
import eddyledger.model.Panel;
import eddyledger.model.Section;
import eddyledger.model.Vehicle;
import eddyledger.quantity.Progress;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * A whole ledger with its model range: cold (nothing known), with only the radiation efficiencies
 * known (every loss factor is another one), and after an edit to one panel.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 4)
@Measurement(iterations = 3, time = 6)
public class LedgerBench {
  /** Different panels of the vehicle. */
  @Param({"50", "100", "200", "400"})
  public int panels;

  /** Threads that compute panels. */
  @Param({"2"})
  public int threads;

  private Vehicle vehicle;
  private LedgerCache warm;
  private int round;

  /** Makes the vehicle and fills the warm cache. */
  @Setup
  public void prepare() {
    vehicle = MadeUpVehicle.of(panels);
    warm = new LedgerCache();
    Ledger.of(vehicle, options(warm));
  }

  private LedgerOptions options(LedgerCache cache) {
    return new LedgerOptions(threads, Progress.NONE, cache);
  }

  /** Nothing is known. */
  @Benchmark
  public Ledger cold() {
    return Ledger.of(vehicle, options(new LedgerCache()));
  }

  /** Every panel has another loss factor; the radiation efficiencies are known. */
  @Benchmark
  public Ledger warmRadiation() {
    round++;
    return Ledger.of(relossed(vehicle.tree().size()), options(warm));
  }

  /** One panel has another loss factor; all else is known. */
  @Benchmark
  public Ledger editOnePanel() {
    round++;
    return Ledger.of(relossed(0), options(warm));
  }

  /** The vehicle with other loss factors in so many sections; with 0, on its first panel alone. */
  private Vehicle relossed(int sections) {
    List<Node> tree = new ArrayList<>(vehicle.tree());
    for (int i = 0; i < Math.max(1, sections); i++) {
      Section section = (Section) tree.get(i);
      List<Node> children = new ArrayList<>(section.children());
      for (int k = 0; k < (sections == 0 ? 1 : children.size()); k++) {
        children.set(k, relossed((Panel) children.get(k)));
      }
      tree.set(i, section.withChildren(children));
    }
    return vehicle.edit().tree(tree).build();
  }

  private Panel relossed(Panel panel) {
    double loss = panel.settings().lossFactor().base().best().values().get(0);
    BandTable other = BandTable.single(loss * (1.0 + 1.0e-6 * round));
    return panel.withSettings(
        panel.settings().edit().lossFactor(ByCondition.always(JudgedBands.of(other))).build());
  }
}
