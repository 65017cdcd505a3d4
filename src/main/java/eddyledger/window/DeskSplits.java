package eddyledger.window;

import java.awt.BorderLayout;
import java.awt.Dimension;
import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JSplitPane;

/**
 * The three lower regions with the splits between them. Until a split was dragged it stands where
 * it suits the size of the desk; a dragged one keeps the width of the sheet and the ledger's part
 * of the height, and is remembered.
 */
final class DeskSplits extends JPanel {
  private static final long serialVersionUID = 1L;
  private static final int DIVIDER = 7;
  private static final int LEAST_SHEET = 344;
  private static final int SHEET = 348;
  private static final int MOST_SHEET = 420;
  private static final int USUAL_WIDTH = 1440;
  private static final int PER_SHEET_PIXEL = 6;
  private static final int LEAST_PICTURE = 190;
  private static final double LEDGER_SHARE = 0.61;

  private final transient WindowMemory memory;
  private final JSplitPane upright = split(JSplitPane.VERTICAL_SPLIT);
  private final JSplitPane across = split(JSplitPane.HORIZONTAL_SPLIT);
  private int sheetWidth;
  private double ledgerShare;
  private int placedWidth;
  private int placedHeight;
  private boolean placing;

  DeskSplits(WindowMemory memory) {
    super(new BorderLayout());
    this.memory = memory;
    sheetWidth = memory.sheetWidth(0);
    ledgerShare = memory.ledgerShare(0.0);
    across.addPropertyChangeListener(
        JSplitPane.DIVIDER_LOCATION_PROPERTY,
        event -> {
          if (!placing && placedWidth > 0 && across.getWidth() == placedWidth) {
            sheetWidth = placedWidth - across.getDividerLocation() - DIVIDER;
          }
        });
    upright.addPropertyChangeListener(
        JSplitPane.DIVIDER_LOCATION_PROPERTY,
        event -> {
          if (!placing && placedHeight > 0 && upright.getHeight() == placedHeight) {
            ledgerShare = (double) upright.getDividerLocation() / placedHeight;
          }
        });
  }

  private static JSplitPane split(int orientation) {
    JSplitPane split = new JSplitPane(orientation);
    split.setBorder(BorderFactory.createEmptyBorder());
    split.setContinuousLayout(true);
    DeskView.release(split, "F6", "F8", "shift F8");
    return split;
  }

  /** Puts the three regions in. */
  void together(JComponent ledger, JComponent picture, JComponent sheet) {
    removeAll();
    placedWidth = 0;
    placedHeight = 0;
    ledger.setMinimumSize(new Dimension(120, LedgerCells.HEADER + 3 * LedgerCells.ROW));
    picture.setMinimumSize(new Dimension(120, LEAST_PICTURE));
    sheet.setMinimumSize(new Dimension(200, 80));
    upright.setTopComponent(ledger);
    upright.setBottomComponent(picture);
    across.setLeftComponent(upright);
    across.setRightComponent(sheet);
    add(across, BorderLayout.CENTER);
    revalidate();
    repaint();
  }

  /** Gives all of the room to one region. */
  void alone(JComponent region) {
    removeAll();
    add(region, BorderLayout.CENTER);
    revalidate();
    repaint();
  }

  @Override
  public void doLayout() {
    super.doLayout();
    if (across.getParent() != this || getWidth() == 0 || getHeight() == 0) {
      return;
    }
    placing = true;
    if (across.getWidth() != placedWidth) {
      placedWidth = across.getWidth();
      int sheet = sheetWidth > 0 ? sheetWidth : usualSheet(placedWidth);
      across.setDividerLocation(Math.max(200, placedWidth - sheet - DIVIDER));
    }
    across.doLayout();
    if (upright.getHeight() != placedHeight) {
      placedHeight = upright.getHeight();
      upright.setDividerLocation(ledgerHeight(placedHeight));
    }
    upright.doLayout();
    placing = false;
  }

  private static int usualSheet(int width) {
    int wanted = SHEET + (width - USUAL_WIDTH) / PER_SHEET_PIXEL;
    return Math.max(LEAST_SHEET, Math.min(MOST_SHEET, wanted));
  }

  /** Whole rows of the ledger, unless the split was dragged to another height. */
  private int ledgerHeight(int height) {
    double share = ledgerShare > 0.0 ? ledgerShare : LEDGER_SHARE;
    int most = height - LEAST_PICTURE - DIVIDER;
    int wanted = Math.max(0, Math.min((int) Math.round(share * height), most));
    return LedgerView.wholeRows(wanted);
  }

  /** Keeps where the splits stand that were dragged. */
  void remember() {
    if (sheetWidth > 0) {
      memory.keepSheetWidth(sheetWidth);
    }
    if (ledgerShare > 0.0) {
      memory.keepLedgerShare(ledgerShare);
    }
  }
}
