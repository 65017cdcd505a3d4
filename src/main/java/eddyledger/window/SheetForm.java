package eddyledger.window;

import eddyledger.chart.Palette;
import eddyledger.present.SheetField;
import eddyledger.present.SheetMessage;
import eddyledger.present.SheetPresenter;
import eddyledger.present.SheetText;
import java.awt.Color;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.Font;
import java.awt.Rectangle;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.awt.event.FocusListener;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.Scrollable;
import net.miginfocom.swing.MigLayout;

/**
 * The lines of the sheet under one another. When the list of fields changes, lines come and go; a
 * line that stays is never touched, so that the field being typed in keeps focus and caret.
 */
final class SheetForm extends JPanel implements Scrollable {
  private static final int LINE = 22;
  private static final int WIDTH = 316;

  private final SheetPresenter presenter;
  private final JComponent traceButton;
  private final Map<String, JComponent> lines = new LinkedHashMap<>();
  private final FocusListener intoSight =
      new FocusAdapter() {
        @Override
        public void focusGained(FocusEvent event) {
          // what is in sight must not move: the mouse may have pressed and not yet released it
          JComponent component = (JComponent) event.getComponent();
          if (component.getVisibleRect().height < component.getHeight()) {
            SheetView.reveal(component);
          }
        }
      };
  private final List<String> wanted = new ArrayList<>();
  private String row = "";
  private boolean grown;

  SheetForm(SheetPresenter presenter, JComponent traceButton) {
    super(
        new MigLayout(
            "insets 10 16 12 4, gap 0, wrap 1, fillx, hidemode 3, novisualpadding",
            "[0:480:480,grow,fill]"));
    this.presenter = presenter;
    this.traceButton = traceButton;
  }

  /** Shows the sheet as it stands. */
  void show(SheetText text) {
    Palette palette = Theme.palette();
    setBackground(palette.paper());
    if (!text.row().equals(row)) {
      // groups of another row may stand in another order
      row = text.row();
      lines.clear();
      removeAll();
    }
    wanted.clear();
    label("title", text.title(), Theme.strong(15), palette.ink(), "wmin 0, h 22!");
    label("trail", text.trail(), Theme.small(), palette.ink2(), "wmin 0, h 16!, gapbottom 2");
    for (int i = 0; i < text.messages().size(); i++) {
      said("message" + i, text.messages().get(i));
    }
    for (SheetText.Group group : text.groups()) {
      String heading = "heading." + group.key();
      label(heading, group.heading(), Theme.strong(12), palette.ink(), "gaptop 8, h 21!, wmin 0");
      if (!group.note().isEmpty()) {
        WrapText note =
            line("note." + group.key(), () -> new WrapText(WIDTH), "growx, wmin 0, gapbottom 4");
        note.setText(group.note());
        note.setForeground(palette.ink2());
      }
      if (group.grid() && !group.fields().isEmpty()) {
        String key = "grid." + text.row();
        SheetGrid grid = line(key, () -> new SheetGrid(group.fields(), presenter), "growx");
        grid.show(group.fields());
      } else {
        group.fields().forEach(field -> field(text.row(), field));
      }
      if (group.key().equals("budget") && text.traced()) {
        line("trace", () -> traceButton, "h 22!, growx 0, gaptop 2");
      }
    }
    if (lines.entrySet().removeIf(entry -> gone(entry.getKey(), entry.getValue())) || grown) {
      grown = false;
      revalidate();
      repaint();
    }
  }

  private boolean gone(String key, JComponent line) {
    if (wanted.contains(key)) {
      return false;
    }
    remove(line);
    return true;
  }

  private void field(String row, SheetField field) {
    String key = row + "/" + field.kind() + "/" + field.key();
    SheetRowView line = line(key, () -> new SheetRowView(field, presenter), "growx");
    line.show(field);
  }

  private void said(String key, SheetMessage message) {
    WrapText text = line(key, () -> new WrapText(WIDTH), "growx, wmin 0, gaptop 4");
    SheetRowView.message(text, message, Theme.palette());
  }

  private void label(String key, String words, Font font, Color ink, String constraints) {
    JLabel label = line(key, JLabel::new, constraints);
    label.setText(words);
    label.setVisible(!words.isEmpty());
    label.setToolTipText(words.isEmpty() ? null : words);
    if (!font.equals(label.getFont())) {
      label.setFont(font);
    }
    label.setForeground(ink);
    Theme.named(label, "sheet." + key, words);
  }

  /** The line of a key, made at its place if it is not there yet. */
  private <T extends JComponent> T line(String key, Supplier<T> maker, String constraints) {
    int index = wanted.size();
    wanted.add(key);
    JComponent line = lines.get(key);
    if (line == null) {
      line = maker.get();
      lines.put(key, line);
      grown = true;
      follow(line);
      add(line, constraints, Math.min(placeOf(index), getComponentCount()));
    }
    @SuppressWarnings("unchecked")
    T typed = (T) line;
    return typed;
  }

  /** Whatever takes the focus comes into sight. */
  private void follow(JComponent line) {
    line.addFocusListener(intoSight);
    for (Component part : line.getComponents()) {
      if (part instanceof JComponent component && !(part instanceof JLabel)) {
        component.addFocusListener(intoSight);
      }
    }
  }

  /** After the line wanted before it, so that lines about to go do not count. */
  private int placeOf(int index) {
    return index == 0 ? 0 : getComponentZOrder(lines.get(wanted.get(index - 1))) + 1;
  }

  /** The component of a field that takes the focus; null if there is none. */
  JComponent target(String key) {
    for (JComponent line : lines.values()) {
      if (line instanceof SheetGrid grid && grid.target(key) != null) {
        return grid.target(key);
      }
      if (line instanceof SheetRowView row && ("sheet." + key).equals(row.target().getName())) {
        return row.target();
      }
    }
    return null;
  }

  @Override
  public Dimension getPreferredScrollableViewportSize() {
    return getPreferredSize();
  }

  @Override
  public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
    return LINE;
  }

  @Override
  public int getScrollableBlockIncrement(Rectangle visible, int orientation, int direction) {
    return Math.max(LINE, visible.height - LINE);
  }

  @Override
  public boolean getScrollableTracksViewportWidth() {
    return true;
  }

  @Override
  public boolean getScrollableTracksViewportHeight() {
    return false;
  }
}
