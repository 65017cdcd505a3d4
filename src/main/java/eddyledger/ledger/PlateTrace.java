package eddyledger.ledger;

import eddyledger.ledger.PanelResult.PlateNumbers;
import eddyledger.ledger.TraceStep.Role;
import eddyledger.model.CrossSpectrumChoice;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Vehicle;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** The steps of a trace from the wall pressure's correlation to the plate's velocity. */
final class PlateTrace {
  private static final String RATIO = "convection_ratio";
  private static final String CROSS = "cross_spectrum";
  private static final String ORDER = "order of the cross-spectrum ";

  private final Vehicle vehicle;
  private final ResolvedPanel panel;
  private final PanelResult result;
  private final Origins origins;
  private final List<TraceStep> steps = new ArrayList<>();

  PlateTrace(Vehicle vehicle, ResolvedPanel panel, PanelResult result) {
    this.vehicle = vehicle;
    this.panel = panel;
    this.result = result;
    origins = panel.origins();
  }

  List<TraceStep> steps() {
    cross();
    plate();
    response();
    return steps;
  }

  private void cross() {
    CrossSpectrumChoice choice = panel.input().cross();
    CrossInput used = CrossInput.of(choice);
    String ratio = origins.words(RATIO);
    add(
        "Uc/Ue",
        "convection speed over local flow speed",
        "",
        panel.input().convectionRatio(),
        ratio.isEmpty() ? PanelResolver.CONVECTION_RATIO_SOURCE : ratio,
        origins.note(RATIO, ""));
    steps.add(
        TraceStep.banded(
            Role.QUANTITY, "Uc", "convection speed", "m/s", result.convectionSpeed(), "", ""));
    String source = origins.source(CROSS, used.spectrum().source());
    String note = origins.note(CROSS, "");
    add("order_along", ORDER + "along the flow", "", used.orderAlong(), source, note);
    add("order_across", ORDER + "across the flow", "", used.orderAcross(), source, note);
    String carried =
        origins.note(
            CROSS,
            "fitted at orders ("
                + choice.fittedOrderAlong()
                + ","
                + choice.fittedOrderAcross()
                + "), carried by the rule "
                + choice.rule().text());
    add("alpha_along", "decay rate along the flow", "", used.decayAlong(), source, carried);
    add("alpha_across", "decay rate across the flow", "", used.decayAcross(), source, carried);
  }

  private void plate() {
    PlateInput plate = panel.input().plate();
    PlateNumbers numbers = result.plate();
    PlateConstruction construction = construction();
    PlateTension tension = PlateTension.of(construction, panel.condition());
    add("a", "length along the flow", "m", plate.length(), origins.words("length_m"), "");
    add("b", "width across the flow", "m", plate.width(), origins.words("width_m"), "");
    add(
        "h",
        "thickness of construction " + construction.id(),
        "m",
        plate.thickness(),
        origins.words("construction"),
        "edges simply supported");
    add("m''", "surface mass", "kg/m²", numbers.surfaceMass(), "rho h", "");
    add("D", "bending stiffness", "N m", numbers.bendingStiffness(), "E h³/(12(1-nu²))", "");
    if (!Double.isInfinite(plate.radius())) {
      add(
          "R",
          "radius of curvature",
          "m",
          plate.radius(),
          "shallow-shell membrane term (Donnell, Mushtari, Vlasov)",
          "");
    }
    add("Nx", "tension along", "N/m", plate.tensionAlong(), tension.words(), "");
    add("Ny", "tension across", "N/m", plate.tensionAcross(), tension.words(), "");
    add(
        "fc",
        "critical frequency in the cabin's air",
        "Hz",
        numbers.criticalFrequency(),
        "(c²/2 pi) sqrt(m''/D)",
        "");
    add("f1", "frequency of the first mode", "Hz", numbers.firstMode(), "plate on knife edges", "");
  }

  private PlateConstruction construction() {
    String id = origins.construction();
    return (PlateConstruction)
        vehicle.constructions().stream().filter(it -> it.id().equals(id)).findFirst().orElseThrow();
  }

  private void response() {
    steps.add(
        TraceStep.banded(
            Role.QUANTITY,
            "eta",
            "damping loss factor, without radiation",
            "",
            panel.input().lossFactor().toArray(),
            origins.words("loss_factor"),
            "radiation damping of both faces is added mode by mode"));
    steps.add(
        TraceStep.banded(
            Role.QUANTITY,
            "modes",
            "modes summed in the band",
            "",
            Arrays.stream(result.modes()).asDoubleStream().toArray(),
            "all modes up to twice the band's upper edge, at least three times the first",
            ""));
    steps.add(
        TraceStep.banded(
            Role.QUANTITY,
            "v²",
            "space-mean-square velocity of the band",
            "m²/s²",
            result.velocitySquared(),
            "sum over modes",
            ""));
  }

  private void add(
      String symbol, String meaning, String unit, double value, String source, String note) {
    steps.add(TraceStep.quantity(symbol, meaning, unit, value, source, note));
  }
}
