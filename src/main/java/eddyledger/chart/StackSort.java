package eddyledger.chart;

import eddyledger.chart.StackFill.Kind;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.RowKind;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Sorts the rows of a sheet into the parts of the stack. */
final class StackSort {
  private static final Comparator<Draft> LARGEST_FIRST =
      Comparator.comparingDouble(draft -> -draft.energyA());

  private final SheetTree tree;
  private final LedgerRow focus;
  private final String selectedId;

  /** Rows that make a part together; none of them lies below another. */
  private record Draft(List<LedgerRow> tops, String label, StackFill fill) {
    double energyA() {
      return Energies.knownA(Energies.sum(tops));
    }
  }

  StackSort(SheetTree tree, LedgerRow focus, String selectedId) {
    this.tree = tree;
    this.focus = focus;
    this.selectedId = selectedId;
  }

  /** The parts, bottom to top. */
  List<StackPart> parts() {
    List<Draft> drafts = new ArrayList<>(focusParts());
    List<LedgerRow> outside = outside();
    if (!outside.isEmpty()) {
      drafts.add(new Draft(outside, "all other panels", StackFill.of(Kind.ELSEWHERE)));
    }
    drafts.addAll(others());
    double total = drafts.stream().mapToDouble(Draft::energyA).sum();
    return drafts.stream().map(draft -> part(draft, total)).toList();
  }

  private StackPart part(Draft draft, double total) {
    var ids = tree.known(draft.tops());
    double energyA = draft.energyA();
    return new StackPart(
        ids,
        draft.label(),
        draft.fill(),
        Energies.sum(draft.tops()),
        energyA,
        total > 0.0 ? energyA / total : 0.0,
        ids.contains(selectedId));
  }

  private List<Draft> focusParts() {
    List<LedgerRow> children = byEnergy(panelsAndSections(focus.id()));
    List<LedgerRow> leaks = children.stream().filter(tree::leak).toList();
    List<LedgerRow> own = children.stream().filter(row -> !tree.leak(row)).toList();
    List<Draft> drafts = new ArrayList<>();
    int coloured = Math.min(StackFill.SERIES, own.size());
    for (int i = 0; i < coloured; i++) {
      List<LedgerRow> one = List.of(own.get(i));
      drafts.add(new Draft(one, name(own.get(i)), new StackFill(Kind.SERIES, i)));
    }
    if (!leaks.isEmpty()) {
      drafts.add(together(leaks, "leaks of " + focus.name(), StackFill.of(Kind.LEAK)));
    }
    drafts.sort(LARGEST_FIRST);
    List<LedgerRow> rest = own.subList(coloured, own.size());
    if (!rest.isEmpty()) {
      drafts.add(together(rest, "more of " + focus.name(), StackFill.of(Kind.REMAINDER)));
    }
    return drafts;
  }

  /** What lies beside the way from the section looked at up to the total. */
  private List<LedgerRow> outside() {
    List<LedgerRow> outside = new ArrayList<>();
    LedgerRow below = focus;
    while (below.kind() != RowKind.TOTAL) {
      String within = below.id();
      for (LedgerRow row : panelsAndSections(below.parent())) {
        if (!row.id().equals(within)) {
          outside.add(row);
        }
      }
      below = tree.rowOrTotal(below.parent());
    }
    return outside;
  }

  private List<Draft> others() {
    List<LedgerRow> sources =
        tree.children(tree.total().id()).stream()
            .filter(row -> row.kind() == RowKind.OTHER && Energies.known(row))
            .toList();
    int alone = sources.size() <= StackFill.OTHERS ? sources.size() : StackFill.OTHERS - 1;
    List<LedgerRow> largest = byEnergy(sources).subList(0, alone);
    List<Draft> drafts = new ArrayList<>();
    // patterns go by the order of the ledger, so that a source keeps its own
    for (LedgerRow source : sources) {
      if (largest.contains(source)) {
        StackFill fill = new StackFill(Kind.OTHER, drafts.size());
        drafts.add(new Draft(List.of(source), source.name(), fill));
      }
    }
    drafts.sort(LARGEST_FIRST);
    List<LedgerRow> rest = sources.stream().filter(row -> !largest.contains(row)).toList();
    if (!rest.isEmpty()) {
      StackFill last = new StackFill(Kind.OTHER, StackFill.OTHERS - 1);
      drafts.add(together(rest, "more other sources", last));
    }
    return drafts;
  }

  private Draft together(List<LedgerRow> rows, String words, StackFill fill) {
    String label = rows.size() == 1 ? name(rows.get(0)) : rows.size() + " " + words;
    return new Draft(rows, label, fill);
  }

  private String name(LedgerRow row) {
    return ShortName.within(row.name(), focus.name());
  }

  private List<LedgerRow> panelsAndSections(String parent) {
    return tree.children(parent).stream()
        .filter(row -> row.kind() != RowKind.OTHER && Energies.known(row) && !tree.empty(row))
        .toList();
  }

  private static List<LedgerRow> byEnergy(List<LedgerRow> rows) {
    return rows.stream()
        .sorted(Comparator.comparingDouble(row -> -Energies.knownA(row.meanSquares())))
        .toList();
  }
}
