package eddyledger.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.check.Severity;
import eddyledger.file.LedgerCsv;
import eddyledger.file.ProjectReader;
import eddyledger.file.ReadResult;
import eddyledger.file.TraceCsv;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Way;
import eddyledger.quantity.AWeighting;
import eddyledger.quantity.Bands;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/**
 * The example of a regional fuselage section: what its flow noise must be like by the physics
 * (level, peak, lead among the panels: estimates for a section of this kind, computed
 * independently), and the tables made of it.
 */
class ExampleTest {
  private static Ledger ledger;

  @BeforeAll
  static void compute() throws IOException {
    ReadResult read = new ProjectReader().read(Path.of("examples/quillon-82.eddyledger"));
    assertThat(read.findings()).noneMatch(it -> it.severity().atLeast(Severity.WARNING));
    ledger = Ledger.of(read.vehicle().orElseThrow());
  }

  private static List<ReceiverSheet> cruise() {
    return ledger.sheets().stream().filter(it -> it.condition().id().equals("cruise")).toList();
  }

  @Test
  void flowNoiseInCruiseIsThatOfSuchASection() {
    assertThat(cruise()).hasSize(3);
    for (ReceiverSheet sheet : cruise()) {
      double levelA = sheet.flow().levelA();
      assertThat(levelA).isBetween(71.0, 79.0);
      assertThat(sheet.flow().level() - levelA).isBetween(2.0, 12.0);
      int peak = 0;
      double[] weighted = new double[Bands.COUNT];
      for (int i = 0; i < Bands.COUNT; i++) {
        weighted[i] = sheet.flow().meanSquares().value(i) * AWeighting.energyRatios().value(i);
        peak = weighted[i] > weighted[peak] ? i : peak;
      }
      assertThat(Bands.centre(peak)).isBetween(240.0, 640.0);
      double upper = sum(sheet, "upper-side");
      assertThat(upper).isGreaterThan(sum(sheet, "window-belt"));
      assertThat(upper).isGreaterThan(sum(sheet, "window-panes"));
      assertThat(sum(sheet, "crown")).isGreaterThan(sum(sheet, "window-panes"));
    }
  }

  private static double sum(ReceiverSheet sheet, String start) {
    return sheet.rows().stream()
        .filter(row -> row.kind() == RowKind.PANEL && row.way() == Way.ALL)
        .filter(row -> row.id().startsWith(start))
        .mapToDouble(LedgerRow::meanSquareA)
        .sum();
  }

  @Test
  void goodyLiesAboveEfimtsovAndSaysThatItIsOutOfRange() {
    for (ReceiverSheet sheet : cruise()) {
      LedgerRow goody = choice(sheet, "spectrum-goody");
      assertThat(goody.levelA() - choice(sheet, "spectrum-efimtsov").levelA()).isBetween(1.0, 4.5);
      assertThat(goody.reason()).contains("outside its range on 59 of 59 panels");
      assertThat(sheet.total().reason()).contains("orders (2,1)", "half-power-width");
    }
  }

  private static LedgerRow choice(ReceiverSheet sheet, String name) {
    return sheet.range().stream().filter(it -> it.choice().equals(name)).findFirst().orElseThrow();
  }

  @Test
  void theCsvHoldsEveryRowInFullPrecision() {
    String text = LedgerCsv.text(ledger.sheets());
    assertThat(text)
        .startsWith(
            "condition_id,receiver_id,node_id,parent_id,name,kind,way,choice,level_dBA,level_dB,"
                + "target_dBA,reserve_dB,allowance_dBA,margin_dB,state,status,reason,25,31.5,40,");
    String[] lines = text.split("\r\n");
    int rows = ledger.sheets().stream().mapToInt(it -> it.rows().size() + it.range().size()).sum();
    assertThat(lines).hasSize(rows + 1);
    String[] total =
        Arrays.stream(lines)
            .filter(it -> it.startsWith("cruise,row-9,quillon-82,,Quillon 82,total,all,chosen,"))
            .findFirst()
            .orElseThrow()
            .split(",");
    assertThat(Double.parseDouble(total[8]))
        .isEqualTo(ledger.sheet("cruise", "row-9").orElseThrow().total().levelA());
  }

  @Test
  void theTraceCsvEndsInTheLevelOfTheLedger() {
    String text = TraceCsv.text(ledger.trace("crown-c", "cruise", "row-9").orElseThrow());
    String[] lines = text.split("\r\n");
    assertThat(lines).hasSize(Bands.COUNT + 1);
    assertThat(lines[0])
        .isEqualTo(
            "band,x,wall_pressure_psd_Pa2_per_Hz,wall_pressure_band_dB,convection_speed_m_per_s,"
                + "velocity_squared_m2_per_s2,radiated_power_W,insertion_loss_dB,zone_power_W,"
                + "receiver_pressure_squared_Pa2,level_dB");
    LedgerRow row =
        ledger.sheet("cruise", "row-9").orElseThrow().row("crown-c", Way.ALL).orElseThrow();
    for (int i = 0; i < Bands.COUNT; i++) {
      String[] cells = lines[i + 1].split(",");
      double passed = Math.pow(10.0, -Double.parseDouble(cells[7]) / 10.0);
      assertThat(Double.parseDouble(cells[10])).isCloseTo(row.levels().value(i), within(1e-12));
      assertThat(Double.parseDouble(cells[6]) * passed / Double.parseDouble(cells[8]))
          .isCloseTo(1.0, within(1e-12));
    }
  }
}
