package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.Edit;
import eddyledger.model.Allowance;
import eddyledger.model.BandTable;
import eddyledger.model.Evidence;
import eddyledger.model.Extras;
import eddyledger.model.JudgedBands;
import eddyledger.model.MeasuredPanel;
import eddyledger.model.OtherSource;
import eddyledger.model.Panel;
import eddyledger.model.PassRule;
import eddyledger.model.Rating;
import eddyledger.model.Settings;
import eddyledger.model.Target;
import eddyledger.model.TreeEdit;
import eddyledger.model.Vehicle;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

/** Sheets of panels, sections, the vehicle and other sources, beside their settings. */
class SheetRowsTest {
  private final ExampleDesk desk = new ExampleDesk();

  @Test
  void aSharedThicknessSaysSoAndChangesThisPanelOnly() {
    desk.row("crown-a");
    SheetField shared = desk.field("thickness");
    assertThat(shared.text()).isEqualTo("1.2");
    assertThat(shared.origin()).isEqualTo("Aluminium skin 1.2 mm, 7 panels");
    assertThat(shared.own()).isFalse();
    assertThat(shared.link()).isEqualTo("Change for all 7 panels");
    desk.type("thickness", "0.063 in");
    SheetField own = desk.field("thickness");
    assertThat(own.text()).isEqualTo("1.6002");
    assertThat(own.origin()).isEqualTo("own, this panel only");
    assertThat(own.back()).isEqualTo("back to 1.2 mm");
    assertThat(desk.field("construction").text())
        .isEqualTo("Aluminium skin 1.6002 mm (Crown, station A)");
    assertThat(desk.state.undoLabel()).contains("thickness of Crown, station A");
    assertThat(desk.row("crown-b-forward").field("thickness").text()).isEqualTo("1.2");
    desk.row("crown-a").sheet.back("thickness");
    assertThat(desk.state.vehicle()).isEqualTo(ExampleDesk.example());
  }

  @Test
  void aSharedThicknessChangesForAllIfAsked() {
    desk.row("crown-a").sheet.link("thickness");
    assertThat(desk.field("thickness").link()).isEqualTo("Change for this panel only");
    desk.type("thickness", "1.3");
    assertThat(desk.row("crown-b-forward").field("thickness").text()).isEqualTo("1.3");
    assertThat(desk.field("thickness").origin()).isEqualTo("Aluminium skin 1.3 mm, 7 panels");
    assertThat(desk.field("thickness").link()).isEqualTo("Change for all 7 panels");
    desk.state.undo();
    assertThat(desk.state.vehicle()).isEqualTo(ExampleDesk.example());
  }

  @Test
  void anotherConstructionTakesThePanelsOwnCopyAway() {
    desk.row("crown-a").type("thickness", "1.5");
    desk.choose("construction", "skin-1-6");
    assertThat(desk.settings("crown-a").construction()).isEqualTo("skin-1-6");
    assertThat(desk.state.vehicle().constructions())
        .isEqualTo(ExampleDesk.example().constructions());
  }

  @Test
  void anAllowanceIsAddedChangedAndRemoved() {
    desk.row("crown-a");
    assertThat(desk.field("allowance").text()).isEmpty();
    assertThat(desk.field("allowance").origin()).isEqualTo("not given");
    desk.type("allowance", "64,5");
    assertThat(desk.state.vehicle().allowances())
        .hasSize(ExampleDesk.example().allowances().size() + 1)
        .contains(new Allowance("crown-a", "row-2", "cruise", 64.5, Evidence.NONE, Extras.NONE));
    desk.computed();
    assertThat(desk.field("margin").text()).matches("[+−]\\d+\\.\\d");
    assertThat(desk.field("margin").state()).isNotNull();
    assertThat(desk.field("margin").origin()).isEqualTo(desk.field("margin").state().text());
    assertThat(desk.field("allowance").back()).isEqualTo("back to none");
    desk.sheet.back("allowance");
    assertThat(desk.state.vehicle()).isEqualTo(ExampleDesk.example());
  }

  @Test
  void anAllowanceKeepsItsPlaceAndEvidence() {
    desk.row("station-b").type("allowance", "66.5");
    Allowance before = ExampleDesk.example().allowances().get(1);
    assertThat(desk.state.vehicle().allowances().get(1))
        .isEqualTo(
            new Allowance(
                "station-b", "row-2", "cruise", 66.5, before.evidence(), before.extras()));
  }

