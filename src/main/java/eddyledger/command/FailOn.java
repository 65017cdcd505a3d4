package eddyledger.command;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.TargetResult;
import java.util.List;
import java.util.Locale;

/** What makes a command that is done end with exit code 1. */
enum FailOn {
  /** An error among the findings. */
  ERROR,
  /** An error or a warning among the findings. */
  WARNING,
  /** An error among the findings, or a target that is missed. */
  TARGET;

  /** The exit code for findings alone. */
  int exitCode(List<Finding> findings) {
    Severity least = this == WARNING ? Severity.WARNING : Severity.ERROR;
    boolean found = findings.stream().anyMatch(finding -> finding.severity().atLeast(least));
    return found ? ExitCode.FINDINGS : ExitCode.DONE;
  }

  /** The exit code for a ledger with all its findings. */
  int exitCode(Ledger ledger, List<Finding> findings) {
    boolean missed = this == TARGET && ledger.targets().stream().anyMatch(TargetResult::missed);
    return missed ? ExitCode.FINDINGS : exitCode(findings);
  }

  @Override
  public String toString() {
    return name().toLowerCase(Locale.ROOT);
  }
}
