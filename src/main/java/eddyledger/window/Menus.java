package eddyledger.window;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.JMenu;
import javax.swing.JMenuBar;
import javax.swing.JMenuItem;
import javax.swing.event.MenuEvent;
import javax.swing.event.MenuListener;

/** The menu bar, from commands; a null command is a line between groups. */
final class Menus {
  private final JMenuBar bar = new JMenuBar();
  private final List<Command> commands = new ArrayList<>();

  Menus() {
    Theme.named(bar, "menu", "Menu");
  }

  /** Adds a menu with its commands. */
  JMenu add(String words, char mnemonic, Command... entries) {
    JMenu menu = Theme.named(new JMenu(words), "menu." + words.toLowerCase(), words);
    menu.setMnemonic(mnemonic);
    for (Command entry : entries) {
      if (entry == null) {
        menu.addSeparator();
      } else {
        commands.add(entry);
        JMenuItem item = new JMenuItem(entry);
        item.setName("menu." + entry.name());
        menu.add(item);
      }
    }
    bar.add(menu);
    return menu;
  }

  /** Adds a menu within a menu whose entries are made when it opens. */
  void addChanging(JMenu into, int position, String words, Consumer<JMenu> fill) {
    JMenu menu = Theme.named(new JMenu(words), "menu.recent", words);
    menu.addMenuListener(
        new MenuListener() {
          @Override
          public void menuSelected(MenuEvent event) {
            menu.removeAll();
            fill.accept(menu);
          }

          @Override
          public void menuDeselected(MenuEvent event) {}

          @Override
          public void menuCanceled(MenuEvent event) {}
        });
    into.insert(menu, position);
  }

  /** Says again what every command is called and whether it can be had. */
  void refresh() {
    commands.forEach(Command::refresh);
  }

  /** Every command, for the list of keys. */
  List<Command> commands() {
    return List.copyOf(commands);
  }

  JMenuBar bar() {
    return bar;
  }
}