  @Test
  void aBarePanelBelowASectionWithALayUp() {
    desk.row("crown-a").choose("layUp", Settings.NO_LAY_UP);
    assertThat(desk.settings("crown-a").layUp()).isEqualTo(Settings.NO_LAY_UP);
    assertThat(desk.field("layUp").text()).isEqualTo("None, bare panel");
    assertThat(desk.field("layUp").back())
        .isEqualTo("back to Trim panel on 75 mm blanket, double wall");
  }

  @Test
  void aSectionHasNoThicknessAndSetsWhatHoldsBelow() {
    desk.row("station-a");
    assertThat(desk.sheet.text().field("thickness")).isEmpty();
    assertThat(desk.sheet.text().field("count")).isEmpty();
    assertThat(desk.sheet.text().traced()).isFalse();
    desk.choose("construction", "skin-1-6");
    assertThat(desk.section("station-a").settings().construction()).isEqualTo("skin-1-6");
    desk.type("name", "Station Alpha");
    assertThat(desk.section("station-a").name()).isEqualTo("Station Alpha");
    assertThat(desk.row("crown-a").field("length").origin()).isEqualTo("Station Alpha");
  }

  @Test
  void theVehiclesOwnChoiceGoesBackToTheDefault() {
    desk.row("quillon-82");
    assertThat(desk.sheet.text().trail()).isEmpty();
    assertThat(desk.field("spectrum").back()).isEqualTo("back to Goody");
    desk.sheet.back("spectrum");
    assertThat(desk.state.vehicle().settings().wallPressure()).isNull();
    assertThat(desk.field("spectrum").origin()).isEqualTo("default");
    desk.sheet.back("convectionRatio");
    assertThat(desk.field("convectionRatio").text()).isEqualTo("0.70");
    assertThat(desk.field("convectionRatio").origin()).isEqualTo("default");
    desk.type("tightBand", "1.5");
    assertThat(desk.state.vehicle().tightBand()).isEqualTo(1.5);
  }

  @Test
  void theTargetsOfReceiverAndCondition() {
    desk.row("quillon-82");
    assertThat(desk.field("target").text()).isEqualTo("76.0");
    desk.type("target", "75");
    desk.type("target.reserve", "0.5");
    desk.choose("target.rounding", "1");
    desk.type("target.target-speech-cruise", "61");
    List<Target> targets = desk.state.vehicle().targets();
    Target before = ExampleDesk.example().targets().get(0);
    assertThat(targets.get(0))
        .isEqualTo(
            new Target(
                before.id(),
                before.name(),
                "cruise",
                List.of("row-2"),
                Rating.OVERALL_A,
                75.0,
                0.5,
                new PassRule(PassRule.Rounding.WHOLE, 0.0, PassRule.Across.WORST),
                before.evidence(),
                before.extras()));
    assertThat(targets.get(6).value()).isEqualTo(61.0);
    assertThat(targets.subList(1, 6)).isEqualTo(ExampleDesk.example().targets().subList(1, 6));
  }

  @Test
  void aTargetIsAddedWhereThereIsNone() {
    Vehicle bare = ExampleDesk.example().edit().targets(List.of()).build();
    ExampleDesk other = new ExampleDesk(bare).row("quillon-82");
    assertThat(other.field("target").origin()).isEqualTo("not given");
    assertThat(other.sheet.text().field("target.reserve")).isEmpty();
    other.type("target", "75.5");
    assertThat(other.state.vehicle().targets())
        .containsExactly(
            new Target(
                "target-row-2-cruise",
                "Overall level",
                "cruise",
                List.of("row-2"),
                Rating.OVERALL_A,
                75.5,
                0.0,
                PassRule.PLAIN,
                Evidence.NONE,
                Extras.NONE));
    assertThat(other.field("target.reserve").text()).isEqualTo("0.0");
    other.state.undo();
    assertThat(other.state.vehicle()).isEqualTo(bare);
  }

