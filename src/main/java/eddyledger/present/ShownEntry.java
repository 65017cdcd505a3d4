package eddyledger.present;

import eddyledger.present.SheetField.Kind;
import java.util.function.BiFunction;

/** A value that follows from others. */
final class ShownEntry extends Entry {
  private final BiFunction<FieldBuilder, SheetContext, FieldBuilder> fill;

  ShownEntry(String key, String label, BiFunction<FieldBuilder, SheetContext, FieldBuilder> fill) {
    super(key, label, label);
    this.fill = fill;
  }

  @Override
  SheetField show(SheetContext context) {
    return fill.apply(new FieldBuilder(this, Kind.SHOWN), context).build();
  }
}
