package eddyledger.command;

import eddyledger.app.Projects;
import eddyledger.app.Workbooks;
import eddyledger.check.Cautions;
import eddyledger.quantity.Progress;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Writes the budget workbook. */
@Command(
    name = "workbook",
    mixinStandardHelpOptions = true,
    description = {
      "Writes the budget as a workbook with live formulas: summary, ledger, other sources,",
      "assumptions and revisions, for every receiver and condition."
    })
final class WorkbookCommand implements Callable<Integer> {
  private final Projects projects;
  private final Workbooks workbooks;

  @Mixin private ProjectArguments project;

  @Parameters(index = "1", paramLabel = "OUT.xlsx", description = "Workbook to write.")
  private Path out;

  @Spec private CommandSpec spec;

  WorkbookCommand(Projects projects, Workbooks workbooks) {
    this.projects = projects;
    this.workbooks = workbooks;
  }

  @Override
  public Integer call() {
    project.workbook(out, spec);
    Session session = Session.open(projects, project);
    workbooks.write(session.ledger(), session.findings(), out, Progress.NONE);
    PrintWriter printer = spec.commandLine().getOut();
    printer.println("Written: " + out);
    printer.println(
        "Sheets: summary, ledger (receivers and conditions: "
            + session.ledger().sheets().size()
            + "), other sources, assumptions, panels, flow, revision.");
    printer.println(FindingsText.count(session.findings()) + "; they stand under assumptions.");
    Cautions.SHORT.forEach(printer::println);
    return project.failOn.exitCode(session.ledger(), session.findings());
  }
}
