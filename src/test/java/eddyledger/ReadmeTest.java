package eddyledger;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.Projects;
import eddyledger.app.Tables;
import eddyledger.app.Workbooks;
import eddyledger.command.MainCommand;
import eddyledger.command.NoDisplay;
import eddyledger.file.ProjectReader;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What the README shows is what the program prints, and the files it names are there. */
class ReadmeTest {
  private static final Path README = Path.of("README.md");

  /** The lines of fenced blocks. */
  private static List<String> shown() throws IOException {
    List<String> shown = new ArrayList<>();
    boolean inside = false;
    for (String line : Files.readAllLines(README)) {
      if (line.startsWith("```")) {
        inside = !inside;
      } else if (inside) {
        shown.add(line);
      }
    }
    return shown;
  }

  private static String printed(String... arguments) {
    StringWriter out = new StringWriter();
    PrintWriter writer = new PrintWriter(out);
    Projects projects = new Projects(new ProjectReader());
    int code =
        new MainCommand(projects, new Tables(), new Workbooks(), new NoDisplay(), writer, writer)
            .run(arguments);
    assertThat(code).as(out.toString()).isZero();
    return out.toString();
  }

  @Test
  void theLedgerLooksAsShown() throws IOException {
    List<String> printed = printed("ledger", "examples/quillon-82.eddyledger").lines().toList();
    List<String> table =
        shown().stream()
            .filter(line -> !line.startsWith("mvn ") && !line.startsWith("java "))
            .filter(line -> !line.equals("...") && !line.isBlank())
            .toList();
    assertThat(table).hasSizeGreaterThan(10);
    assertThat(printed).containsAll(table);
  }

  @Test
  void theCommandsShownRun(@TempDir Path folder) throws IOException {
    List<String> commands =
        shown().stream()
            .filter(line -> line.startsWith("java -jar target/eddyledger.jar"))
            .toList();
    assertThat(commands).hasSize(5);
    for (String command : commands) {
      List<String> words = new ArrayList<>(Arrays.asList(command.trim().split("\\s+")));
      List<String> arguments = words.subList(3, words.size());
      if (arguments.get(0).equals("window")) {
        // the tests of the window open it; here there is no display
        assertThat(Path.of(arguments.get(1))).exists();
        continue;
      }
      arguments.replaceAll(
          word ->
              word.endsWith(".csv") || word.endsWith(".xlsx")
                  ? folder.resolve(word).toString()
                  : word);
      assertThat(printed(arguments.toArray(String[]::new))).isNotBlank();
    }
    assertThat(folder)
        .isDirectoryContaining("glob:**.csv")
        .isDirectoryContaining("glob:**/budget.xlsx");
  }

  @Test
  void theFilesNamedAreThere() {
    List<String> names =
        List.of(
            "DEVELOPERS.md",
            "templates/eddyledger.schema.json",
            "installer/build-image",
            "src/docs/make-pictures",
            "src/docs/pictures/desk-light.png",
            "src/docs/pictures/desk-dark.png",
            "src/docs/pictures/workbook.png");
    assertThat(names)
        .allSatisfy(
            name -> {
              assertThat(README).content().contains(name);
              assertThat(Path.of(name)).exists();
            });
  }
}
