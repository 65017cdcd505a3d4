package eddyledger.command;

import eddyledger.check.Finding;
import java.util.List;

/** Thrown when a project cannot be used at all; the findings say why. */
final class UnusableInput extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient List<Finding> findings;

  UnusableInput(List<Finding> findings) {
    super("the input cannot be used");
    this.findings = List.copyOf(findings);
  }

  List<Finding> findings() {
    return findings;
  }
}