  @Test
  void anOtherSourceHasTwentyEightLevels() {
    desk.row("propulsion-row-2-cruise");
    List<SheetField> bands =
        desk.sheet.text().fields().stream().filter(it -> it.key().startsWith("band.")).toList();
    assertThat(bands).hasSize(28);
    assertThat(bands)
        .extracting(SheetField::label)
        .startsWith("25", "31.5")
        .endsWith("10k", "12.5k");
    assertThat(desk.field("band.1250").label()).isEqualTo("1.25k");
    assertThat(desk.field("band.63").text()).isEqualTo("68.1");
    desk.type("band.63", "70,25");
    JudgedBands before = ExampleDesk.example().otherSources().get(0).levels();
    JudgedBands after = desk.state.vehicle().otherSources().get(0).levels();
    IntStream.range(0, 28)
        .forEach(
            band ->
                assertThat(after.best().values().get(band))
                    .isEqualTo(band == 4 ? 70.25 : before.best().values().get(band)));
    assertThat(after.evidence()).isEqualTo(before.evidence());
    assertThat(desk.state.undoLabel()).contains("level at 63 Hz of Propulsion");
    assertThat(desk.field("source").text())
        .isEqualTo("Shape after a predecessor, scaled to the agreed share");
  }

  @Test
  void levelsEnteredOtherwiseAreToldAndNotSplit() {
    assertNote(BandTable.single(60.0), "One number for all bands: 60.0 dB.");
    assertNote(
        BandTable.octaves("63", 60.0, null, 50.5),
        "Entered in octaves from 63 Hz on: 60.0, missing, 50.5 dB."
            + " Octave levels are not split into thirds.");
  }

  private void assertNote(BandTable levels, String note) {
    OtherSource source =
        new OtherSource("fan", "Fan", "row-2", "cruise", JudgedBands.of(levels), Extras.NONE);
    Vehicle vehicle = ExampleDesk.example().edit().otherSources(List.of(source)).build();
    SheetText text = new ExampleDesk(vehicle).row("fan").sheet.text();
    assertThat(text.groups().get(1).note()).isEqualTo(note);
    assertThat(text.groups().get(1).fields()).isEmpty();
  }

  @Test
  void aMeasuredPanelSaysWhatDoesNotCount() {
    Vehicle vehicle =
        TreeEdit.change(
            ExampleDesk.example(),
            "crown-a",
            node -> {
              Panel panel = (Panel) node;
              MeasuredPanel measured =
                  new MeasuredPanel(JudgedBands.of(BandTable.single(30.0)), null, Extras.NONE);
              return new Panel(
                  panel.id(),
                  panel.name(),
                  panel.count(),
                  panel.settings(),
                  measured,
                  panel.evidence(),
                  panel.extras());
            });
    SheetText text = new ExampleDesk(vehicle).row("crown-a").sheet.text();
    assertThat(text.groups().get(0).note())
        .isEqualTo(
            "A measured level difference stands for build and lay-up;"
                + " they do not change the level.");
    assertThat(desk.row("crown-a").sheet.text().groups().get(0).note()).isEmpty();
  }

  @Test
  void aVehicleThatCannotBeComputedSaysSo() {
    desk.row("crown-a").computed();
    desk.state.apply(Edit.of("conditions", "", it -> it.edit().receivers(List.of()).build()));
    desk.computed();
    assertThat(desk.field("level").origin()).isEqualTo("not computed");
    assertThat(desk.field("level").weight()).isEqualTo(SheetField.Weight.FAINT);
  }

  @Test
  void anAllowanceGivenTwiceIsTakenAwayWhole() {
    List<Allowance> twice = new ArrayList<>(ExampleDesk.example().allowances());
    twice.add(new Allowance("station-a", "row-2", "cruise", 60.0, Evidence.NONE, Extras.NONE));
    ExampleDesk other =
        new ExampleDesk(ExampleDesk.example().edit().allowances(twice).build()).row("station-a");
    assertThat(other.field("allowance").text()).isEqualTo("71.5");
    other.sheet.back("allowance");
    assertThat(other.field("allowance").text()).isEmpty();
    assertThat(other.state.vehicle().allowances()).hasSize(twice.size() - 2);
  }

  @Test
  void aMissingLevelIsADashAndSaysWhy() {
    Vehicle vehicle =
        TreeEdit.settings(
            ExampleDesk.example(), "station-a", it -> it.edit().localSpeed(null).build());
    ExampleDesk other = new ExampleDesk(vehicle).row("crown-a").computed();
    assertThat(other.field("level").text()).isEqualTo("—");
    assertThat(other.field("level").message().text())
        .isEqualTo("The panel has no local flow speed in condition \"cruise\".");
    assertThat(other.field("localSpeed").message().text())
        .isEqualTo(
            "The panel has no local flow speed in condition \"cruise\"."
                + " Set it on the panel, or on a section above it.");
    assertThat(other.field("margin").text()).isEqualTo("—");
    assertThat(other.row("station-a").field("level").text()).isEqualTo("—");
  }
}
