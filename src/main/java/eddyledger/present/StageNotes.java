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
  private static final String DEFAULT = "default, nobody set it";
  private static final Pattern FILLED =
      Pattern.compile("^(.+?) ([-+0-9.eE]+) (\\S+) filled in (.+)$");
  private static final Pattern ORIGIN = Pattern.compile("^(from |set on the panel).*");

  /** What is always so and told in the table of all numbers. */
  private static final List<String> ALWAYS =
      List.of("edges simply supported", "radiation damping of both faces", "fitted at orders");

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
    String told = step.meaning() + "; " + step.source() + "; " + step.note();
    if (told.contains(DEFAULT) && !defaults.contains(name(step))) {
      defaults.add(name(step));
    }
    note(step.note());
  }

  private void note(String note) {
    if (note.isEmpty() || note.equals(DEFAULT) || ORIGIN.matcher(note).matches()) {
      return;
    }
    if (ALWAYS.stream().anyMatch(note::startsWith)) {
      return;
    }
    Matcher matcher = FILLED.matcher(note);
    if (matcher.matches()) {
      filled.computeIfAbsent(matcher.group(4), rule -> new ArrayList<>()).add(matcher.group(1));
    } else if (note.startsWith("interpolated from octaves")) {
      others.add(new TraceNote(Kind.INTERPOLATED, "from octaves, linear in lg f"));
    } else {
      doubts.add(new TraceNote(Kind.DOUBT, Readable.sentence(note)));
    }
  }

  private static String name(TraceStep step) {
    return switch (step.symbol()) {
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

  private static String printed(String rule) {
    String sentence = Readable.sentence(rule);
    return Character.toLowerCase(sentence.charAt(0)) + sentence.substring(1);
  }
}
