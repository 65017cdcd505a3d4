package eddyledger.present;

import eddyledger.ledger.TraceStep;
import eddyledger.present.TraceNote.Kind;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The notes of a stage, gathered from its steps so that none is lost and none is told twice. */
final class StageNotes {
  private static final String DEFAULT = "default, nobody set ";
  private static final String MORE = "; ";
  private static final Pattern FILLED =
      Pattern.compile("^(.+?) ([-+0-9.eE]+) (\\S+) filled in (.+)$");

  /** Steps whose notes are about ranges left, where they are not about what was filled in. */
  private static final List<String> DOUBTED = List.of("Ue", "Gpp", "H");

  /** What is always so, or told by the stage itself; the table of all numbers has it. */
  private static final List<String> ALWAYS =
      List.of(
          "edges simply supported",
          "radiation damping of both faces",
          "fitted at orders",
          "the measured level difference holds the whole path");

  private final List<TraceNote> doubts = new ArrayList<>();
  private final List<String> defaults = new ArrayList<>();
  private final Map<String, List<String>> filled = new LinkedHashMap<>();
  private final List<TraceNote> others = new ArrayList<>();

  private StageNotes() {}

  /** The notes of some steps: doubts first, then defaults, then what was filled in. */
  static List<TraceNote> of(List<TraceStep> steps) {
    StageNotes notes = new StageNotes();
    steps.forEach(notes::read);
    List<TraceNote> all = new ArrayList<>(notes.doubts);
    if (!notes.defaults.isEmpty()) {
      all.add(
          new TraceNote(Kind.DEFAULT, "nobody set the " + String.join(", the ", notes.defaults)));
    }
    notes.filled.forEach(
        (rule, names) ->
            all.add(new TraceNote(Kind.FILLED_IN, joined(names) + ", " + printed(rule))));
    all.addAll(notes.others);
    return all;
  }

  private void read(TraceStep step) {
    String note = step.note();
    if (note.startsWith(DEFAULT)) {
      if (!defaults.contains(name(step))) {
        defaults.add(name(step));
      }
      int more = note.indexOf(MORE);
      note = more < 0 ? "" : note.substring(more + MORE.length());
    }
    note(step, note);
  }

  private void note(TraceStep step, String note) {
    if (note.isEmpty() || ALWAYS.stream().anyMatch(note::startsWith)) {
      return;
    }
    Matcher matcher = FILLED.matcher(note);
    if (matcher.matches()) {
      filled.computeIfAbsent(matcher.group(4), rule -> new ArrayList<>()).add(matcher.group(1));
    } else if (note.startsWith("interpolated from octaves")) {
      others.add(new TraceNote(Kind.INTERPOLATED, "from octaves, linear in lg f"));
    } else if (DOUBTED.contains(step.symbol())) {
      doubts.add(new TraceNote(Kind.DOUBT, Readable.sentence(note)));
    } else {
      others.add(new TraceNote(Kind.NOTE, printed(note)));
    }
  }

  private static String name(TraceStep step) {
    return switch (step.symbol()) {
      case "IL" -> "lay-up";
      case "Gpp" -> "model of the wall-pressure spectrum";
      case "order_along", "order_across", "alpha_along", "alpha_across" ->
          "orders and decay rates of the cross-spectrum";
      default -> step.meaning();
    };
  }

  private static String joined(List<String> names) {
    int last = names.size() - 1;
    return last == 0
        ? names.get(0)
        : String.join(", ", names.subList(0, last)) + " and " + names.get(last);
  }

  /** As printed, with the first letter as it was. */
  private static String printed(String text) {
    return text.charAt(0) + Readable.sentence(text).substring(1);
  }
}
