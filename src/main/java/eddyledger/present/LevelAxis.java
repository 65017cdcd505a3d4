package eddyledger.present;

import java.util.ArrayList;
import java.util.List;

/**
 * The axis of the running level.
 *
 * @param low level at its left end, dB
 * @param high level at its right end, dB
 * @param ticks levels that are marked, dB
 */
public record LevelAxis(double low, double high, List<Integer> ticks) {
  private static final int TICK = 20;
  private static final double AIR = 4.0;

  public LevelAxis {
    ticks = List.copyOf(ticks);
  }

  /** An axis that holds the levels of all stages, in steps of 20 dB. */
  static LevelAxis over(List<TraceStage> stages) {
    List<Double> levels =
        stages.stream().map(TraceStage::level).filter(Double::isFinite).sorted().toList();
    double least = levels.isEmpty() ? 0.0 : levels.get(0);
    double most = levels.isEmpty() ? 100.0 : levels.get(levels.size() - 1);
    int first = TICK * (int) Math.floor((least - AIR) / TICK);
    int last = TICK * (int) Math.ceil((most + AIR) / TICK);
    List<Integer> ticks = new ArrayList<>();
    for (int tick = first; tick <= last; tick += TICK) {
      ticks.add(tick);
    }
    return new LevelAxis(first, last, ticks);
  }
}
