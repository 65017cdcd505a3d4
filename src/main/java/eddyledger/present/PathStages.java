package eddyledger.present;

import eddyledger.model.BandTable;
import eddyledger.model.Construction;
import eddyledger.model.Evidence;
import eddyledger.model.JudgedBands;
import eddyledger.model.LayUp;
import eddyledger.model.Panel;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Settings;
import eddyledger.model.TabulatedLayUp;
import eddyledger.present.StageSteps.Stage;
import eddyledger.present.TraceNote.Kind;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/** Writes the stages of the path: the panel's response and radiation, the lay-up. */
final class PathStages {
  private static final String OCTAVES = " from octaves, linear in lg f";

  private final TraceSource source;
  private final Panel panel;

  PathStages(TraceSource source) {
    this.source = source;
    panel = source.trace().panel();
  }

  StageText panel() {
    double[] changes = source.changes(Stage.PANEL);
    StagePicture picture =
        StagePicture.bands(changes, source.band(), false, StagePicture.range(changes, "dB"));
    String change = "L_{W} − L_{p} = " + Readable.level(changes[source.band()]) + " dB";
    return source.measured() ? measured(picture, change) : computed(picture, change);
  }

  private StageText computed(StagePicture picture, String change) {
    String size = Readable.size(source.value("a"), source.value("b"));
    int modes = (int) source.value("modes");
    return new StageText(
        pieces() + construction() + ", " + size + ".",
        origins(),
        "W = n p^{2} Σ_{modes} acceptance · radiation · resonance",
        "f_{1} = "
            + Readable.frequency(source.value("f1"))
            + ",  f_{c} = "
            + Readable.frequency(source.value("fc"))
            + ",  η = "
            + Readable.plain(source.value("eta"))
            + ",  "
            + modes
            + (modes == 1 ? " mode,  " : " modes,  ")
            + change,
        picture);
  }

  private String pieces() {
    return panel.count() == 1 ? "One piece of " : panel.count() + " pieces of ";
  }

  private String construction() {
    Construction construction = find();
    String thickness =
        construction instanceof PlateConstruction plate ? Readable.length(plate.thickness()) : "";
    String name = construction.name();
    return name.contains(thickness) ? name : name + " " + thickness;
  }

  private Construction find() {
    String id = source.where().fixed(Settings::construction).orElseThrow();
    return source.vehicle().constructions().stream()
        .filter(it -> it.id().equals(id))
        .findFirst()
        .orElseThrow();
  }

  private String origins() {
    Map<String, List<String>> names = new LinkedHashMap<>();
    origin(names, "construction", source.where().ofFixed(Settings::construction));
    origin(names, "size", source.where().ofFixed(Settings::length));
    if (!source.where().ofFixed(Settings::width).equals(source.where().ofFixed(Settings::length))) {
      origin(names, "width", source.where().ofFixed(Settings::width));
    }
    origin(
        names,
        "loss factor",
        source.where().ofVarying(Settings::lossFactor)
            + source
                .where()
                .varying(Settings::lossFactor)
                .map(it -> graded(it.evidence()))
                .orElse(""));
    return Readable.capital(
        names.entrySet().stream()
            .map(entry -> String.join(" and ", entry.getValue()) + " " + entry.getKey())
            .collect(Collectors.joining("; ")));
  }

  private static void origin(Map<String, List<String>> names, String name, String where) {
    names.computeIfAbsent(where, it -> new ArrayList<>()).add(name);
  }

  private StageText measured(StagePicture picture, String change) {
    JudgedBands difference = panel.measured().levelDifference();
    double value = difference.best().spectrum().value(source.band());
    String piece = panel.count() == 1 ? "one piece." : panel.count() + " pieces.";
    return new StageText(
        "Measured level difference between wall and zone, " + piece,
        "Measurement set here" + graded(difference.evidence()),
        "W = n p^{2} 10^{−D/10} A/(4 ρ c)",
        "D = " + Readable.level(value) + " dB in the band " + source.bandName() + ",  " + change,
        picture);
  }

  /** Evidence grade in brackets; empty if none is stated. */
  static String graded(Evidence evidence) {
    return evidence.grade() == null ? "" : " (" + evidence.grade().text() + ")";
  }

  private static Evidence loss(LayUp layUp) {
    return layUp instanceof TabulatedLayUp table ? table.insertionLoss().evidence() : Evidence.NONE;
  }

  StageText layUp() {
    double[] loss = source.values("IL");
    if (source.measured()) {
      return bare("Held by the measurement, so not taken off again.", "held by the measurement");
    }
    Optional<LayUp> layUp = found();
    if (layUp.isEmpty()) {
      return bare("None: the panel radiates straight into the zone.", "no lay-up");
    }
    return new StageText(
        layUp.get().name() + ".",
        "Lay-up "
            + source.where().ofFixed(Settings::layUp)
            + "; insertion loss"
            + graded(loss(layUp.get())),
        "L_{W} after = L_{W} before − IL",
        "IL = " + Readable.level(source.value("IL")) + " dB in the band " + source.bandName(),
        StagePicture.bands(loss, source.band(), true, StagePicture.range(loss, "dB")));
  }

  private StageText bare(String sentence, String picture) {
    return new StageText(sentence, "", "", "", StagePicture.none(picture));
  }

  private Optional<LayUp> found() {
    String id = source.where().fixed(Settings::layUp).orElse(Settings.NO_LAY_UP);
    return source.vehicle().layUps().stream().filter(it -> it.id().equals(id)).findFirst();
  }

  /** Band tables of the panel that were entered as octaves; the trace does not tell of these. */
  List<TraceNote> interpolated() {
    List<TraceNote> notes = new ArrayList<>();
    if (source.measured()) {
      note(notes, "level difference", panel.measured().levelDifference());
      note(notes, "absorption area of the measurement", panel.measured().absorptionArea());
    } else {
      note(notes, "loss factor", source.where().varying(Settings::lossFactor).orElse(null));
    }
    return notes;
  }

  /** A note on a band table that was entered as octaves. */
  static void note(List<TraceNote> notes, String name, JudgedBands table) {
    if (table != null && Optional.of(table.best()).filter(BandTable::interpolated).isPresent()) {
      notes.add(new TraceNote(Kind.INTERPOLATED, name + OCTAVES));
    }
  }
}
