package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.ComputedLedger;
import eddyledger.app.Edit;
import eddyledger.app.NewVehicle;
import eddyledger.app.ProjectState;
import eddyledger.app.TreeEdits;
import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.ledger.Ledger;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** The status line, the title and the walk through the findings. */
class StatusAndFindingsTest {
  private static final Finding NOTE = finding(Severity.NOTE, "cabin");
  private static final Finding ERROR = finding(Severity.ERROR, "panel-1");
  private static final Finding WARNING = finding(Severity.WARNING, "section-1");

  private final ProjectState state = new ProjectState();
  private final StatusPresenter status = new StatusPresenter(state);
  private final FindingsPresenter findings = new FindingsPresenter(state);

  private static Finding finding(Severity severity, String subject) {
    return new Finding(severity, "some-code", subject, "tree[0].length_m", "It is so.", "Mend it.");
  }

  @BeforeEach
  void open() {
    state.put(NewVehicle.empty(), null);
    state.apply(TreeEdits.addSection(state.vehicle(), "new-vehicle"));
    state.apply(TreeEdits.addPanel(state.vehicle(), "section-1"));
  }

  private void compute(Finding... found) {
    state.computed(
        new ComputedLedger(
            state.revision(), Optional.of(Ledger.of(state.vehicle())), List.of(found)));
  }

  @Test
  void theStatusTellsReadyFromComputingCancelledAndNotComputed() {
    assertThat(status.readiness()).isEqualTo("Computing");
    status.computing(3, 59);
    assertThat(status.readiness()).isEqualTo("Computing, 5 %");
    compute();
    assertThat(status.readiness()).isEqualTo("Ready");
    assertThat(status.extent()).isEqualTo("1 contribution, 0 targets");
    state.apply(Edit.of("x", "", before -> before.edit().name("Other").build()));
    status.cancelled(true);
    assertThat(status.readiness()).startsWith("Cancelled").contains("F5");
    status.cancelled(false);
    state.computed(new ComputedLedger(state.revision(), Optional.empty(), List.of(ERROR)));
    assertThat(status.readiness()).isEqualTo("Not computed: see the findings");
  }

  @Test
  void theSummaryCountsWhatStopsALevel() {
    compute();
    assertThat(findings.summary()).isEqualTo("No findings");
    compute(NOTE);
    assertThat(findings.summary()).isEqualTo("1 finding, none stops a level");
    compute(NOTE, ERROR, WARNING);
    assertThat(findings.summary()).isEqualTo("3 findings, 1 stops a level");
  }

  @Test
  void theWalkBeginsAtTheGravestAndGoesAround() {
    compute(NOTE, ERROR, WARNING);
    findings.walk(1);
    assertThat(findings.at()).isEqualTo(ERROR);
    assertThat(state.selection().rowId()).isEqualTo("panel-1");
    findings.walk(1);
    assertThat(findings.at()).isEqualTo(WARNING);
    assertThat(state.selection().rowId()).isEqualTo("section-1");
    findings.walk(1);
    findings.walk(1);
    assertThat(findings.at()).isEqualTo(ERROR);
    findings.walk(-1);
    assertThat(findings.at()).isEqualTo(NOTE);
  }

  @Test
  void aFindingIsToldByTheNameOfItsRowOrByItsPlace() {
    compute(ERROR, NOTE);
    assertThat(findings.line(ERROR).where()).isEqualTo("New panel");
    assertThat(findings.line(NOTE).where()).isEqualTo("tree[0].length_m (cabin)");
  }

  @Test
  void theTitleNamesFileAndUnsavedWork() {
    assertThat(WindowTitle.of(new ProjectState())).isEqualTo("Eddyledger");
    assertThat(WindowTitle.of(state)).isEqualTo("New vehicle, not saved yet, changed – Eddyledger");
    state.savedTo(Path.of("some", "car.eddyledger"), state.vehicle());
    assertThat(WindowTitle.of(state)).isEqualTo("car.eddyledger – Eddyledger");
  }
}
