package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.check.Severity;
import eddyledger.model.ByCondition;
import eddyledger.model.Judged;
import eddyledger.model.JudgedBands;
import eddyledger.model.Settings;
import eddyledger.model.TreeEdit;
import eddyledger.model.Vehicle;
import java.lang.reflect.RecordComponent;
import java.util.Arrays;
import java.util.List;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

/** The sheet of a panel: what it shows, where values come from, and what typing does. */
class SheetPresenterTest {
  private final ExampleDesk desk = new ExampleDesk().row("upper-side-left-a");

  @Test
  void titleTrailAndGroupsInTheOrderSoundTravels() {
    SheetText text = desk.sheet.text();
    assertThat(text.title()).isEqualTo("Upper side left, station A");
    assertThat(text.trail()).isEqualTo("Quillon 82 › Station A");
    assertThat(text.groups())
        .extracting(SheetText.Group::heading)
        .containsExactly(
            "Size and build",
            "Flow",
            "Wall pressure",
            "Path and zone",
            "Allowance, Row 2, Cruise",
            "Supplier");
    assertThat(desk.row("window-panes-left-b-forward").sheet.text().trail())
        .isEqualTo("Quillon 82 › Station B › Station B, into the forward cabin");
  }

  @Test
  void anInheritedValueNamesWhereItComesFrom() {
    assertField("length", "0.500", "m", "Station A", false);
    assertField("lossFactor", "0.040", "", "Station A", false);
    assertField("localSpeed", "1.08", "× U", "Station A", false);
    assertField("layerThickness", "50.0", "mm", "Station A", false);
    assertField("convectionRatio", "0.70", "", "Quillon 82", false);
    assertField("decayAlong", "0.116", "", "Quillon 82", false);
    assertField("spectrum", "Efimtsov", "", "Quillon 82", false);
    assertField("orderAlong", "2", "", "Quillon 82", false);
    assertField("layUp", "Trim panel on 75 mm blanket, double wall", "", "Station A", false);
    assertField("zone", "Cabin, rows 1 to 6", "", "Station A", false);
    assertField("construction", "Aluminium skin 1.4 mm", "", "set here", true);
    assertField("count", "33", "", "", true);
    assertField("surfaceMass", "3.892", "kg/m²", "worked out", false);
    assertThat(desk.field("length").back()).isEmpty();
  }

  private void assertField(String key, String text, String unit, String origin, boolean own) {
    SheetField field = desk.field(key);
    assertThat(field.text()).as(key).isEqualTo(text);
    assertThat(field.unit()).as(key).isEqualTo(unit);
    assertThat(field.origin()).as(key).isEqualTo(origin);
    assertThat(field.own()).as(key).isEqualTo(own);
  }

  @Test
  void typingOverAnInheritedValueSetsItHereWithAWayBack() {
    desk.type("length", "0.55");
    assertThat(desk.settings("upper-side-left-a").length()).isEqualTo(0.55);
    assertThat(desk.settings("station-a").length()).isEqualTo(0.5);
    assertField("length", "0.550", "m", "set here", true);
    assertThat(desk.field("length").back()).isEqualTo("back to 0.500 m");
    desk.sheet.back("length");
    assertThat(desk.state.vehicle()).isEqualTo(ExampleDesk.example());
  }

  @Test
  void typingIsOneStepOfUndoWithAName() {
    desk.type("length", "0.55");
    desk.type("width", "0.2");
    assertThat(desk.state.undoLabel()).contains("width of Upper side left, station A");
    desk.state.undo();
    assertThat(desk.state.undoLabel()).contains("length of Upper side left, station A");
    desk.state.undo();
    assertThat(desk.state.vehicle()).isSameAs(ExampleDesk.example());
    assertThat(desk.state.undoLabel()).isEmpty();
  }

  @Test
  void theSameFieldEnteredTwiceIsTwoSteps() {
    desk.type("length", "0.55");
    desk.type("length", "0.6");
    desk.state.undo();
    assertThat(desk.settings("upper-side-left-a").length()).isEqualTo(0.55);
  }

