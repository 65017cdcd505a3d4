package eddyledger.ledger;

import eddyledger.check.Finding;
import eddyledger.check.NearMiss;
import eddyledger.check.Severity;
import eddyledger.ledger.ResolvedPanel.Failure;
import eddyledger.model.Panel;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import eddyledger.physics.Remark;
import eddyledger.physics.wallpressure.WallPressureSpectra;
import eddyledger.physics.wallpressure.WallPressureSpectrum;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** What a run has to say beyond the description: formulas out of range, panels that failed. */
final class RunFindings {
  private final Vehicle vehicle;
  private final LedgerRun run;
  private final List<Finding> all = new ArrayList<>();

  /** Remarks of one topic in one condition, met on some panels. */
  private record Topic(String condition, String words) {}

  private record Met(String panel, String place, Remark remark) {}

  RunFindings(Vehicle vehicle, LedgerRun run) {
    this.vehicle = vehicle;
    this.run = run;
  }

  List<Finding> all() {
    for (String condition : run.conditions().keySet()) {
      panels(condition);
    }
    all.addAll(new CabinFindings(vehicle, run).all());
    return all;
  }

  private void panels(String condition) {
    Map<Topic, List<Met>> topics = new LinkedHashMap<>();
    for (TreePath path : run.panels()) {
      Panel panel = (Panel) path.node();
      PanelOutcome outcome = run.outcome(panel.id(), condition);
      if (outcome.failure() != null) {
        failed(panel, path, condition, outcome.failure());
        continue;
      }
      for (Remark remark : outcome.result().remarks()) {
        if (remark.kind() == Remark.Kind.OUT_OF_RANGE) {
          topics
              .computeIfAbsent(new Topic(condition, remark.topic()), key -> new ArrayList<>())
              .add(new Met(panel.id(), path.place(), remark));
        }
      }
    }
    topics.forEach(this::outOfRange);
  }

  private void failed(Panel panel, TreePath path, String condition, Failure failure) {
    // what the check has already said of the panel is not said twice
    boolean told = run.resolved(panel.id(), condition).failure() != null;
    if (told || run.failure(condition).isPresent()) {
      return;
    }
    all.add(
        new Finding(
            Severity.ERROR,
            "not-computed",
            panel.id(),
            path.place(),
            "In condition \"" + condition + "\" it cannot be computed: " + failure.reason() + ".",
            "Correct its input; totals above it are partial until then."
                + suggestion(run.resolved(panel.id(), condition))));
  }

  private static String suggestion(ResolvedPanel panel) {
    String spectrum =
        panel.input() != null ? panel.input().spectrum() : panel.measured().spectrum();
    return WallPressureSpectra.byId(spectrum).isPresent()
        ? ""
        : NearMiss.of(
            spectrum, WallPressureSpectra.all().stream().map(WallPressureSpectrum::id).toList());
  }

  private void outOfRange(Topic topic, List<Met> met) {
    Met first = met.get(0);
    int more = met.size() - 1;
    String others =
        more == 0
            ? ""
            : " (and " + more + (more == 1 ? " more panel alike)" : " more panels alike)");
    all.add(
        new Finding(
            Severity.WARNING,
            "out-of-range",
            first.panel(),
            first.place(),
            "In condition \"" + topic.condition() + "\": " + first.remark().text() + others + ".",
            "Look at the model range, or choose a model whose range holds here."));
  }
}
