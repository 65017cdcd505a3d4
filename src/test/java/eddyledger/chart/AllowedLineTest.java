package eddyledger.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.State;
import eddyledger.ledger.Status;
import eddyledger.ledger.Way;
import eddyledger.quantity.AWeighting;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Decibels;
import java.io.IOException;
import org.junit.jupiter.api.Test;

/** The allowed line: the total's own spectrum, moved by the margin of the total. */
class AllowedLineTest {
  private static final double SMALL_LEVEL = 60.0 + 10.0 * Math.log10(28.0);

  private static SmallSheet small() {
    return new SmallSheet().panel("roof", SmallSheet.TOTAL, 1.0);
  }

  @Test
  void lineIsTotalPlusMarginAndSumsToWhatIsAllowed() throws IOException {
    for (ReceiverSheet sheet : ExampleLedger.ledger().sheets()) {
      AllowedLine line = AllowedLine.of(sheet).orElseThrow();
      LedgerRow total = sheet.total();
      double sum = 0.0;
      for (int band = 0; band < Bands.COUNT; band++) {
        double weighted = total.levels().value(band) + AWeighting.weights().value(band);
        double moved = weighted + total.judgement().margin();
        assertThat(line.bands()[band]).isCloseTo(moved, within(1.0e-12));
        sum += Decibels.ratio(line.bands()[band]);
      }
      assertThat(line.overall()).isEqualTo(total.judgement().allowance());
      assertThat(Decibels.ofRatio(sum)).isCloseTo(line.overall(), within(1.0e-9));
    }
  }

  @Test
  void noTargetNoLine() {
    assertThat(AllowedLine.of(small().sheet(Status.OK))).isEmpty();
  }

  @Test
  void excessIsSaidOnlyWhenOver() {
    ReceiverSheet over = small().sheet(Status.OK, SMALL_LEVEL - 0.72, State.OVER);
    AllowedLine line = AllowedLine.of(over).orElseThrow();
    assertThat(line.exceeded()).isTrue();
    assertThat(line.excess()).isCloseTo(0.72, within(1.0e-9));
    assertThat(line.excessWords()).isEqualTo("0.7 over");
    AllowedLine tight =
        AllowedLine.of(small().sheet(Status.OK, SMALL_LEVEL + 0.4, State.TIGHT)).orElseThrow();
    assertThat(tight.exceeded()).isFalse();
    assertThat(tight.excess()).isZero();
    assertThat(tight.excessWords()).isEmpty();
  }

  @Test
  void aToleranceCanForgiveAndRoundingCanCondemn() {
    AllowedLine forgiven =
        AllowedLine.of(small().sheet(Status.OK, SMALL_LEVEL - 0.3, State.TIGHT)).orElseThrow();
    assertThat(forgiven.exceeded()).isFalse();
    assertThat(forgiven.excessWords()).isEmpty();
    AllowedLine condemned =
        AllowedLine.of(small().sheet(Status.OK, SMALL_LEVEL + 0.2, State.OVER)).orElseThrow();
    assertThat(condemned.exceeded()).isFalse();
    assertThat(condemned.excessWords()).isEqualTo("over after its pass rule");
  }

  @Test
  void ofAPartialTotalTheLineSaysSo() {
    AllowedLine line = AllowedLine.of(small().sheet(Status.PARTIAL, 80.0, null)).orElseThrow();
    assertThat(line.words()).isEqualTo("allowed, at the shape of what is known");
    assertThat(line.overallWords()).isEqualTo("allowed 80.0");
  }

  @Test
  void aTotalThatLacksABandHasNoLinePerBand() {
    double[] some = SmallSheet.energy(1.0).toArray();
    some[10] = Double.NaN;
    BandSpectrum lacking = BandSpectrum.of(some);
    ReceiverSheet sheet =
        new SmallSheet()
            .row("roof", SmallSheet.TOTAL, RowKind.PANEL, Way.ALL, lacking, Status.PARTIAL, "")
            .sheet(Status.PARTIAL, 75.0, null);
    AllowedLine line = AllowedLine.of(sheet).orElseThrow();
    assertThat(line.overall()).isEqualTo(75.0);
    assertThat(line.bands()).hasSize(Bands.COUNT).containsOnly(Double.NaN);
  }
}
