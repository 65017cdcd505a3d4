package eddyledger.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.chart.StackFill.Kind;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Way;
import eddyledger.quantity.Bands;
import java.io.IOException;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The parts of the stack for the example: whatever is selected, together they are the total. */
class StackPartsTest {
  private static Ledger whole;
  private static Ledger lacking;

  @BeforeAll
  static void compute() throws IOException {
    whole = ExampleLedger.ledger();
    lacking = ExampleLedger.without("crown-e");
  }

  private static ReceiverSheet hold() {
    return whole.sheet("hold", "row-2").orElseThrow();
  }

  private static List<String> labels(StackParts parts) {
    return parts.parts().stream().map(StackPart::label).toList();
  }

  private static List<StackFill> fills(StackParts parts) {
    return parts.parts().stream().map(StackPart::fill).toList();
  }

  @Test
  void partsSumToTheTotalForEverySelection() {
    for (Ledger ledger : List.of(whole, lacking)) {
      for (ReceiverSheet sheet : ledger.sheets()) {
        for (LedgerRow row : sheet.rows()) {
          assertSumsToTotal(sheet, StackParts.of(sheet, row.id()));
        }
      }
    }
  }

  private static void assertSumsToTotal(ReceiverSheet sheet, StackParts parts) {
    for (int band = 0; band < Bands.COUNT; band++) {
      double sum = 0.0;
      for (StackPart part : parts.parts()) {
        sum += part.meanSquares().has(band) ? part.meanSquares().value(band) : 0.0;
      }
      double total = sheet.total().meanSquares().value(band);
      assertThat(sum).isCloseTo(total, within(1.0e-12 * total));
    }
    double shares = parts.parts().stream().mapToDouble(StackPart::share).sum();
    assertThat(shares).isCloseTo(1.0, within(1.0e-12));
    double energy = sheet.total().meanSquareA();
    assertThat(parts.energyA()).isCloseTo(energy, within(1.0e-12 * energy));
  }

  @Test
  void everyPanelAndOtherSourceIsInOnePart() {
    for (LedgerRow selected : hold().children("station-b")) {
      StackParts parts = StackParts.of(hold(), selected.id());
      for (LedgerRow row : hold().rows()) {
        if (row.kind() == RowKind.PANEL || row.kind() == RowKind.OTHER) {
          assertThat(parts.parts().stream().filter(part -> part.rowIds().contains(row.id())))
              .as(row.id())
              .hasSize(1);
        }
      }
    }
  }

  @Test
  void theTotalIsSplitByItsSections() {
    StackParts parts = StackParts.of(hold(), "quillon-82");
    assertThat(labels(parts))
        .containsExactly(
            "Station A",
            "Station B",
            "Station C",
            "Station D",
            "Station E",
            "Air conditioning and systems",
            "Propulsion");
    assertThat(fills(parts))
        .containsExactly(
            new StackFill(Kind.SERIES, 0),
            new StackFill(Kind.SERIES, 1),
            new StackFill(Kind.SERIES, 2),
            new StackFill(Kind.SERIES, 3),
            new StackFill(Kind.SERIES, 4),
            new StackFill(Kind.OTHER, 1),
            new StackFill(Kind.OTHER, 0));
    assertThat(parts.outline()).isEmpty();
    assertThat(parts.parts()).noneMatch(StackPart::selected);
    assertThat(parts.partial()).isFalse();
    assertThat(parts.missing()).isEmpty();
  }

  @Test
  void aPanelIsOutlinedAmongItsNeighbours() {
    StackParts parts = StackParts.of(hold(), "upper-side-left-a");
    assertThat(parts.focus().id()).isEqualTo("station-a");
    assertThat(labels(parts))
        .containsExactly(
            "Crown",
            "Upper side left",
            "Upper side right",
            "Window panes left",
            "Window panes right",
            "4 more of Station A",
            "all other panels",
            "Air conditioning and systems",
            "Propulsion");
    assertThat(fills(parts).subList(4, 7))
        .containsExactly(
            new StackFill(Kind.SERIES, 4),
            new StackFill(Kind.REMAINDER, 0),
            new StackFill(Kind.ELSEWHERE, 0));
    StackOutline outline = parts.outline().orElseThrow();
    LedgerRow row = hold().row("upper-side-left-a", Way.ALL).orElseThrow();
    assertThat(outline.part()).isEqualTo(1);
    assertThat(outline.label()).isEqualTo("Upper side left");
    assertThat(outline.meanSquares()).isEqualTo(row.meanSquares());
    assertThat(parts.parts().stream().filter(StackPart::selected).map(StackPart::label))
        .containsExactly("Upper side left");
  }

  @Test
  void aSmallPanelIsOutlinedInThePartOfTheSmallOnes() {
    StackParts parts = StackParts.of(hold(), "lower-side-left-a");
    assertThat(parts.outline().orElseThrow().part()).isEqualTo(5);
    assertThat(parts.parts().get(5).rowIds())
        .isEqualTo(
            Set.of(
                "window-belt-left-a",
                "window-belt-right-a",
                "lower-side-left-a",
                "lower-side-right-a"));
    assertThat(parts.parts().get(5).selected()).isTrue();
  }

  @Test
  void aSectionIsOutlinedFromTheBottom() {
    StackParts parts = StackParts.of(hold(), "station-b");
    StackOutline outline = parts.outline().orElseThrow();
    assertThat(outline.part()).isZero();
    double section = 0.0;
    for (StackPart part : parts.parts()) {
      boolean inside = part.fill().kind() == Kind.SERIES || part.fill().kind() == Kind.REMAINDER;
      section += inside ? part.energyA() : 0.0;
    }
    assertThat(section).isCloseTo(outline.energyA(), within(1.0e-12 * section));
  }

  @Test
  void theLedgerFindsThePartOfARow() {
    StackParts parts = StackParts.of(hold(), "crown-b-forward");
    assertThat(parts.partOf("crown-b-forward").orElseThrow().label()).startsWith("Crown");
    assertThat(parts.partOf("station-b-middle").orElseThrow().label())
        .isEqualTo("all other panels");
    assertThat(parts.partOf("crown-e").orElseThrow().label()).isEqualTo("all other panels");
    assertThat(parts.partOf("propulsion-row-2-hold").orElseThrow().label()).isEqualTo("Propulsion");
    assertThat(parts.partOf("station-b-forward")).isEmpty();
    assertThat(parts.partOf("station-b")).isEmpty();
    assertThat(parts.partOf("quillon-82")).isEmpty();
  }

  @Test
  void aMissingPanelIsInNoPartAndIsNamed() {
    ReceiverSheet sheet = lacking.sheet("hold", "row-2").orElseThrow();
    StackParts parts = StackParts.of(sheet, "crown-e");
    assertThat(parts.focus().id()).isEqualTo("station-e");
    assertThat(parts.partOf("crown-e")).isEmpty();
    assertThat(parts.outline()).isEmpty();
    assertThat(parts.partial()).isTrue();
    assertThat(parts.missing()).isEqualTo("without the missing Crown of Station E");
    assertThat(labels(parts)).doesNotContain("Crown");
  }

  @Test
  void anUnknownRowStandsForTheTotal() {
    assertThat(labels(StackParts.of(hold(), "nobody")))
        .isEqualTo(labels(StackParts.of(hold(), "quillon-82")));
  }
}
