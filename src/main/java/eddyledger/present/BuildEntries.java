package eddyledger.present;

import eddyledger.app.ConstructionEdit;
import eddyledger.app.FixedSlot;
import eddyledger.app.RowEdit;
import eddyledger.app.Slot;
import eddyledger.app.VaryingSlot;
import eddyledger.check.Limit;
import eddyledger.model.JudgedBands;
import eddyledger.model.Panel;
import eddyledger.model.Settings;
import eddyledger.model.TreeEdit;
import eddyledger.model.Vehicle;
import eddyledger.present.ChoiceEntry.ChoiceIn;
import eddyledger.present.SheetField.Option;
import eddyledger.present.SheetField.Weight;
import java.util.ArrayList;
import java.util.List;
import java.util.function.BiFunction;
import java.util.function.Function;

/** Fields of size and build, path, zone and supplier. */
final class BuildEntries {
  private final String row;
  private final String condition;

  BuildEntries(SheetContext context) {
    row = context.row();
    condition = context.selection().conditionId();
  }

  private <T> Slot<T> fixed(Function<Settings, T> get, BiFunction<Settings, T, Settings> put) {
    return new FixedSlot<>(row, get, put);
  }

  /** What a panel is built of. */
  List<Entry> ofPanel() {
    List<Entry> entries = new ArrayList<>(List.of(new NameEntry(), count()));
    entries.addAll(size());
    entries.add(construction());
    entries.add(new ThicknessEntry());
    entries.add(new ShownEntry("surfaceMass", "Surface mass", BuildEntries::surfaceMass));
    entries.add(lossFactor());
    return entries;
  }

  /** What holds below a section or in the whole vehicle. */
  List<Entry> below() {
    List<Entry> entries = new ArrayList<>(size());
    entries.add(construction());
    entries.add(lossFactor());
    return entries;
  }

  private Entry count() {
    return new DirectNumber("count", "Pieces alike", "count", Quantity.COUNT, Limit.COUNT)
        .on(
            context -> (double) panel(context.vehicle()).count(),
            (vehicle, value) -> RowEdit.count(vehicle, row, value.intValue()))
        .at(vehicle -> List.of(FindingPlaces.ofRow(vehicle, row) + ".count"));
  }

  private Panel panel(Vehicle vehicle) {
    return (Panel) TreeEdit.find(vehicle, row).orElseThrow().node();
  }

  private List<Entry> size() {
    PlainNumber number = new PlainNumber(Quantity.SIZE, Limit.SIZE);
    Slot<Double> length =
        fixed(Settings::length, (it, value) -> it.edit().size(value, it.width()).build());
    Slot<Double> width =
        fixed(Settings::width, (it, value) -> it.edit().size(it.length(), value).build());
    return List.of(
        new NumberEntry<>("length", "Length in flow", "length", length, "length_m", number),
        new NumberEntry<>("width", "Width across", "width", width, "width_m", number));
  }

  private Entry construction() {
    FixedSlot<String> plain =
        new FixedSlot<>(
            row, Settings::construction, (it, id) -> it.edit().construction(id).build());
    return choice(
        "construction",
        "Construction",
        new ConstructionSlot(plain),
        "construction",
        vehicle -> options(vehicle.constructions(), it -> it.id(), it -> it.name()));
  }

  private static FieldBuilder surfaceMass(FieldBuilder field, SheetContext context) {
    double mass =
        ConstructionEdit.of(context.vehicle(), context.row())
            .map(plate -> plate.surfaceMass())
            .orElse(Double.NaN);
    return field
        .text(
            Double.isNaN(mass)
                ? "—"
                : NumberText.text(mass, Quantity.SURFACE_MASS, Unit.SURFACE_MASS, 4))
        .unit(Unit.SURFACE_MASS, Quantity.SURFACE_MASS)
        .origin(Double.isNaN(mass) ? "" : "worked out", false)
        .weight(Weight.FAINT);
  }

  private Entry lossFactor() {
    Slot<JudgedBands> slot =
        new VaryingSlot<>(
            row,
            condition,
            Settings::lossFactor,
            (it, value) -> it.edit().lossFactor(value).build());
    return new NumberEntry<>(
        "lossFactor", "Loss factor", "loss factor", slot, "loss_factor", new LossFactorNumber());
  }

  /** Lay-up and zone. */
  List<Entry> path() {
    Slot<String> layUp = fixed(Settings::layUp, (it, id) -> it.edit().layUp(id).build());
    Slot<String> zone = fixed(Settings::zone, (it, id) -> it.edit().zone(id).build());
    return List.of(
        choice("layUp", "Lay-up", layUp, "lay_up", BuildEntries::layUps),
        choice(
            "zone",
            "Zone",
            zone,
            "zone",
            vehicle -> options(vehicle.zones(), it -> it.id(), it -> it.name())));
  }

  private static List<Option> layUps(Vehicle vehicle) {
    List<Option> options = new ArrayList<>();
    options.add(new Option(Settings.NO_LAY_UP, "None, bare panel"));
    options.addAll(options(vehicle.layUps(), it -> it.id(), it -> it.name()));
    return options;
  }

  /** Who answers for it. */
  List<Entry> supplier() {
    Slot<String> supplier = fixed(Settings::supplier, (it, id) -> it.edit().supplier(id).build());
    return List.of(
        choice(
            "supplier",
            "Answers for it",
            supplier,
            "supplier",
            vehicle -> options(vehicle.suppliers(), it -> it.id(), it -> it.name())));
  }

  private static Entry choice(
      String key,
      String label,
      Slot<String> slot,
      String place,
      Function<Vehicle, List<Option>> options) {
    String otherwise = key.equals("layUp") ? Settings.NO_LAY_UP : "";
    String what = key.equals("layUp") ? "lay-up" : key;
    return new ChoiceEntry<>(
        key,
        label,
        what,
        slot,
        place,
        new ChoiceIn<>(Function.identity(), (old, id) -> id, options, otherwise));
  }

  private static <T> List<Option> options(
      List<T> things, Function<T, String> id, Function<T, String> name) {
    return things.stream()
        .map(it -> new Option(id.apply(it), name.apply(it) == null ? id.apply(it) : name.apply(it)))
        .toList();
  }
}
