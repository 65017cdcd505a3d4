package eddyledger.present;

import java.util.List;
import java.util.Optional;

/**
 * The form of the selected row as it stands now. Immutable.
 *
 * @param row id of the row; empty if there is none
 * @param title its name
 * @param trail where it stands: the vehicle and the sections above it
 * @param messages what is said of the row as a whole
 * @param groups groups of fields, in the order sound travels
 * @param traced whether the account of its level can be shown
 */
public record SheetText(
    String row,
    String title,
    String trail,
    List<SheetMessage> messages,
    List<Group> groups,
    boolean traced) {
  /** Nothing is selected. */
  public static final SheetText EMPTY = new SheetText("", "", "", List.of(), List.of(), false);

  public SheetText {
    messages = List.copyOf(messages);
    groups = List.copyOf(groups);
  }

  /**
   * Fields under one heading.
   *
   * @param key stable name
   * @param heading heading
   * @param note what is to be said of all of them; empty if nothing
   * @param grid whether they are many small numbers, laid in four columns
   * @param fields the fields, in reading order
   */
  public record Group(
      String key, String heading, String note, boolean grid, List<SheetField> fields) {
    public Group {
      fields = List.copyOf(fields);
    }
  }

  /** Every field, in reading order. */
  public List<SheetField> fields() {
    return groups.stream().flatMap(group -> group.fields().stream()).toList();
  }

  /** A field by its key. */
  public Optional<SheetField> field(String key) {
    return fields().stream().filter(field -> field.key().equals(key)).findFirst();
  }
}
