package eddyledger.window;

import eddyledger.present.SheetField;
import eddyledger.present.SheetField.Kind;
import eddyledger.present.SheetPresenter;
import java.awt.event.ActionEvent;
import java.awt.event.FocusEvent;
import java.awt.event.FocusListener;
import javax.swing.AbstractAction;
import javax.swing.JComponent;
import javax.swing.KeyStroke;
import javax.swing.SwingConstants;
import javax.swing.SwingUtilities;
import javax.swing.event.DocumentEvent;
import javax.swing.event.DocumentListener;

/** A field that is typed into; every keystroke counts at once. */
final class TypedInput implements SheetInput, FocusListener, DocumentListener {
  private final String key;
  private final SheetPresenter presenter;
  private final QuietField text = new QuietField();
  private boolean showing;
  private boolean waiting;

  TypedInput(SheetField field, SheetPresenter presenter) {
    key = field.key();
    this.presenter = presenter;
    text.setHorizontalAlignment(
        field.kind() == Kind.TEXT ? SwingConstants.LEADING : SwingConstants.TRAILING);
    text.getDocument().addDocumentListener(this);
    text.addFocusListener(this);
    bind("ENTER", this::enter);
    bind("ESCAPE", () -> presenter.escape(key));
  }

  private void bind(String stroke, Runnable what) {
    text.getInputMap().put(KeyStroke.getKeyStroke(stroke), stroke);
    text.getActionMap()
        .put(
            stroke,
            new AbstractAction() {
              @Override
              public void actionPerformed(ActionEvent e) {
                flush();
                what.run();
              }
            });
  }

  private void enter() {
    presenter.commit(key);
    text.selectAll();
  }

  @Override
  public JComponent component() {
    return text;
  }

  @Override
  public void show(SheetField field) {
    Theme.named(text, "sheet." + key, field.spokenWithUnit());
    if (!waiting && !text.getText().equals(field.text())) {
      showing = true;
      text.setText(field.text());
      // a narrow field would show the end of its text
      text.setCaretPosition(text.isFocusOwner() ? field.text().length() : 0);
      showing = false;
    }
    text.quiet(!field.own() && field.message() == null && !field.text().isEmpty());
    SheetInput.outline(text, field.message());
    text.setToolTipText(SheetInput.tip(field.tip()));
  }

  @Override
  public void focusGained(FocusEvent e) {
    presenter.enter(key);
  }

  @Override
  public void focusLost(FocusEvent e) {
    if (!e.isTemporary()) {
      flush();
      presenter.leave(key);
      text.setCaretPosition(0);
    }
  }

  private void changed() {
    if (!showing && !waiting) {
      // typing over a selection removes and inserts: only what stands in the end counts
      waiting = true;
      SwingUtilities.invokeLater(this::flush);
    }
  }

  private void flush() {
    if (waiting) {
      waiting = false;
      if (!text.isDisplayable()) {
        return; // another row's sheet has come meanwhile
      }
      presenter.type(key, text.getText());
    }
  }

  @Override
  public void insertUpdate(DocumentEvent e) {
    changed();
  }

  @Override
  public void removeUpdate(DocumentEvent e) {
    changed();
  }

  @Override
  public void changedUpdate(DocumentEvent e) {
    // only attributes
  }
}
