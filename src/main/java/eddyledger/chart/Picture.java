package eddyledger.chart;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import java.util.ArrayList;
import java.util.List;

/** The pictures of the desk and what is written over them. */
public enum Picture {
  /** Levels of the selected row, the section above it and the total. */
  SPECTRUM("Spectrum", "Level in each band"),
  /** What makes each band of the total. */
  STACK("Stack", "What makes each band");

  private final String word;
  private final String heading;

  Picture(String word, String heading) {
    this.word = word;
    this.heading = heading;
  }

  /** One word, for the switch of pictures. */
  public String word() {
    return word;
  }

  /** What the picture answers. */
  public String heading() {
    return heading;
  }

  /** What is shown, in what unit, and what is missing; one line. */
  public String subHeading(ReceiverSheet sheet, String selectedId) {
    StackParts parts = StackParts.of(sheet, selectedId);
    List<String> words = new ArrayList<>();
    if (this == SPECTRUM) {
      words.add("dB(A) per band: " + listed(curveNames(sheet, selectedId)));
    } else {
      words.add("dB(A) per band, split by energy");
      parts.outline().ifPresent(outline -> words.add("outlined: " + outline.label()));
    }
    if (parts.partial()) {
      words.add(parts.missing());
    }
    return String.join("; ", words);
  }

  /** What the picture says, in sentences, for those who cannot see it. */
  public String description(ReceiverSheet sheet, String selectedId) {
    StackParts parts = StackParts.of(sheet, selectedId);
    StringBuilder text = new StringBuilder();
    text.append(heading).append(" at ").append(sheet.receiver().name()).append(", ");
    text.append(sheet.condition().name()).append(". ");
    text.append(subHeading(sheet, selectedId)).append(". Total ");
    text.append(parts.partial() ? "at least " : "").append(level(sheet.total())).append(".");
    AllowedLine.of(sheet)
        .ifPresent(
            line -> {
              text.append(" ").append(capital(line.overallWords())).append(" dB(A)");
              String over = line.excessWords();
              text.append(over.isEmpty() ? "." : ", " + over + ".");
            });
    if (this == SPECTRUM) {
      LedgerRow selected = SpectrumCurve.selected(sheet, selectedId);
      if (selected.kind() != RowKind.TOTAL) {
        text.append(" ").append(selected.name()).append(": ").append(level(selected)).append(".");
      }
      return text.toString();
    }
    List<String> shares = new ArrayList<>();
    for (int i = parts.parts().size() - 1; i >= 0; i--) {
      StackPart part = parts.parts().get(i);
      shares.add(part.label() + " " + LevelWords.share(part.share()));
    }
    return text.append(" Top to bottom: ").append(String.join(", ", shares)).append(".").toString();
  }

  private static String level(LedgerRow row) {
    double level = row.levelA();
    return LevelWords.level(level) + (Double.isFinite(level) ? " dB(A)" : "");
  }

  /** The selected row first. */
  private static List<String> curveNames(ReceiverSheet sheet, String selectedId) {
    List<SpectrumCurve> curves = SpectrumCurve.of(sheet, selectedId);
    List<String> names = new ArrayList<>();
    List<String> known = SpectrumCurve.names(curves);
    for (int i = 0; i < curves.size(); i++) {
      boolean total = curves.get(i).row().kind() == RowKind.TOTAL;
      names.add(0, total ? "the total" : known.get(i));
    }
    return names;
  }

  private static String listed(List<String> names) {
    int last = names.size() - 1;
    return last == 0
        ? names.get(0)
        : String.join(", ", names.subList(0, last)) + " and " + names.get(last);
  }

  private static String capital(String words) {
    return Character.toUpperCase(words.charAt(0)) + words.substring(1);
  }
}
