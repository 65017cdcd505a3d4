package eddyledger.ledger;

import eddyledger.physics.vibration.RadiationCache;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/**
 * What was computed before: panel results by resolved input, radiation efficiencies by size and
 * wavenumber. After a run it keeps what that run used, so it does not grow with the edits of a day.
 * May be shared by threads; runs that share it should follow one another.
 */
public final class LedgerCache {
  private final RadiationCache radiation = new RadiationCache();
  private volatile Map<PanelInput, PanelResult> results = Map.of();

  /** An empty cache. */
  public LedgerCache() {}

  RadiationCache radiation() {
    return radiation;
  }

  /** The result for an input, from the last run; null if there is none. */
  PanelResult known(PanelInput input) {
    return results.get(input);
  }

  /** Keeps the results of a run and forgets all others. */
  void keep(Map<PanelInput, PanelResult> used) {
    results = new ConcurrentHashMap<>(used);
  }
}
