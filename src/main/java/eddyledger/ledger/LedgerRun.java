package eddyledger.ledger;

import eddyledger.check.Finding;
import eddyledger.ledger.ResolvedPanel.Failure;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Panel;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** One computation of a ledger: resolve, compute the panels, balance the cabin. */
final class LedgerRun {
  private final Vehicle vehicle;
  private final LedgerOptions options;
  private final LevelErrors errors;
  private final PanelResolver resolver;
  private final List<TreePath> panels;
  private final List<Finding> findings;
  private final Map<String, ResolvedCondition> conditions = new LinkedHashMap<>();
  private final Map<String, CabinResponse> cabins = new HashMap<>();
  private final Map<String, Failure> conditionFailures = new HashMap<>();
  private final Map<PanelKey, ResolvedPanel> resolved = new LinkedHashMap<>();
  private final Map<PanelKey, PanelOutcome> outcomes = new HashMap<>();

  /** A panel in a condition. */
  private record PanelKey(String panel, String condition) {}

  LedgerRun(Vehicle vehicle, List<Finding> described, LedgerOptions options) {
    this.vehicle = vehicle;
    this.options = options;
    errors = new LevelErrors(vehicle, described);
    resolver = new PanelResolver(vehicle, errors);
    findings = new ArrayList<>(described);
    panels = TreePath.of(vehicle).stream().filter(path -> path.node() instanceof Panel).toList();
  }

  void compute() {
    for (OperatingCondition condition : vehicle.conditions()) {
      condition(condition);
    }
    for (TreePath path : panels) {
      for (ResolvedCondition condition : conditions.values()) {
        resolved.put(
            new PanelKey(path.node().id(), condition.id()), resolver.resolve(path, condition));
      }
    }
    Set<PanelInput> inputs = new LinkedHashSet<>();
    for (ResolvedPanel panel : resolved.values()) {
      if (panel.input() != null) {
        inputs.add(panel.input());
      }
    }
    Map<PanelInput, PanelOutcome> computed = new PanelPool(options).compute(inputs);
    resolved.forEach(
        (key, panel) -> {
          if (panel.failure() != null) {
            outcomes.put(key, PanelOutcome.failed(panel.failure()));
          } else if (panel.measured() != null) {
            outcomes.put(key, measured(panel));
          } else {
            outcomes.put(key, computed.get(panel.input()));
          }
        });
    findings.addAll(new RunFindings(vehicle, this).all());
  }

  private void condition(OperatingCondition condition) {
    Optional<Finding> error = errors.about(condition.id());
    if (error.isPresent()) {
      conditionFailures.put(condition.id(), failed(error.get()));
      return;
    }
    ResolvedCondition state = ResolvedCondition.of(condition);
    conditions.put(condition.id(), state);
    Optional<Finding> cabinError =
        vehicle.zones().stream()
            .map(zone -> errors.about(zone.id()))
            .flatMap(Optional::stream)
            .findFirst()
            .or(
                () ->
                    vehicle.apertures().stream()
                        .map(aperture -> errors.about(aperture.id()))
                        .flatMap(Optional::stream)
                        .findFirst());
    if (cabinError.isPresent()) {
      conditionFailures.put(condition.id(), failed(cabinError.get()));
      return;
    }
    try {
      cabins.put(condition.id(), new CabinResponse(vehicle, state));
    } catch (IllegalArgumentException e) {
      conditionFailures.put(condition.id(), new Failure(Status.FAILED, e.getMessage()));
    }
  }

  private static Failure failed(Finding finding) {
    return new Failure(Status.FAILED, finding.where() + ": " + finding.what());
  }

  private PanelOutcome measured(ResolvedPanel panel) {
    CabinResponse cabin = cabins.get(panel.condition().id());
    if (cabin == null) {
      return PanelOutcome.failed(conditionFailures.get(panel.condition().id()));
    }
    try {
      return PanelOutcome.of(MeasuredPhysics.compute(panel, cabin));
    } catch (IllegalArgumentException e) {
      return PanelOutcome.failed(new Failure(Status.FAILED, e.getMessage()));
    }
  }

  List<TreePath> panels() {
    return panels;
  }

  List<Finding> findings() {
    return findings;
  }

  /** The conditions that could be resolved, in the order of the file. */
  Map<String, ResolvedCondition> conditions() {
    return conditions;
  }

  /** The cabin in a condition; null if it could not be balanced. */
  CabinResponse cabin(String condition) {
    return cabins.get(condition);
  }

  /** Why nothing can be said in a condition; empty if something can. */
  Optional<Failure> failure(String condition) {
    return Optional.ofNullable(conditionFailures.get(condition));
  }

  /** The resolved panel; null in a condition that could not be resolved. */
  ResolvedPanel resolved(String panel, String condition) {
    return resolved.get(new PanelKey(panel, condition));
  }

  /** What came out for a panel; null in a condition that could not be resolved. */
  PanelOutcome outcome(String panel, String condition) {
    return outcomes.get(new PanelKey(panel, condition));
  }

  /** Why the receiver cannot have a level; empty if it can. */
  Optional<Finding> receiverError(String receiver) {
    return errors.about(receiver);
  }

  /** The first error finding about an id; empty if there is none. */
  Optional<Finding> error(String id) {
    return errors.about(id);
  }

  /** On how many computed panels a wall-pressure spectrum leaves its range in a condition. */
  long panelsOutOfRange(String spectrumId, String condition) {
    long count = 0;
    for (TreePath path : panels) {
      PanelOutcome outcome = outcome(path.node().id(), condition);
      boolean known = outcome != null && outcome.result() != null;
      count += known && outcome.result().beyond().contains(spectrumId) ? 1 : 0;
    }
    return count;
  }
}
