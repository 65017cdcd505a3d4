package eddyledger.present;

import eddyledger.app.RecentFile;
import eddyledger.ledger.State;
import eddyledger.quantity.BandSpectrum;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/**
 * A file opened lately, as the start page shows it.
 *
 * @param file the file
 * @param name its name
 * @param folder the last folders above it
 * @param when when it was opened
 * @param description what it describes and how much it holds
 * @param counts how many targets are in each state, without states that none is in
 * @param missing whether the file is no longer there
 * @param levels band levels of the strip, dB(A); NaN where missing
 */
public record RecentLine(
    Path file,
    String name,
    String folder,
    String when,
    String description,
    List<Count> counts,
    boolean missing,
    BandSpectrum levels) {

  /**
   * How many targets are in a state.
   *
   * @param state the state; null for not known
   * @param number how many
   */
  public record Count(State state, int number) {
    /** Number and word. */
    public String text() {
      return number + " " + (state == null ? "not known" : state.text());
    }
  }

  public RecentLine {
    counts = List.copyOf(counts);
  }

  static RecentLine of(RecentFile file, String folder, String when, boolean missing) {
    List<Count> counts = new ArrayList<>();
    add(counts, State.OVER, file.over());
    add(counts, State.TIGHT, file.tight());
    add(counts, State.INSIDE, file.inside());
    add(counts, null, file.unknown());
    String holds =
        file.contributions() + (file.contributions() == 1 ? " contribution" : " contributions");
    String words = file.description().isEmpty() ? "" : file.description() + ", ";
    return new RecentLine(
        file.file(),
        String.valueOf(file.file().getFileName()),
        folder,
        when,
        missing ? "The file is no longer there." : words + holds,
        missing ? List.of() : counts,
        missing,
        file.levels());
  }

  private static void add(List<Count> counts, State state, int number) {
    if (number > 0) {
      counts.add(new Count(state, number));
    }
  }

  /** The whole line in words, for screen readers. */
  public String spoken() {
    List<String> parts = new ArrayList<>();
    parts.add(name);
    parts.add(folder.replace(" / ", ", "));
    parts.add("opened " + when);
    parts.add(description);
    counts.forEach(count -> parts.add(count.text()));
    return String.join(". ", parts);
  }
}
