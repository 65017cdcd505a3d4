package eddyledger.present;

import eddyledger.app.ConstructionEdit;
import eddyledger.check.Limit;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Vehicle;
import eddyledger.present.SheetField.Kind;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;

/**
 * The thickness of a panel's plate. Panels share constructions: a change is for this panel only,
 * which then has a construction of its own, unless all of them are asked for.
 */
final class ThicknessEntry extends Entry {
  private static final Quantity QUANTITY = Quantity.THICKNESS;

  ThicknessEntry() {
    super("thickness", "Thickness", "thickness");
  }

  @Override
  SheetField show(SheetContext context) {
    Unit unit = context.unit(key(), QUANTITY);
    FieldBuilder field = new FieldBuilder(this, Kind.NUMBER).unit(unit, QUANTITY);
    Optional<PlateConstruction> plate = ConstructionEdit.of(context.vehicle(), context.row());
    if (plate.isEmpty()) {
      return field.origin("no construction", false).build();
    }
    field.text(NumberText.text(plate.get().thickness(), QUANTITY, unit));
    Optional<PlateConstruction> shared =
        ConstructionEdit.original(context.vehicle(), context.row());
    if (shared.isPresent()) {
      String before = NumberText.text(shared.get().thickness(), QUANTITY, unit);
      return field
          .origin("own, this panel only", true)
          .back("back to " + before + " " + unit.symbol())
          .tip(plate.get().name() + "; the way back leads to " + shared.get().name())
          .build();
    }
    int panels = users(context, plate.get());
    if (panels <= 1) {
      return field.origin(plate.get().name() + ", this panel only", true).build();
    }
    String all = "all " + panels + " panels";
    return field
        .origin(plate.get().name() + ", " + panels + " panels", context.allPanels())
        .link(context.allPanels() ? "Change for this panel only" : "Change for " + all)
        .tip("A change is for " + (context.allPanels() ? all : "this panel only") + ".")
        .build();
  }

  private static int users(SheetContext context, PlateConstruction plate) {
    return ConstructionEdit.panelsOf(context.vehicle(), plate.id()).size();
  }

  @Override
  Outcome take(SheetContext context, String text) {
    NumberText.Read read = NumberText.read(text, QUANTITY, context.unit(key(), QUANTITY));
    if (!read.ok()) {
      return new Outcome.Refusal(read.fault());
    }
    double value = read.value();
    if (!Limit.THICKNESS.holds(value)) {
      return new Outcome.Refusal(
          Words.sentence(Limit.THICKNESS.what(value)) + " " + Limit.THICKNESS.remedy());
    }
    String row = context.row();
    return new Outcome.Change(
        context.allPanels()
            ? vehicle -> ConstructionEdit.thicknessOfAll(vehicle, row, value)
            : vehicle -> ConstructionEdit.thickness(vehicle, row, value));
  }

  @Override
  Optional<UnaryOperator<Vehicle>> back(SheetContext context) {
    String row = context.row();
    return Optional.of(vehicle -> ConstructionEdit.back(vehicle, row));
  }

  @Override
  List<String> places(SheetContext context) {
    return ConstructionEdit.of(context.vehicle(), context.row())
        .map(plate -> "constructions[" + context.vehicle().constructions().indexOf(plate) + "]")
        .map(List::of)
        .orElse(List.of());
  }
}
