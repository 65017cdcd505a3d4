package eddyledger.window;

import eddyledger.chart.Palette;
import eddyledger.present.SheetField;
import eddyledger.present.SheetField.Weight;
import java.awt.Color;
import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.SwingConstants;

/** A value that cannot be edited: a number right-aligned with the fields, or text that wraps. */
final class ShownValue implements SheetInput {
  private static final int TEXT_WIDTH = 220;

  private final String key;
  private final JLabel number = new JLabel("", SwingConstants.TRAILING);
  private final WrapText words = new WrapText(TEXT_WIDTH);
  private final boolean text;

  ShownValue(SheetField field) {
    key = field.key();
    text = field.unit().isEmpty();
    number.setBorder(BorderFactory.createEmptyBorder(0, 0, 0, 6));
    words.setBorder(BorderFactory.createEmptyBorder(3, 6, 3, 0));
    words.setFont(Theme.body());
  }

  @Override
  public JComponent component() {
    return text ? words : number;
  }

  @Override
  public void show(SheetField field) {
    Palette palette = Theme.palette();
    Theme.named(component(), "sheet." + key, field.spokenWithUnit());
    boolean strong = field.weight() == Weight.RESULT;
    Color ink = field.weight() == Weight.FAINT ? palette.ink2() : palette.ink();
    Color stated = field.state() == null || !strong ? ink : palette.stateText(field.state());
    number.setText(field.text());
    number.setFont(strong ? Theme.strong(12) : Theme.body());
    number.setForeground(stated);
    number.setToolTipText(SheetInput.tip(field.tip()));
    words.setText(field.text());
    words.setForeground(palette.ink2());
  }
}
