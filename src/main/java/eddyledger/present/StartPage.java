package eddyledger.present;

import eddyledger.app.Example;
import eddyledger.app.RecentFile;
import eddyledger.check.Cautions;
import java.nio.file.Path;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.Locale;
import java.util.function.Predicate;

/**
 * The page one starts on: files opened lately, and examples.
 *
 * @param recent files opened lately, the latest first
 * @param examples examples that come with the program
 */
public record StartPage(List<RecentLine> recent, List<Example> examples) {
  /** Name of the program. */
  public static final String NAME = "Eddyledger";

  /** What it is for. */
  public static final String SENTENCE =
      "What each panel adds to the noise inside, and whether it may.";

  /** Stands where no file was opened yet. */
  public static final String NOTHING_RECENT =
      "Nothing opened yet. Begin with an example, or open a project file.";

  /** Says how else a file can be opened. */
  public static final String DROP =
      "Drop an .eddyledger file anywhere in this window to open it. Nothing leaves this machine.";

  private static final DateTimeFormatter TIME =
      DateTimeFormatter.ofPattern("HH:mm", Locale.ENGLISH);
  private static final DateTimeFormatter DAY =
      DateTimeFormatter.ofPattern("d MMMM", Locale.ENGLISH);
  private static final DateTimeFormatter YEAR =
      DateTimeFormatter.ofPattern("d MMMM yyyy", Locale.ENGLISH);
  private static final int FOLDERS_SHOWN = 2;

  public StartPage {
    recent = List.copyOf(recent);
    examples = List.copyOf(examples);
  }

  /**
   * The page.
   *
   * @param recent files opened lately, the latest first
   * @param examples examples
   * @param now the time that "today" is told by
   * @param zone the reader's time zone
   * @param exists whether a file is there
   */
  public static StartPage of(
      List<RecentFile> recent,
      List<Example> examples,
      Instant now,
      ZoneId zone,
      Predicate<Path> exists) {
    LocalDate today = now.atZone(zone).toLocalDate();
    List<RecentLine> lines =
        recent.stream()
            .map(
                file ->
                    RecentLine.of(
                        file,
                        folder(file.file()),
                        when(file.opened(), today, zone),
                        !exists.test(file.file())))
            .toList();
    return new StartPage(lines, examples);
  }

  /** When a file was opened, as one says it: {@code today 09:14}, {@code 27 November}. */
  static String when(Instant opened, LocalDate today, ZoneId zone) {
    LocalDate day = opened.atZone(zone).toLocalDate();
    long ago = ChronoUnit.DAYS.between(day, today);
    if (ago == 0) {
      return "today " + TIME.format(opened.atZone(zone));
    }
    if (ago == 1) {
      return "yesterday";
    }
    return (day.getYear() == today.getYear() ? DAY : YEAR).format(day);
  }

  /** The last two folders of a file: {@code Programmes / Quillon}. */
  static String folder(Path file) {
    Path parent = file.getParent();
    if (parent == null || parent.getNameCount() == 0) {
      return "";
    }
    int count = parent.getNameCount();
    Path last = parent.subpath(Math.max(0, count - FOLDERS_SHOWN), count);
    StringBuilder text = new StringBuilder();
    for (Path name : last) {
      text.append(text.isEmpty() ? "" : " / ").append(name);
    }
    return text.toString();
  }

  /** The caution that stands at the foot of the page. */
  public static String caution() {
    return String.join(" ", Cautions.SHORT);
  }
}
