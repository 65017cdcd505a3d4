package eddyledger.workbook;

import eddyledger.check.Cautions;
import eddyledger.check.Finding;
import eddyledger.ledger.Choice;
import eddyledger.workbook.Grid.Field;
import eddyledger.workbook.Look.Emphasis;
import java.util.Comparator;
import java.util.List;

/** Writes the sheet of assumptions: cautions, findings, conditions, models, parts. */
final class AssumptionsPage {
  static final String SHEET = "assumptions";

  private final Grid grid;
  private final WorkbookContent content;

  AssumptionsPage(Page page, WorkbookContent content) {
    grid = new Grid(page);
    this.content = content;
  }

  void write(String title) {
    grid.title(
        title,
        "Everything the levels rest upon. On grey only the program follows a change: change the"
            + " project and write the workbook again. White numbers were derived or filled in.");
    cautions();
    findings();
    new ConditionTable(grid, content).write();
    models();
    new PartTables(grid, content.vehicle()).write();
    new SettingsTable(grid, content).write();
  }

  private void cautions() {
    grid.heading("Cautions", "");
    grid.paragraph(Cautions.text(), Emphasis.CAUTION);
    grid.paragraph(
        "A prediction is engineering judgement: only the named test by the named body is evidence."
            + " Sums over panels are weak below a zone's Schroeder frequency, and the choice of"
            + " cross-spectrum moves slow vehicles by more than 10 dB: look at the model range.",
        Emphasis.CAUTION);
  }

  private void findings() {
    List<Field> fields =
        List.of(
            Field.text("Severity"),
            Field.text("Where"),
            Field.wide("What was found", 11),
            Field.text("Remedy"));
    grid.table("Findings", "As of when this was computed; the gravest first.", fields);
    if (content.findings().isEmpty()) {
      Answer none = Answer.words(Answer.NOT_ASKED);
      grid.row(fields, List.of(none, none, Answer.words("Nothing was found."), none));
    }
    content.findings().stream()
        .sorted(Comparator.comparing(Finding::severity).reversed())
        .forEach(
            finding ->
                grid.row(
                    fields,
                    List.of(
                        Answer.text(finding.severity().text()),
                        Answer.text(finding.where()),
                        Answer.text(finding.what()),
                        Answer.text(finding.remedy()))));
  }

  private void models() {
    List<Field> fields = List.of(Field.text("Choice of models"), Field.wide("What it means", 3));
    grid.table(
        "Models of the model range",
        "Each replaces one part of the models on every panel; their totals stand below each ledger.",
        fields);
    for (Choice choice : Choice.all()) {
      grid.row(fields, List.of(Answer.text(choice.name()), Answer.text(choice.words())));
    }
  }
}
