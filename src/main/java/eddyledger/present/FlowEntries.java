package eddyledger.present;

import eddyledger.app.PartSlot;
import eddyledger.app.VaryingSlot;
import eddyledger.check.Limit;
import eddyledger.model.Extras;
import eddyledger.model.Judged;
import eddyledger.model.LayerGiven;
import eddyledger.model.Settings;
import eddyledger.present.NumberIn.Fallback;
import eddyledger.present.SheetField.Weight;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.BiFunction;
import java.util.function.Function;

/** Fields of the flow: local speed and boundary layer. */
final class FlowEntries {
  private static final LayerGiven BLANK = new LayerGiven(null, null, null, null, null, Extras.NONE);

  private final String row;
  private final String condition;

  FlowEntries(SheetContext context) {
    row = context.row();
    condition = context.selection().conditionId();
  }

  /** All of them; a panel shows its speed at the edge of the layer too. */
  List<Entry> all(boolean panel) {
    Entry speed =
        new SpeedEntry(
            new VaryingSlot<>(
                row,
                condition,
                Settings::localSpeed,
                (it, value) -> it.edit().localSpeed(value).build()));
    Entry edge = new ShownEntry("edgeSpeed", "Edge speed", FlowEntries::edgeSpeed);
    List<Entry> layer =
        List.of(
            part(
                new Part(
                    "layerThickness", "Layer thickness", "boundary-layer thickness", "thickness_m"),
                number(Quantity.LAYER, Limit.LAYER_THICKNESS, "delta"),
                LayerGiven::thickness,
                (it, value) -> with(it, 1, value)),
            part(
                new Part("runningLength", "Running length", "running length", "running_length_m"),
                number(Quantity.RUNNING_LENGTH, Limit.RUNNING_LENGTH, ""),
                LayerGiven::runningLength,
                (it, value) -> with(it, 0, value)),
            part(
                new Part(
                    "displacementThickness",
                    "Displacement",
                    "displacement thickness",
                    "displacement_thickness_m"),
                number(Quantity.LAYER, Limit.LAYER_THICKNESS, "delta*"),
                LayerGiven::displacementThickness,
                (it, value) -> with(it, 2, value)),
            part(
                new Part(
                    "momentumThickness", "Momentum", "momentum thickness", "momentum_thickness_m"),
                number(Quantity.LAYER, Limit.LAYER_THICKNESS, "theta"),
                LayerGiven::momentumThickness,
                (it, value) -> with(it, 3, value)),
            part(
                new Part("wallShear", "Wall shear", "wall shear stress", "wall_shear_stress_Pa"),
                number(Quantity.SHEAR, Limit.WALL_SHEAR, "tau_w"),
                LayerGiven::wallShear,
                (it, value) -> with(it, 4, value)));
    List<Entry> all = new ArrayList<>();
    all.add(speed);
    if (panel) {
      all.add(edge);
    }
    all.addAll(layer);
    return all;
  }

  /** Names of a part of the layer. */
  private record Part(String key, String label, String what, String place) {}

  private static JudgedNumber number(Quantity quantity, Limit limit, String symbol) {
    return new JudgedNumber(
        quantity,
        limit,
        true,
        context -> new Fallback(context.traced(symbol), "worked out", !symbol.isEmpty()));
  }

  private Entry part(
      Part part,
      JudgedNumber number,
      Function<LayerGiven, Judged> get,
      BiFunction<LayerGiven, Judged, LayerGiven> put) {
    VaryingSlot<LayerGiven> whole =
        new VaryingSlot<>(
            row,
            condition,
            Settings::boundaryLayer,
            (it, value) -> it.edit().boundaryLayer(value).build());
    return new NumberEntry<>(
        part.key(),
        part.label(),
        part.what(),
        new PartSlot<>(whole, get, put, BLANK, FlowEntries::essence),
        "boundary_layer." + part.place(),
        number);
  }

  private static Object essence(LayerGiven layer) {
    return Arrays.asList(parts(layer));
  }

  private static Judged[] parts(LayerGiven layer) {
    return new Judged[] {
      layer.runningLength(),
      layer.thickness(),
      layer.displacementThickness(),
      layer.momentumThickness(),
      layer.wallShear()
    };
  }

  private static LayerGiven with(LayerGiven layer, int index, Judged value) {
    Judged[] parts = parts(layer);
    parts[index] = value;
    return new LayerGiven(parts[0], parts[1], parts[2], parts[3], parts[4], layer.extras());
  }

  private static FieldBuilder edgeSpeed(FieldBuilder field, SheetContext context) {
    Unit unit = context.unit("edgeSpeed", Quantity.SPEED);
    double speed = context.traced("Ue");
    String text = NumberText.text(speed, Quantity.SPEED, unit, 4);
    return field
        .text(text.isEmpty() ? "—" : text)
        .unit(unit, Quantity.SPEED)
        .origin(context.stale() ? context.pending() : text.isEmpty() ? "" : "worked out", false)
        .weight(Weight.FAINT);
  }
}
