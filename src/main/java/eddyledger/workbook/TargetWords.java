package eddyledger.workbook;

import eddyledger.model.Evidence;
import eddyledger.model.Target;
import eddyledger.workbook.Look.Format;
import eddyledger.workbook.Look.Role;
import java.util.ArrayList;
import java.util.List;

/** The words and the pass rule in a target's row. */
final class TargetWords {
  static final int NAME = 0;
  static final int RECEIVER = 1;
  static final int RATING = 9;

  /** Step to which the judged level is rounded, dB; 0 for none. */
  static final int STEP = 10;

  static final int TOLERANCE = 11;
  static final int SOURCE = 12;

  private TargetWords() {}

  /**
   * Writes them.
   *
   * @param receiver the receiver, or which one counts
   * @param formula formula for the receiver; null where it is fixed
   */
  static void write(Line line, Target target, Answer receiver, String formula) {
    Look text = Look.of(Format.WRAPPED);
    String name = target.name() + " (" + target.id() + ")";
    line.text(NAME, name, text);
    if (formula == null) {
      line.text(RECEIVER, receiver.words(), text);
    } else {
      line.formula(RECEIVER, formula, receiver, text);
    }
    line.text(RATING, target.rating().text() + ", " + target.rating().unit(), text.indented(1));
    Look program = Look.of(Format.LEVEL, Role.PROGRAM);
    double step =
        switch (target.rule().rounding()) {
          case NONE -> 0.0;
          case TENTH -> 0.1;
          case WHOLE -> 1.0;
        };
    line.number(STEP, step, program);
    line.number(TOLERANCE, target.rule().tolerance(), program);
    String source = source(target);
    line.text(SOURCE, source, text.indented(1));
    line.height(Heights.most(Heights.of(name, 26), Heights.of(source, 44)));
  }

  private static String source(Target target) {
    List<String> words = new ArrayList<>();
    words.add("in " + target.condition());
    Evidence evidence = target.evidence();
    if (evidence.grade() != null) {
      words.add(evidence.grade().text());
    }
    if (evidence.source() != null) {
      words.add(evidence.source());
    }
    return String.join("; ", words);
  }
}
