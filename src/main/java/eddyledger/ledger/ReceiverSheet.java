package eddyledger.ledger;

import eddyledger.model.OperatingCondition;
import eddyledger.model.Receiver;
import java.util.List;
import java.util.Optional;

/**
 * The ledger of one receiver in one condition.
 *
 * @param condition the operating condition
 * @param receiver the receiver
 * @param rows the total, then sections and panels down the tree (all ways first, then each way),
 *     then other sources; under the chosen models
 * @param range the total under every alternative of the model range
 */
public record ReceiverSheet(
    OperatingCondition condition, Receiver receiver, List<LedgerRow> rows, List<LedgerRow> range) {
  public ReceiverSheet {
    rows = List.copyOf(rows);
    range = List.copyOf(range);
  }

  /** The total under the chosen models. */
  public LedgerRow total() {
    return rows.get(0);
  }

  /** A row by id and way; empty if there is none. */
  public Optional<LedgerRow> row(String id, Way way) {
    return rows.stream().filter(row -> row.id().equals(id) && row.way() == way).findFirst();
  }

  /** The rows that are summed into a row: its children of way {@link Way#ALL}. */
  public List<LedgerRow> children(String id) {
    return rows.stream().filter(row -> row.parent().equals(id) && row.way() == Way.ALL).toList();
  }

  /** The mean squares that come in as flow noise over panels, without other sources, Pa². */
  public Contributed flow() {
    List<LedgerRow> top =
        children(total().id()).stream().filter(row -> row.kind() != RowKind.OTHER).toList();
    return Contributed.of(top);
  }

  /** The mean squares of the other sources together, Pa². */
  public Contributed others() {
    return Contributed.of(rows.stream().filter(row -> row.kind() == RowKind.OTHER).toList());
  }

  /** Names it: receiver and condition. */
  public String title() {
    return receiver.id() + " in " + condition.id();
  }
}
