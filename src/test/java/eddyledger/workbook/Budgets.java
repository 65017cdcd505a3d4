package eddyledger.workbook;

import eddyledger.file.ProjectReader;
import eddyledger.ledger.Judgement;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Status;
import eddyledger.ledger.Way;
import eddyledger.model.BandTable;
import eddyledger.model.Evidence;
import eddyledger.model.Extras;
import eddyledger.model.JudgedBands;
import eddyledger.model.Node;
import eddyledger.model.OperatingCondition;
import eddyledger.model.OtherSource;
import eddyledger.model.Panel;
import eddyledger.model.PassRule;
import eddyledger.model.Rating;
import eddyledger.model.Section;
import eddyledger.model.Target;
import eddyledger.model.Vehicle;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;

/** Ledgers to make workbooks of. */
final class Budgets {
  /** A name that a spreadsheet would take for a formula. */
  static final String HOSTILE = "=HYPERLINK(\"http://nowhere\",\"A\")";

  /** The panel of {@link #faulty()} that cannot be computed. */
  static final String FAILED = "crown-c";

  /** The other source of {@link #faulty()} that lacks a band. */
  static final String PARTIAL = "systems-row-9-hold";

  /** The band it lacks. */
  static final String LACKING_BAND = "1000";

  private Budgets() {}

  static Vehicle example() {
    try {
      return new ProjectReader()
          .read(Path.of("examples", "quillon-82.eddyledger"))
          .vehicle()
          .orElseThrow();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static WorkbookContent content(Vehicle vehicle) {
    Ledger ledger = Ledger.of(vehicle);
    return WorkbookContent.of(ledger, ledger.findings());
  }

  /**
   * The example while holding, with a panel that fails, an other source that lacks a band, an empty
   * section, and names that look like formulas.
   */
  static Vehicle faulty() {
    Vehicle example = example();
    List<Node> tree = new ArrayList<>();
    for (Node node : example.tree()) {
      tree.add(spoilt(node));
    }
    tree.add(new Section("bare", "-bare", example.settings(), List.of(), Extras.NONE));
    OperatingCondition hold = example.conditions().get(1);
    return example
        .edit()
        .name("@" + example.name())
        .conditions(List.of(hold))
        .otherSources(
            example.otherSources().stream()
                .filter(source -> source.condition().equals(hold.id()))
                .map(Budgets::spoilt)
                .toList())
        .targets(
            Stream.concat(
                    example.targets().stream().filter(it -> it.condition().equals(hold.id())),
                    everyRating(hold.id()).stream())
                .toList())
        .allowances(
            example.allowances().stream().filter(it -> it.condition().equals(hold.id())).toList())
        .tree(tree)
        .build();
  }

  /** The example with targets of every rating under every pass rule. */
  static Vehicle judgedInEveryWay() {
    Vehicle example = example();
    List<Target> targets = new ArrayList<>(example.targets());
    targets.addAll(everyRating("cruise"));
    return example.edit().targets(targets).build();
  }

  private static List<Target> everyRating(String condition) {
    List<Target> targets = new ArrayList<>();
    for (Rating rating : Rating.values()) {
      for (PassRule.Across across : PassRule.Across.values()) {
        for (PassRule.Rounding rounding : PassRule.Rounding.values()) {
          // some are missed, some held, some within their tolerance only
          double value =
              rating == Rating.OVERALL_LINEAR ? 82.8 : rating == Rating.OVERALL_A ? 74.9 : 63.0;
          String id = "t" + targets.size();
          PassRule rule = new PassRule(rounding, targets.size() % 3 == 0 ? 0.5 : 0.0, across);
          targets.add(
              new Target(
                  id,
                  id,
                  condition,
                  List.of("row-9", "row-2", "row-16"),
                  rating,
                  value,
                  0.25,
                  rule,
                  Evidence.NONE,
                  Extras.NONE));
        }
      }
    }
    return targets;
  }

  private static Node spoilt(Node node) {
    if (node instanceof Section section) {
      List<Node> children = section.children().stream().map(Budgets::spoilt).toList();
      return section.withChildren(children);
    }
    Panel panel = (Panel) node;
    if (!panel.id().equals(FAILED)) {
      return panel;
    }
    return new Panel(
        panel.id(),
        HOSTILE,
        panel.count(),
        panel.settings().edit().construction("nowhere").build(),
        null,
        panel.evidence(),
        panel.extras());
  }

  private static OtherSource spoilt(OtherSource source) {
    if (!source.id().equals(PARTIAL)) {
      return source;
    }
    double[] levels = source.levels().best().spectrum().toArray();
    levels[Bands.position(LACKING_BAND)] = Double.NaN;
    JudgedBands judged = JudgedBands.of(BandTable.thirds(BandSpectrum.of(levels)));
    return new OtherSource(
        source.id(),
        "+" + source.name(),
        source.receiver(),
        source.condition(),
        judged,
        source.extras());
  }

  /** Some sheets with every panel's sound split into three ways, but for one panel. */
  static WorkbookContent threeWays(WorkbookContent content, String oneWay) {
    List<ReceiverSheet> sheets = new ArrayList<>();
    for (ReceiverSheet sheet : content.sheets()) {
      List<LedgerRow> rows = new ArrayList<>();
      for (LedgerRow row : sheet.rows()) {
        if (row.way() == Way.ALL) {
          rows.add(row);
          if (row.kind() == RowKind.PANEL || row.kind() == RowKind.SECTION) {
            rows.addAll(ways(sheet, row, oneWay));
          }
        }
      }
      sheets.add(new ReceiverSheet(sheet.condition(), sheet.receiver(), rows, sheet.range()));
    }
    return new WorkbookContent(
        content.vehicle(), sheets, content.targets(), content.findings(), content.traces());
  }

  private static List<LedgerRow> ways(ReceiverSheet sheet, LedgerRow row, String oneWay) {
    if (row.id().equals(oneWay)) {
      return List.of(way(row, Way.BOUNDARY_LAYER, row.meanSquares()));
    }
    List<LedgerRow> ways = new ArrayList<>();
    for (Way way : List.of(Way.BOUNDARY_LAYER, Way.ACOUSTIC, Way.LEAK)) {
      ways.add(way(row, way, BandSpectrum.of(meanSquares(sheet, row, way, oneWay))));
    }
    return ways;
  }

  /** Mean squares of one way below a row, Pa². */
  private static double[] meanSquares(ReceiverSheet sheet, LedgerRow row, Way way, String oneWay) {
    double[] sum = new double[Bands.COUNT];
    if (row.kind() == RowKind.PANEL) {
      double part = row.id().equals(oneWay) ? whole(way) : part(way);
      Arrays.setAll(sum, band -> part * row.meanSquares().value(band));
      return sum;
    }
    for (LedgerRow child : sheet.children(row.id())) {
      double[] below = meanSquares(sheet, child, way, oneWay);
      Arrays.setAll(sum, band -> sum[band] + below[band]);
    }
    return sum;
  }

  private static double whole(Way way) {
    return way == Way.BOUNDARY_LAYER ? 1.0 : 0.0;
  }

  private static double part(Way way) {
    return switch (way) {
      case BOUNDARY_LAYER -> 0.625;
      case ACOUSTIC -> 0.25;
      default -> 0.125;
    };
  }

  private static LedgerRow way(LedgerRow row, Way way, BandSpectrum meanSquares) {
    return new LedgerRow(
        row.id(),
        row.parent(),
        row.depth(),
        row.name(),
        row.kind(),
        way,
        row.choice(),
        meanSquares,
        Judgement.NONE,
        Status.OK,
        "");
  }
}
