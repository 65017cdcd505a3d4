package eddyledger.command;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Findings as readable text, the gravest first. */
final class FindingsText {
  private FindingsText() {}

  /** One block per finding: what and where, then the remedy. */
  static List<String> lines(List<Finding> findings) {
    List<String> lines = new ArrayList<>();
    List<Finding> sorted =
        findings.stream().sorted(Comparator.comparing(Finding::severity).reversed()).toList();
    for (Finding finding : sorted) {
      lines.add(finding.severity().text() + "  " + finding.where());
      lines.add("    " + finding.what());
      lines.add("    " + finding.remedy());
    }
    return lines;
  }

  /** How many of each severity, in words; for instance {@code 1 error, 2 warnings, 0 notes}. */
  static String count(List<Finding> findings) {
    long errors = number(findings, Severity.ERROR) + number(findings, Severity.FATAL);
    return plural(errors, "error")
        + ", "
        + plural(number(findings, Severity.WARNING), "warning")
        + ", "
        + plural(number(findings, Severity.NOTE), "note");
  }

  private static long number(List<Finding> findings, Severity severity) {
    return findings.stream().filter(finding -> finding.severity() == severity).count();
  }

  private static String plural(long number, String word) {
    return number + " " + word + (number == 1 ? "" : "s");
  }
}
