package eddyledger.command;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.file.SmallFile;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The aligned tables under long ids and names, and names that more than one thing bears. */
class LongNamesTest {
  private static final String LONG = "window-" + "x".repeat(57);

  @TempDir private Path folder;

  private Path project(SmallFile small) {
    return CommandRun.project(folder, small.root().toString());
  }

  private static SmallFile longNames() {
    return new SmallFile()
        .with("tree[0].children[0].id", quoted(LONG))
        .with("receivers[0].direct[0].panel", quoted(LONG))
        .with("allowances[0].node", quoted(LONG))
        .with("tree[0].children[0].name", quoted("Scheibe vorne, äußere, große ".repeat(10)))
        .with("targets[0].id", quoted("target-" + "y".repeat(57)))
        .with("vehicle.name", quoted("車両 ".repeat(50).strip()));
  }

  private static String quoted(String text) {
    return '"' + text + '"';
  }

  @Test
  void everyNumberEndsBelowTheEndOfItsHeading() {
    List<String> lines =
        CommandRun.of("ledger", project(longNames()), "--fail-on", "target").lines();
    String heading = line(lines, " dB(A) ");
    for (String row : List.of("small ", "  side ", "    " + LONG, "    door ", "  tyres (")) {
      String line = line(lines, row);
      assertThat(line).as(row).startsWith(row);
      for (String column : List.of(" dB(A)", " dB ", " share")) {
        int end = heading.indexOf(column) + column.stripTrailing().length();
        assertThat(line.substring(0, end)).as("%s under%s", row, column).matches(".*[0-9]( %)?");
        assertThat(line.substring(end)).as("%s after%s", row, column).matches("| .*");
      }
    }
    String allowed = line(lines, "    " + LONG);
    int end = heading.indexOf("allowed") + "allowed".length();
    assertThat(allowed.substring(0, end)).endsWith(" 60.0");
    // the id is followed by the gap between columns, and the heading by nothing
    assertThat(allowed).startsWith("    " + LONG + "  ");
    assertThat(lines).noneMatch(line -> line.endsWith(" "));
  }

  @Test
  void theTableOfTargetsIsAlignedTheSameWay() {
    List<String> lines = CommandRun.of("ledger", project(longNames())).lines();
    String heading = line(lines, "target  ");
    String target = line(lines, "target-yyy");
    for (String column : List.of("reserve", "level", "margin")) {
      int end = heading.indexOf(column) + column.length();
      assertThat(target.substring(0, end)).as(column).matches(".*[0-9]");
      assertThat(target.charAt(end)).as(column).isEqualTo(' ');
    }
    assertThat(target.indexOf("overall-a")).isEqualTo(heading.indexOf("rating"));
  }

  private static String line(List<String> lines, String part) {
    return lines.stream().filter(line -> line.contains(part)).findFirst().orElseThrow();
  }

  @Test
  void aUniqueNameStandsForItsId() {
    Path file = project(new SmallFile().with("tree[0].children[0].name", "\"Front pane\""));
    CommandRun byName = CommandRun.of("trace", file, "Front pane");
    assertThat(byName.lines()).anyMatch(line -> line.startsWith("Panel window (Front pane) at "));
    assertThat(byName.out()).isEqualTo(CommandRun.of("trace", file, "window").out());
  }

  @ParameterizedTest
  @CsvSource({"conditions, --condition, 'cruise, climb'", "receivers, --receiver, 'driver, rear'"})
  void aNameThatOccursTwiceIsAnsweredWithTheIds(String group, String option, String ids) {
    SmallFile small = new SmallFile();
    String second = small.root().get(group).get(0).toString();
    small.with(group + "[1]", second).with(group + "[1].id", quoted(ids.split(", ")[1]));
    small.with(group + "[0].name", "\"the same\"").with(group + "[1].name", "\"the same\"");
    Path file = project(small);
    for (CommandRun run :
        List.of(
            CommandRun.of("ledger", file, option, "the same"),
            CommandRun.of("trace", file, "window", option, "the same"))) {
      assertThat(run.refused(ExitCode.USAGE).err())
          .contains("The name \"the same\" is borne by " + ids + "; give the id.");
    }
  }

  @Test
  void anIdGoesBeforeANameThatReadsTheSame() {
    Path file = project(new SmallFile().with("tree[0].children[0].name", "\"door\""));
    assertThat(CommandRun.of("trace", file, "door").out()).contains("Panel door (door) at ");
  }
}
