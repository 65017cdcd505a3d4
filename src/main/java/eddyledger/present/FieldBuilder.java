package eddyledger.present;

import eddyledger.ledger.State;
import eddyledger.present.SheetField.Kind;
import eddyledger.present.SheetField.Only;
import eddyledger.present.SheetField.Option;
import eddyledger.present.SheetField.Weight;
import java.util.List;

/** Puts a field of the sheet together. */
final class FieldBuilder {
  private final String key;
  private final String label;
  private final String spoken;
  private final Kind kind;
  private String text = "";
  private String chosen = "";
  private List<Option> options = List.of();
  private String unit = "";
  private List<String> units = List.of();
  private String origin = "";
  private boolean own;
  private String back = "";
  private SheetMessage message;
  private String tip = "";
  private String link = "";
  private Only only = Only.NEVER;
  private State state;
  private Weight weight = Weight.PLAIN;

  FieldBuilder(Entry entry, Kind kind) {
    this(entry.key(), entry.label(), Words.sentence(entry.what()), kind);
  }

  private FieldBuilder(String key, String label, String spoken, Kind kind) {
    this.key = key;
    this.label = label;
    this.spoken = spoken;
    this.kind = kind;
  }

  /** A changeable copy. */
  static FieldBuilder of(SheetField field) {
    FieldBuilder copy = new FieldBuilder(field.key(), field.label(), field.spoken(), field.kind());
    copy.text = field.text();
    copy.chosen = field.chosen();
    copy.options = field.options();
    copy.unit = field.unit();
    copy.units = field.units();
    copy.origin = field.origin();
    copy.own = field.own();
    copy.back = field.back();
    copy.message = field.message();
    copy.tip = field.tip();
    copy.link = field.link();
    copy.only = field.only();
    copy.state = field.state();
    copy.weight = field.weight();
    return copy;
  }

  FieldBuilder text(String value) {
    text = value;
    return this;
  }

  FieldBuilder choice(String id, List<Option> offered) {
    chosen = id;
    options = offered;
    text =
        offered.stream().filter(it -> it.id().equals(id)).map(Option::name).findFirst().orElse(id);
    return this;
  }

  FieldBuilder unit(Unit shown, Quantity quantity) {
    unit = shown.symbol();
    boolean several = quantity.units().size() > 1;
    units = several ? quantity.units().stream().map(Unit::symbol).toList() : List.of();
    return this;
  }

  FieldBuilder origin(String words, boolean here) {
    origin = words;
    own = here;
    return this;
  }

  FieldBuilder back(String words) {
    back = words;
    return this;
  }

  FieldBuilder message(SheetMessage value) {
    message = SheetMessage.graver(message, value);
    return this;
  }

  FieldBuilder tip(String value) {
    tip = value;
    return this;
  }

  FieldBuilder link(String words) {
    link = words;
    return this;
  }

  FieldBuilder only(Only value) {
    only = value;
    return this;
  }

  FieldBuilder state(State value) {
    state = value;
    return this;
  }

  FieldBuilder weight(Weight value) {
    weight = value;
    return this;
  }

  SheetField build() {
    return new SheetField(
        key, label, spoken, kind, text, chosen, options, unit, units, origin, own, back, message,
        tip, link, only, state, weight);
  }
}
