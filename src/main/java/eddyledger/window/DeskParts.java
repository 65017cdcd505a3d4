package eddyledger.window;

import eddyledger.app.ProjectState;
import eddyledger.check.Finding;
import eddyledger.present.FindingsPresenter;
import eddyledger.present.LedgerPresenter;
import eddyledger.present.PicturePresenter;
import eddyledger.present.SheetPresenter;
import eddyledger.present.StatusPresenter;
import eddyledger.present.TargetStripPresenter;
import javax.swing.JComponent;

/** The desk's presenters and views joined: what the menus ask of it ends here. */
final class DeskParts {
  private final TargetStripPresenter targets;
  private final LedgerPresenter ledger;
  private final PicturePresenter picture;
  private final FindingsPresenter findings;
  private final SheetPresenter sheet;
  private final StatusPresenter status;
  private final TargetStripView strip;
  private final LedgerView ledgerView;
  private final SheetView sheetView;
  private final FindingsView findingsView;
  private final StatusView statusView;
  private final DeskView view;

  DeskParts(ProjectState state, WindowMemory memory, Runnable showTrace) {
    targets = new TargetStripPresenter(state);
    ledger = new LedgerPresenter(state);
    picture = new PicturePresenter(state);
    findings = new FindingsPresenter(state);
    status = new StatusPresenter(state);
    strip = new TargetStripView(targets);
    ledgerView = new LedgerView(ledger);
    sheet = new SheetPresenter(state);
    sheetView = new SheetView(sheet, showTrace);
    findingsView = new FindingsView(findings, this::go, () -> showFindings(false));
    statusView = new StatusView(status, findings, () -> showFindings(true));
    PictureView pictureView = new PictureView(picture, () -> whole(DeskView.Region.PICTURE));
    view = new DeskView(strip, ledgerView, pictureView, sheetView, findingsView, memory);
  }

  /** The view of the desk, without status line. */
  JComponent view() {
    return view;
  }

  /** The status line. */
  StatusView statusView() {
    return statusView;
  }

  /** What the status line says. */
  StatusPresenter status() {
    return status;
  }

  /** Says findings and status again. */
  void refresh() {
    findingsView.refresh();
    statusView.refresh();
  }

  void remember() {
    view.remember();
  }

  void worst() {
    ledger.jumpToWorst();
    ledgerView.focusTable();
  }

  void nextReceiver() {
    targets.nextReceiver();
  }

  void nextCondition() {
    targets.nextCondition();
  }

  void nextPicture() {
    picture.next();
  }

  /** Walks through the findings and shows their list. */
  void finding(int steps) {
    showFindings(true);
    findings.walk(steps);
    findingsView.refresh();
    if (findings.at() != null) {
      toField(findings.at());
    }
  }

  private void go(Finding finding) {
    findings.go(finding);
    toField(finding);
  }

  private void toField(Finding finding) {
    sheet.fieldOf(finding).ifPresent(sheetView::focusField);
  }

  void toggleFindings() {
    showFindings(!view.findingsShown());
  }

  private void showFindings(boolean show) {
    findingsView.refresh();
    view.showFindings(show);
  }

  void whole(DeskView.Region region) {
    view.toggleWhole(region);
  }

  void toLedger() {
    ledgerView.focusTable();
  }

  void toSheet() {
    sheetView.focusField("name");
  }
}
