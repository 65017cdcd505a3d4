package eddyledger.chart;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Status;
import java.util.List;
import java.util.Optional;

/**
 * The parts of the stack picture for a selected row, bottom to top: the children of the section
 * looked at by energy, its smaller children together, all other panels, other sources. Together
 * they are the total. Rows without any value are in no part, and the whole is then partial.
 */
public final class StackParts {
  private final SheetTree tree;
  private final LedgerRow focus;
  private final LedgerRow selected;
  private final List<StackPart> parts;

  private StackParts(SheetTree tree, LedgerRow focus, LedgerRow selected, List<StackPart> parts) {
    this.tree = tree;
    this.focus = focus;
    this.selected = selected;
    this.parts = List.copyOf(parts);
  }

  /**
   * The parts for a selected row. The section looked at is the selected section, the one above a
   * selected panel, else the whole vehicle.
   *
   * @param selectedId id of the selected row; an id that is not in the sheet stands for the total
   */
  public static StackParts of(ReceiverSheet sheet, String selectedId) {
    SheetTree tree = new SheetTree(sheet);
    LedgerRow selected = tree.rowOrTotal(selectedId);
    LedgerRow focus =
        switch (selected.kind()) {
          case SECTION -> selected;
          case PANEL -> tree.rowOrTotal(selected.parent());
          case OTHER, TOTAL -> sheet.total();
        };
    return new StackParts(tree, focus, selected, new StackSort(tree, focus, selected.id()).parts());
  }

  /** The parts, bottom to top. */
  public List<StackPart> parts() {
    return parts;
  }

  /** The part that holds a row; empty if it has no value or is spread over several parts. */
  public Optional<StackPart> partOf(String rowId) {
    return parts.stream().filter(part -> part.rowIds().contains(rowId)).findFirst();
  }

  /** The row whose children stand by themselves: a section, or the total. */
  public LedgerRow focus() {
    return focus;
  }

  /** The outline of the selected row; empty for the total and for a row without a value. */
  public Optional<StackOutline> outline() {
    if (selected.kind() == RowKind.TOTAL || !Energies.known(selected)) {
      return Optional.empty();
    }
    int at = 0;
    if (selected.kind() != RowKind.SECTION) {
      StackPart part = partOf(selected.id()).orElseThrow();
      at = parts.indexOf(part);
    } else if (tree.empty(selected)) {
      return Optional.empty();
    }
    String label = ShortName.within(selected.name(), focus.name());
    double energyA = Energies.knownA(selected.meanSquares());
    return Optional.of(new StackOutline(label, at, selected.meanSquares(), energyA));
  }

  /** Sum of the A-weighted energies of all parts over the bands that have a value, Pa². */
  public double energyA() {
    return parts.stream().mapToDouble(StackPart::energyA).sum();
  }

  /** Whether something is missing, so that the heights are lower bounds. */
  public boolean partial() {
    return tree.total().status() != Status.OK;
  }

  /** What is missing, as "without the missing Crown of Station E"; empty if nothing is. */
  public String missing() {
    return partial() ? MissingWords.of(tree) : "";
  }
}
