package eddyledger.present;

import eddyledger.ledger.State;
import java.util.List;

/**
 * One field of the sheet as it stands now. Immutable.
 *
 * @param key stable name, unique on the sheet
 * @param label what stands before it
 * @param spoken its whole name, where the label is a short one
 * @param kind how it is edited
 * @param text its text; of a choice the name of what is chosen
 * @param chosen id of what is chosen; empty if it is no choice or nothing is
 * @param options what can be chosen; empty if it is no choice
 * @param unit unit shown behind it; empty for none
 * @param units units it can be shown in; empty if there is only one
 * @param origin where the value comes from, in few words
 * @param own whether the value is set on this row
 * @param back what giving the own value back leads to, as words; empty if there is no way back
 * @param message what is wrong with it; null if nothing
 * @param tip more about it, for a tooltip; empty if nothing
 * @param link words of a small switch below it; empty for none
 * @param only whether it is special for the condition, and can be
 * @param state state of a margin; null if it is none or not known
 * @param weight how heavy its text is
 */
public record SheetField(
    String key,
    String label,
    String spoken,
    Kind kind,
    String text,
    String chosen,
    List<Option> options,
    String unit,
    List<String> units,
    String origin,
    boolean own,
    String back,
    SheetMessage message,
    String tip,
    String link,
    Only only,
    State state,
    Weight weight) {
  public SheetField {
    options = List.copyOf(options);
    units = List.copyOf(units);
  }

  /** How a field is edited. */
  public enum Kind {
    /** A number, perhaps with a unit typed behind it. */
    NUMBER,
    /** One of several. */
    CHOICE,
    /** Free text. */
    TEXT,
    /** Not at all: it follows from others. */
    SHOWN
  }

  /** How heavy a text is. */
  public enum Weight {
    /** As all others. */
    PLAIN,
    /** A result. */
    RESULT,
    /** A result of an older revision, or grey for another reason. */
    FAINT
  }

  /**
   * One of several.
   *
   * @param id what is chosen
   * @param name its name
   */
  public record Option(String id, String name) {
    @Override
    public String toString() {
      return name;
    }
  }

  /**
   * Whether a value holds in this condition only.
   *
   * @param words the switch in words, for instance {@code Only in Holding}; empty if there is none
   * @param on whether it is on
   */
  public record Only(String words, boolean on) {
    /** It cannot be special. */
    public static final Only NEVER = new Only("", false);
  }

  /** Its whole name with its unit, for screen readers. */
  public String spokenWithUnit() {
    return unit.isEmpty() ? spoken : spoken + ", " + unit;
  }

  /** Whether it can be typed into or chosen from. */
  public boolean editable() {
    return kind != Kind.SHOWN;
  }
}
