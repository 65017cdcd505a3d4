package eddyledger.command;

import eddyledger.app.Computation;
import eddyledger.app.OpenedProject;
import eddyledger.app.Projects;
import eddyledger.check.Finding;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerCache;
import eddyledger.ledger.LedgerOptions;
import eddyledger.ledger.UnusableVehicle;
import eddyledger.quantity.Progress;
import java.util.List;

/**
 * A project opened and computed for one command.
 *
 * @param ledger its ledger
 * @param findings what reading and computing found, each once
 */
record Session(Ledger ledger, List<Finding> findings) {

  /**
   * Opens and computes a project.
   *
   * @throws UnusableInput if nothing can be computed, with the findings that say why
   */
  static Session open(Projects projects, ProjectArguments arguments) {
    OpenedProject project = projects.open(arguments.file);
    if (project.vehicle().isEmpty()) {
      throw new UnusableInput(project.findings());
    }
    int threads = Runtime.getRuntime().availableProcessors();
    LedgerOptions options = new LedgerOptions(threads, Progress.NONE, new LedgerCache());
    try {
      Ledger ledger = Ledger.of(project.vehicle().get(), options);
      return new Session(ledger, Computation.together(project.findings(), ledger.findings()));
    } catch (UnusableVehicle e) {
      throw new UnusableInput(Computation.together(project.findings(), e.findings()));
    }
  }
}
