package eddyledger.command;

import static eddyledger.command.Figures.level;
import static eddyledger.command.Figures.margin;

import eddyledger.app.Projects;
import eddyledger.app.Tables;
import eddyledger.app.Workbooks;
import eddyledger.check.Cautions;
import eddyledger.ledger.Judgement;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.quantity.Progress;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** Prints the ledger, and writes it as CSV. */
@Command(
    name = "ledger",
    mixinStandardHelpOptions = true,
    description = {
      "Prints contributions, allowances and margins down the tree, and the model range below.",
      "Where condition or receiver is left out, the worst margin is taken and named; the CSV then"
          + " holds all of them."
    })
final class LedgerCommand implements Callable<Integer> {
  private final Projects projects;
  private final Tables tables;
  private final Workbooks workbooks;

  @Mixin private ProjectArguments project;

  @Mixin private SheetArguments which;

  @Option(names = "--csv", paramLabel = "OUT", description = "Writes the ledger as CSV.")
  private Path csv;

  @Option(
      names = "--workbook",
      paramLabel = "OUT.xlsx",
      description = "Writes the budget workbook of every receiver and condition.")
  private Path workbook;

  @Spec private CommandSpec spec;

  LedgerCommand(Projects projects, Tables tables, Workbooks workbooks) {
    this.projects = projects;
    this.tables = tables;
    this.workbooks = workbooks;
  }

  @Override
  public Integer call() {
    project.spare(csv, spec);
    if (workbook != null) {
      project.workbook(workbook, spec);
    }
    Session session = Session.open(projects, project);
    List<ReceiverSheet> sheets = which.among(session.ledger());
    PrintWriter out = spec.commandLine().getOut();
    if (sheets.size() > 1) {
      overview(session.ledger(), sheets, out);
    }
    ReceiverSheet worst = Ledger.worst(sheets);
    new LedgerText(session.ledger(), worst).lines().forEach(out::println);
    out.println();
    out.println(
        FindingsText.count(session.findings())
            + "; 'check' prints them. Levels re 20 µPa; margin = allowed minus level.");
    Cautions.SHORT.forEach(out::println);
    if (csv != null) {
      tables.writeLedger(sheets, csv);
      out.println("Written: " + csv);
    }
    if (workbook != null) {
      workbooks.write(session.ledger(), session.findings(), workbook, Progress.NONE);
      out.println("Written: " + workbook);
    }
    return project.failOn.exitCode(session.ledger(), session.findings());
  }

  private static void overview(Ledger ledger, List<ReceiverSheet> sheets, PrintWriter out) {
    ReceiverSheet worst = Ledger.worst(sheets);
    TextTable table = new TextTable("llrrrrll");
    table.row("condition", "receiver", "dB(A)", "dB", "allowed", "margin", "state", "");
    for (ReceiverSheet sheet : sheets) {
      Judgement judgement = sheet.total().judgement();
      table.row(
          sheet.condition().id(),
          sheet.receiver().id(),
          level(sheet.total().levelA()),
          level(sheet.total().level()),
          level(judgement.allowance()),
          margin(judgement.margin()),
          judgement.judged() ? judgement.state().text() : sheet.total().status().text(),
          sheet == worst ? "<- worst margin, below" : "");
    }
    out.println(ledger.vehicle().name() + ": total at every receiver and condition");
    out.println();
    table.lines().forEach(out::println);
    out.println();
  }
}
