package eddyledger.ledger;

import eddyledger.ledger.TraceStep.Role;
import eddyledger.model.EdgeSpeed;
import eddyledger.physics.Remark;
import eddyledger.physics.flow.AirState;
import eddyledger.physics.flow.BoundaryLayer;
import eddyledger.physics.wallpressure.WallPressureSpectrum;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/** The steps of a trace from ambient air to the mean-square wall pressure. */
final class FlowTrace {
  private static final String CLOSURE = "law of the wall with wake, or as the note says";

  private final ResolvedPanel panel;
  private final BoundaryLayer layer;
  private final PanelResult result;
  private final FlowInput flow;
  private final List<TraceStep> steps = new ArrayList<>();

  FlowTrace(ResolvedPanel panel, PanelResult result) {
    this.panel = panel;
    this.result = result;
    layer = result.layer();
    flow = panel.input() != null ? panel.input().flow() : panel.measured().flow();
  }

  List<TraceStep> steps() {
    ambient();
    edge();
    layer();
    wallPressure();
    return steps;
  }

  private void ambient() {
    AirState air = flow.outside();
    String source = "condition " + panel.condition().id() + ", ISO 2533 where given by altitude";
    add("T", "temperature of the outside air", "K", air.temperature(), source);
    add("p", "pressure of the outside air", "Pa", air.pressure(), source);
    add("rho", "density of the outside air", "kg/m³", air.density(), "p/(R T)");
    add("c", "speed of sound outside", "m/s", air.soundSpeed(), "sqrt(gamma R T)");
    add("U", "speed of the vehicle", "m/s", flow.vehicleSpeed(), source);
    add("M", "Mach number", "", flow.vehicleSpeed() / air.soundSpeed(), "U/c");
  }

  private void edge() {
    String meaning =
        switch (flow.way()) {
          case SPEED -> "local flow speed as given";
          case RATIO -> "ratio of the local to the vehicle's speed";
          case PRESSURE_COEFFICIENT -> "pressure coefficient, isentropic flow";
          case PRESSURE_COEFFICIENT_INCOMPRESSIBLE -> "pressure coefficient, incompressible flow";
        };
    String unit = flow.way() == EdgeSpeed.Way.SPEED ? "m/s" : "";
    add(flow.way().key(), meaning, unit, flow.value(), panel.origins().words("local_speed"));
    steps.add(
        TraceStep.quantity(
            "Ue",
            "local flow speed at the edge of the boundary layer",
            "m/s",
            layer.edgeSpeed(),
            "isentropic flow along a streamline",
            outOfRange(layer.edge().remarks())));
    add("Me", "local Mach number", "", layer.edge().mach(), "Ue over local speed of sound");
    add("q", "dynamic pressure at the edge", "Pa", layer.dynamicPressure(), "rho_e Ue²/2");
  }

  private void layer() {
    layerStep("delta", "boundary-layer thickness", "m", layer.thickness());
    layerStep("delta*", "displacement thickness", "m", layer.displacementThickness());
    layerStep("theta", "momentum thickness", "m", layer.momentumThickness());
    layerStep("tau_w", "wall shear stress", "Pa", layer.wallShearStress());
    add("u_tau", "friction velocity", "m/s", layer.frictionVelocity(), "sqrt(tau_w/rho_w)");
    add("Re_tau", "friction Reynolds number", "", layer.frictionReynolds(), "u_tau delta/nu_w");
    add("Re_theta", "momentum Reynolds number", "", layer.momentumReynolds(), "Ue theta/nu_w");
    add("H", "shape factor", "", layer.shapeFactor(), "delta*/theta");
    String beyond = outOfRange(layer.remarks());
    if (!beyond.isEmpty()) {
      TraceStep last = steps.remove(steps.size() - 1);
      steps.add(
          TraceStep.quantity(
              last.symbol(), last.meaning(), last.unit(), last.value(), last.source(), beyond));
    }
  }

  private void layerStep(String symbol, String quantity, String unit, double value) {
    String filled =
        layer.remarks().stream()
            .filter(remark -> remark.kind() == Remark.Kind.FILLED_IN)
            .filter(remark -> remark.topic().equals(quantity))
            .map(Remark::text)
            .collect(Collectors.joining("; "));
    String source =
        filled.isEmpty() ? panel.origins().words("boundary_layer") + ", as given" : CLOSURE;
    steps.add(TraceStep.quantity(symbol, quantity, unit, value, source, filled));
  }

  private void wallPressure() {
    String id = panel.input() != null ? panel.input().spectrum() : panel.measured().spectrum();
    WallPressureSpectrum spectrum = WallPressureBands.spectrum(id);
    steps.add(
        TraceStep.banded(
            Role.QUANTITY,
            "Gpp",
            "one-sided spectral density of the wall pressure at mid-band, after " + spectrum.name(),
            "Pa²/Hz",
            result.wallPressureDensity(),
            panel
                .origins()
                .source("wall_pressure", spectrum.source() + "; " + spectrum.confidence()),
            panel.origins().note("wall_pressure", outOfRange(spectrum.remarks(layer)))));
    steps.add(
        TraceStep.banded(
            Role.START,
            "p²_wall",
            "mean-square wall pressure of the band",
            "Pa²",
            result.wallPressure(),
            "Gpp summed over " + WallPressureBands.SLICES.perBand() + " slices of the band",
            ""));
  }

  private void add(String symbol, String meaning, String unit, double value, String source) {
    steps.add(TraceStep.quantity(symbol, meaning, unit, value, source, ""));
  }

  static String outOfRange(List<Remark> remarks) {
    return remarks.stream()
        .filter(remark -> remark.kind() != Remark.Kind.FILLED_IN)
        .map(Remark::text)
        .collect(Collectors.joining("; "));
  }
}
