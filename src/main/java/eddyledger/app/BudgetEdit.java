package eddyledger.app;

import eddyledger.model.Allowance;
import eddyledger.model.Evidence;
import eddyledger.model.Extras;
import eddyledger.model.PassRule;
import eddyledger.model.Rating;
import eddyledger.model.Target;
import eddyledger.model.Vehicle;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;

/** Changes to targets and allowances. */
public final class BudgetEdit {
  private BudgetEdit() {}

  /** The allowance of a node at a receiver in a condition; empty if none was entered. */
  public static Optional<Allowance> allowance(
      Vehicle vehicle, String node, String receiver, String condition) {
    return vehicle.allowances().stream()
        .filter(it -> isFor(it, node, receiver, condition))
        .findFirst();
  }

  private static boolean isFor(
      Allowance allowance, String node, String receiver, String condition) {
    return node.equals(allowance.node())
        && receiver.equals(allowance.receiver())
        && condition.equals(allowance.condition());
  }

  /** The vehicle with an allowance added or its level changed, dB(A). */
  public static Vehicle allow(
      Vehicle vehicle, String node, String receiver, String condition, double level) {
    List<Allowance> all = new ArrayList<>(vehicle.allowances());
    Optional<Allowance> old = allowance(vehicle, node, receiver, condition);
    Evidence evidence = old.map(Allowance::evidence).orElse(Evidence.NONE);
    Extras extras = old.map(Allowance::extras).orElse(Extras.NONE);
    Allowance fresh = new Allowance(node, receiver, condition, level, evidence, extras);
    if (old.isPresent()) {
      all.set(all.indexOf(old.get()), fresh);
    } else {
      all.add(fresh);
    }
    return vehicle.edit().allowances(all).build();
  }

  /** The vehicle without an allowance, even if it was given twice. */
  public static Vehicle disallow(Vehicle vehicle, String node, String receiver, String condition) {
    List<Allowance> rest = new ArrayList<>(vehicle.allowances());
    // given twice by mistake, the second would hold once the first is gone
    rest.removeIf(it -> isFor(it, node, receiver, condition));
    return vehicle.edit().allowances(rest).build();
  }

  /** The targets of a receiver in a condition, in the order of the file. */
  public static List<Target> targets(Vehicle vehicle, String receiver, String condition) {
    return vehicle.targets().stream()
        .filter(it -> condition.equals(it.condition()) && it.receivers().contains(receiver))
        .toList();
  }

  /** The vehicle with a target changed. */
  public static Vehicle target(Vehicle vehicle, String id, UnaryOperator<Target> change) {
    List<Target> all =
        vehicle.targets().stream().map(it -> it.id().equals(id) ? change.apply(it) : it).toList();
    return vehicle.edit().targets(all).build();
  }

  /**
   * The vehicle with a target for the A-weighted overall level of one receiver in one condition,
   * dB(A); without reserve, judged without rounding.
   */
  public static Vehicle addTarget(
      Vehicle vehicle, String receiver, String condition, double value) {
    String id = CopyName.free(vehicle, "target-" + receiver + "-" + condition);
    List<Target> all = new ArrayList<>(vehicle.targets());
    all.add(
        new Target(
            id,
            "Overall level",
            condition,
            List.of(receiver),
            Rating.OVERALL_A,
            value,
            0.0,
            PassRule.PLAIN,
            Evidence.NONE,
            Extras.NONE));
    return vehicle.edit().targets(all).build();
  }

  /** The target with another value, in its rating's unit. */
  public static Target withValue(Target target, double value) {
    return changed(target, value, target.reserve(), target.rule());
  }

  /** The target with another reserve, dB. */
  public static Target withReserve(Target target, double reserve) {
    return changed(target, target.value(), reserve, target.rule());
  }

  /** The target with the judged level rounded otherwise. */
  public static Target withRounding(Target target, PassRule.Rounding rounding) {
    PassRule rule = new PassRule(rounding, target.rule().tolerance(), target.rule().across());
    return changed(target, target.value(), target.reserve(), rule);
  }

  private static Target changed(Target like, double value, double reserve, PassRule rule) {
    return new Target(
        like.id(),
        like.name(),
        like.condition(),
        like.receivers(),
        like.rating(),
        value,
        reserve,
        rule,
        like.evidence(),
        like.extras());
  }
}
