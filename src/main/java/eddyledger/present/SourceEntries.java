package eddyledger.present;

import eddyledger.app.RowEdit;
import eddyledger.check.Limit;
import eddyledger.model.BandTable;
import eddyledger.model.BandTable.Resolution;
import eddyledger.model.Evidence;
import eddyledger.model.JudgedBands;
import eddyledger.model.OtherSource;
import eddyledger.model.Vehicle;
import eddyledger.quantity.Bands;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** Fields of an other source: its band levels and their evidence. */
final class SourceEntries {
  private final String row;
  private final OtherSource source;

  SourceEntries(OtherSource source) {
    this.row = source.id();
    this.source = source;
  }

  private boolean perBand() {
    return source.levels() != null
        && source.levels().best().resolution() == Resolution.THIRD_OCTAVE
        && source.levels().best().values().size() == Bands.COUNT;
  }

  /** The 28 levels; none if they were entered otherwise. */
  List<Entry> bands() {
    List<Entry> entries = new ArrayList<>();
    for (int band = 0; perBand() && band < Bands.COUNT; band++) {
      entries.add(band(band));
    }
    return entries;
  }

  private Entry band(int band) {
    String label = Bands.label(band);
    String brief = label.endsWith("000") ? label.substring(0, label.length() - 3) + "k" : label;
    if (label.length() > 3 && !label.endsWith("000") && label.indexOf('.') < 0) {
      brief = Double.parseDouble(label) / 1000.0 + "k";
    }
    return new DirectNumber(
            "band." + label, brief, "level at " + label + " Hz", Quantity.LEVEL, Limit.LEVEL)
        .on(
            context -> value(context.vehicle(), band),
            (vehicle, level) -> RowEdit.bandLevel(vehicle, row, band, level))
        .at(
            vehicle ->
                List.of(FindingPlaces.ofRow(vehicle, row) + ".levels_dB.values[" + band + "]"));
  }

  private Double value(Vehicle vehicle, int band) {
    return RowEdit.source(vehicle, row)
        .map(OtherSource::levels)
        .map(JudgedBands::best)
        .map(BandTable::values)
        .map(values -> values.get(band))
        .orElse(null);
  }

  /** How the levels were entered, where it is not per band. */
  String note() {
    if (source.levels() == null) {
      return "No levels are given.";
    }
    BandTable table = source.levels().best();
    return switch (table.resolution()) {
      case SINGLE ->
          table.values().isEmpty()
              ? "No levels are given."
              : "One number for all bands: " + text(table.values().get(0)) + " dB.";
      case OCTAVE ->
          "Entered in octaves from "
              + table.first()
              + " Hz on: "
              + String.join(", ", table.values().stream().map(SourceEntries::text).toList())
              + " dB. Octave levels are not split into thirds.";
      case THIRD_OCTAVE -> perBand() ? "" : "There are not " + Bands.COUNT + " levels.";
    };
  }

  private static String text(Double value) {
    return value == null ? "missing" : NumberText.text(value, Quantity.LEVEL, Unit.DECIBEL);
  }

  /** Where the levels come from. */
  List<Entry> evidence() {
    return List.of(
        shown(
            "grade",
            "Grade",
            evidence -> Optional.ofNullable(evidence.grade()).map(it -> it.text())),
        shown(
            "valueKind",
            "Kind of value",
            evidence -> Optional.ofNullable(evidence.kind()).map(it -> it.text())),
        shown("source", "Source", evidence -> Optional.ofNullable(evidence.source())));
  }

  private Entry shown(String key, String label, Function<Evidence, Optional<String>> part) {
    String text =
        Optional.ofNullable(source.levels())
            .map(JudgedBands::evidence)
            .flatMap(part)
            .orElse("not stated");
    return new ShownEntry(
        key, label, (field, context) -> field.text(Words.sentence(text)).tip(text));
  }
}