  @Test
  void whatCannotBeTakenStaysInTheFieldWithAMessage() {
    desk.sheet.enter("length");
    desk.sheet.type("length", "0.6");
    desk.sheet.type("length", "0.6x");
    assertThat(desk.field("length").text()).isEqualTo("0.6x");
    assertThat(desk.field("length").message().severity()).isEqualTo(Severity.ERROR);
    assertThat(desk.field("length").message().text())
        .isEqualTo("“x” is not a unit for this. It takes m, mm, in, ft.");
    assertThat(desk.settings("upper-side-left-a").length()).isEqualTo(0.6);
    desk.sheet.leave("length");
    assertThat(desk.field("length").text()).isEqualTo("0.500");
    assertThat(desk.field("length").message()).isNull();
  }

  @Test
  void aValueOutsideItsLimitIsRefusedInTheWordsOfTheCheck() {
    desk.sheet.enter("length");
    desk.sheet.type("length", "500");
    assertThat(desk.field("length").message().text())
        .isEqualTo(
            "A size of 500 m is not between 0.005 m and 40 m."
                + " Correct it: millimetres typed as metres?");
    assertThat(desk.settings("upper-side-left-a").length()).isNull();
    desk.sheet.type("length", "500 mm");
    assertThat(desk.field("length").message()).isNull();
    assertThat(desk.settings("upper-side-left-a").length()).isEqualTo(0.5);
  }

  @Test
  void escapeTakesBackWhatWasDoneSinceTheFieldWasEntered() {
    desk.type("length", "0.55");
    desk.sheet.enter("length");
    desk.sheet.type("length", "0.7");
    desk.sheet.type("length", "0.7y");
    desk.sheet.escape("length");
    assertThat(desk.field("length").text()).isEqualTo("0.550");
    assertThat(desk.field("length").message()).isNull();
    desk.sheet.leave("length");
    desk.state.undo();
    assertThat(desk.state.vehicle()).isEqualTo(ExampleDesk.example());
  }

  @Test
  void enterEndsAStepAndShowsTheUsualUnit() {
    desk.sheet.enter("length");
    desk.sheet.type("length", "20 in");
    assertThat(desk.field("length").text()).isEqualTo("20 in");
    desk.sheet.commit("length");
    assertThat(desk.field("length").text()).isEqualTo("0.508");
    desk.sheet.type("length", "0.6");
    desk.sheet.leave("length");
    desk.state.undo();
    assertThat(desk.settings("upper-side-left-a").length()).isEqualTo(0.508);
  }

  @Test
  void aFieldCanBeShownInAnotherUnit() {
    desk.sheet.unit("length", "mm");
    assertField("length", "500", "mm", "Station A", false);
    desk.type("length", "550");
    assertThat(desk.settings("upper-side-left-a").length()).isEqualTo(0.55);
    assertThat(desk.field("length").units()).containsExactly("m", "mm", "in", "ft");
  }

  @Test
  void undoWhileTheFieldHasTheFocusShowsTheOldText() {
    desk.sheet.enter("length");
    desk.sheet.type("length", "0.7");
    desk.state.undo();
    assertThat(desk.field("length").text()).isEqualTo("0.500");
    desk.sheet.type("length", "0.8");
    desk.state.undo();
    assertThat(desk.state.vehicle()).isEqualTo(ExampleDesk.example());
  }

  @Test
  void anEmptiedFieldKeepsItsValueUntilAnotherIsTyped() {
    desk.sheet.enter("count");
    desk.sheet.type("count", "");
    assertThat(desk.panel("upper-side-left-a").count()).isEqualTo(33);
    desk.sheet.leave("count");
    assertThat(desk.field("count").text()).isEqualTo("33");
    desk.type("count", "34");
    assertThat(desk.panel("upper-side-left-a").count()).isEqualTo(34);
    desk.sheet.enter("count");
    desk.sheet.type("count", "3.5");
    assertThat(desk.field("count").message().text()).isEqualTo("Type a whole number.");
  }

