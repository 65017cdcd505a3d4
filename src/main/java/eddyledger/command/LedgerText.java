package eddyledger.command;

import static eddyledger.command.Figures.level;
import static eddyledger.command.Figures.margin;
import static eddyledger.command.Figures.share;

import eddyledger.ledger.Choice;
import eddyledger.ledger.Contributed;
import eddyledger.ledger.Judgement;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Status;
import eddyledger.ledger.TargetResult;
import eddyledger.ledger.Way;
import eddyledger.quantity.LevelText;
import eddyledger.quantity.SpeechInterferenceLevel;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;

/** The ledger of one receiver and condition as aligned text. */
final class LedgerText {
  private final Ledger ledger;
  private final ReceiverSheet sheet;

  LedgerText(Ledger ledger, ReceiverSheet sheet) {
    this.ledger = ledger;
    this.sheet = sheet;
  }

  /** Heading, tree, sums, targets and model range. */
  List<String> lines() {
    List<String> lines = new ArrayList<>();
    lines.add(
        ledger.vehicle().name()
            + ": "
            + sheet.receiver().id()
            + " ("
            + sheet.receiver().name()
            + ") in "
            + sheet.condition().id()
            + " ("
            + sheet.condition().name()
            + ")");
    lines.add("");
    lines.addAll(tree());
    lines.add(speech());
    lines.add("");
    lines.addAll(targets());
    lines.add("");
    lines.addAll(range());
    return lines;
  }

  private List<String> tree() {
    TextTable table = new TextTable("lrrrrrll");
    table.row("", "dB(A)", "dB", "share", "allowed", "margin", "state", "");
    Optional<LedgerRow> worst = worstRow();
    for (LedgerRow row : sheet.rows()) {
      if (row.way() == Way.ALL) {
        boolean marked = worst.isPresent() && worst.get().equals(row);
        table.row(cells(row, marked));
      }
    }
    Contributed flow = sheet.flow();
    table.row("", "", "", "", "", "", "", "");
    table.row(
        "flow over all panels",
        level(flow.levelA()),
        level(flow.level()),
        share(Math.pow(10.0, (flow.levelA() - sheet.total().levelA()) / 10.0)),
        "",
        "",
        "",
        flow.status() == Status.OK ? "" : flow.status().text());
    return table.lines();
  }

  /** The speech interference levels of the total, each named by its octaves. */
  private String speech() {
    return Arrays.stream(SpeechInterferenceLevel.values())
        .map(
            kind ->
                String.join("-", kind.octaves())
                    + " Hz "
                    + LevelText.text(sheet.total().speechInterference(kind)))
        .collect(Collectors.joining(", ", "speech interference level of the total, dB: ", ""));
  }

  /** The row of the sheet with the least margin. */
  private Optional<LedgerRow> worstRow() {
    return sheet.rows().stream()
        .filter(row -> !Double.isNaN(row.judgement().margin()))
        .min(Comparator.comparingDouble(row -> row.judgement().margin()));
  }

  private String[] cells(LedgerRow row, boolean worst) {
    Judgement judgement = row.judgement();
    String note = row.status() == Status.OK ? "" : row.status().text() + ": " + row.reason();
    return new String[] {
      "  ".repeat(row.depth()) + row.id() + (row.kind() == RowKind.OTHER ? " (other source)" : ""),
      level(row.levelA()),
      level(row.level()),
      share(row.meanSquareA() / sheet.total().meanSquareA()),
      level(judgement.allowance()),
      margin(judgement.margin()),
      judgement.judged() ? judgement.state().text() : "",
      (worst ? "<- worst margin " : "") + note
    };
  }

  private List<String> targets() {
    List<TargetResult> here =
        ledger.targets().stream()
            .filter(result -> result.target().condition().equals(sheet.condition().id()))
            .filter(result -> result.target().receivers().contains(sheet.receiver().id()))
            .toList();
    if (here.isEmpty()) {
      return List.of("No target for this receiver and condition.");
    }
    TextTable table = new TextTable("llrrrrll");
    table.row("target", "rating", "target", "reserve", "level", "margin", "state", "counts");
    for (TargetResult result : here) {
      table.row(
          result.target().id(),
          result.target().rating().text() + ", " + result.target().rating().unit(),
          level(result.target().value()),
          level(result.target().reserve()),
          level(result.level()),
          margin(result.margin()),
          result.state() == null ? result.status().text() : result.state().text(),
          result.receiver().isEmpty() ? "energy mean" : result.receiver());
    }
    return table.lines();
  }

  private List<String> range() {
    TextTable table = new TextTable("lrrrl");
    table.row("model range of the total", "dB(A)", "dB", "margin", "");
    LedgerRow chosen = sheet.total();
    table.row(rangeCells(chosen, Choice.CHOSEN));
    for (LedgerRow row : sheet.range()) {
      Choice choice =
          Choice.all().stream()
              .filter(it -> it.name().equals(row.choice()))
              .findFirst()
              .orElseThrow();
      table.row(rangeCells(row, choice));
    }
    return table.lines();
  }

  private static String[] rangeCells(LedgerRow row, Choice choice) {
    return new String[] {
      choice.name(),
      level(row.levelA()),
      level(row.level()),
      margin(row.judgement().margin()),
      row.reason().isEmpty() ? choice.words() : choice.words() + ": " + row.reason()
    };
  }
}
