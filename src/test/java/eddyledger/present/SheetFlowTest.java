package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.Way;
import eddyledger.model.ByCondition;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.Judged;
import eddyledger.model.LayerGiven;
import eddyledger.model.TreeEdit;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Values that change with the condition, the boundary layer, and numbers out of the ledger. */
class SheetFlowTest {
  private final ExampleDesk desk = new ExampleDesk().row("crown-a");

  @Test
  void whatIsNotGivenIsTakenFromTheTrace() {
    assertThat(desk.field("displacementThickness").text()).isEmpty();
    assertThat(desk.field("displacementThickness").origin()).isEqualTo("not given");
    desk.computed();
    double traced =
        desk
            .state
            .ledger()
            .orElseThrow()
            .trace("crown-a", "cruise", "row-2")
            .orElseThrow()
            .steps()
            .stream()
            .filter(step -> step.symbol().equals("delta*"))
            .findFirst()
            .orElseThrow()
            .value();
    SheetField field = desk.field("displacementThickness");
    assertThat(Double.parseDouble(field.text())).isCloseTo(traced * 1000.0, within(5.0e-4));
    assertThat(field.origin()).isEqualTo("worked out");
    assertThat(field.weight()).isEqualTo(SheetField.Weight.FAINT);
    assertThat(desk.field("edgeSpeed").text()).isEqualTo("236.9");
    assertThat(desk.field("runningLength").text()).isEmpty();
    desk.type("length", "0.55");
    assertThat(desk.field("displacementThickness").origin()).isEqualTo("computing");
    assertThat(desk.field("level").origin()).isEqualTo("computing");
  }

  @Test
  void aLevelFollowsTheThicknessAndComesBackWithUndo() {
    desk.computed();
    String before = desk.field("level").text();
    double levelBefore = level();
    desk.type("thickness", "2.4");
    assertThat(desk.field("level").text()).isEqualTo(before);
    desk.computed();
    assertThat(level()).isLessThan(levelBefore - 1.0);
    assertThat(desk.field("level").text()).isNotEqualTo(before);
    assertThat(desk.field("level").weight()).isEqualTo(SheetField.Weight.RESULT);
    desk.state.undo();
    desk.computed();
    assertThat(level()).isEqualTo(levelBefore);
  }

  private double level() {
    return desk.state
        .sheet()
        .flatMap(it -> it.row("crown-a", Way.ALL))
        .map(LedgerRow::levelA)
        .orElseThrow();
  }

  @Test
  void anOverrideFromAboveIsNamedAndTypedOverForItsConditionOnly() {
    desk.in("hold");
    assertThat(desk.field("layerThickness").text()).isEqualTo("47.0");
    assertThat(desk.field("layerThickness").origin()).isEqualTo("Station A, for Holding only");
    desk.type("layerThickness", "45");
    assertThat(desk.settings("crown-a").boundaryLayer())
        .isEqualTo(new ByCondition<>(null, Map.of("hold", LayerGiven.thickness(0.045))));
    assertThat(desk.field("layerThickness").origin()).isEqualTo("for Holding only");
    assertThat(desk.field("layerThickness").back()).isEqualTo("back to 47.0 mm");
    assertThat(desk.in("cruise").field("layerThickness").origin()).isEqualTo("Station A");
    desk.in("hold").sheet.back("layerThickness");
    assertThat(desk.state.vehicle()).isEqualTo(ExampleDesk.example());
  }

  @Test
  void typingForOneConditionLeavesAnOverrideFromAboveInForce() {
    desk.type("layerThickness", "60");
    assertThat(desk.field("layerThickness").origin()).isEqualTo("set here");
    assertThat(desk.in("hold").field("layerThickness").text()).isEqualTo("47.0");
    desk.in("cruise").sheet.back("layerThickness");
    assertThat(desk.state.vehicle()).isEqualTo(ExampleDesk.example());
  }

