package eddyledger.command;

import eddyledger.app.Projects;
import java.io.PrintWriter;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** Reads and computes a project, and prints every finding. */
@Command(
    name = "check",
    mixinStandardHelpOptions = true,
    description = "Prints every finding about a project: what, where and the remedy.")
final class CheckCommand implements Callable<Integer> {
  private final Projects projects;

  @Mixin private ProjectArguments project;

  @Spec private CommandSpec spec;

  CheckCommand(Projects projects) {
    this.projects = projects;
  }

  @Override
  public Integer call() {
    Session session = Session.open(projects, project);
    PrintWriter out = spec.commandLine().getOut();
    FindingsText.lines(session.findings()).forEach(out::println);
    out.println(project.file + ": " + FindingsText.count(session.findings()));
    return project.failOn.exitCode(session.ledger(), session.findings());
  }
}
