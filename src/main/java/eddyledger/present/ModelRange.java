package eddyledger.present;

import eddyledger.ledger.Choice;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.Status;
import java.util.ArrayList;
import java.util.List;

/** The levels of a sheet's total under the chosen and all other models. */
final class ModelRange {
  private static final double WORTH_SAYING = 1.0;

  private final ReceiverSheet sheet;
  private final double lowest;
  private final double highest;

  ModelRange(ReceiverSheet sheet) {
    this.sheet = sheet;
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    List<LedgerRow> all = new ArrayList<>(sheet.range());
    all.add(sheet.total());
    for (LedgerRow row : all) {
      double level = row.levelA();
      if (Double.isFinite(level)) {
        low = Math.min(low, level);
        high = Math.max(high, level);
      }
    }
    lowest = low;
    highest = high;
  }

  /** Whether models differ by more than 1 dB, so that one number says too little. */
  boolean wide() {
    return highest - lowest > WORTH_SAYING;
  }

  /** Lowest and highest level, dB(A); empty if they are close. */
  List<Double> ends() {
    return wide() ? List.of(lowest, highest) : List.of();
  }

  /** As "models 75.2 to 77.4"; empty if they are close. */
  String text() {
    if (!wide()) {
      return "";
    }
    String bound = sheet.total().status() == Status.OK ? "" : DeskNumbers.AT_LEAST;
    return "models " + bound + DeskNumbers.level(lowest) + " to " + DeskNumbers.level(highest);
  }

  /** One line for each choice of models, with what makes it doubtful. */
  List<String> tips() {
    List<String> tips = new ArrayList<>();
    for (LedgerRow row : sheet.range()) {
      String doubt = row.status() != Status.OK || row.reason().isEmpty() ? "" : "; " + row.reason();
      tips.add(DeskNumbers.level(row.levelA(), row.status()) + ": " + words(row.choice()) + doubt);
    }
    return tips;
  }

  private static String words(String choice) {
    return Choice.all().stream()
        .filter(it -> it.name().equals(choice))
        .findFirst()
        .map(Choice::words)
        .orElse(choice);
  }
}
