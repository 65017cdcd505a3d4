package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.check.Cautions;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.State;
import eddyledger.ledger.Trace;
import eddyledger.ledger.TraceStep;
import eddyledger.ledger.Way;
import eddyledger.present.TraceNote.Kind;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** The account of a contribution of the example, as its reader meets it. */
class TraceAccountTest {
  private static final Ledger LEDGER = Quillon.ledger();
  private static final int AT_400_HZ = 12;

  private static TraceAccount account(String panel, String condition, int band) {
    return TraceAccount.of(LEDGER, panel, condition, Quillon.ROW_2, band).orElseThrow();
  }

  private static TraceStage stage(TraceAccount account, String name) {
    return account.stages().stream().filter(it -> it.name().equals(name)).findFirst().orElseThrow();
  }

  @Test
  void nineStagesInTheOrderSoundTravels() {
    TraceAccount account = account("upper-side-left-a", Quillon.CRUISE, AT_400_HZ);
    assertThat(account.stages().stream().map(TraceStage::name))
        .containsExactly(
            "Ambient air",
            "Flow at the panel",
            "Boundary layer",
            "Wall pressure",
            "Cross-spectrum",
            "Panel",
            "Lay-up",
            "Zone",
            "Receiver");
    assertThat(account.title()).isEqualTo("Upper side left, station A");
    assertThat(account.subtitle())
        .isEqualTo(
            "Heard at Row 2, window seat in Cruise, M 0.74 at 10 700 m: from the air outside to "
                + account.total().level()
                + ", step by step.");
    assertThat(account.bandName()).isEqualTo("400 Hz");
  }

  @Test
  void stagesSpeakPlainly() {
    TraceAccount account = account("upper-side-left-a", Quillon.CRUISE, AT_400_HZ);
    TraceStage air = stage(account, "Ambient air");
    assertThat(air.sentence()).isEqualTo("Standard atmosphere at 10.7 km.");
    assertThat(air.origin()).isEqualTo("Altitude from condition Cruise");
    assertThat(air.numbers())
        .isEqualTo("T = 218.6 K,  p = 23.7 kPa,  ρ = 0.378 kg/m³,  c = 296.4 m/s");
    TraceStage flow = stage(account, "Flow at the panel");
    assertThat(flow.sentence()).isEqualTo("Mach 0.74 times the local speed ratio 1.08.");
    assertThat(flow.origin()).isEqualTo("Mach from Cruise; ratio from Station A (calculation)");
    assertThat(flow.numbers()).startsWith("U_{e} = 1.08 · 0.74 · 296.4 = 236.9 m/s,");
    assertThat(stage(account, "Wall pressure").sentence())
        .isEqualTo("Efimtsov spectrum at a point, summed over each band.");
    TraceStage panel = stage(account, "Panel");
    assertThat(panel.sentence()).isEqualTo("33 pieces of Aluminium skin 1.4 mm, 500 by 180 mm.");
    assertThat(panel.origin())
        .isEqualTo(
            "Construction set here; size from Station A; loss factor from Station A (read-across)");
    assertThat(stage(account, "Zone").sentence())
        .isEqualTo("Power meets the absorption of Cabin, rows 1 to 6.");
  }

  @Test
  void overridesForAConditionAreTold() {
    assertThat(stage(account("crown-a", Quillon.HOLD, 16), "Boundary layer").origin())
        .isEqualTo("Boundary layer from Station A for this condition");
    assertThat(stage(account("crown-a", Quillon.CRUISE, 16), "Boundary layer").origin())
        .isEqualTo("Boundary layer from Station A");
  }

  @Test
  void soundOfAnotherZonePassesOn() {
    assertThat(stage(account("lower-side-left-a", Quillon.HOLD, 16), "Zone").sentence())
        .isEqualTo(
            "Power meets the absorption of Underfloor, and passes on to Cabin, rows 1 to 6.");
  }

  @Test
  void whatLeftItsRangeOrWasFilledInIsSeen() {
    TraceAccount account = account("upper-side-left-a", Quillon.CRUISE, AT_400_HZ);
    assertThat(stage(account, "Wall pressure").notes())
        .containsExactly(
            new TraceNote(
                Kind.DOUBT,
                "Efimtsov is used at running-length Reynolds number 2.124·10⁷;"
                    + " its range is 5·10⁷ to 4.85·10⁸"));
    assertThat(stage(account, "Boundary layer").notes())
        .containsExactly(
            new TraceNote(
                Kind.FILLED_IN,
                "displacement thickness, momentum thickness and wall shear stress, from the law"
                    + " of the wall with wake, anchored on the boundary-layer thickness"));
    assertThat(stage(account, "Lay-up").notes())
        .containsExactly(new TraceNote(Kind.INTERPOLATED, "from octaves, linear in lg f"));
    assertThat(stage(account, "Cross-spectrum").notes())
        .extracting(TraceNote::kind)
        .containsExactly(Kind.CHOICE);
    assertThat(stage(account, "Zone").notes())
        .extracting(TraceNote::kind)
        .containsExactly(Kind.NOTE);
  }

