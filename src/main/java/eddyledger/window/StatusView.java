package eddyledger.window;

import eddyledger.chart.Palette;
import eddyledger.present.FindingsPresenter;
import eddyledger.present.StatusPresenter;
import java.awt.Cursor;
import java.awt.Dimension;
import java.awt.Insets;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JProgressBar;
import javax.swing.Timer;
import net.miginfocom.swing.MigLayout;

/** The line at the bottom: ready or at work, findings, extent of the ledger, units. */
final class StatusView extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final int PATIENCE_MS = 300;

  private final transient StatusPresenter presenter;
  private final transient FindingsPresenter findings;
  private final JLabel ready = Theme.named(new JLabel(), "status.ready", "State of the numbers");
  private final JButton found;
  private final JLabel key = new JLabel("F8 next finding");
  private final JLabel extent = Theme.named(new JLabel(), "status.extent", "Extent of the ledger");
  private final JLabel weighting = new JLabel("A-weighted, dB re 20 µPa");
  private final JLabel units = new JLabel("SI units");
  private final JProgressBar bar =
      Theme.named(new JProgressBar(), "status.progress", "Progress of the work");
  private final JButton cancel = Theme.named(new JButton("Cancel"), "status.cancel", "Cancel");
  private final transient Timer patience = new Timer(PATIENCE_MS, event -> showWork());
  private transient Runnable stop = () -> {};

  StatusView(StatusPresenter presenter, FindingsPresenter findings, Runnable showFindings) {
    super(new MigLayout("insets 0 12 0 12, fillx, hidemode 3, novisualpadding", "[]push[]"));
    this.presenter = presenter;
    this.findings = findings;
    found = Theme.named(new JButton(), "status.findings", "Findings");
    found.addActionListener(event -> showFindings.run());
    found.setCursor(Cursor.getPredefinedCursor(Cursor.HAND_CURSOR));
    found.putClientProperty("JButton.buttonType", "borderless");
    found.setMargin(new Insets(0, 0, 0, 0));
    cancel.addActionListener(event -> stop.run());
    cancel.setFocusable(false);
    cancel.putClientProperty("JButton.buttonType", "borderless");
    patience.setRepeats(false);
    add(ready, "cell 0 0");
    add(found, "cell 0 0, h 22!, gapleft 16");
    add(key, "cell 0 0, gapleft 16");
    add(bar, "cell 0 0, w 120!, h 6!, gapleft 16");
    add(cancel, "cell 0 0, h 22!, gapleft 12");
    add(extent, "cell 1 0");
    add(weighting, "cell 1 0, gapleft 16");
    add(units, "cell 1 0, gapleft 16");
    bar.setVisible(false);
    cancel.setVisible(false);
    setPreferredSize(new Dimension(100, 27));
    updateUI();
    refresh();
  }

  /** Says everything again. */
  void refresh() {
    ready.setText(presenter.readiness());
    found.setText(findings.summary());
    found.getAccessibleContext().setAccessibleName(findings.summary() + ", show them");
    boolean open = !presenter.extent().isEmpty();
    found.setVisible(open);
    key.setVisible(open);
    weighting.setVisible(open);
    units.setVisible(open);
    extent.setText(presenter.extent());
  }

  /** Work has begun that may take a while; its progress shows if it does. */
  void begin(String words, Runnable cancelling) {
    stop = cancelling;
    presenter.working(words);
    bar.setIndeterminate(true);
    patience.restart();
    refresh();
  }

  private void showWork() {
    bar.setVisible(true);
    cancel.setVisible(true);
    revalidate();
  }

  /** Says what was done, until something else is to be said. */
  void say(String words) {
    presenter.working(words);
    refresh();
  }

  /** So much of the work is done. */
  void progress(int steps, int of) {
    bar.setIndeterminate(of <= 0);
    bar.setMaximum(of);
    bar.setValue(steps);
  }

  /** The work has ended. */
  void end() {
    patience.stop();
    presenter.working("");
    bar.setVisible(false);
    cancel.setVisible(false);
    refresh();
  }

  @Override
  public void updateUI() {
    super.updateUI();
    Palette palette = Theme.palette();
    setBackground(palette.ground());
    setBorder(BorderFactory.createMatteBorder(1, 0, 0, 0, palette.hairline()));
    if (ready != null) {
      ready.setFont(Theme.strong(11));
      found.setFont(Theme.small());
      key.setFont(Theme.small());
      key.setForeground(palette.ink2());
      for (JLabel label : new JLabel[] {extent, weighting, units}) {
        label.setFont(Theme.small());
        label.setForeground(palette.ink2());
      }
      cancel.setFont(Theme.small());
    }
  }
}
