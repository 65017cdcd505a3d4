package eddyledger.window;

import eddyledger.present.SheetField;
import eddyledger.present.SheetMessage;
import eddyledger.present.SheetPresenter;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.SwingConstants;
import net.miginfocom.swing.MigLayout;

/** Many small numbers in four columns, with one message below all of them. */
final class SheetGrid extends JPanel {
  private static final int COLUMNS = 4;
  private static final int WIDTH = 316;

  private final Map<String, SheetInput> inputs = new LinkedHashMap<>();
  private final Map<String, JLabel> labels = new LinkedHashMap<>();
  private final WrapText message = new WrapText(WIDTH);

  SheetGrid(List<SheetField> fields, SheetPresenter presenter) {
    setLayout(
        new MigLayout(
            "insets 0, gap 0, hidemode 3, novisualpadding, wrap " + 2 * COLUMNS,
            "[31!]4[36:40:]4[31!]4[36:40:]4[31!]4[36:40:]4[31!]4[36:40:]"));
    setOpaque(false);
    for (SheetField field : fields) {
      SheetInput input = SheetInput.of(field, presenter);
      JLabel label = new JLabel("", SwingConstants.TRAILING);
      label.setFont(Theme.small());
      label.setLabelFor(input.component());
      inputs.put(field.key(), input);
      labels.put(field.key(), label);
      add(label, "growx, h 23!");
      add(input.component(), "growx, h 20!, w 36:40:48");
    }
    add(message, "newline, span, growx, wmin 0, gapbottom 4");
  }

  /** The component of a field; null if it has none of that key. */
  JComponent target(String key) {
    return inputs.containsKey(key) ? inputs.get(key).component() : null;
  }

  /** Shows the fields as they stand; the same fields in the same order. */
  void show(List<SheetField> fields) {
    SheetMessage first = null;
    for (SheetField field : fields) {
      inputs.get(field.key()).show(field);
      JLabel label = labels.get(field.key());
      label.setText(field.label());
      label.setForeground(Theme.palette().ink2());
      if (first == null && field.message() != null) {
        String words = field.label() + " Hz: " + field.message().text();
        first = new SheetMessage(field.message().severity(), words);
      }
    }
    SheetRowView.message(message, first, Theme.palette());
  }
}
