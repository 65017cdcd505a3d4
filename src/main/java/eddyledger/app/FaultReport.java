package eddyledger.app;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;

/** Keeps what the makers of the program need to know of an internal fault, in a file. */
public final class FaultReport {
  private final Path folder;

  /** Reports into the folder for temporary files. */
  public FaultReport() {
    this(Path.of(System.getProperty("java.io.tmpdir")));
  }

  FaultReport(Path folder) {
    this.folder = folder;
  }

  /** Writes the report and says in a sentence where it is. Never throws. */
  public String write(Throwable fault) {
    StringWriter text = new StringWriter();
    PrintWriter writer = new PrintWriter(text);
    writer.println("Eddyledger, internal fault at " + Instant.now());
    writer.println(
        "Java " + System.getProperty("java.version") + ", " + System.getProperty("os.name"));
    fault.printStackTrace(writer);
    writer.flush();
    try {
      Path file = Files.createTempFile(folder, "eddyledger-fault-", ".txt");
      Files.writeString(file, text.toString());
      return "A report is in " + file + "; please send it to whoever looks after the program.";
    } catch (IOException e) {
      return "No report could be written (" + e.getMessage() + "). What it would say: " + fault;
    }
  }
}
