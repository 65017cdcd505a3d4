package eddyledger.present;

import eddyledger.ledger.Trace;
import eddyledger.ledger.TraceStep;
import eddyledger.ledger.TraceStep.Role;
import eddyledger.quantity.AWeighting;
import eddyledger.quantity.Decibels;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The steps of a trace given out to the stages they belong to, every step to exactly one, and what
 * each stage does to the running level.
 *
 * <p>Until the panel the running level is one of mean-square pressure re 20 µPa, then of power re 1
 * pW, from the zone on of mean-square pressure again. Its steps are made from the start and the
 * factors of the trace alone, and from the A-weighting.
 */
final class StageSteps {
  /** The stages, in the order sound travels. */
  enum Stage {
    AMBIENT("Ambient air", "T"),
    FLOW("Flow at the panel", null),
    LAYER("Boundary layer", "delta"),
    WALL("Wall pressure", "Gpp"),
    CROSS("Cross-spectrum", "Uc/Ue"),
    PANEL("Panel", "a"),
    LAY_UP("Lay-up", "IL"),
    ZONE("Zone", "A"),
    RECEIVER("Receiver", "p²");

    private final String title;
    private final String first;

    Stage(String title, String first) {
      this.title = title;
      this.first = first;
    }

    /** Its name. */
    String title() {
      return title;
    }
  }

  private static final String LAST_OF_AMBIENT = "M";
  private static final String MEASURED_POWER = "W1/p²";

  private final Map<Stage, List<TraceStep>> steps = new EnumMap<>(Stage.class);

  StageSteps(Trace trace) {
    for (Stage stage : Stage.values()) {
      steps.put(stage, new ArrayList<>());
    }
    Stage now = Stage.AMBIENT;
    for (TraceStep step : trace.steps()) {
      now = stage(step, now);
      steps.get(now).add(step);
      if (step.symbol().equals(LAST_OF_AMBIENT)) {
        now = Stage.FLOW;
      }
    }
  }

  private static Stage stage(TraceStep step, Stage now) {
    for (Stage stage : Stage.values()) {
      if (stage.ordinal() > now.ordinal() && step.symbol().equals(stage.first)) {
        return stage;
      }
    }
    // a measured panel has no plate: its stage begins with the power
    boolean power = step.symbol().equals(MEASURED_POWER) && now.ordinal() < Stage.PANEL.ordinal();
    return power ? Stage.PANEL : now;
  }

  /** The steps of a stage, in order. */
  List<TraceStep> of(Stage stage) {
    return steps.get(stage);
  }

  /** The first step with a symbol. */
  Optional<TraceStep> find(String symbol) {
    return steps.values().stream()
        .flatMap(List::stream)
        .filter(step -> step.symbol().equals(symbol))
        .findFirst();
  }

  /**
   * What a stage changes, dB in a band; at the wall pressure the level itself; NaN before it and
   * where the band is missing.
   */
  double change(Stage stage, int band) {
    return switch (stage) {
      case AMBIENT, FLOW, LAYER -> Double.NaN;
      case WALL -> Decibels.pressureLevel(product(stage, Role.START, band));
      case PANEL -> gain(stage, band) + Decibels.ofRatio(Decibels.P0_SQUARED / Decibels.W0);
      case CROSS, LAY_UP -> gain(stage, band);
      case ZONE -> gain(stage, band) + Decibels.ofRatio(Decibels.W0 / Decibels.P0_SQUARED);
      case RECEIVER -> gain(stage, band) + AWeighting.weights().value(band);
    };
  }

  /** The running level after a stage, dB in a band; NaN before the wall pressure. */
  double level(Stage stage, int band) {
    double level = Double.NaN;
    for (Stage each : Stage.values()) {
      if (each.ordinal() <= stage.ordinal() && each.ordinal() >= Stage.WALL.ordinal()) {
        double change = change(each, band);
        level = each == Stage.WALL ? change : level + change;
      }
    }
    return level;
  }

  private double gain(Stage stage, int band) {
    return Decibels.ofRatio(product(stage, Role.FACTOR, band));
  }

  private double product(Stage stage, Role role, int band) {
    double product = 1.0;
    for (TraceStep step : of(stage)) {
      if (step.role() == role) {
        product *= step.values().value(band);
      }
    }
    return product;
  }
}
