package eddyledger.ledger;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.ledger.ResolvedPanel.Failure;
import eddyledger.ledger.ResolvedPanel.MeasuredInput;
import eddyledger.model.ByCondition;
import eddyledger.model.Construction;
import eddyledger.model.CrossSpectrumChoice;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.Held;
import eddyledger.model.InheritedSettings;
import eddyledger.model.Judged;
import eddyledger.model.LayUp;
import eddyledger.model.LayerGiven;
import eddyledger.model.Panel;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Settings;
import eddyledger.model.TabulatedLayUp;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import eddyledger.model.WallPressureChoice;
import eddyledger.physics.flow.BoundaryLayerInput;
import eddyledger.quantity.BandSpectrum;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;

/** Turns a panel of the model into what is computed with: inheritance, references, defaults. */
final class PanelResolver {
  /** Convection ratio where none is set: a broad-band value of the literature, 0.6 to 0.85. */
  static final double CONVECTION_RATIO = 0.7;

  /** Wall-pressure spectrum where none is chosen. */
  static final String SPECTRUM = "goody";

  private final Vehicle vehicle;
  private final Map<String, Construction> constructions = new HashMap<>();
  private final Map<String, LayUp> layUps = new HashMap<>();
  private final Map<String, Finding> errors = new HashMap<>();

  PanelResolver(Vehicle vehicle, List<Finding> findings) {
    this.vehicle = vehicle;
    vehicle.constructions().forEach(it -> constructions.put(it.id(), it));
    vehicle.layUps().forEach(it -> layUps.put(it.id(), it));
    for (Finding finding : findings) {
      if (finding.severity().atLeast(Severity.ERROR) && concernsLevels(finding)) {
        errors.putIfAbsent(finding.subject(), finding);
      }
    }
  }

  /** A faulty allowance or an unknown supplier is named on a panel, but changes no level of it. */
  private static boolean concernsLevels(Finding finding) {
    return !finding.place().startsWith("allowances[") && !finding.place().endsWith(".supplier");
  }

  /** The first error finding about an id; empty if there is none. */
  Optional<Finding> error(String id) {
    return Optional.ofNullable(errors.get(id));
  }

  /** The panel at a path in a condition. */
  ResolvedPanel resolve(TreePath path, ResolvedCondition condition) {
    Panel panel = (Panel) path.node();
    Origins origins = new Origins();
    origins.uses(panel.id());
    Lookup look = new Lookup(InheritedSettings.at(vehicle, path), condition.id(), origins);
    String zone = look.fixed("zone", Settings::zone);
    String layUpId = look.fixed("lay_up", Settings::layUp);
    look.fixed("construction", Settings::construction);
    look.fixed("length_m", Settings::length);
    look.fixed("width_m", Settings::width);
    look.varying("local_speed", Settings::localSpeed);
    look.varying("boundary_layer", Settings::boundaryLayer);
    look.varying("loss_factor", Settings::lossFactor);
    look.references(zone, layUpId, constructions, layUps);
    Optional<Failure> failure = failure(origins);
    if (failure.isPresent()) {
      return ResolvedPanel.failed(panel, condition, origins, failure.get());
    }
    TabulatedLayUp layUp = (TabulatedLayUp) layUps.get(layUpId);
    FlowInput flow = flow(look, condition);
    String spectrum =
        look.orDefault("wall_pressure", Settings::wallPressure, WallPressureChoice.of(SPECTRUM))
            .model();
    if (panel.measured() != null) {
      MeasuredInput measured = new MeasuredInput(flow, spectrum, panel.measured());
      // a measured level difference holds the whole path, the lay-up included
      return new ResolvedPanel(panel, condition, zone, null, measured, null, origins, null);
    }
    PanelInput input =
        new PanelInput(
            flow,
            spectrum,
            look.orDefault("cross_spectrum", Settings::crossSpectrum, CrossSpectrumChoice.DEFAULT),
            look.orDefault(
                    "convection_ratio", Settings::convectionRatio, Judged.of(CONVECTION_RATIO))
                .best(),
            plate(look, condition),
            lossFactor(look),
            condition.cabin());
    return new ResolvedPanel(panel, condition, zone, input, null, layUp, origins, null);
  }

  private Optional<Failure> failure(Origins origins) {
    return origins.holders().stream()
        .map(errors::get)
        .filter(finding -> finding != null)
        .map(
            finding ->
                new Failure(
                    finding.code().equals("missing-value") ? Status.MISSING : Status.FAILED,
                    finding.where() + ": " + finding.what()))
        .findFirst();
  }

  private FlowInput flow(Lookup look, ResolvedCondition condition) {
    EdgeSpeed speed = look.varying("local_speed", Settings::localSpeed);
    LayerGiven layer = look.varying("boundary_layer", Settings::boundaryLayer);
    return new FlowInput(
        condition.outside(),
        condition.speed(),
        speed.way(),
        speed.value().best(),
        new BoundaryLayerInput(
            best(layer.runningLength()),
            best(layer.thickness()),
            best(layer.displacementThickness()),
            best(layer.momentumThickness()),
            best(layer.wallShear())));
  }

  private static Double best(Judged value) {
    return value == null ? null : Double.valueOf(value.best());
  }

  private PlateInput plate(Lookup look, ResolvedCondition condition) {
    PlateConstruction plate =
        (PlateConstruction) constructions.get(look.fixed("construction", Settings::construction));
    double radius = plate.radius() == null ? Double.POSITIVE_INFINITY : plate.radius();
    PlateTension tension = PlateTension.of(plate, condition);
    return new PlateInput(
        look.fixed("length_m", Settings::length),
        look.fixed("width_m", Settings::width),
        plate.thickness(),
        plate.youngsModulus(),
        plate.density(),
        plate.poissonRatio(),
        radius,
        tension.along(),
        tension.across());
  }

  private static BandSpectrum lossFactor(Lookup look) {
    return look.varying("loss_factor", Settings::lossFactor).best().spectrum();
  }

  /** Looks settings up and notes where they are from. */
  private record Lookup(InheritedSettings settings, String condition, Origins origins) {

    <T> T fixed(String key, Function<Settings, T> setting) {
      Optional<Held<T>> held = settings.find(setting);
      return held.map(value -> origins.note(key, value)).orElse(null);
    }

    <T> T varying(String key, Function<Settings, ByCondition<T>> setting) {
      Optional<Held<T>> held = settings.find(setting, condition);
      return held.map(value -> origins.note(key, value)).orElse(null);
    }

    <T> T orDefault(String key, Function<Settings, ByCondition<T>> setting, T otherwise) {
      T value = varying(key, setting);
      if (value == null) {
        origins.defaulted(key);
        return otherwise;
      }
      return value;
    }

    void references(
        String zone,
        String layUp,
        Map<String, Construction> constructions,
        Map<String, LayUp> layUps) {
      origins.uses(condition);
      if (zone != null) {
        origins.uses(zone);
      }
      if (layUps.containsKey(layUp)) {
        origins.uses(layUp);
      }
      String construction = fixed("construction", Settings::construction);
      if (constructions.containsKey(construction)) {
        origins.usesConstruction(construction);
      }
    }
  }
}
