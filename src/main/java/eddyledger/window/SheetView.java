package eddyledger.window;

import eddyledger.present.SheetPresenter;
import java.awt.BorderLayout;
import java.awt.Dimension;
import java.awt.Rectangle;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.SwingUtilities;

/** The sheet: the form of the selected row, at the right of the desk. */
public final class SheetView extends JPanel {
  private static final int WIDTH = 348;
  private static final int LEAST = 300;
  private static final int LINES_AROUND = 30;

  private final SheetPresenter presenter;
  private final JButton trace = new LinkButton(null, "How this level comes about");
  private final SheetForm form;
  private String row = "";

  /**
   * A view of a presenter's sheet.
   *
   * @param showTrace shows the account of the selected panel's level
   */
  public SheetView(SheetPresenter presenter, Runnable showTrace) {
    super(new BorderLayout());
    this.presenter = presenter;
    trace.addActionListener(event -> showTrace.run());
    Theme.named(trace, "sheet.trace", trace.getText());
    form = new SheetForm(presenter, trace);
    // the bar keeps its room, so that lines do not shift when it comes; its track is not seen
    JScrollPane scroll =
        new JScrollPane(
            form, JScrollPane.VERTICAL_SCROLLBAR_ALWAYS, JScrollPane.HORIZONTAL_SCROLLBAR_NEVER);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    scroll.getVerticalScrollBar().setUnitIncrement(22);
    add(new SoftEdge(scroll));
    Theme.named(this, "sheet", "Sheet of the selected row");
    presenter.listen(this::refresh);
    refresh();
  }

  private void refresh() {
    trace.setForeground(Theme.palette().accent());
    form.getParent().setBackground(Theme.palette().paper());
    var text = presenter.text();
    form.show(text);
    if (!text.row().equals(row)) {
      row = text.row();
      form.scrollRectToVisible(new Rectangle(0, 0, 1, 1));
    }
  }

  @Override
  public void updateUI() {
    super.updateUI();
    if (form != null) {
      // colours of the theme are set field by field
      SwingUtilities.invokeLater(this::refresh);
    }
  }

  /** Puts the focus into a field and brings it into sight; does nothing if there is none. */
  public void focusField(String key) {
    JComponent target = form.target(key);
    if (target != null) {
      reveal(target);
      target.requestFocusInWindow();
    }
  }

  /** Scrolls a field into sight, with a line above and below. */
  static void reveal(JComponent component) {
    component.scrollRectToVisible(
        new Rectangle(
            0, -LINES_AROUND, component.getWidth(), component.getHeight() + 2 * LINES_AROUND));
  }

  @Override
  public Dimension getPreferredSize() {
    return new Dimension(WIDTH, super.getPreferredSize().height);
  }

  @Override
  public Dimension getMinimumSize() {
    return new Dimension(LEAST, 0);
  }
}
