package eddyledger.present;

import eddyledger.app.ProjectState;
import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.model.TreeEdit;
import java.util.Comparator;
import java.util.List;

/** The findings as a list one walks through, the gravest first. */
public final class FindingsPresenter {
  private final ProjectState state;
  private Finding at;

  /** On the findings of a project's state. */
  public FindingsPresenter(ProjectState state) {
    this.state = state;
  }

  /**
   * A finding as the list shows it.
   *
   * @param severity the word of its severity
   * @param where what it is about: a name, or the place in the file
   * @param what what was found
   * @param remedy what to do
   */
  public record Line(String severity, String where, String what, String remedy) {}

  /** Every finding, the gravest first. */
  public List<Finding> findings() {
    return state.findings().stream()
        .sorted(Comparator.comparing(Finding::severity).reversed())
        .toList();
  }

  /** A finding in words. */
  public Line line(Finding finding) {
    String name = rowName(finding);
    return new Line(
        finding.severity().text(),
        name.isEmpty() ? finding.where() : name,
        words(finding.what()),
        words(finding.remedy()));
  }

  private String words(String text) {
    return state.open() ? FindingWords.sentence(state.vehicle(), text) : Readable.sentence(text);
  }

  private String rowName(Finding finding) {
    if (!state.open() || finding.subject().isEmpty()) {
      return "";
    }
    return FindingWords.name(state.vehicle(), finding);
  }

  /** How many there are and whether one stops a level, for the status line. */
  public String summary() {
    List<Finding> all = state.findings();
    if (all.isEmpty()) {
      return "No findings";
    }
    long stopping = all.stream().filter(f -> f.severity().atLeast(Severity.ERROR)).count();
    String stops =
        stopping == 0
            ? "none stops a level"
            : stopping + (stopping == 1 ? " stops a level" : " stop levels");
    return all.size() + (all.size() == 1 ? " finding, " : " findings, ") + stops;
  }

  /** The gravest severity there is; a note if there is nothing at all. */
  public Severity gravest() {
    return state.findings().stream()
        .map(Finding::severity)
        .max(Comparator.naturalOrder())
        .orElse(Severity.NOTE);
  }

  /** Goes on by so many findings, around the end, and selects the row it is about. */
  public void walk(int steps) {
    List<Finding> all = findings();
    if (all.isEmpty()) {
      return;
    }
    int before = all.indexOf(at);
    int start = before >= 0 ? before : steps > 0 ? -1 : 0;
    go(all.get(Math.floorMod(start + steps, all.size())));
  }

  /** Goes to a finding and selects the row it is about, if it is about one. */
  public void go(Finding finding) {
    at = finding;
    if (state.open() && TreeEdit.find(state.vehicle(), finding.subject()).isPresent()) {
      state.select(state.selection().on(finding.subject()));
    }
  }

  /** The finding one is at; null before the walk. */
  public Finding at() {
    return findings().contains(at) ? at : null;
  }

  /**
   * The last name of a finding's place, without unit, for instance {@code thickness}; empty if the
   * place names no property.
   */
  public static String property(Finding finding) {
    String place = finding.place();
    String last = place.substring(place.lastIndexOf('.') + 1);
    return last.contains("[") ? "" : last;
  }
}
