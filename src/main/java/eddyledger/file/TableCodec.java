package eddyledger.file;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.check.NearMiss;
import eddyledger.model.BandTable;
import eddyledger.model.BandTable.Resolution;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Octaves;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;

/** Values per band without judgement: a plain number, or an object that says how it is entered. */
final class TableCodec implements RecordCodec<BandTable> {
  static final TableCodec TABLE = new TableCodec();

  static final String BANDS = "bands";
  private static final String FIRST = "first";
  private static final String VALUE = "value";
  private static final String VALUES = "values";
  private static final String WEIGHTING = "weighting";
  private static final String LENGTH = "spectrum-length";

  /** The keys that make up a table. */
  static final List<String> KEYS =
      List.of(BANDS, FIRST, VALUE, VALUES, "quantity", "unit", WEIGHTING);

  private static final List<String> PARTS = List.of(BANDS, FIRST, VALUE, VALUES);

  private TableCodec() {}

  /** The table of a key in its short or its full form; null if it is absent. */
  static BandTable read(JsonValue value) {
    if (value.absent()) {
      return null;
    }
    return value.isObject() ? TABLE.read(value.object()) : plain(value);
  }

  /** A table of one number. */
  static BandTable plain(JsonValue value) {
    Double number = value.number();
    return BandTable.single(number == null ? Double.NaN : number);
  }

  @Override
  public BandTable read(JsonObject object) {
    object.essence(VALUE);
    KEYS.forEach(object::value);
    weighting(object.value(WEIGHTING));
    Resolution resolution = object.choice(BANDS, Resolution.values(), Resolution::text);
    String first = object.text(FIRST);
    List<Double> values = List.of();
    boolean usable = false;
    if (resolution == null) {
      if (object.value(BANDS).absent()) {
        object
            .self()
            .wholeFault(
                "missing-value",
                "It is not said how the bands are given.",
                "Write \"bands\": \"third-octave\", \"octave\" or \"single\".");
      }
      object.self().faults().enoughOf(object.self());
    } else if (resolution == Resolution.SINGLE) {
      first = null;
      values = List.of(object.requiredNumber(VALUE));
      usable = !values.get(0).isNaN();
    } else {
      values = values(object.value(VALUES));
      usable =
          resolution == Resolution.THIRD_OCTAVE
              ? thirds(object.self(), first, values)
              : octaves(object.self(), first, values);
    }
    if (!usable) {
      PARTS.forEach(key -> object.value(key).keep());
      resolution = Resolution.SINGLE;
      first = null;
      values = List.of(Double.NaN);
    }
    String quantity = object.text("quantity");
    String unit = object.text("unit");
    return new BandTable(resolution, first, values, quantity, unit, object.extras());
  }

  private static void weighting(JsonValue weighting) {
    String weighted = weighting.text();
    if (weighted != null && !weighted.equals("none")) {
      weighting.fault(
          "weighting",
          "Band values weighted by " + JsonValue.shownText(weighted) + " cannot be used.",
          "Give unweighted values and write \"none\", or leave it out.");
    }
  }

  private static List<Double> values(JsonValue value) {
    List<Double> values = new ArrayList<>();
    value.items().forEach(item -> values.add(item.number()));
    return values;
  }

  private static boolean thirds(JsonValue self, String first, List<Double> values) {
    boolean fits = Bands.label(0).equals(first) && values.size() == Bands.COUNT;
    if (!fits) {
      String begun = first == null ? "without a first band" : "from " + first + " Hz on";
      self.wholeFault(
          LENGTH,
          "There are " + values.size() + " third-octave values " + begun + ".",
          "Give 28 of them with \"first\": \"25\", and null where a band is missing.");
    }
    return fits;
  }

  private static boolean octaves(JsonValue self, String first, List<Double> values) {
    int position = Octaves.position(first == null ? "" : first);
    if (position < 0) {
      String named = first == null ? "No first octave is named." : "There is no octave " + first;
      self.wholeFault(
          "unknown-word",
          first == null ? named : named + "." + NearMiss.of(first, Octaves.labels()),
          "Write \"first\" as one of " + String.join(", ", Octaves.labels()) + ".");
      return false;
    }
    if (position + values.size() > Octaves.COUNT) {
      self.wholeFault(
          LENGTH,
          values.size() + " octaves from " + first + " Hz on pass 8000 Hz.",
          "Give at most " + (Octaves.COUNT - position) + " values.");
      return false;
    }
    if (values.stream().noneMatch(Objects::nonNull)) {
      self.wholeFault(LENGTH, "There is no value.", "Give at least one octave.");
      return false;
    }
    return true;
  }

  @Override
  public ObjectNode write(BandTable table) {
    return content(table).with(table.extras());
  }

  /** The keys of the table itself. */
  static JsonBuilder content(BandTable table) {
    JsonBuilder builder = new JsonBuilder();
    if (table.resolution() != Resolution.SINGLE) {
      builder.text(BANDS, table.resolution().text()).text(FIRST, table.first());
      builder.numbers(VALUES, table.values());
    } else if (!table.values().get(0).isNaN()) {
      builder.text(BANDS, table.resolution().text()).number(VALUE, table.values().get(0));
    }
    return builder.text("quantity", table.quantity()).text("unit", table.unit());
  }

  /** A plain number where the object says no more; nothing where it says nothing. */
  static JsonNode brief(ObjectNode full) {
    if (full.isEmpty()) {
      return MissingNode.getInstance();
    }
    boolean plain = full.size() == 2 && full.has(VALUE) && full.has(BANDS);
    return plain ? full.get(VALUE) : full;
  }
}
