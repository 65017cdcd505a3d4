package eddyledger.window;

import java.awt.BorderLayout;
import java.awt.Dimension;
import javax.swing.BorderFactory;
import javax.swing.InputMap;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JSplitPane;
import javax.swing.KeyStroke;

/**
 * The desk: target strip on top, ledger above picture, sheet at the right, findings below. Splits
 * are remembered; each of the three lower regions can take the whole desk and give it back.
 */
final class DeskView extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final int SHEET_WIDTH = 348;
  private static final double LEDGER_SHARE = 0.62;
  private static final int FINDINGS_HEIGHT = 150;

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
  private final transient WindowMemory memory;
  private final JPanel centre = new JPanel(new BorderLayout());
  private final JSplitPane upright = split(JSplitPane.VERTICAL_SPLIT);
  private final JSplitPane across = split(JSplitPane.HORIZONTAL_SPLIT);
  private Region whole;
  private boolean placed;

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
    this.memory = memory;
    upright.setResizeWeight(LEDGER_SHARE);
    across.setResizeWeight(1.0);
    for (JComponent part : new JComponent[] {ledger, picture, sheet}) {
      part.setMinimumSize(new Dimension(120, 80));
    }
    findings.setPreferredSize(new Dimension(100, FINDINGS_HEIGHT));
    findings.setVisible(false);
    add(strip, BorderLayout.NORTH);
    add(centre, BorderLayout.CENTER);
    add(findings, BorderLayout.SOUTH);
    together();
  }

  private static JSplitPane split(int orientation) {
    JSplitPane split = new JSplitPane(orientation);
    split.setBorder(BorderFactory.createEmptyBorder());
    split.setContinuousLayout(true);
    release(split, "F6", "F8", "shift F8");
    return split;
  }

  /** Takes keys away that a standard component keeps for itself. */
  static void release(JComponent component, String... keys) {
    InputMap map = component.getInputMap(JComponent.WHEN_ANCESTOR_OF_FOCUSED_COMPONENT);
    for (String key : keys) {
      map.put(KeyStroke.getKeyStroke(key), "none");
    }
  }

  private void together() {
    centre.removeAll();
    upright.setTopComponent(ledger);
    upright.setBottomComponent(picture);
    across.setLeftComponent(upright);
    across.setRightComponent(sheet);
    centre.add(across, BorderLayout.CENTER);
    placed = false;
    centre.revalidate();
    centre.repaint();
  }

  @Override
  public void doLayout() {
    super.doLayout();
    if (!placed && whole == null && getHeight() > 0 && centre.getHeight() > 0) {
      placed = true;
      centre.doLayout();
      int width = memory.sheetWidth(SHEET_WIDTH);
      across.setDividerLocation(Math.max(200, across.getWidth() - width - 7));
      across.doLayout();
      upright.setDividerLocation((int) (memory.ledgerShare(LEDGER_SHARE) * upright.getHeight()));
    }
  }

  /** Gives the whole desk to a region, or gives it back if the region has it. */
  void toggleWhole(Region region) {
    if (whole == null) {
      remember();
    }
    if (whole == region) {
      whole = null;
      together();
    } else {
      whole = region;
      centre.removeAll();
      centre.add(part(region), BorderLayout.CENTER);
      centre.revalidate();
      centre.repaint();
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
    if (placed && whole == null && across.getWidth() > 0 && upright.getHeight() > 0) {
      memory.keepSheetWidth(across.getWidth() - across.getDividerLocation() - 7);
      memory.keepLedgerShare((double) upright.getDividerLocation() / upright.getHeight());
    }
  }
}
