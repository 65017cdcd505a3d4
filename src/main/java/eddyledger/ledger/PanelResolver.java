package eddyledger.ledger;

import eddyledger.ledger.ResolvedPanel.Failure;
import eddyledger.ledger.ResolvedPanel.MeasuredInput;
import eddyledger.model.Construction;
import eddyledger.model.CrossSpectrumChoice;
import eddyledger.model.InheritedSettings;
import eddyledger.model.Judged;
import eddyledger.model.JudgedBands;
import eddyledger.model.LayUp;
import eddyledger.model.Panel;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Settings;
import eddyledger.model.TabulatedLayUp;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/** Turns a panel of the model into what is computed with: inheritance, references, defaults. */
final class PanelResolver {
  /** Convection ratio where none is set: a broad-band value of the literature, 0.6 to 0.85. */
  static final double CONVECTION_RATIO = 0.7;

  /** Where the default of the convection ratio comes from, in words. */
  static final String CONVECTION_RATIO_SOURCE = "broad-band value of the literature, 0.6 to 0.85";

  private final Vehicle vehicle;
  private final LevelErrors errors;
  private final Map<String, Construction> constructions = new HashMap<>();
  private final Map<String, LayUp> layUps = new HashMap<>();

  PanelResolver(Vehicle vehicle, LevelErrors errors) {
    this.vehicle = vehicle;
    this.errors = errors;
    vehicle.constructions().forEach(it -> constructions.put(it.id(), it));
    vehicle.layUps().forEach(it -> layUps.put(it.id(), it));
  }

  /** The panel at a path in a condition; only an error about a value that it uses stops it. */
  ResolvedPanel resolve(TreePath path, ResolvedCondition condition) {
    Panel panel = (Panel) path.node();
    Origins origins = new Origins(errors, panel.id(), condition.id());
    origins.uses(condition.id());
    origins.usesOwn("count");
    PanelLookup look =
        new PanelLookup(InheritedSettings.at(vehicle, path), condition.id(), origins);
    return panel.measured() == null
        ? computed(panel, condition, look)
        : measured(panel, condition, look);
  }

  private ResolvedPanel computed(Panel panel, ResolvedCondition condition, PanelLookup look) {
    Origins origins = look.origins();
    FlowLookup flow = FlowLookup.of(look);
    String construction = look.fixed("construction", Settings::construction);
    if (construction != null) {
      origins.usesConstruction(construction);
    }
    Double length = look.fixed("length_m", Settings::length);
    Double width = look.fixed("width_m", Settings::width);
    JudgedBands lossFactor = look.varying("loss_factor", Settings::lossFactor);
    CrossSpectrumChoice cross =
        look.orDefault("cross_spectrum", Settings::crossSpectrum, CrossSpectrumChoice.DEFAULT);
    Judged convectionRatio =
        look.orDefault("convection_ratio", Settings::convectionRatio, Judged.of(CONVECTION_RATIO));
    String layUp = look.fixed("lay_up", Settings::layUp);
    if (layUps.containsKey(layUp)) {
      origins.uses(layUp);
    }
    Optional<Failure> failure = failure(origins);
    if (failure.isPresent()) {
      return ResolvedPanel.failed(panel, condition, origins, failure.get());
    }
    PlateConstruction plate = (PlateConstruction) constructions.get(construction);
    PanelInput input =
        new PanelInput(
            flow.input(condition),
            flow.spectrum(),
            cross,
            convectionRatio.best(),
            plate(plate, length, width, condition),
            lossFactor.best().spectrum(),
            condition.cabin());
    TabulatedLayUp table = (TabulatedLayUp) layUps.get(layUp);
    return new ResolvedPanel(panel, condition, flow.zone(), input, null, table, origins, null);
  }

  /** A measured level difference holds the whole path: plate and lay-up are not asked for. */
  private ResolvedPanel measured(Panel panel, ResolvedCondition condition, PanelLookup look) {
    Origins origins = look.origins();
    FlowLookup flow = FlowLookup.of(look);
    origins.usesOwn("measured");
    Optional<Failure> failure = failure(origins);
    if (failure.isPresent()) {
      return ResolvedPanel.failed(panel, condition, origins, failure.get());
    }
    MeasuredInput input =
        new MeasuredInput(flow.input(condition), flow.spectrum(), panel.measured());
    return new ResolvedPanel(panel, condition, flow.zone(), null, input, null, origins, null);
  }

  private static Optional<Failure> failure(Origins origins) {
    return origins
        .error()
        .map(
            finding ->
                new Failure(
                    finding.code().equals("missing-value") ? Status.MISSING : Status.FAILED,
                    finding.where() + ": " + finding.what()));
  }

  private static PlateInput plate(
      PlateConstruction plate, double length, double width, ResolvedCondition condition) {
    double radius = plate.radius() == null ? Double.POSITIVE_INFINITY : plate.radius();
    PlateTension tension = PlateTension.of(plate, condition);
    return new PlateInput(
        length,
        width,
        plate.thickness(),
        plate.youngsModulus(),
        plate.density(),
        plate.poissonRatio(),
        radius,
        tension.along(),
        tension.across());
  }
}
