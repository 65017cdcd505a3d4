package eddyledger.check;

import eddyledger.model.Allowance;
import eddyledger.model.Vehicle;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Whether every section and panel has one allowance at most per receiver and condition. */
final class Allowances {
  private Allowances() {}

  static void check(Vehicle vehicle, Findings findings) {
    Map<List<String>, Integer> seen = new HashMap<>();
    for (int i = 0; i < vehicle.allowances().size(); i++) {
      Allowance allowance = vehicle.allowances().get(i);
      if (allowance.node() == null
          || allowance.receiver() == null
          || allowance.condition() == null) {
        continue; // what is missing is told by the check of references
      }
      Integer first =
          seen.putIfAbsent(
              List.of(allowance.node(), allowance.receiver(), allowance.condition()), i);
      if (first != null) {
        findings.add(
            Severity.ERROR,
            "duplicate-allowance",
            allowance.node(),
            "allowances[" + i + "]",
            "The allowance of \""
                + allowance.node()
                + "\" at receiver \""
                + allowance.receiver()
                + "\" in condition \""
                + allowance.condition()
                + "\" stands already at allowances["
                + first
                + "].",
            "Take one of the two away; until then the first one holds.");
      }
    }
  }
}
