package eddyledger.present;

import eddyledger.app.RowEdit;
import eddyledger.present.SheetField.Kind;

/** The name of a row. */
final class NameEntry extends Entry {
  private static final int LONGEST = 200;

  NameEntry() {
    super("name", "Name", "name");
  }

  @Override
  SheetField show(SheetContext context) {
    return new FieldBuilder(this, Kind.TEXT)
        .text(SheetRow.name(context.vehicle(), context.row()))
        .origin("", true)
        .build();
  }

  @Override
  Outcome take(SheetContext context, String text) {
    String name = text.strip();
    if (name.isEmpty()) {
      return new Outcome.Refusal("Give it a name.");
    }
    if (name.length() > LONGEST) {
      return new Outcome.Refusal("A name has at most " + LONGEST + " characters.");
    }
    String row = context.row();
    return new Outcome.Change(vehicle -> RowEdit.rename(vehicle, row, name));
  }
}
