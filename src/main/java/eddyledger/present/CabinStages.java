package eddyledger.present;

import eddyledger.check.Finding;
import eddyledger.model.ByCondition;
import eddyledger.model.JudgedBands;
import eddyledger.model.Receiver;
import eddyledger.model.Receiver.DirectPath;
import eddyledger.model.Settings;
import eddyledger.model.Zone;
import eddyledger.present.StageSteps.Stage;
import eddyledger.present.TraceNote.Kind;
import eddyledger.quantity.AWeighting;
import java.util.ArrayList;
import java.util.List;

/** Writes the stages in the cabin: zone and receiver. */
final class CabinStages {
  private final TraceSource source;
  private final Receiver receiver;
  private final Zone into;
  private final Zone at;

  CabinStages(TraceSource source) {
    this.source = source;
    receiver = source.trace().receiver();
    into = source.zone();
    at = source.zone(receiver.zone());
  }

  StageText zone() {
    double[] area = source.values("A");
    String passes = into.id().equals(at.id()) ? "" : ", and passes on to " + at.name();
    String sight = direct() ? "; direct sound from " + Readable.length(distance()) : "";
    String metres = StagePicture.range(area, "m²");
    return new StageText(
        "Power meets the absorption of " + into.name() + passes + sight + ".",
        "Zone "
            + source.where().ofFixed(Settings::zone)
            + "; absorption entered"
            + graded(into.absorptionArea()),
        "p^{2} = 4 ρ c W/A, balanced over coupled zones"
            + (sight.isEmpty() ? "" : ", and direct part"),
        "A = "
            + Readable.level(source.value("A"))
            + " m²,  p^{2}/W = "
            + Readable.number(source.value("p²/W"), 3)
            + " Pa²/W,  L_{p} − L_{W} = "
            + Readable.level(source.steps().change(Stage.ZONE, source.band()))
            + " dB",
        StagePicture.bands(area, source.band(), true, metres));
  }

  /** Whether the run counted direct sound; it may refuse a line of sight that was entered. */
  private boolean direct() {
    return source.steps().find("p²/W").orElseThrow().meaning().contains("direct part");
  }

  private double distance() {
    return receiver.direct().stream()
        .filter(path -> path.panel().equals(source.trace().panel().id()))
        .mapToDouble(DirectPath::distance)
        .findFirst()
        .orElse(Double.NaN);
  }

  private String graded(ByCondition<JudgedBands> area) {
    JudgedBands holds = area == null ? null : area.in(source.trace().condition().id());
    return holds == null ? "" : PathStages.graded(holds.evidence());
  }

  StageText receiver() {
    double[] levels = source.levels(Stage.RECEIVER);
    double weight = AWeighting.weights().value(source.band());
    int peak = peak(levels);
    return new StageText(
        receiver.name() + " is in " + at.name() + ". A-weighted.",
        "Receiver from the vehicle",
        "L_{A} = L_{p} + A(f)",
        "A("
            + source.bandName()
            + ") = "
            + Readable.level(weight)
            + " dB,  L_{A} = "
            + Readable.level(levels[source.band()])
            + " dB(A)"
            + (peak < 0 ? "" : ",  highest at " + Readable.band(peak)),
        StagePicture.bands(
            levels,
            source.band(),
            false,
            peak < 0 ? "no value" : "peak " + Readable.level(levels[peak]) + " dB(A)"));
  }

  /** The position of the highest level; -1 if no band has one. */
  private static int peak(double[] levels) {
    int peak = -1;
    for (int band = 0; band < levels.length; band++) {
      boolean higher = peak < 0 || levels[band] > levels[peak];
      peak = Double.isFinite(levels[band]) && higher ? band : peak;
    }
    return peak;
  }

  /** What the zone's description leaves open, and what the run found about the zones. */
  List<TraceNote> notes() {
    List<TraceNote> notes = new ArrayList<>();
    if (source.trace().condition().cabinAir() == null) {
      notes.add(
          new TraceNote(Kind.DEFAULT, "nobody set the cabin's air: 20 °C at the outside pressure"));
    }
    if (into.absorptionArea() != null) {
      PathStages.note(
          notes, "absorption area", into.absorptionArea().in(source.trace().condition().id()));
    }
    for (Finding finding : source.ledger().findings()) {
      for (Zone zone : into.id().equals(at.id()) ? List.of(into) : List.of(into, at)) {
        if (finding.subject().equals(zone.id())) {
          notes.add(new TraceNote(Kind.NOTE, zone.name() + ": " + lower(finding.what())));
        }
      }
      if (finding.subject().equals(receiver.id()) && concerns(finding.what())) {
        notes.add(new TraceNote(Kind.NOTE, receiver.name() + ": " + lower(finding.what())));
      }
    }
    return notes;
  }

  /** Findings about a receiver may name one panel; those about others are of no use here. */
  private boolean concerns(String what) {
    return !what.contains("panel \"")
        || what.contains("panel \"" + source.trace().panel().id() + "\"");
  }

  private static String lower(String sentence) {
    return Character.toLowerCase(sentence.charAt(0)) + sentence.substring(1);
  }
}
