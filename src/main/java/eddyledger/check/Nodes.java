package eddyledger.check;

import eddyledger.model.CrossSpectrumChoice;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.LayerGiven;
import eddyledger.model.Panel;
import eddyledger.model.Settings;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;

/** The values that the vehicle, its sections and its panels set. */
final class Nodes {
  private static final int HIGHEST_ORDER = 5;

  private final Findings findings;

  private Nodes(Findings findings) {
    this.findings = findings;
  }

  static void check(Vehicle vehicle, Findings findings) {
    Nodes nodes = new Nodes(findings);
    nodes.settings(vehicle.settings(), vehicle.id(), "vehicle");
    for (TreePath path : TreePath.of(vehicle)) {
      nodes.settings(path.node().settings(), path.node().id(), path.place());
      if (path.node() instanceof Panel panel) {
        nodes.panel(panel, path.place());
      }
    }
  }

  private void panel(Panel panel, String place) {
    findings.required(Limit.COUNT, (double) panel.count(), panel.id(), place + ".count");
    if (panel.measured() != null) {
      String at = place + ".measured";
      if (panel.measured().levelDifference() == null) {
        findings.add(
            Severity.ERROR,
            "missing-value",
            panel.id(),
            at + ".level_difference_dB",
            "The measured level difference is missing.",
            "Enter it per band, or take the measurement away.");
      }
      if (panel.measured().absorptionArea() == null) {
        findings.add(
            Severity.WARNING,
            "absorption-assumed",
            panel.id(),
            at + ".absorption_area_m2",
            "The absorption area of the room it was measured in is not given, and that of the"
                + " panel's zone as described is taken, so that absorption added to the zone does"
                + " not lower this panel's diffuse sound.",
            "Enter the absorption area at the time of the measurement.");
      }
      findings.bands(
          Limit.LOSS, panel.measured().levelDifference(), panel.id(), at + ".level_difference_dB");
      findings.bands(
          Limit.AREA, panel.measured().absorptionArea(), panel.id(), at + ".absorption_area_m2");
    }
  }

  private void settings(Settings settings, String id, String place) {
    findings.within(Limit.SIZE, settings.length(), id, place + ".length_m");
    findings.within(Limit.SIZE, settings.width(), id, place + ".width_m");
    findings.each(
        settings.localSpeed(), place + ".local_speed", (value, at) -> speed(value, id, at));
    findings.each(
        settings.boundaryLayer(), place + ".boundary_layer", (value, at) -> layer(value, id, at));
    findings.each(
        settings.crossSpectrum(), place + ".cross_spectrum", (value, at) -> cross(value, id, at));
    findings.each(
        settings.convectionRatio(),
        place + ".convection_ratio",
        (value, at) -> findings.judged(Limit.CONVECTION_RATIO, value, id, at));
    findings.each(
        settings.lossFactor(),
        place + ".loss_factor",
        (value, at) -> findings.bands(Limit.LOSS_FACTOR, value, id, at));
  }

  private void speed(EdgeSpeed speed, String id, String place) {
    Limit limit =
        switch (speed.way()) {
          case SPEED -> Limit.SPEED;
          case RATIO -> Limit.SPEED_RATIO;
          case PRESSURE_COEFFICIENT, PRESSURE_COEFFICIENT_INCOMPRESSIBLE ->
              Limit.PRESSURE_COEFFICIENT;
        };
    findings.judged(limit, speed.value(), id, place + "." + speed.way().key());
  }

  private void layer(LayerGiven layer, String id, String place) {
    if (layer.empty()) {
      findings.add(
          Severity.ERROR,
          "missing-value",
          id,
          place,
          "Nothing of the boundary layer is given.",
          "Give its thickness, its running length, or another of its quantities.");
    }
    findings.judged(Limit.RUNNING_LENGTH, layer.runningLength(), id, place + ".running_length_m");
    findings.judged(Limit.LAYER_THICKNESS, layer.thickness(), id, place + ".thickness_m");
    findings.judged(
        Limit.LAYER_THICKNESS,
        layer.displacementThickness(),
        id,
        place + ".displacement_thickness_m");
    findings.judged(
        Limit.LAYER_THICKNESS, layer.momentumThickness(), id, place + ".momentum_thickness_m");
    findings.judged(Limit.WALL_SHEAR, layer.wallShear(), id, place + ".wall_shear_stress_Pa");
  }

  private void cross(CrossSpectrumChoice choice, String id, String place) {
    order(choice.orderAlong(), id, place + ".order_along");
    order(choice.orderAcross(), id, place + ".order_across");
    order(choice.fittedOrderAlong(), id, place + ".fitted_order_along");
    order(choice.fittedOrderAcross(), id, place + ".fitted_order_across");
    findings.judged(Limit.DECAY, choice.decayAlong(), id, place + ".decay_along");
    findings.judged(Limit.DECAY, choice.decayAcross(), id, place + ".decay_across");
  }

  private void order(int order, String id, String place) {
    if (order < 1 || order > HIGHEST_ORDER) {
      findings.add(
          Severity.ERROR,
          "absurd-value",
          id,
          place,
          "An order of " + order + " is not between 1 and " + HIGHEST_ORDER + ".",
          "Give a whole number from 1 to " + HIGHEST_ORDER + ".");
    }
  }
}
