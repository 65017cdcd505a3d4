package eddyledger.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.chart.StackFill.Kind;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Status;
import eddyledger.ledger.Way;
import eddyledger.quantity.BandSpectrum;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Order, fills and names of the parts, on sheets whose energies are whole numbers. */
class StackSortTest {
  private static List<String> words(StackParts parts) {
    return parts.parts().stream()
        .map(part -> part.label() + ": " + part.fill().kind() + " " + part.fill().number())
        .toList();
  }

  @Test
  void leaksHaveTheirOwnFillWhereverTheyStand() {
    ReceiverSheet sheet =
        new SmallSheet()
            .section("side", SmallSheet.TOTAL, 10.0)
            .panel("glass", "side", 6.0)
            .leak("seal", "side", 3.0)
            .panel("sill", "side", 1.0)
            .sheet(Status.OK);
    assertThat(words(StackParts.of(sheet, "side")))
        .containsExactly("Glass: SERIES 0", "Seal: LEAK 0", "Sill: SERIES 1");
  }

  @Test
  void severalLeaksAreOnePart() {
    ReceiverSheet sheet =
        new SmallSheet()
            .section("side", SmallSheet.TOTAL, 7.0)
            .leak("seal", "side", 3.0)
            .leak("gap", "side", 2.0)
            .panel("sill", "side", 2.0)
            .sheet(Status.OK);
    StackParts parts = StackParts.of(sheet, "gap");
    assertThat(words(parts)).containsExactly("2 leaks of Side: LEAK 0", "Sill: SERIES 0");
    assertThat(parts.parts().get(0).share()).isCloseTo(5.0 / 7.0, within(1.0e-12));
    assertThat(parts.parts().get(0).selected()).isTrue();
  }

  @Test
  void aPanelThatAlsoLeaksIsNoLeak() {
    ReceiverSheet sheet =
        new SmallSheet()
            .panel("door", SmallSheet.TOTAL, 4.0)
            .row(
                "door",
                SmallSheet.TOTAL,
                RowKind.PANEL,
                Way.LEAK,
                SmallSheet.energy(1.0),
                Status.OK,
                "")
            .sheet(Status.OK);
    assertThat(words(StackParts.of(sheet, SmallSheet.TOTAL))).containsExactly("Door: SERIES 0");
  }

  @Test
  void theSixthChildAloneKeepsItsNameAndTheRestAreCounted() {
    SmallSheet sheet = new SmallSheet();
    for (int i = 1; i <= 6; i++) {
      sheet.panel("p" + i, SmallSheet.TOTAL, i);
    }
    assertThat(words(StackParts.of(sheet.sheet(Status.OK), "p3")))
        .containsExactly(
            "P6: SERIES 0",
            "P5: SERIES 1",
            "P4: SERIES 2",
            "P3: SERIES 3",
            "P2: SERIES 4",
            "P1: REMAINDER 0");
    sheet.panel("p0", SmallSheet.TOTAL, 0.5);
    assertThat(words(StackParts.of(sheet.sheet(Status.OK), "p3")).get(5))
        .isEqualTo("2 more of Van: REMAINDER 0");
  }

  @Test
  void otherSourcesKeepTheirPatternWhicheverIsLouder() {
    for (double tyres : new double[] {1.0, 5.0}) {
      ReceiverSheet sheet =
          new SmallSheet()
              .panel("roof", SmallSheet.TOTAL, 2.0)
              .other("tyres", tyres)
              .other("engine", 3.0)
              .sheet(Status.OK);
      StackParts parts = StackParts.of(sheet, "tyres");
      assertThat(parts.partOf("tyres").orElseThrow().fill())
          .isEqualTo(new StackFill(Kind.OTHER, 0));
      assertThat(parts.partOf("engine").orElseThrow().fill())
          .isEqualTo(new StackFill(Kind.OTHER, 1));
      assertThat(parts.parts().get(1).label()).isEqualTo(tyres > 3.0 ? "Tyres" : "Engine");
    }
  }

  @Test
  void moreThanThreeOtherSourcesAreTwoAndTheRest() {
    ReceiverSheet sheet =
        new SmallSheet()
            .other("fan", 1.0)
            .other("tyres", 5.0)
            .other("pump", 2.0)
            .other("engine", 3.0)
            .sheet(Status.OK);
    StackParts parts = StackParts.of(sheet, "pump");
    assertThat(words(parts))
        .containsExactly("Tyres: OTHER 0", "Engine: OTHER 1", "2 more other sources: OTHER 2");
    assertThat(parts.outline().orElseThrow().part()).isEqualTo(2);
    assertThat(parts.outline().orElseThrow().energyA() / parts.parts().get(2).energyA())
        .isCloseTo(2.0 / 3.0, within(1.0e-12));
  }

  @Test
  void anEmptySectionIsNoPart() {
    ReceiverSheet sheet =
        new SmallSheet()
            .panel("roof", SmallSheet.TOTAL, 2.0)
            .section("later", SmallSheet.TOTAL, 0.0)
            .sheet(Status.OK);
    assertThat(words(StackParts.of(sheet, SmallSheet.TOTAL))).containsExactly("Roof: SERIES 0");
    StackParts later = StackParts.of(sheet, "later");
    assertThat(words(later)).containsExactly("all other panels: ELSEWHERE 0");
    assertThat(later.outline()).isEmpty();
  }

  @Test
  void missingRowsAreCounted() {
    double[] some = SmallSheet.energy(1.0).toArray();
    some[3] = Double.NaN;
    ReceiverSheet sheet =
        new SmallSheet()
            .panel("roof", SmallSheet.TOTAL, 2.0)
            .row(
                "door",
                SmallSheet.TOTAL,
                RowKind.PANEL,
                Way.ALL,
                BandSpectrum.of(some),
                Status.PARTIAL,
                "no value at 50 Hz")
            .missing("floor", SmallSheet.TOTAL, "no construction")
            .sheet(Status.PARTIAL);
    StackParts parts = StackParts.of(sheet, "floor");
    assertThat(parts.missing()).isEqualTo("without the missing bands of Door and 1 more");
    assertThat(words(parts)).containsExactly("Roof: SERIES 0", "Door: SERIES 1");
    assertThat(parts.parts().get(1).meanSquares().has(3)).isFalse();
    double bands = 27.0 / (2.0 * 28.0 + 27.0);
    assertThat(parts.parts().get(1).share()).isCloseTo(bands, within(1.0e-12));
  }

  @Test
  void withoutAnyValueThereAreNoParts() {
    ReceiverSheet sheet =
        new SmallSheet().missing("roof", SmallSheet.TOTAL, "no zone").sheet(Status.MISSING);
    StackParts parts = StackParts.of(sheet, "roof");
    assertThat(parts.parts()).isEmpty();
    assertThat(parts.missing()).isEqualTo("without the missing Roof");
  }
}
