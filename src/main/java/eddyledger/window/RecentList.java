package eddyledger.window;

import eddyledger.present.RecentLine;
import java.awt.Point;
import java.awt.event.ActionEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.AbstractAction;
import javax.swing.DefaultListModel;
import javax.swing.JList;
import javax.swing.JMenuItem;
import javax.swing.JPopupMenu;
import javax.swing.KeyStroke;
import javax.swing.ListSelectionModel;

/** The files opened lately: up and down choose, Enter opens, Delete takes one off the list. */
final class RecentList extends JList<RecentLine> {
  private static final int MOST_VISIBLE = 7;

  private final transient Consumer<Path> open;
  private final transient Consumer<Path> forget;

  RecentList(Consumer<Path> open, Consumer<Path> forget) {
    super(new DefaultListModel<>());
    this.open = open;
    this.forget = forget;
    Theme.named(this, "start.recent", "Recent files");
    getAccessibleContext()
        .setAccessibleDescription("Enter opens, Delete takes a file off the list");
    setCellRenderer(new RecentCell());
    setFixedCellHeight(RecentCell.HEIGHT);
    setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
    key("ENTER", this::openSelected);
    key("DELETE", this::forgetSelected);
    addMouseListener(
        new MouseAdapter() {
          @Override
          public void mouseClicked(MouseEvent event) {
            boolean twice = event.getClickCount() == 2 && event.getButton() == MouseEvent.BUTTON1;
            if (twice && at(event.getPoint()) >= 0) {
              openSelected();
            }
          }

          @Override
          public void mousePressed(MouseEvent event) {
            popup(event);
          }

          @Override
          public void mouseReleased(MouseEvent event) {
            popup(event);
          }
        });
  }

  private void key(String key, Runnable action) {
    getInputMap(WHEN_FOCUSED).put(KeyStroke.getKeyStroke(key), key);
    getActionMap()
        .put(
            key,
            new AbstractAction() {
              @Override
              public void actionPerformed(ActionEvent event) {
                action.run();
              }
            });
  }

  private int at(Point point) {
    int index = locationToIndex(point);
    return index >= 0 && getCellBounds(index, index).contains(point) ? index : -1;
  }

  private void popup(MouseEvent event) {
    int index = at(event.getPoint());
    if (!event.isPopupTrigger() || index < 0) {
      return;
    }
    setSelectedIndex(index);
    JPopupMenu menu = Theme.named(new JPopupMenu(), "start.recent-menu", "Recent file");
    menu.add(item("Open", "start.recent-open", this::openSelected));
    menu.add(item("Take off the list", "start.recent-forget", this::forgetSelected));
    menu.show(this, event.getX(), event.getY());
  }

  private static JMenuItem item(String text, String name, Runnable action) {
    JMenuItem item = Theme.named(new JMenuItem(text), name, text);
    item.addActionListener(event -> action.run());
    return item;
  }

  private void openSelected() {
    if (getSelectedValue() != null) {
      open.accept(getSelectedValue().file());
    }
  }

  private void forgetSelected() {
    if (getSelectedValue() != null) {
      forget.accept(getSelectedValue().file());
    }
  }

  /** Shows some files; the selection stays at its place in the list. */
  void show(List<RecentLine> lines) {
    int selected = Math.max(0, getSelectedIndex());
    DefaultListModel<RecentLine> model = new DefaultListModel<>();
    lines.forEach(model::addElement);
    setModel(model);
    setVisibleRowCount(Math.max(1, Math.min(MOST_VISIBLE, lines.size())));
    if (!lines.isEmpty()) {
      setSelectedIndex(Math.min(selected, lines.size() - 1));
    }
  }
}
