package eddyledger.command;

import eddyledger.ledger.Ledger;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Receiver;
import java.util.List;
import picocli.CommandLine.Option;

/** Which receiver and condition a command is about. */
final class SheetArguments {
  @Option(
      names = "--condition",
      paramLabel = "ID",
      description =
          "Operating condition, by id or unique name (default: that of the worst margin).")
  String condition;

  @Option(
      names = "--receiver",
      paramLabel = "ID",
      description = "Receiver, by id or unique name (default: that of the worst margin).")
  String receiver;

  /**
   * The sheets that fit what was asked for.
   *
   * @throws UnknownName if there is no such condition or receiver
   */
  List<ReceiverSheet> among(Ledger ledger) {
    String conditionId =
        condition == null
            ? null
            : Names.find(
                "condition",
                condition,
                ledger.vehicle().conditions(),
                OperatingCondition::id,
                OperatingCondition::name);
    String receiverId =
        receiver == null
            ? null
            : Names.find(
                "receiver", receiver, ledger.vehicle().receivers(), Receiver::id, Receiver::name);
    return ledger.sheets().stream()
        .filter(sheet -> conditionId == null || sheet.condition().id().equals(conditionId))
        .filter(sheet -> receiverId == null || sheet.receiver().id().equals(receiverId))
        .toList();
  }

  /** Whether one receiver in one condition was asked for. */
  boolean complete() {
    return condition != null && receiver != null;
  }
}