  @Test
  void aValueCanBeMadeSpecialForACondition() {
    desk.in("hold");
    assertThat(desk.field("lossFactor").only())
        .isEqualTo(new SheetField.Only("Only in Holding", false));
    desk.sheet.only("lossFactor");
    assertThat(desk.field("lossFactor").only().on()).isTrue();
    assertThat(desk.state.undoLabel()).contains("loss factor of Crown, station A");
    desk.type("lossFactor", "0.05");
    assertThat(desk.field("lossFactor").text()).isEqualTo("0.050");
    assertThat(desk.in("cruise").field("lossFactor").text()).isEqualTo("0.040");
    assertThat(desk.field("lossFactor").own()).isFalse();
    desk.in("hold").sheet.only("lossFactor");
    assertThat(desk.state.vehicle()).isEqualTo(ExampleDesk.example());
    assertThat(desk.field("length").only()).isEqualTo(SheetField.Only.NEVER);
  }

  @Test
  void aSecondQuantityOfTheLayerCopiesTheInheritedOnes() {
    desk.type("displacementThickness", "6");
    LayerGiven own = desk.settings("crown-a").boundaryLayer().base();
    LayerGiven above = desk.settings("station-a").boundaryLayer().base();
    assertThat(own)
        .isEqualTo(
            new LayerGiven(null, above.thickness(), Judged.of(0.006), null, null, above.extras()));
    assertThat(desk.field("displacementThickness").back()).isEqualTo("back to worked out");
    assertThat(desk.field("layerThickness").origin()).isEqualTo("set here");
    assertThat(desk.field("layerThickness").back()).isEmpty();
    desk.sheet.back("displacementThickness");
    assertThat(desk.state.vehicle()).isEqualTo(ExampleDesk.example());
  }

  @Test
  void emptyingAQuantityOfTheLayerTakesItAwayButNotTheLast() {
    desk.type("displacementThickness", "6");
    desk.sheet.enter("layerThickness");
    desk.sheet.type("layerThickness", "");
    desk.sheet.leave("layerThickness");
    LayerGiven own = desk.settings("crown-a").boundaryLayer().base();
    assertThat(own.thickness()).isNull();
    assertThat(own.displacementThickness()).isEqualTo(Judged.of(0.006));
    desk.sheet.enter("displacementThickness");
    desk.sheet.type("displacementThickness", "");
    desk.sheet.leave("displacementThickness");
    assertThat(desk.settings("crown-a").boundaryLayer().base()).isEqualTo(own);
  }

  @Test
  void aSpeedTypedWithItsUnitChangesTheWayItIsGiven() {
    desk.type("localSpeed", "900 km/h");
    EdgeSpeed own = desk.settings("crown-a").localSpeed().base();
    assertThat(own.way()).isEqualTo(EdgeSpeed.Way.SPEED);
    assertThat(own.value()).isEqualTo(Judged.of(250.0));
    assertThat(desk.field("localSpeed").text()).isEqualTo("250");
    assertThat(desk.field("localSpeed").unit()).isEqualTo("m/s");
    assertThat(desk.field("localSpeed").back()).isEqualTo("back to 1.08 × U");
    desk.type("localSpeed", "-0.2 Cp");
    assertThat(desk.settings("crown-a").localSpeed().base().way())
        .isEqualTo(EdgeSpeed.Way.PRESSURE_COEFFICIENT);
    desk.sheet.enter("localSpeed");
    desk.sheet.type("localSpeed", "3 U");
    desk.sheet.type("localSpeed", "30 U");
    assertThat(desk.field("localSpeed").message().text())
        .isEqualTo(
            "A speed ratio of 30 is not between 0.05 and 3. Correct it: a speed typed as a ratio?");
  }

  @Test
  void anotherWayTakesTheSpeedTheLedgerFound() {
    desk.computed();
    desk.sheet.unit("localSpeed", "m/s");
    EdgeSpeed own = desk.settings("crown-a").localSpeed().base();
    assertThat(own.way()).isEqualTo(EdgeSpeed.Way.SPEED);
    assertThat(own.value().best()).isCloseTo(236.9, within(0.05));
    desk.state.undo();
    assertThat(desk.field("localSpeed").unit()).isEqualTo("× U");
    assertThat(desk.field("localSpeed").text()).isEqualTo("1.08");
  }

