package eddyledger.present;

import eddyledger.check.Cautions;
import java.util.ArrayList;
import java.util.List;

/** An account as plain text: what the reader sees, then all numbers, then the cautions. */
final class AccountText {
  private AccountText() {}

  static String of(TraceAccount account) {
    List<String> lines = new ArrayList<>();
    lines.add(account.title());
    lines.add(account.subtitle());
    if (!account.reason().isEmpty()) {
      lines.add(account.reason());
    }
    if (account.hasValue()) {
      lines.add("Followed band: " + account.bandName());
    }
    for (TraceStage stage : account.stages()) {
      lines.add("");
      List<String> said = stage.lines();
      lines.add(said.get(0));
      said.subList(1, said.size()).forEach(line -> lines.add("   " + line));
    }
    lines.add("");
    lines.add(account.total().line());
    if (!account.numbers().isEmpty()) {
      lines.add("");
      lines.add("All numbers in the band " + account.bandName() + ":");
      lines.add(String.join("\t", "stage", "symbol", "value", "unit", "meaning", "source", "note"));
      for (TraceNumber number : account.numbers()) {
        lines.add(
            String.join(
                "\t",
                number.stage(),
                number.symbol(),
                number.value(),
                number.unit(),
                number.meaning(),
                number.source(),
                number.note()));
      }
    }
    lines.add("");
    lines.add(String.join(" ", Cautions.SHORT));
    return String.join("\n", lines) + "\n";
  }
}
