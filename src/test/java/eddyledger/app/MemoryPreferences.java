package eddyledger.app;

import java.util.Map;
import java.util.TreeMap;
import java.util.prefs.AbstractPreferences;
import java.util.prefs.BackingStoreException;

/** Preferences that live in memory, and can be told to fail. */
final class MemoryPreferences extends AbstractPreferences {
  private final Map<String, String> values = new TreeMap<>();
  private final Map<String, MemoryPreferences> children = new TreeMap<>();
  private boolean broken;

  MemoryPreferences() {
    this(null, "");
  }

  private MemoryPreferences(AbstractPreferences parent, String name) {
    super(parent, name);
  }

  /** From now on the store answers nothing. */
  void breakDown() {
    broken = true;
    children.values().forEach(MemoryPreferences::breakDown);
  }

  @Override
  protected void putSpi(String key, String value) {
    values.put(key, value);
  }

  @Override
  protected String getSpi(String key) {
    return values.get(key);
  }

  @Override
  protected void removeSpi(String key) {
    values.remove(key);
  }

  @Override
  protected void removeNodeSpi() {
    ((MemoryPreferences) parent()).children.remove(name());
  }

  @Override
  protected String[] keysSpi() {
    return values.keySet().toArray(String[]::new);
  }

  @Override
  protected String[] childrenNamesSpi() throws BackingStoreException {
    if (broken) {
      throw new BackingStoreException("broken");
    }
    return children.keySet().toArray(String[]::new);
  }

  @Override
  protected AbstractPreferences childSpi(String name) {
    return children.computeIfAbsent(name, it -> new MemoryPreferences(this, it));
  }

  @Override
  protected void syncSpi() {}

  @Override
  protected void flushSpi() throws BackingStoreException {
    if (broken) {
      throw new BackingStoreException("broken");
    }
  }
}