  @Test
  void aWayThatCannotBeWorkedOutWaitsForANumber() {
    desk.sheet.unit("localSpeed", "Cp");
    assertThat(desk.state.vehicle()).isEqualTo(ExampleDesk.example());
    assertThat(desk.field("localSpeed").text()).isEmpty();
    assertThat(desk.field("localSpeed").message().text())
        .isEqualTo("Type it in Cp; until then 1.08 × U holds.");
    desk.type("localSpeed", "−0.2");
    assertThat(desk.settings("crown-a").localSpeed().base())
        .isEqualTo(
            new EdgeSpeed(
                EdgeSpeed.Way.PRESSURE_COEFFICIENT, Judged.of(-0.2), eddyledger.model.Extras.NONE));
    assertThat(desk.field("localSpeed").text()).isEqualTo("−0.2");
  }

  @Test
  void anOrderOfTheCrossSpectrumCopiesTheRest() {
    desk.choose("orderAlong", "3");
    assertThat(desk.settings("crown-a").crossSpectrum().base())
        .isEqualTo(
            desk.settings("quillon-82")
                .crossSpectrum()
                .base()
                .at(3, 1, eddyledger.model.CrossSpectrumChoice.Rule.HALF_POWER_WIDTH));
    assertThat(desk.field("orderAlong").back()).isEqualTo("back to 2");
    assertThat(desk.state.undoLabel())
        .contains("order of the cross-spectrum along of Crown, station A");
    desk.sheet.back("orderAlong");
    assertThat(desk.state.vehicle()).isEqualTo(ExampleDesk.example());
  }

  @Test
  void aLossFactorPerBandIsToldAndReplacedByATypedNumber() {
    var bands =
        eddyledger.model.JudgedBands.of(
            eddyledger.model.BandTable.octaves("125", 0.02, 0.04, 0.06));
    desk.state.put(
        TreeEdit.settings(
            ExampleDesk.example(),
            "crown-a",
            it -> it.edit().lossFactor(ByCondition.always(bands)).build()),
        null);
    desk.row("crown-a");
    assertThat(desk.field("lossFactor").text()).isEqualTo("per band, 0.020 to 0.060");
    assertThat(desk.field("lossFactor").tip())
        .contains("\n125 Hz  0.020")
        .contains("\n500 Hz  0.060");
    desk.type("lossFactor", "0.05");
    assertThat(desk.settings("crown-a").lossFactor().base().best().values()).containsExactly(0.05);
    desk.state.undo();
    assertThat(desk.settings("crown-a").lossFactor().base()).isEqualTo(bands);
  }

  @Test
  void aFindingStandsUnderItsField() {
    desk.state.put(
        TreeEdit.settings(
            ExampleDesk.example(),
            "crown-a",
            it ->
                it.edit()
                    .boundaryLayer(
                        ByCondition.always(
                            new LayerGiven(
                                null,
                                new Judged(
                                    0.05,
                                    0.06,
                                    0.07,
                                    eddyledger.model.Evidence.NONE,
                                    eddyledger.model.Extras.NONE),
                                null,
                                null,
                                null,
                                eddyledger.model.Extras.NONE)))
                    .build()),
        null);
    desk.row("crown-a").computed();
    SheetMessage message = desk.field("layerThickness").message();
    assertThat(message.severity()).isEqualTo(eddyledger.check.Severity.ERROR);
    assertThat(message.text()).startsWith("Low, best and high are not in this order.");
    assertThat(desk.field("runningLength").message()).isNull();
    var finding =
        desk.state.findings().stream()
            .filter(it -> it.code().equals("low-above-high"))
            .findFirst()
            .orElseThrow();
    assertThat(desk.sheet.fieldOf(finding)).contains("layerThickness");
    assertThat(desk.row("upper-side-left-a").field("layerThickness").message()).isNull();
  }
}
