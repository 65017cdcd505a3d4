package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Trace;
import eddyledger.ledger.TraceStep;
import eddyledger.ledger.Way;
import eddyledger.present.StageSteps.Stage;
import eddyledger.quantity.AWeighting;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Decibels;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The steps in dB of every account sum to the level, with nothing hidden in between. */
class RunningLevelTest {
  private static final double TIGHT = 1.0e-9;
  private static final Ledger LEDGER = Quillon.ledger();

  @Test
  void theStepsOfEveryPanelSumToItsLevelInEveryBand() {
    int panels = 0;
    for (ReceiverSheet sheet : LEDGER.sheets()) {
      for (LedgerRow row : sheet.rows()) {
        if (row.kind() == RowKind.PANEL && row.way() == Way.ALL) {
          check(sheet, row);
          panels++;
        }
      }
    }
    assertThat(panels).isEqualTo(6 * 59);
  }

  private static void check(ReceiverSheet sheet, LedgerRow row) {
    Trace trace =
        LEDGER.trace(row.id(), sheet.condition().id(), sheet.receiver().id()).orElseThrow();
    StageSteps steps = new StageSteps(trace);
    double[] weighted = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      double level = 0.0;
      for (Stage stage : List.of(Stage.WALL, Stage.CROSS, Stage.PANEL, Stage.LAY_UP, Stage.ZONE)) {
        level += steps.change(stage, band);
      }
      assertThat(level).as(row.id()).isCloseTo(row.levels().value(band), within(TIGHT));
      assertThat(steps.level(Stage.ZONE, band)).isCloseTo(level, within(TIGHT));
      weighted[band] = level + steps.change(Stage.RECEIVER, band);
      assertThat(steps.change(Stage.RECEIVER, band)).isEqualTo(AWeighting.weights().value(band));
    }
    assertThat(Decibels.sum(weighted)).as(row.id()).isCloseTo(row.levelA(), within(TIGHT));
  }

  @Test
  void theAccountShowsTheSameLevelsInWhicheverBandIsFollowed() {
    Trace trace = LEDGER.trace("crown-a", Quillon.CRUISE, Quillon.ROW_2).orElseThrow();
    for (int band = 0; band < Bands.COUNT; band++) {
      TraceAccount account =
          TraceAccount.of(LEDGER, "crown-a", Quillon.CRUISE, Quillon.ROW_2, band).orElseThrow();
      double running = Double.NaN;
      for (TraceStage stage : account.stages()) {
        running =
            switch (stage.kind()) {
              case NONE -> Double.NaN;
              case WALL, POWER, PRESSURE, WEIGHTED ->
                  Double.isNaN(running) ? stage.step() : running + stage.step();
            };
        if (stage.kind() != TraceStage.LevelKind.NONE) {
          assertThat(stage.level()).isCloseTo(running, within(TIGHT));
        }
      }
      double weight = AWeighting.weights().value(band);
      double level = Decibels.pressureLevel(trace.product().value(band)) + weight;
      assertThat(running).isCloseTo(level, within(TIGHT));
    }
  }

  @Test
  void powerStandsBetweenPanelAndZone() {
    Trace trace = LEDGER.trace("crown-a", Quillon.CRUISE, Quillon.ROW_2).orElseThrow();
    StageSteps steps = new StageSteps(trace);
    for (int band = 0; band < Bands.COUNT; band++) {
      assertThat(steps.level(Stage.WALL, band))
          .isCloseTo(
              Decibels.pressureLevel(trace.bands().wallPressure().value(band)), within(TIGHT));
      assertThat(steps.level(Stage.PANEL, band))
          .isCloseTo(Decibels.powerLevel(trace.bands().radiatedPower().value(band)), within(TIGHT));
      assertThat(steps.level(Stage.LAY_UP, band))
          .isCloseTo(Decibels.powerLevel(trace.bands().zonePower().value(band)), within(TIGHT));
    }
  }

  @Test
  void everyStepBelongsToOneStageAndStandsInTheTable() {
    Trace trace = LEDGER.trace("crown-a", Quillon.HOLD, Quillon.ROW_2).orElseThrow();
    StageSteps steps = new StageSteps(trace);
    List<TraceStep> all = new ArrayList<>();
    for (Stage stage : Stage.values()) {
      assertThat(steps.of(stage)).as(stage.title()).isNotEmpty();
      all.addAll(steps.of(stage));
    }
    assertThat(all).containsExactlyElementsOf(trace.steps());
    TraceAccount account =
        TraceAccount.of(LEDGER, "crown-a", Quillon.HOLD, Quillon.ROW_2, 16).orElseThrow();
    assertThat(account.numbers().stream().map(TraceNumber::symbol))
        .containsExactlyElementsOf(trace.steps().stream().map(TraceStep::symbol).toList());
  }
}
