package eddyledger.window;

import eddyledger.present.SheetField;
import eddyledger.present.SheetPresenter;
import java.util.List;
import javax.swing.ButtonGroup;
import javax.swing.JCheckBoxMenuItem;
import javax.swing.JMenuItem;
import javax.swing.JPopupMenu;
import javax.swing.JRadioButtonMenuItem;

/** The menu of a field: its units, one condition or all, and the way back. */
final class SheetMenu extends JPopupMenu {
  private final SheetPresenter presenter;
  private List<Object> filled = List.of();

  SheetMenu(SheetPresenter presenter) {
    this.presenter = presenter;
  }

  /** Offers what a field can do. */
  void show(SheetField field) {
    List<Object> now =
        List.of(field.key(), field.unit(), field.units(), field.only(), field.back(), field.link());
    if (!now.equals(filled)) {
      filled = now;
      fill(field);
    }
  }

  private void fill(SheetField field) {
    removeAll();
    ButtonGroup group = new ButtonGroup();
    for (String unit : field.units()) {
      String words = unit.isEmpty() ? "As a plain number" : "In " + unit;
      JMenuItem item = new JRadioButtonMenuItem(words, unit.equals(field.unit()));
      item.addActionListener(e -> presenter.unit(field.key(), unit));
      group.add(item);
      add(item);
    }
    separate();
    if (!field.only().words().isEmpty()) {
      JMenuItem item = new JCheckBoxMenuItem(field.only().words(), field.only().on());
      item.addActionListener(e -> presenter.only(field.key()));
      add(item);
    }
    if (!field.back().isEmpty()) {
      add(item("Go " + field.back(), () -> presenter.back(field.key())));
    }
    if (!field.link().isEmpty()) {
      add(item(field.link(), () -> presenter.link(field.key())));
    }
  }

  private static JMenuItem item(String words, Runnable what) {
    JMenuItem item = new JMenuItem(words);
    item.addActionListener(e -> what.run());
    return item;
  }

  private void separate() {
    if (getComponentCount() > 0) {
      addSeparator();
    }
  }
}
