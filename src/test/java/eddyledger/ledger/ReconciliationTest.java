package eddyledger.ledger;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.model.Vehicle;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The ledger always sums: at every node, on every sheet, per band and overall. */
class ReconciliationTest {
  private static final double TIGHT = 1.0e-12;

  record Case(String name, Ledger ledger) {
    @Override
    public String toString() {
      return name;
    }
  }

  static Stream<Case> ledgers() {
    Vehicle sample = SampleVehicle.vehicle();
    Vehicle partial =
        Edits.settings(
            sample, "floor", it -> it.construction("glass").lossFactor(null).layUp("none"));
    partial = Edits.settings(partial, "tail", it -> it.zone(null));
    List<Case> cases = new ArrayList<>();
    cases.add(new Case("sample", Ledger.of(sample)));
    cases.add(new Case("sample with a panel that has no zone", Ledger.of(partial)));
    for (long seed = 1; seed <= 4; seed++) {
      cases.add(new Case("seed " + seed, Ledger.of(RandomVehicle.of(seed))));
    }
    return cases.stream();
  }

  @ParameterizedTest
  @MethodSource("ledgers")
  void childrenSumToTheirParent(Case given) {
    int sums = 0;
    for (ReceiverSheet sheet : given.ledger().sheets()) {
      for (LedgerRow row : sheet.rows()) {
        boolean sum = row.kind() == RowKind.SECTION || row.kind() == RowKind.TOTAL;
        if (sum && row.way() == Way.ALL) {
          assertSum(row, sheet.children(row.id()), given + ", " + sheet.title());
          sums++;
        }
      }
    }
    assertThat(sums).isGreaterThanOrEqualTo(given.ledger().sheets().size());
  }

  @ParameterizedTest
  @MethodSource("ledgers")
  void waysSumToAll(Case given) {
    int nodes = 0;
    for (ReceiverSheet sheet : given.ledger().sheets()) {
      for (LedgerRow row : sheet.rows()) {
        boolean node = row.kind() == RowKind.SECTION || row.kind() == RowKind.PANEL;
        if (node && row.way() == Way.ALL) {
          List<LedgerRow> ways =
              sheet.rows().stream()
                  .filter(it -> it.id().equals(row.id()) && it.way() != Way.ALL)
                  .toList();
          assertSum(row, ways, given + ", ways of " + row.id());
          nodes++;
        }
      }
    }
    assertThat(nodes).isPositive();
  }

  @ParameterizedTest
  @MethodSource("ledgers")
  void flowAndOtherSourcesAreTheTotal(Case given) {
    for (ReceiverSheet sheet : given.ledger().sheets()) {
      BandSpectrum flow = sheet.flow().meanSquares();
      List<LedgerRow> others =
          sheet.rows().stream().filter(row -> row.kind() == RowKind.OTHER).toList();
      for (int band = 0; band < Bands.COUNT; band++) {
        double sum = flow.value(band);
        for (LedgerRow other : others) {
          sum += other.meanSquares().value(band);
        }
        double total = sheet.total().meanSquares().value(band);
        assertThat(sum).as("%s, %s", given, sheet.title()).isCloseTo(total, within(TIGHT * total));
      }
    }
  }

  @ParameterizedTest
  @MethodSource("ledgers")
  void everyRowStandsBelowItsParentOnce(Case given) {
    for (ReceiverSheet sheet : given.ledger().sheets()) {
      assertThat(sheet.rows().stream().map(row -> row.id() + row.way())).doesNotHaveDuplicates();
      for (LedgerRow row : sheet.rows().subList(1, sheet.rows().size())) {
        LedgerRow parent = sheet.row(row.parent(), Way.ALL).orElseThrow();
        assertThat(row.depth()).as("%s: %s", given, row.id()).isEqualTo(parent.depth() + 1);
      }
      assertThat(sheet.total().kind()).isEqualTo(RowKind.TOTAL);
      assertThat(sheet.total().depth()).isZero();
    }
  }

  /** Bands in which no row has a value are missing in the sum; a sum of nothing is zero. */
  private static void assertSum(LedgerRow whole, List<LedgerRow> parts, String what) {
    double[] sum = new double[Bands.COUNT];
    boolean ok = true;
    for (LedgerRow part : parts) {
      ok &= part.status() == Status.OK;
      for (int band = 0; band < Bands.COUNT; band++) {
        sum[band] += part.meanSquares().has(band) ? part.meanSquares().value(band) : 0.0;
      }
    }
    double overall = 0.0;
    for (int band = 0; band < Bands.COUNT; band++) {
      int at = band;
      boolean known =
          parts.isEmpty() || parts.stream().anyMatch(part -> part.meanSquares().has(at));
      assertThat(whole.meanSquares().has(band)).as(what).isEqualTo(known);
      if (known) {
        double value = whole.meanSquares().value(band);
        assertThat(sum[band]).as(what).isCloseTo(value, within(TIGHT * value));
        overall += sum[band];
      }
    }
    assertThat(whole.status() == Status.OK).as(what + ": " + whole.id()).isEqualTo(ok);
    if (whole.meanSquares().complete() && overall > 0.0) {
      assertThat(10.0 * Math.log10(overall / 4.0e-10))
          .as(what)
          .isCloseTo(whole.level(), within(1e-11));
    }
  }
}
