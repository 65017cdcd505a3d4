package eddyledger.workbook;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.File;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Assumptions;

/**
 * LibreOffice as an independent calculator: opens a workbook, recalculates every formula and saves
 * it. Without the setting in its profile it would show the stored results and check nothing.
 */
final class Office {
  private static final String REQUIRED = "EDDYLEDGER_REQUIRE_OFFICE";
  private static final int MINUTES = 5;

  private static final String ALWAYS_RECALCULATE =
      """
      <?xml version="1.0" encoding="UTF-8"?>
      <oor:items xmlns:oor="http://openoffice.org/2001/registry"
          xmlns:xs="http://www.w3.org/2001/XMLSchema"
          xmlns:xsi="http://www.w3.org/2001/XMLSchema-instance">
        <item oor:path="/org.openoffice.Office.Calc/Formula/Load">
          <prop oor:name="OOXMLRecalcMode" oor:op="fuse"><value>0</value></prop>
        </item>
      </oor:items>
      """;

  private final Path folder;

  /** Works in an empty folder, with a profile of its own. */
  Office(Path folder) {
    this.folder = folder;
  }

  /** Ends a test as skipped where LibreOffice is not installed, or as failed where it must be. */
  static void assumeInstalled() {
    if (Boolean.getBoolean(REQUIRED) || "true".equals(System.getenv(REQUIRED))) {
      assertThat(program()).as("soffice must be on the PATH").isNotNull();
    }
    Assumptions.assumeTrue(
        program() != null, "LibreOffice (soffice) is not on the PATH: nothing recalculated");
  }

  private static Path program() {
    String path = System.getenv("PATH");
    return Arrays.stream((path == null ? "" : path).split(File.pathSeparator))
        .flatMap(place -> List.of("soffice", "soffice.exe").stream().map(it -> Path.of(place, it)))
        .filter(Files::isExecutable)
        .findFirst()
        .orElse(null);
  }

  /** The workbook as LibreOffice saves it after recalculation. */
  Path recalculated(Path workbook) {
    try {
      Path profile = Files.createDirectories(folder.resolve("profile/user"));
      Files.writeString(profile.resolve("registrymodifications.xcu"), ALWAYS_RECALCULATE);
      Path out = Files.createDirectories(folder.resolve("out"));
      Path log = folder.resolve("office.log");
      Process process =
          new ProcessBuilder(
                  program().toString(),
                  "-env:UserInstallation=" + folder.resolve("profile").toUri(),
                  "--headless",
                  "--convert-to",
                  "xlsx:Calc MS Excel 2007 XML",
                  "--outdir",
                  out.toString(),
                  workbook.toString())
              .redirectErrorStream(true)
              .redirectOutput(log.toFile())
              .start();
      try {
        assertThat(process.waitFor(MINUTES, TimeUnit.MINUTES)).as("soffice is done").isTrue();
      } finally {
        process.descendants().forEach(ProcessHandle::destroyForcibly);
        process.destroyForcibly();
      }
      Path saved = out.resolve(workbook.getFileName());
      assertThat(saved).as(Files.readString(log)).exists();
      return saved;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException(e);
    }
  }
}
