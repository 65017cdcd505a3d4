package eddyledger.window;

import eddyledger.chart.Palette;
import eddyledger.check.Finding;
import eddyledger.present.FindingsPresenter;
import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.dnd.DropTarget;
import java.awt.event.ActionEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.AbstractAction;
import javax.swing.BorderFactory;
import javax.swing.DefaultListModel;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.KeyStroke;
import javax.swing.ListCellRenderer;
import net.miginfocom.swing.MigLayout;

/** The list of findings; Enter or a click goes to the row and field a finding is about. */
final class FindingsView extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final int HEAD = 30;
  private static final int ROW = 37;

  private final transient FindingsPresenter presenter;
  private final transient Consumer<Finding> go;
  private final DefaultListModel<Finding> model = new DefaultListModel<>();
  private final JList<Finding> list =
      Theme.named(new Findings(model), "findings.list", "Findings, the gravest first");
  private final JLabel heading = new JLabel("Findings");

  FindingsView(FindingsPresenter presenter, Consumer<Finding> go, Runnable close) {
    super(new BorderLayout());
    this.presenter = presenter;
    this.go = go;
    list.setCellRenderer(new Renderer());
    list.setFixedCellHeight(ROW);
    list.addMouseListener(
        new MouseAdapter() {
          @Override
          public void mouseClicked(MouseEvent event) {
            chosen();
          }
        });
    list.getInputMap().put(KeyStroke.getKeyStroke("ENTER"), "go");
    list.getActionMap()
        .put(
            "go",
            new AbstractAction() {
              private static final long serialVersionUID = 1L;

              @Override
              public void actionPerformed(ActionEvent event) {
                chosen();
              }
            });
    JButton shut = Theme.named(new JButton("Close"), "findings.close", "Close the findings");
    shut.putClientProperty("JButton.buttonType", "borderless");
    shut.addActionListener(event -> close.run());
    JPanel head = new JPanel(new MigLayout("insets 0 12 0 8, fillx, h " + HEAD + "!", "[]push[]"));
    head.setOpaque(false);
    head.add(heading);
    head.add(shut, "h 22!");
    JScrollPane scroll = new JScrollPane(list);
    scroll.setBorder(BorderFactory.createEmptyBorder());
    add(head, BorderLayout.NORTH);
    add(scroll, BorderLayout.CENTER);
    updateUI();
  }

  /** Height in which so many findings are seen whole, pixels. */
  static int height(int findings) {
    return 1 + HEAD + findings * ROW;
  }

  private void chosen() {
    if (list.getSelectedValue() != null) {
      go.accept(list.getSelectedValue());
    }
  }

  /** Shows the findings as they are now, and the one the walk is at. */
  void refresh() {
    List<Finding> findings = presenter.findings();
    boolean same =
        findings.size() == model.size()
            && java.util.stream.IntStream.range(0, model.size())
                .allMatch(i -> model.get(i).equals(findings.get(i)));
    if (!same) {
      model.clear();
      findings.forEach(model::addElement);
    }
    if (presenter.at() != null) {
      list.setSelectedValue(presenter.at(), true);
    }
  }

  @Override
  public void updateUI() {
    super.updateUI();
    Palette palette = Theme.palette();
    setBackground(palette.paper());
    setBorder(BorderFactory.createMatteBorder(1, 0, 0, 0, palette.hairline()));
    if (heading != null) {
      heading.setFont(Theme.strong(13));
      list.setBackground(palette.paper());
      list.setSelectionBackground(palette.selection());
    }
  }

  /** Two lines a finding: what and where, then the remedy. */
  private final class Renderer implements ListCellRenderer<Finding> {
    private final JPanel cell =
        new JPanel(new MigLayout("insets 3 12 3 12, gap 8 0, novisualpadding", "[56!][grow]", ""));
    private final JLabel severity = new JLabel();
    private final JLabel what = new JLabel();
    private final JLabel remedy = new JLabel();

    private Renderer() {
      cell.add(severity);
      cell.add(what, "wmin 0, wrap");
      cell.add(remedy, "skip, wmin 0");
    }

    @Override
    public Component getListCellRendererComponent(
        JList<? extends Finding> owner, Finding finding, int index, boolean chosen, boolean focus) {
      Palette palette = Theme.palette();
      FindingsPresenter.Line line = presenter.line(finding);
      cell.setBackground(chosen ? palette.selection() : palette.paper());
      severity.setText(line.severity());
      severity.setFont(Theme.strong(11));
      severity.setForeground(
          switch (finding.severity()) {
            case FATAL, ERROR -> palette.stateText(eddyledger.ledger.State.OVER);
            case WARNING -> palette.stateText(eddyledger.ledger.State.TIGHT);
            case NOTE -> palette.ink2();
          });
      what.setText(line.where() + ": " + line.what());
      what.setFont(Theme.body());
      what.setForeground(palette.ink());
      remedy.setText(line.remedy());
      remedy.setFont(Theme.small());
      remedy.setForeground(palette.ink2());
      String all = line.where() + ": " + line.what() + " " + line.remedy();
      cell.getAccessibleContext().setAccessibleName(line.severity() + ", " + all);
      cell.setToolTipText(Tip.of(List.of(line.where() + ": " + line.what(), line.remedy())));
      return cell;
    }
  }

  /** A list as wide as its room; what is cut is in the tip. */
  private static final class Findings extends JList<Finding> {
    private static final long serialVersionUID = 1L;

    private Findings(DefaultListModel<Finding> model) {
      super(model);
    }

    @Override
    public synchronized void setDropTarget(DropTarget target) {
      // a file that is dropped here is meant for the window
      super.setDropTarget(null);
    }

    @Override
    public boolean getScrollableTracksViewportWidth() {
      return true;
    }
  }
}
