package eddyledger.window;

import eddyledger.chart.Palette;
import java.awt.Rectangle;
import java.util.prefs.Preferences;

/** What the window remembers from one day to the next: theme, place, splits. */
final class WindowMemory {
  private final Preferences store;

  WindowMemory(Preferences store) {
    this.store = store;
  }

  Palette palette() {
    return store.getBoolean("dark", false) ? Palette.DARK : Palette.LIGHT;
  }

  void palette(Palette palette) {
    store.putBoolean("dark", palette.dark());
  }

  /** Place and size; null if none is kept. */
  Rectangle bounds() {
    int width = store.getInt("width", 0);
    int height = store.getInt("height", 0);
    if (width < 400 || height < 300) {
      return null;
    }
    return new Rectangle(store.getInt("x", 0), store.getInt("y", 0), width, height);
  }

  void bounds(Rectangle bounds) {
    store.putInt("x", bounds.x);
    store.putInt("y", bounds.y);
    store.putInt("width", bounds.width);
    store.putInt("height", bounds.height);
  }

  boolean maximized() {
    return store.getBoolean("maximized", false);
  }

  void maximized(boolean value) {
    store.putBoolean("maximized", value);
  }

  /** Part of the desk's height that the ledger has. */
  double ledgerShare(double otherwise) {
    double share = store.getDouble("ledger", otherwise);
    return share > 0.02 && share < 0.98 ? share : otherwise;
  }

  void keepLedgerShare(double share) {
    store.putDouble("ledger", share);
  }

  /** Width of the sheet, pixels. */
  int sheetWidth(int otherwise) {
    int width = store.getInt("sheet", otherwise);
    return width >= 200 ? width : otherwise;
  }

  void keepSheetWidth(int width) {
    store.putInt("sheet", width);
  }
}
