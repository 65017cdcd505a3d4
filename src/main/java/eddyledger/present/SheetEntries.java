package eddyledger.present;

import eddyledger.app.RowEdit;
import eddyledger.check.Limit;
import eddyledger.model.Node;
import eddyledger.model.OtherSource;
import eddyledger.model.Panel;
import eddyledger.model.TreeEdit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Which fields the selected row has, in the order sound travels. */
final class SheetEntries {
  /**
   * Fields under one heading.
   *
   * @param key stable name
   * @param heading heading
   * @param note what is to be said of all; empty if nothing
   * @param grid whether they are many small numbers
   * @param entries the fields
   */
  record Group(String key, String heading, String note, boolean grid, List<Entry> entries) {}

  private final SheetContext context;
  private final List<Group> groups = new ArrayList<>();

  private SheetEntries(SheetContext context) {
    this.context = context;
  }

  /** The groups of a row; none if there is no such row. */
  static List<Group> of(SheetContext context) {
    return new SheetEntries(context).groups();
  }

  private List<Group> groups() {
    String row = context.row();
    if (context.vehicle().id().equals(row)) {
      vehicle();
      return groups;
    }
    Optional<OtherSource> source = RowEdit.source(context.vehicle(), row);
    Optional<Node> node = TreeEdit.find(context.vehicle(), row).map(path -> path.node());
    if (source.isPresent()) {
      source(new SourceEntries(source.get()));
    } else if (node.isPresent()) {
      node(node.get());
    }
    return groups;
  }

  private void vehicle() {
    add(
        "vehicle",
        "Vehicle",
        List.of(
            new NameEntry(),
            new DirectNumber("tightBand", "Tight band", "tight band", Quantity.LEVEL, Limit.RESERVE)
                .on(
                    now -> now.vehicle().tightBandOrDefault(),
                    (vehicle, value) -> vehicle.edit().tightBand(value).build())
                .at(vehicle -> List.of("vehicle.tight_band_dB"))));
    add("budget", "Target, " + where(), new BudgetEntries(context).targets());
    settings(false, "Holds in the whole vehicle unless set again below.");
  }

  private void node(Node node) {
    boolean measured = node instanceof Panel it && it.measured() != null;
    String panelNote =
        measured
            ? "A measured level difference stands for build and lay-up; they do not change the level."
            : "";
    boolean panel = node instanceof Panel;
    settings(panel, panel ? panelNote : "Holds below this section unless set again there.");
    add("budget", "Allowance, " + where(), new BudgetEntries(context).allowance());
    add("supplier", "Supplier", new BuildEntries(context).supplier());
  }

  private void settings(boolean panel, String note) {
    BuildEntries build = new BuildEntries(context);
    boolean vehicle = context.vehicle().id().equals(context.row());
    List<Entry> built = new ArrayList<>();
    if (!panel && !vehicle) {
      built.add(new NameEntry());
    }
    built.addAll(panel ? build.ofPanel() : build.below());
    groups.add(new Group("build", "Size and build", note, false, List.copyOf(built)));
    add("flow", "Flow", new FlowEntries(context).all(panel));
    add("wallPressure", "Wall pressure", new WallPressureEntries(context).all());
    add("path", "Path and zone", build.path());
    if (vehicle) {
      add("supplier", "Supplier", build.supplier());
    }
  }

  private void source(SourceEntries source) {
    add("name", "Other source", List.of(new NameEntry()));
    groups.add(new Group("bands", "Band levels, dB", source.note(), true, source.bands()));
    add("budget", "Level, " + where(), List.of(new BudgetEntries(context).level()));
    add("evidence", "Evidence", source.evidence());
  }

  private void add(String key, String heading, List<Entry> entries) {
    groups.add(new Group(key, heading, "", false, List.copyOf(entries)));
  }

  private String where() {
    return context.receiverName() + ", " + context.conditionName();
  }
}
