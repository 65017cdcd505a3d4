package eddyledger.command;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.file.SmallFile;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Help, version, and words of a command line that cannot be meant: exit code 64 and a hint. */
class UsageTest {
  @TempDir private Path folder;
  private Path file;

  @BeforeEach
  void write() {
    file = CommandRun.project(folder, SmallFile.text());
  }

  @Test
  void helpNamesCommandsAndExitCodes() {
    String out = CommandRun.of("--help").done(ExitCode.DONE).out();
    assertThat(out).contains("Usage: eddyledger", "check", "ledger", "trace", "--version");
    assertThat(out.replaceAll("\\s+", " "))
        .contains("0 done", "1 done, with findings", "2 the input", "64 wrong", "70 internal");
    assertThat(CommandRun.of().done(ExitCode.DONE).out()).isEqualTo(out);
  }

  @ParameterizedTest
  @CsvSource({
    "check, FILE --fail-on",
    "ledger, FILE --fail-on --condition --receiver --csv",
    "trace, FILE PANEL-ID --fail-on --condition --receiver --csv"
  })
  void helpOfACommandNamesAllItTakes(String command, String words) {
    String out = CommandRun.of(command, "--help").done(ExitCode.DONE).out();
    assertThat(out).contains("Usage: eddyledger " + command).contains(words.split(" "));
  }

  @Test
  void versionIsOneLine() {
    CommandRun run = CommandRun.of("--version").done(ExitCode.DONE);
    assertThat(run.lines()).hasSize(1);
    assertThat(run.out()).startsWith("Eddyledger ");
  }

  @ParameterizedTest
  @CsvSource({"legder, eddyledger ledger", "chekc, eddyledger check", "traec, eddyledger trace"})
  void anUnknownCommandIsAnsweredWithTheNearest(String word, String meant) {
    String err = CommandRun.of(word, file).refused(ExitCode.USAGE).err();
    assertThat(err).contains("'" + word + "'", meant, "Try 'eddyledger --help'");
  }

  @ParameterizedTest
  @CsvSource({"check, FILE", "ledger, FILE", "trace, FILE"})
  void aMissingFileIsNamed(String command, String missing) {
    String err = CommandRun.of(command).refused(ExitCode.USAGE).err();
    assertThat(err).contains("Missing", missing, "Try 'eddyledger " + command + " --help'");
  }

  @Test
  void aMissingPanelIsNamed() {
    assertThat(CommandRun.of("trace", file).refused(ExitCode.USAGE).err()).contains("PANEL-ID");
  }

  @ParameterizedTest
  @ValueSource(strings = {"--fail-onn=error", "--csvv=x.csv", "--recever=driver"})
  void anUnknownOptionIsNamed(String option) {
    String err = CommandRun.of("ledger", file, option).refused(ExitCode.USAGE).err();
    assertThat(err).contains("Unknown option", option, "Possible solutions: --");
  }

  @Test
  void anUnknownLevelOfFailureListsTheKnownOnes() {
    String err = CommandRun.of("check", file, "--fail-on", "never").refused(ExitCode.USAGE).err();
    assertThat(err.toLowerCase(Locale.ROOT))
        .contains("--fail-on", "error, warning, target", "never");
  }

  @ParameterizedTest
  @CsvSource({
    "ledger, --condition, cruse, There is no condition \"cruse\". Did you mean \"cruise\"?",
    "ledger, --receiver, drivr, There is no receiver \"drivr\". Did you mean \"driver\"?",
    "trace, --condition, Cruise, There is no condition \"Cruise\". Did you mean \"cruise\"?",
    "trace, --receiver, passenger, There is no receiver \"passenger\". Known are: driver."
  })
  void anUnknownPlaceIsAnsweredWithTheNearest(
      String command, String option, String word, String answer) {
    Object[] arguments =
        command.equals("trace")
            ? new Object[] {command, file, "window", option, word}
            : new Object[] {command, file, option, word};
    assertThat(CommandRun.of(arguments).refused(ExitCode.USAGE).err()).contains(answer);
  }

  @ParameterizedTest
  @CsvSource({
    "windw, There is no panel \"windw\". Did you mean \"window\"?",
    "roof, 'There is no panel \"roof\". Known are: window, door.'",
    "side, There is no panel \"side\"."
  })
  void anUnknownPanelIsAnsweredWithTheNearest(String word, String answer) {
    assertThat(CommandRun.of("trace", file, word).refused(ExitCode.USAGE).err()).contains(answer);
  }

  @Test
  void anAmbiguousNameIsRefused() {
    SmallFile small =
        new SmallFile()
            .with("tree[0].children[0].name", "\"pane\"")
            .with("tree[0].children[1].name", "\"pane\"");
    Path both = CommandRun.project(folder, small.root().toString());
    String err = CommandRun.of("trace", both, "pane").refused(ExitCode.USAGE).err();
    assertThat(err).contains("\"pane\"", "window, door", "give the id");
  }

  @Test
  void aTableIsNotWrittenOverTheProject() throws IOException {
    Path detour = folder.resolve("..").resolve(folder.getFileName()).resolve(file.getFileName());
    for (Path target : new Path[] {file, detour}) {
      String err = CommandRun.of("ledger", file, "--csv", target).refused(ExitCode.USAGE).err();
      assertThat(err).contains("is the project itself");
      CommandRun.of("trace", file, "window", "--csv", target).refused(ExitCode.USAGE);
    }
    assertThat(Files.readString(file)).isEqualTo(SmallFile.text());
  }
}
