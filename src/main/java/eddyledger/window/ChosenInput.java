package eddyledger.window;

import com.formdev.flatlaf.FlatClientProperties;
import eddyledger.chart.Palette;
import eddyledger.present.SheetField;
import eddyledger.present.SheetField.Option;
import eddyledger.present.SheetPresenter;
import java.awt.Color;
import java.awt.event.FocusEvent;
import java.awt.event.FocusListener;
import java.util.List;
import javax.swing.DefaultComboBoxModel;
import javax.swing.JComboBox;
import javax.swing.JComponent;

/** A field that is chosen from a list. */
final class ChosenInput implements SheetInput, FocusListener {
  private final String key;
  private final SheetPresenter presenter;
  private final JComboBox<Option> box = new JComboBox<>();
  private List<Option> offered = List.of();
  private String style = "";
  private boolean showing;

  ChosenInput(SheetField field, SheetPresenter presenter) {
    key = field.key();
    this.presenter = presenter;
    box.setFont(Theme.body());
    box.setMaximumRowCount(14);
    box.putClientProperty(FlatClientProperties.MINIMUM_WIDTH, 0);
    box.addFocusListener(this);
    box.addActionListener(e -> choose());
  }

  private void choose() {
    if (!showing && box.getSelectedItem() instanceof Option option) {
      presenter.type(key, option.id());
    }
  }

  @Override
  public JComponent component() {
    return box;
  }

  @Override
  public void show(SheetField field) {
    Theme.named(box, "sheet." + key, field.spoken());
    showing = true;
    if (!offered.equals(field.options())) {
      offered = field.options();
      box.setModel(new DefaultComboBoxModel<>(offered.toArray(Option[]::new)));
    }
    field.options().stream()
        .filter(it -> it.id().equals(field.chosen()))
        .findFirst()
        .ifPresent(box::setSelectedItem);
    showing = false;
    dress(!field.own() && field.message() == null);
    SheetInput.outline(box, field.message());
    box.setToolTipText(field.text());
  }

  private void dress(boolean quiet) {
    Palette palette = Theme.palette();
    String arrow = hex(quiet ? palette.ink3() : palette.ink2());
    String back = hex(quiet ? palette.paper() : palette.field());
    String edge = hex(quiet ? palette.paper() : palette.hairline());
    String wanted =
        "padding: 1,5,1,0; buttonStyle: "
            + (quiet ? "none" : "auto")
            + "; background: "
            + back
            + "; buttonBackground: "
            + back
            + "; buttonArrowColor: "
            + arrow
            + "; borderColor: "
            + edge
            + "; foreground: "
            + hex(quiet ? palette.ink2() : palette.ink());
    if (!wanted.equals(style)) {
      style = wanted;
      box.putClientProperty(FlatClientProperties.STYLE, wanted);
    }
  }

  private static String hex(Color colour) {
    return String.format("#%06x", colour.getRGB() & 0xFFFFFF);
  }

  @Override
  public void focusGained(FocusEvent e) {
    presenter.enter(key);
  }

  @Override
  public void focusLost(FocusEvent e) {
    if (!e.isTemporary()) {
      presenter.leave(key);
    }
  }
}
