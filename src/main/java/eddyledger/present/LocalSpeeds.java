package eddyledger.present;

import eddyledger.ledger.Ledger;
import eddyledger.ledger.Trace;
import eddyledger.ledger.TraceStep;
import eddyledger.model.Node;
import eddyledger.model.Panel;
import eddyledger.model.Section;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * The ratio of the local speed to the vehicle's over the whole outside: one bar for each section
 * within which it is the same.
 */
final class LocalSpeeds {
  private static final double SAME = 1.0e-9;

  private record Bar(String name, double ratio, boolean holdsPanel) {}

  private final Ledger ledger;
  private final Trace trace;
  private final Map<String, Double> ratios = new HashMap<>();
  private final List<Bar> bars = new ArrayList<>();

  private LocalSpeeds(Ledger ledger, Trace trace) {
    this.ledger = ledger;
    this.trace = trace;
  }

  /** The picture, with the part that holds the trace's panel marked. */
  static StagePicture picture(Ledger ledger, Trace trace) {
    LocalSpeeds speeds = new LocalSpeeds(ledger, trace);
    ledger.vehicle().tree().forEach(speeds::collect);
    return speeds.picture();
  }

  private void collect(Node node) {
    List<Panel> panels = panels(node);
    List<Double> known =
        panels.stream().map(this::ratio).filter(ratio -> !ratio.isNaN()).sorted().toList();
    if (known.isEmpty()) {
      return;
    }
    boolean same = known.get(known.size() - 1) - known.get(0) < SAME;
    if (same || !(node instanceof Section section)) {
      boolean here = panels.stream().anyMatch(it -> it.id().equals(trace.panel().id()));
      bars.add(new Bar(node.name(), known.get(0), here));
    } else {
      section.children().forEach(this::collect);
    }
  }

  private static List<Panel> panels(Node node) {
    if (node instanceof Panel panel) {
      return List.of(panel);
    }
    return ((Section) node).children().stream().flatMap(child -> panels(child).stream()).toList();
  }

  private double ratio(Panel panel) {
    return ratios.computeIfAbsent(
        panel.id(),
        id ->
            ledger
                .trace(id, trace.condition().id(), trace.receiver().id())
                .map(it -> value(it, "Ue") / value(it, "U"))
                .orElse(Double.NaN));
  }

  private static double value(Trace trace, String symbol) {
    return trace.steps().stream()
        .filter(step -> step.symbol().equals(symbol))
        .mapToDouble(TraceStep::value)
        .findFirst()
        .orElse(Double.NaN);
  }

  private StagePicture picture() {
    double[] values = bars.stream().mapToDouble(Bar::ratio).toArray();
    double most = bars.stream().mapToDouble(Bar::ratio).max().orElse(1.0);
    int marked = -1;
    for (int i = 0; i < bars.size(); i++) {
      if (bars.get(i).holdsPanel()) {
        marked = i;
      }
    }
    return new StagePicture(
        StagePicture.Kind.BARS,
        new double[0],
        List.<double[]>of(values),
        shortened(bars.stream().map(Bar::name).toList()),
        marked,
        0.0,
        Math.max(most, 1.0),
        "",
        "local speed ratio",
        "");
  }

  /** The names without the words that all of them begin with. */
  static List<String> shortened(List<String> names) {
    if (names.size() < 2) {
      return names;
    }
    String[] first = names.get(0).split(" ");
    int common = first.length - 1;
    for (String name : names) {
      String[] words = name.split(" ");
      int same = 0;
      while (same < Math.min(common, words.length - 1) && words[same].equals(first[same])) {
        same++;
      }
      common = same;
    }
    int skip = common;
    return names.stream()
        .map(
            name ->
                String.join(" ", List.of(name.split(" ")).subList(skip, name.split(" ").length)))
        .toList();
  }
}
