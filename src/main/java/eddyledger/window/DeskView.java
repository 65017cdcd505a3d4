package eddyledger.window;

import java.awt.BorderLayout;
import java.awt.Dimension;
import javax.swing.InputMap;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.KeyStroke;

/**
 * The desk: target strip on top, ledger above picture, sheet at the right, findings below. Splits
 * are remembered; each of the three lower regions can take the whole desk and give it back.
 */
final class DeskView extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final int LOW = 800;
  private static final int FEW_FINDINGS = 3;
  private static final int MORE_FINDINGS = 5;

  /** The regions below the target strip. */
  enum Region {
    LEDGER,
    PICTURE,
    SHEET
  }

  private final JComponent ledger;
  private final JComponent picture;
  private final JComponent sheet;
  private final JComponent findings;
  private final DeskSplits centre;
  private Region whole;

  DeskView(
      JComponent strip,
      JComponent ledger,
      JComponent picture,
      JComponent sheet,
      JComponent findings,
      WindowMemory memory) {
    super(new BorderLayout());
    this.ledger = ledger;
    this.picture = picture;
    this.sheet = sheet;
    this.findings = findings;
    centre = new DeskSplits(memory);
    findings.setVisible(false);
    add(strip, BorderLayout.NORTH);
    add(centre, BorderLayout.CENTER);
    add(findings, BorderLayout.SOUTH);
    centre.together(ledger, picture, sheet);
  }

  /** Takes keys away that a standard component keeps for itself. */
  static void release(JComponent component, String... keys) {
    InputMap map = component.getInputMap(JComponent.WHEN_ANCESTOR_OF_FOCUSED_COMPONENT);
    for (String key : keys) {
      map.put(KeyStroke.getKeyStroke(key), "none");
    }
  }

  @Override
  public void doLayout() {
    int rows = getHeight() < LOW ? FEW_FINDINGS : MORE_FINDINGS;
    findings.setPreferredSize(new Dimension(100, FindingsView.height(rows)));
    super.doLayout();
  }

  /** Gives the whole desk to a region, or gives it back if the region has it. */
  void toggleWhole(Region region) {
    if (whole == region) {
      whole = null;
      centre.together(ledger, picture, sheet);
    } else {
      whole = region;
      centre.alone(part(region));
    }
    part(region).requestFocusInWindow();
  }

  /** The region that has the whole desk; null if none has. */
  Region whole() {
    return whole;
  }

  private JComponent part(Region region) {
    return switch (region) {
      case LEDGER -> ledger;
      case PICTURE -> picture;
      case SHEET -> sheet;
    };
  }

  /** Shows or hides the findings. */
  void showFindings(boolean show) {
    findings.setVisible(show);
    revalidate();
  }

  /** Whether the findings show. */
  boolean findingsShown() {
    return findings.isVisible();
  }

  /** Keeps where the splits stand. */
  void remember() {
    centre.remember();
  }
}
