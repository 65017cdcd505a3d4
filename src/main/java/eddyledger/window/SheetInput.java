package eddyledger.window;

import eddyledger.present.SheetField;
import eddyledger.present.SheetMessage;
import eddyledger.present.SheetPresenter;
import javax.swing.JComponent;

/** What a field of the sheet is read and edited with. */
interface SheetInput {
  /** The component. */
  JComponent component();

  /** Shows the field as it stands; what is being typed is left alone. */
  void show(SheetField field);

  /** The input that fits a field. */
  static SheetInput of(SheetField field, SheetPresenter presenter) {
    return switch (field.kind()) {
      case NUMBER, TEXT -> new TypedInput(field, presenter);
      case CHOICE -> new ChosenInput(field, presenter);
      case SHOWN -> new ShownValue(field);
    };
  }

  /** Outlines a component whose field has a message. */
  static void outline(JComponent component, SheetMessage message) {
    String outline =
        message == null
            ? null
            : message.severity().atLeast(eddyledger.check.Severity.ERROR) ? "error" : "warning";
    component.putClientProperty("JComponent.outline", outline);
    component
        .getAccessibleContext()
        .setAccessibleDescription(message == null ? null : message.text());
  }

  /** A tooltip, with its lines; none if the text is empty. */
  static String tip(String text) {
    if (text.isEmpty()) {
      return null;
    }
    String safe = text.replace("&", "&amp;").replace("<", "&lt;");
    return "<html>" + safe.replace("\n", "<br>") + "</html>";
  }
}