  @Test
  void lowHighAndEvidenceStayWhenTheBestOfAnOwnValueIsTyped() {
    desk.row("station-a");
    Judged before = desk.settings("station-a").localSpeed().base().value();
    desk.type("localSpeed", "1.07");
    Judged after = desk.settings("station-a").localSpeed().base().value();
    assertThat(after)
        .isEqualTo(
            new Judged(1.07, before.low(), before.high(), before.evidence(), before.extras()));
    assertThat(desk.field("localSpeed").message()).isNull();
    desk.type("localSpeed", "1.2");
    assertThat(desk.field("localSpeed").message())
        .isEqualTo(
            new SheetMessage(
                Severity.WARNING, "Outside low and high, 1.06 to 1.10 × U, as judged."));
    assertThat(desk.field("localSpeed").link()).isEqualTo("Drop low and high");
    desk.sheet.link("localSpeed");
    assertThat(desk.settings("station-a").localSpeed().base().value())
        .isEqualTo(new Judged(1.2, null, null, before.evidence(), before.extras()));
    assertThat(desk.field("localSpeed").message()).isNull();
  }

  @Test
  void aValueTypedOverAnInheritedOneIsNotHeldToItsLowAndHigh() {
    desk.type("lossFactor", "0.2");
    ByCondition<JudgedBands> own = desk.settings("upper-side-left-a").lossFactor();
    assertThat(own.base().best().values()).containsExactly(0.2);
    assertThat(own.base().low()).isNull();
    assertThat(desk.field("lossFactor").message()).isNull();
    assertThat(desk.field("lossFactor").back()).isEqualTo("back to 0.040");
  }

  @Test
  void everySettingIsReachable() {
    List<String> all =
        Arrays.stream(Settings.class.getRecordComponents()).map(RecordComponent::getName).toList();
    TreeSet<String> changed = new TreeSet<>();
    for (SheetField field : desk.sheet.text().fields()) {
      if (field.kind() == SheetField.Kind.NUMBER) {
        desk.type(field.key(), field.text().isEmpty() ? "1" : nudged(field));
      } else if (field.kind() == SheetField.Kind.CHOICE) {
        field.options().stream()
            .filter(option -> !option.id().equals(field.chosen()))
            .findFirst()
            .ifPresent(option -> desk.choose(field.key(), option.id()));
      }
      changed.addAll(differences(desk.state.vehicle()));
      while (desk.state.undoLabel().isPresent()) {
        desk.state.undo();
      }
    }
    assertThat(changed).containsExactlyInAnyOrderElementsOf(all);
  }

  private static String nudged(SheetField field) {
    return field.text().replaceAll("\\d$", "7").replaceFirst("^0\\.700$", "0.707");
  }

  private static List<String> differences(Vehicle vehicle) {
    Settings before = settings(ExampleDesk.example());
    Settings after = settings(vehicle);
    return Arrays.stream(Settings.class.getRecordComponents())
        .filter(it -> !java.util.Objects.equals(read(it, before), read(it, after)))
        .map(RecordComponent::getName)
        .toList();
  }

  private static Settings settings(Vehicle vehicle) {
    return TreeEdit.find(vehicle, "upper-side-left-a").orElseThrow().node().settings();
  }

  private static Object read(RecordComponent component, Settings settings) {
    try {
      return component.getAccessor().invoke(settings);
    } catch (ReflectiveOperationException e) {
      throw new AssertionError(e);
    }
  }

  @Test
  void nothingOpenIsAnEmptySheet() {
    desk.state.clear();
    assertThat(desk.sheet.text()).isEqualTo(SheetText.EMPTY);
    desk.sheet.enter("length");
    desk.sheet.type("length", "1");
    desk.sheet.leave("length");
    assertThat(desk.sheet.text()).isEqualTo(SheetText.EMPTY);
  }
}
