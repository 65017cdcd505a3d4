package eddyledger.window;

import eddyledger.chart.Digits;
import eddyledger.chart.Palette;
import eddyledger.check.Severity;
import eddyledger.ledger.State;
import eddyledger.present.SheetField;
import eddyledger.present.SheetField.Kind;
import eddyledger.present.SheetField.Weight;
import eddyledger.present.SheetMessage;
import eddyledger.present.SheetPresenter;
import java.awt.Color;
import java.awt.Cursor;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import net.miginfocom.swing.MigLayout;

/** One field of the sheet: label, value, unit, origin or way back, and what is said below it. */
final class SheetRowView extends JPanel {
  private static final int MESSAGE_WIDTH = 214;
  private static final int LONGEST_NUMBER = 12;
  private static final String ORIGIN = ", growx";
  private static final String BACK = ", growx, h 20!";
  private static final int CHOICE = 119;
  private static final int WIDE_CHOICE = 156;
  private static final int LONG_CHOICE = 224;
  private static final int ROOM_FOR_ARROW = 25;

  private final SheetPresenter presenter;
  private final SheetInput input;
  private final SheetMenu menu;
  private final MigLayout layout;
  private final JLabel label = new JLabel();
  private final JLabel unit = new JLabel();
  private final JLabel origin = new JLabel();
  private final LinkButton back = new LinkButton(new BackIcon(), "");
  private final JButton link = new LinkButton(null, "");
  private final WrapText message = new WrapText(MESSAGE_WIDTH);
  private SheetField shown;
  private Palette inked;

  SheetRowView(SheetField field, SheetPresenter presenter) {
    this.presenter = presenter;
    input = SheetInput.of(field, presenter);
    menu = new SheetMenu(presenter);
    layout =
        new MigLayout(
            "insets 0, gap 0, hidemode 3, novisualpadding",
            "[96!][78!]6[35!]4[grow,fill]",
            "[22::,center][]0[]");
    setLayout(layout);
    setOpaque(false);
    label.setFont(Theme.body());
    label.setLabelFor(input.component());
    unit.setFont(Theme.small());
    origin.setFont(Theme.small());
    add(label, "cell 0 0, wmin 0, wmax 94");
    add(input.component(), place(field));
    add(unit, "cell 2 0, wmin 0");
    add(origin, behind(field) + ORIGIN);
    add(back, behind(field) + BACK);
    add(message, "cell 1 1 3 1, growx, wmin 0, gapbottom 4");
    add(link, "cell 1 2 3 1, h 20!, wmin 0");
    input.component().setComponentPopupMenu(menu);
    back.addActionListener(e -> presenter.back(shown.key()));
    link.addActionListener(e -> presenter.link(shown.key()));
    unit.addMouseListener(
        new MouseAdapter() {
          @Override
          public void mousePressed(MouseEvent e) {
            if (!shown.units().isEmpty()) {
              menu.show(unit, 0, unit.getHeight());
            }
          }
        });
  }

  private static String place(SheetField field) {
    boolean rest =
        field.kind() == Kind.TEXT || field.kind() == Kind.SHOWN && field.unit().isEmpty();
    if (rest) {
      return "cell 1 0 3 1, growx, wmin 0" + (field.kind() == Kind.TEXT ? ", h 20!" : "");
    }
    if (field.kind() == Kind.CHOICE) {
      String width = fits(field) ? CHOICE + "!" : WIDE_CHOICE + ":" + LONG_CHOICE + ":";
      return "cell 1 0 3 1, h 20!, w " + width;
    }
    String size = wide(field) ? "cell 1 0 3 1, w " + WIDE_CHOICE + "!" : "cell 1 0, w 78!";
    return size + ", h 20!";
  }

  /** Whether a choice is aligned with the fields above it; else it leaves a short origin only. */
  private static boolean fits(SheetField field) {
    return Digits.width(Theme.body(), field.text()) + ROOM_FOR_ARROW <= CHOICE;
  }

  /** Whether a number needs more room than numbers have, as a table of them does. */
  private static boolean wide(SheetField field) {
    return field.kind() == Kind.NUMBER && field.text().length() > LONGEST_NUMBER;
  }

  private static String behind(SheetField field) {
    return field.kind() == Kind.CHOICE || wide(field)
        ? "cell 1 0, gapleft 4, wmin 56"
        : "cell 3 0, wmin 0";
  }

  /** The component that takes the focus. */
  JComponent target() {
    return input.component();
  }

  /** Shows the field as it stands. */
  void show(SheetField field) {
    Palette palette = Theme.palette();
    input.show(field);
    if (field.equals(shown) && palette == inked) {
      return; // most fields stay as they are when one is edited
    }
    if (shown == null || !place(field).equals(place(shown))) {
      layout.setComponentConstraints(input.component(), place(field));
      layout.setComponentConstraints(origin, behind(field) + ORIGIN);
      layout.setComponentConstraints(back, behind(field) + BACK);
    }
    shown = field;
    inked = palette;
    label.setText(field.label());
    label.setToolTipText(field.spoken());
    boolean faint = !field.own() && field.weight() != Weight.RESULT;
    label.setForeground(faint ? palette.ink2() : palette.ink());
    unit.setText(field.unit());
    unit.setVisible(field.kind() != Kind.CHOICE && !wide(field));
    unit.setForeground(palette.ink2());
    boolean several = !field.units().isEmpty();
    unit.setCursor(several ? Cursor.getPredefinedCursor(Cursor.HAND_CURSOR) : null);
    unit.setToolTipText(several ? "Click for other units" : null);
    menu.show(field);
    origin(field, palette);
    link.setVisible(!field.link().isEmpty());
    link.setText(field.link());
    link.setForeground(palette.accent());
    Theme.named(link, "sheet." + field.key() + ".link", field.spoken() + ": " + field.link());
    message(message, field.message(), palette);
  }

  private void origin(SheetField field, Palette palette) {
    boolean way = !field.back().isEmpty();
    boolean special = field.only().on();
    origin.setVisible(!way && field.kind() != Kind.TEXT);
    origin.setText(field.origin());
    origin.setToolTipText(field.origin().isEmpty() ? null : field.origin());
    State state = field.state();
    boolean margin = field.key().equals("margin") && !field.origin().isEmpty();
    boolean fresh = margin && field.weight() == Weight.RESULT;
    origin.setIcon(margin ? new MarkIcon(state) : null);
    Color ink = field.own() ? palette.ink() : palette.ink2();
    origin.setForeground(fresh ? palette.stateText(state) : ink);
    origin.setFont(fresh ? Theme.strong(12) : Theme.small());
    back.setVisible(way);
    back.texts(special ? field.origin() : field.back(), "back");
    back.setForeground(palette.ink2());
    back.setToolTipText(SheetInput.tip(field.origin() + "; " + field.back()));
    Theme.named(back, "sheet." + field.key() + ".back", field.spoken() + ": " + field.back());
  }

  /** Shows a message in the ink of its severity; hides the text if there is none. */
  static void message(WrapText text, SheetMessage message, Palette palette) {
    text.setVisible(message != null);
    if (message != null) {
      text.setText(message.text());
      boolean error = message.severity().atLeast(Severity.ERROR);
      text.setForeground(palette.stateText(error ? State.OVER : State.TIGHT));
    }
  }
}
