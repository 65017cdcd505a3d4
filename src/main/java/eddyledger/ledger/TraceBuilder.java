package eddyledger.ledger;

import eddyledger.ledger.ResolvedPanel.Failure;
import eddyledger.ledger.TraceStep.Role;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Panel;
import eddyledger.model.Receiver;
import eddyledger.model.Vehicle;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Decibels;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** Writes down the account of a contribution from what a run kept; computes nothing anew. */
final class TraceBuilder {
  private final Vehicle vehicle;
  private final LedgerRun run;

  TraceBuilder(Vehicle vehicle, LedgerRun run) {
    this.vehicle = vehicle;
    this.run = run;
  }

  /** The trace; empty if there is no such panel, condition or receiver. */
  Optional<Trace> trace(String panelId, String conditionId, String receiverId) {
    Optional<Panel> panel =
        run.panels().stream()
            .map(path -> (Panel) path.node())
            .filter(it -> it.id().equals(panelId))
            .findFirst();
    Optional<OperatingCondition> condition =
        vehicle.conditions().stream().filter(it -> it.id().equals(conditionId)).findFirst();
    Optional<Receiver> receiver =
        vehicle.receivers().stream().filter(it -> it.id().equals(receiverId)).findFirst();
    if (panel.isEmpty() || condition.isEmpty() || receiver.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(trace(panel.get(), condition.get(), receiver.get()));
  }

  private Trace trace(Panel panel, OperatingCondition condition, Receiver receiver) {
    Failure failure = PanelShare.failure(run, panel.id(), condition.id(), receiver);
    if (failure != null) {
      return new Trace(
          panel, condition, receiver, List.of(), null, failure.status(), failure.reason());
    }
    ResolvedPanel resolved = run.resolved(panel.id(), condition.id());
    PanelResult result = run.outcome(panel.id(), condition.id()).result();
    CabinResponse cabin = run.cabin(condition.id());
    PanelShare share = PanelShare.of(resolved, result, 0, cabin, receiver);
    Contribution whole = PanelShare.contributions(run, panel.id(), condition.id(), receiver).get(0);
    List<TraceStep> steps = new ArrayList<>(new FlowTrace(resolved, result).steps());
    if (resolved.input() != null) {
      steps.addAll(new PlateTrace(vehicle, resolved, result).steps());
    }
    TraceBands bands = bands(resolved, result, share);
    steps.addAll(path(resolved, result, share, bands, cabin, receiver));
    return new Trace(panel, condition, receiver, steps, bands, whole.status(), whole.reason());
  }

  private static TraceBands bands(ResolvedPanel panel, PanelResult result, PanelShare share) {
    double[] radiated = new double[Bands.COUNT];
    double[] zone = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      radiated[band] = share.power()[band] * share.count();
      zone[band] = radiated[band] * share.pathFactor()[band];
    }
    return new TraceBands(
        BandSpectrum.of(result.wallPressureDensity()),
        BandSpectrum.of(result.wallPressure()),
        BandSpectrum.of(result.convectionSpeed()),
        BandSpectrum.of(result.velocitySquared()),
        BandSpectrum.of(radiated),
        PanelShare.insertionLoss(panel),
        BandSpectrum.of(zone),
        BandSpectrum.of(share.meanSquares()));
  }

  private static List<TraceStep> path(
      ResolvedPanel panel,
      PanelResult result,
      PanelShare share,
      TraceBands bands,
      CabinResponse cabin,
      Receiver receiver) {
    List<TraceStep> steps = new ArrayList<>();
    double[] perWall = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      perWall[band] = share.power()[band] / result.wallPressure()[band];
    }
    steps.add(
        TraceStep.banded(
            Role.FACTOR,
            "W1/p²",
            "power radiated by one piece per mean-square wall pressure",
            "W/Pa²",
            perWall,
            panel.input() == null
                ? "measured level difference D: 10^(-D/10) A/(4 rho c)"
                : "sum over modes of joint acceptance, radiation efficiency and resonance",
            absorptionAssumed(panel)
                ? "A of the measurement was not given: that of zone " + panel.zone() + " is taken"
                : ""));
    steps.add(factor("n", "identical pieces", "", constant(share.count()), "count of the panel"));
    steps.add(
        TraceStep.banded(
            Role.QUANTITY,
            "W",
            "power radiated by all pieces",
            "W",
            bands.radiatedPower().toArray(),
            "product so far",
            ""));
    String layUp = panel.layUp() == null ? "none" : panel.layUp().id();
    steps.add(
        TraceStep.banded(
            Role.QUANTITY,
            "IL",
            "insertion loss of the lay-up: " + layUp,
            "dB",
            bands.insertionLoss().toArray(),
            panel.origins().words("lay_up"),
            layUpNote(panel)));
    steps.add(
        factor(
            "10^(-IL/10)",
            "part of the power that the lay-up lets through",
            "",
            share.pathFactor(),
            "definition of insertion loss for blocked wall pressure"));
    steps.add(
        TraceStep.banded(
            Role.QUANTITY,
            "A",
            "absorption area of zone " + panel.zone(),
            "m²",
            cabin.absorption(panel.zone()).toArray(),
            "entered for the zone",
            ""));
    steps.add(
        factor(
            "p²/W",
            answer(panel, cabin, receiver),
            "Pa²/W",
            share.perWatt(),
            "power balance of coupled zones: inverse of absorption and apertures, times 4 rho c"));
    steps.add(
        TraceStep.banded(
            Role.RESULT,
            "p²",
            "mean-square pressure at receiver " + receiver.id(),
            "Pa²",
            bands.meanSquare().toArray(),
            "product of the factors",
            ""));
    steps.add(
        TraceStep.banded(
            Role.RESULT,
            "L",
            "band level at receiver " + receiver.id(),
            "dB",
            bands
                .meanSquare()
                .map(it -> it > 0.0 ? Decibels.pressureLevel(it) : Double.NaN)
                .toArray(),
            "10 lg p²/(20 µPa)²",
            ""));
    return steps;
  }

  private static String layUpNote(ResolvedPanel panel) {
    if (panel.measured() != null) {
      return "the measured level difference holds the whole path, a lay-up included";
    }
    if (panel.layUp() == null) {
      return panel.origins().words("lay_up").isEmpty() ? "default, nobody set one" : "";
    }
    boolean octaves = panel.layUp().insertionLoss().best().interpolated();
    return octaves ? "interpolated from octaves, linear in lg f" : "";
  }

  private static boolean absorptionAssumed(ResolvedPanel panel) {
    return panel.measured() != null && panel.measured().data().absorptionArea() == null;
  }

  private static String answer(ResolvedPanel panel, CabinResponse cabin, Receiver receiver) {
    String words = "answer of zone " + receiver.zone() + " to power let into zone " + panel.zone();
    double distance =
        cabin.distance(receiver, panel.zone(), panel.panel().id(), PanelShare.area(panel));
    return Double.isNaN(distance)
        ? words + ", diffuse"
        : words
            + ", diffuse part times (1 - mean absorption) and direct part at "
            + distance
            + " m";
  }

  private static TraceStep factor(
      String symbol, String meaning, String unit, double[] values, String source) {
    return TraceStep.banded(Role.FACTOR, symbol, meaning, unit, values, source, "");
  }

  private static double[] constant(double value) {
    double[] values = new double[Bands.COUNT];
    Arrays.fill(values, value);
    return values;
  }
}
