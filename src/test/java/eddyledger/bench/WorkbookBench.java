package eddyledger.bench;

import eddyledger.ledger.Ledger;
import eddyledger.model.Node;
import eddyledger.model.Panel;
import eddyledger.model.Section;
import eddyledger.model.Vehicle;
import eddyledger.quantity.Progress;
import eddyledger.workbook.BudgetWorkbook;
import eddyledger.workbook.WorkbookContent;
import java.io.IOException;
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
 * The budget workbook of a computed ledger, three conditions and two receivers, against the bare
 * library that writes the same cells, formulas, stored results and styles from a list.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 2, time = 5)
@Measurement(iterations = 3, time = 8)
public class WorkbookBench {
  private static final int DIFFERENT_PANELS = 20;

  /**
   * Panels of the vehicle; those beyond the first few are like them, so that setting up is quick.
   */
  @Param({"45", "300", "2000"})
  public int panels;

  private WorkbookContent content;
  private BareWorkbook bare;

  /** Computes the ledger and lists the cells of its workbook. */
  @Setup
  public void prepare() throws IOException {
    Ledger ledger = Ledger.of(vehicle(panels));
    content = WorkbookContent.of(ledger, ledger.findings());
    byte[] bytes = BudgetWorkbook.of(content, Progress.NONE);
    bare = BareWorkbook.like(bytes);
    System.out.println(bytes.length / 1024 + " kB, " + bare.cells() + " cells");
  }

  static Vehicle vehicle(int panels) {
    Vehicle few = MadeUpVehicle.of(DIFFERENT_PANELS);
    Section section = (Section) few.tree().get(0);
    List<Node> tree = new ArrayList<>();
    int made = 0;
    while (made < panels) {
      List<Node> children = new ArrayList<>();
      for (Node node : section.children()) {
        if (made < panels) {
          children.add(((Panel) node).withId("panel-" + made));
          made++;
        }
      }
      String id = "section-" + tree.size();
      tree.add(new Section(id, id, section.settings(), children, section.extras()));
    }
    return few.edit().tree(tree).build();
  }

  /** The budget workbook. */
  @Benchmark
  public byte[] budget() throws IOException {
    return BudgetWorkbook.of(content, Progress.NONE);
  }

  /** The same cells by the bare library. */
  @Benchmark
  public byte[] bareLibrary() throws IOException {
    return bare.write();
  }
}
