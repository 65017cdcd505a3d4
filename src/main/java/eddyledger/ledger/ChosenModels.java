package eddyledger.ledger;

import eddyledger.model.CrossSpectrumChoice;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Collectors;

/** In words, which models the lead chose, with the rule that carries decay rates between orders. */
final class ChosenModels {
  private ChosenModels() {}

  /** The choices of all panels in a condition, each with the number of panels; empty if none. */
  static String words(LedgerRun run, String condition) {
    Map<String, Integer> choices = new LinkedHashMap<>();
    run.panels().stream()
        .map(path -> run.resolved(path.node().id(), condition))
        .filter(panel -> panel != null && panel.failure() == null)
        .forEach(panel -> choices.merge(words(panel), 1, Integer::sum));
    return choices.entrySet().stream()
        .map(choice -> choice.getKey() + " on " + plural(choice.getValue()))
        .collect(Collectors.joining("; "));
  }

  private static String words(ResolvedPanel panel) {
    if (panel.input() == null) {
      return "measured level difference under wall pressure " + panel.measured().spectrum();
    }
    CrossSpectrumChoice cross = panel.input().cross();
    return "wall pressure "
        + panel.input().spectrum()
        + ", orders ("
        + cross.orderAlong()
        + ","
        + cross.orderAcross()
        + ") with rates fitted at ("
        + cross.fittedOrderAlong()
        + ","
        + cross.fittedOrderAcross()
        + ") and carried by "
        + cross.rule().text();
  }

  private static String plural(int panels) {
    return panels + (panels == 1 ? " panel" : " panels");
  }
}
