package eddyledger.ledger;

import eddyledger.model.ByCondition;
import eddyledger.model.InheritedSettings;
import eddyledger.model.Settings;
import java.util.function.Function;

/**
 * Looks up the settings of a panel in a condition and notes where they are from.
 *
 * @param settings what holds at the panel
 * @param condition id of the condition
 * @param origins where what was looked up is noted
 */
record PanelLookup(InheritedSettings settings, String condition, Origins origins) {

  /** A setting that does not change with the condition; null if nobody set it. */
  <T> T fixed(String key, Function<Settings, T> setting) {
    return origins.note(key, settings.find(setting));
  }

  /** A setting as it is in the condition; null if nobody set it. */
  <T> T varying(String key, Function<Settings, ByCondition<T>> setting) {
    return origins.note(key, settings.find(setting, condition));
  }

  /** A setting as it is in the condition, or a default. */
  <T> T orDefault(String key, Function<Settings, ByCondition<T>> setting, T otherwise) {
    T value = varying(key, setting);
    if (value == null) {
      origins.defaulted(key);
      return otherwise;
    }
    return value;
  }
}
