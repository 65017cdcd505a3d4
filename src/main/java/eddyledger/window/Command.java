package eddyledger.window;

import java.awt.event.ActionEvent;
import java.util.function.BooleanSupplier;
import java.util.function.Supplier;
import javax.swing.AbstractAction;
import javax.swing.Action;
import javax.swing.KeyStroke;

/** One thing the user can ask for, with its words, its key and when it can be had. */
final class Command extends AbstractAction {
  private static final long serialVersionUID = 1L;

  private final transient Runnable work;
  private final transient BooleanSupplier possible;
  private final transient Supplier<String> words;

  private Command(
      String name, Supplier<String> words, String key, Runnable work, BooleanSupplier possible) {
    this.words = words;
    this.work = work;
    this.possible = possible;
    putValue(Action.ACTION_COMMAND_KEY, name);
    if (!key.isEmpty()) {
      putValue(Action.ACCELERATOR_KEY, KeyStroke.getKeyStroke(key));
    }
    refresh();
  }

  /**
   * A command.
   *
   * @param name its name for tests, for instance {@code file.open}
   * @param words what the menu says
   * @param key its key as {@link KeyStroke#getKeyStroke(String)} reads it; empty for none
   */
  static Command of(
      String name, String words, String key, Runnable work, BooleanSupplier possible) {
    return new Command(name, () -> words, key, work, possible);
  }

  /** A command that can always be had. */
  static Command of(String name, String words, String key, Runnable work) {
    return of(name, words, key, work, () -> true);
  }

  /** A command whose words change. */
  static Command worded(
      String name, Supplier<String> words, String key, Runnable work, BooleanSupplier possible) {
    return new Command(name, words, key, work, possible);
  }

  /** Its name for tests. */
  String name() {
    return (String) getValue(Action.ACTION_COMMAND_KEY);
  }

  /** Says again what it is called and whether it can be had. */
  void refresh() {
    putValue(Action.NAME, words.get());
    setEnabled(possible.getAsBoolean());
  }

  @Override
  public void actionPerformed(ActionEvent event) {
    if (possible.getAsBoolean()) {
      work.run();
    }
  }
}
