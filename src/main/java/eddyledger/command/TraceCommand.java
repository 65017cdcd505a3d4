package eddyledger.command;

import eddyledger.app.Projects;
import eddyledger.app.Tables;
import eddyledger.ledger.Cautions;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.Trace;
import eddyledger.model.Node;
import eddyledger.model.Panel;
import eddyledger.model.TreePath;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Prints the account of one panel's contribution, and writes its bands as CSV. */
@Command(
    name = "trace",
    mixinStandardHelpOptions = true,
    description = {
      "Prints the account of a panel's contribution, from ambient air to level: symbol, meaning,"
          + " value and source of each step, what was defaulted and which formula left its range.",
      "Where condition or receiver is left out, the worst margin of the vehicle is taken and named."
    })
final class TraceCommand implements Callable<Integer> {
  private final Projects projects;
  private final Tables tables;

  @Mixin private ProjectArguments project;

  @Parameters(index = "1", paramLabel = "PANEL-ID", description = "Panel, by id or unique name.")
  private String panel;

  @Mixin private SheetArguments which;

  @Option(
      names = "--csv",
      paramLabel = "OUT",
      description =
          "Writes one row per band as CSV; velocity is the mean over all pieces of the panel,"
              + " power their sum.")
  private Path csv;

  @Spec private CommandSpec spec;

  TraceCommand(Projects projects, Tables tables) {
    this.projects = projects;
    this.tables = tables;
  }

  @Override
  public Integer call() {
    project.spare(csv, spec);
    Session session = Session.open(projects, project);
    List<Node> panels =
        TreePath.of(session.ledger().vehicle()).stream()
            .map(TreePath::node)
            .filter(Panel.class::isInstance)
            .toList();
    String id = Names.find("panel", panel, panels, Node::id, Node::name);
    ReceiverSheet sheet = Ledger.worst(which.among(session.ledger()));
    Trace trace =
        session.ledger().trace(id, sheet.condition().id(), sheet.receiver().id()).orElseThrow();
    PrintWriter out = spec.commandLine().getOut();
    if (!which.complete()) {
      out.println("Worst margin: " + sheet.title() + ".");
    }
    new TraceText(trace).lines().forEach(out::println);
    out.println();
    Cautions.SHORT.forEach(out::println);
    if (csv != null) {
      tables.writeTrace(trace, csv);
      out.println("Written: " + csv);
    }
    return trace.hasValue()
        ? project.failOn.exitCode(session.ledger(), session.findings())
        : ExitCode.FINDINGS;
  }
}
