package eddyledger.present;

import eddyledger.ledger.PictureCurves;
import eddyledger.model.CrossSpectrumChoice;
import eddyledger.model.Settings;
import eddyledger.present.StageSteps.Stage;
import eddyledger.present.TraceNote.Kind;
import eddyledger.quantity.Bands;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

/** Writes the stages of the pressure on the wall: its spectrum at a point, its cross-spectrum. */
final class PressureStages {
  private static final int POINTS = 81;
  private static final String AFTER = ", after ";

  private final TraceSource source;

  PressureStages(TraceSource source) {
    this.source = source;
  }

  StageText wall() {
    double[] levels = source.levels(Stage.WALL);
    return new StageText(
        model() + " spectrum at a point, summed over each band.",
        "Model "
            + source.where().ofVarying(Settings::wallPressure)
            + source
                .where()
                .varying(Settings::wallPressure)
                .map(it -> PathStages.graded(it.evidence()))
                .orElse(""),
        "p^{2} = ∫ G_{pp}(f) df over the band",
        "L_{p} = "
            + Readable.level(levels[source.band()])
            + " dB in the band "
            + source.bandName()
            + ",  G_{pp} = "
            + Readable.number(source.value("Gpp"), 3)
            + " Pa²/Hz",
        StagePicture.bands(levels, source.band(), false, StagePicture.range(levels, "dB")));
  }

  private String model() {
    String meaning = source.steps().find("Gpp").orElseThrow().meaning();
    return meaning.substring(meaning.lastIndexOf(AFTER) + AFTER.length());
  }

  StageText cross() {
    if (source.measured()) {
      return new StageText(
          "Not needed: the panel is given by measurement.",
          "",
          "",
          "",
          StagePicture.none("held by the measurement"));
    }
    int along = (int) source.value("order_along");
    int across = (int) source.value("order_across");
    String length = "ℓ_{x} = " + Readable.length(length("alpha_along"));
    return new StageText(
        "Corcos of order " + along + " along and " + across + " across the flow.",
        origin(),
        "Γ = f_{" + along + "}(ξ/ℓ_{x}) f_{" + across + "}(η/ℓ_{y}),  ℓ = U_{c}/(α ω)",
        "U_{c} = "
            + Readable.plain(source.value("Uc/Ue"))
            + " U_{e} = "
            + Readable.speed(source.value("Uc"))
            + ",  "
            + length
            + ",  ℓ_{y} = "
            + Readable.length(length("alpha_across"))
            + " at "
            + source.bandName(),
        decay(along, across));
  }

  private String origin() {
    String orders = source.where().ofVarying(Settings::crossSpectrum);
    String ratio = source.where().ofVarying(Settings::convectionRatio);
    return orders.equals(ratio)
        ? "Orders, decay rates and convection ratio " + ratio
        : "Orders and decay rates " + orders + "; convection ratio " + ratio;
  }

  /** Convection speed over decay rate and angular frequency, m, in the followed band. */
  private double length(String decay) {
    double omega = 2.0 * Math.PI * Bands.centre(source.band());
    return source.value("Uc") / (source.value(decay) * omega);
  }

  private StagePicture decay(int along, int across) {
    double reach = rounded(2.0 * length("alpha_along"));
    double[] distances =
        IntStream.range(0, POINTS).mapToDouble(i -> i * reach / (POINTS - 1)).toArray();
    double speed = source.value("Uc");
    double frequency = Bands.centre(source.band());
    double[] flow =
        PictureCurves.coherence(along, source.value("alpha_along"), speed, frequency, distances);
    double[] side =
        PictureCurves.coherence(across, source.value("alpha_across"), speed, frequency, distances);
    return new StagePicture(
        StagePicture.Kind.CURVES,
        distances,
        List.of(flow, side),
        List.of("along the flow", "across"),
        -1,
        -0.1,
        1.0,
        "0",
        "distance",
        Readable.length(reach));
  }

  /** The length rounded up to one, two or five times a power of ten. */
  static double rounded(double length) {
    double power = Math.pow(10.0, Math.floor(Math.log10(length)));
    double part = length / power;
    return power * (part <= 1.0 ? 1.0 : part <= 2.0 ? 2.0 : part <= 5.0 ? 5.0 : 10.0);
  }

  /** Decay rates used at another order than they were fitted to are a choice that must be seen. */
  Optional<TraceNote> carried() {
    Optional<CrossSpectrumChoice> given = source.where().varying(Settings::crossSpectrum);
    CrossSpectrumChoice choice = given.orElse(CrossSpectrumChoice.DEFAULT);
    boolean same =
        choice.orderAlong() == choice.fittedOrderAlong()
            && choice.orderAcross() == choice.fittedOrderAcross();
    if (source.measured() || same) {
      return Optional.empty();
    }
    return Optional.of(
        new TraceNote(
            Kind.CHOICE,
            "decay rates fitted at orders ("
                + choice.fittedOrderAlong()
                + ", "
                + choice.fittedOrderAcross()
                + ") are carried to these orders by the rule "
                + choice.rule().text()));
  }
}
