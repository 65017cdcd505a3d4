package eddyledger.window;

import eddyledger.check.Cautions;
import java.awt.Component;
import java.awt.event.InputEvent;
import java.awt.event.KeyEvent;
import java.util.List;
import java.util.stream.Collectors;
import javax.swing.Action;
import javax.swing.JOptionPane;
import javax.swing.KeyStroke;

/** The list of keys, and the cautions. */
final class Help {
  private Help() {}

  static void showKeys(Component parent, List<Command> commands) {
    String menuKeys =
        commands.stream()
            .filter(command -> command.getValue(Action.ACCELERATOR_KEY) != null)
            .map(
                command ->
                    keyText((KeyStroke) command.getValue(Action.ACCELERATOR_KEY))
                        + "\t"
                        + command.getValue(Action.NAME))
            .collect(Collectors.joining("\n"));
    String ledgerKeys =
        """

        In the ledger
        Up, Down\tfrom row to row
        Right, Left\topen, close; to the first row below, to the section above
        Enter\topen or close
        * \topen everything

        In the sheet
        Tab\tfrom field to field
        Escape\tback to what the field held
        """;
    JOptionPane.showMessageDialog(
        parent, Wrapped.text(menuKeys + "\n" + ledgerKeys), "Keys", JOptionPane.PLAIN_MESSAGE);
  }

  private static String keyText(KeyStroke key) {
    String modifiers = InputEvent.getModifiersExText(key.getModifiers());
    String name = KeyEvent.getKeyText(key.getKeyCode());
    return modifiers.isEmpty() ? name : modifiers + "+" + name;
  }

  static void showCautions(Component parent) {
    JOptionPane.showMessageDialog(
        parent, Wrapped.text(Cautions.text()), "Cautions", JOptionPane.PLAIN_MESSAGE);
  }
}