  @Test
  void noNoteOfTheTraceIsHidden() {
    List<String> always =
        List.of("edges simply", "radiation damping of both faces", "fitted at orders");
    int seen = 0;
    for (String panel : List.of("crown-a", "window-panes-left-a", "lower-side-left-e")) {
      TraceAccount account = account(panel, Quillon.HOLD, 5);
      String notes =
          account.stages().stream()
              .flatMap(stage -> stage.notes().stream())
              .map(TraceNote::line)
              .collect(Collectors.joining("\n"));
      Trace trace = LEDGER.trace(panel, Quillon.HOLD, Quillon.ROW_2).orElseThrow();
      for (TraceStep step : trace.steps()) {
        if (step.note().isEmpty() || always.stream().anyMatch(step.note()::startsWith)) {
          continue;
        }
        String needed =
            step.note().contains("filled in")
                ? step.meaning()
                : Readable.sentence(step.note()).replace("Interpolated ", "");
        assertThat(notes).as(step.symbol()).contains(needed);
        seen++;
      }
    }
    assertThat(seen).isGreaterThan(9);
  }

  @Test
  void theTotalIsJudgedByTheNearestAllowance() {
    ReceiverSheet sheet = LEDGER.sheet(Quillon.CRUISE, Quillon.ROW_2).orElseThrow();
    LedgerRow station = sheet.row("station-b", Way.ALL).orElseThrow();
    assertThat(station.judgement().state()).isEqualTo(State.OVER);
    TraceTotal total = account("lower-side-left-b", Quillon.CRUISE, 13).total();
    assertThat(total.allowance()).isEqualTo("Station B: allowance 66.0 dB(A), margin");
    assertThat(total.margin())
        .isEqualTo("−" + String.format("%.1f", -station.judgement().margin()) + " dB");
    assertThat(total.state()).isEqualTo(State.OVER);
    assertThat(total.stateWord()).isEqualTo("over");
    TraceTotal none = account("lower-side-left-b", Quillon.HOLD, 13).total();
    assertThat(none.judged()).isFalse();
    assertThat(none.line()).contains("No allowance is set for it.");
  }

  @Test
  void levelAndShareAreThoseOfTheLedger() {
    for (ReceiverSheet sheet : LEDGER.sheets().subList(0, 2)) {
      for (LedgerRow row : sheet.rows()) {
        if (row.kind() == RowKind.PANEL && row.way() == Way.ALL) {
          TraceTotal total =
              TraceAccount.of(LEDGER, row.id(), sheet.condition().id(), sheet.receiver().id(), 0)
                  .orElseThrow()
                  .total();
          assertThat(total.level()).isEqualTo(Readable.level(row.levelA()) + " dB(A)");
          String share = Readable.share(row.meanSquareA() / sheet.total().meanSquareA());
          assertThat(total.share())
              .isEqualTo(share + " of the energy at " + sheet.receiver().name());
        }
      }
    }
  }

  @Test
  void theFlowPictureMarksWhereThePanelIs() {
    StagePicture picture =
        stage(account("crown-c", Quillon.CRUISE, 0), "Flow at the panel").picture();
    assertThat(picture.kind()).isEqualTo(StagePicture.Kind.BARS);
    assertThat(picture.names()).containsExactly("A", "B", "C", "D", "E");
    assertThat(picture.marked()).isEqualTo(2);
    assertThat(picture.rows().get(0)[0])
        .isCloseTo(1.08, org.assertj.core.api.Assertions.within(1e-9));
  }

  @Test
  void theTemperaturePictureRunsThroughTheTracesTemperature() {
    StagePicture picture = stage(account("crown-c", Quillon.CRUISE, 0), "Ambient air").picture();
    assertThat(picture.x()[picture.marked()]).isEqualTo(10.7);
    assertThat(picture.rows().get(0)[picture.marked()])
        .isCloseTo(288.15 - 6.5 * 10.7, org.assertj.core.api.Assertions.within(1e-9));
  }

  @Test
  void theAxisHoldsEveryLevelInEveryBand() {
    for (int band = 0; band < 28; band++) {
      TraceAccount account = account("window-panes-left-a", Quillon.CRUISE, band);
      LevelAxis axis = account.axis();
      assertThat(account.stages().stream().map(TraceStage::level).filter(Double::isFinite))
          .isNotEmpty()
          .allMatch(level -> level > axis.low() && level < axis.high());
    }
  }

  @Test
  void theLoudestBandIsThatOfTheHighestWeightedLevel() {
    int band = TraceAccount.loudestBand(LEDGER, "upper-side-left-a", Quillon.CRUISE, Quillon.ROW_2);
    assertThat(band).isEqualTo(AT_400_HZ);
    TraceAccount account = account("upper-side-left-a", Quillon.CRUISE, band);
    assertThat(stage(account, "Receiver").numbers()).endsWith("highest at 400 Hz");
  }

  @Test
  void theTextHoldsStagesNumbersAndCautions() {
    TraceAccount account = account("upper-side-left-a", Quillon.CRUISE, AT_400_HZ);
    String text = account.text();
    for (TraceStage stage : account.stages()) {
      assertThat(text).contains(stage.number() + ". " + stage.name() + ": " + stage.sentence());
      stage.notes().forEach(note -> assertThat(text).contains(note.line()));
    }
    assertThat(text).contains("\tW1/p²\t").contains(account.total().line());
    assertThat(text).endsWith(String.join(" ", Cautions.SHORT) + "\n").doesNotContain("_{");
    List<String> lines = text.lines().toList();
    assertThat(lines.get(0)).isEqualTo(account.title());
  }

  @Test
  void whatDoesNotExistHasNoAccount() {
    assertThat(TraceAccount.of(LEDGER, "nothing", Quillon.CRUISE, Quillon.ROW_2, 0)).isEmpty();
    assertThat(TraceAccount.of(LEDGER, "station-a", Quillon.CRUISE, Quillon.ROW_2, 0)).isEmpty();
  }
}
