package eddyledger.app;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.file.ProjectReader;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Settings;
import eddyledger.model.TreeEdit;
import eddyledger.model.Vehicle;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

/** The thickness of one panel's plate, where panels share constructions. */
class ConstructionEditTest {
  private static final String CROWN = "crown-a";

  private final Vehicle example =
      new Projects(new ProjectReader())
          .open(Path.of("examples", "quillon-82.eddyledger"))
          .vehicle()
          .orElseThrow();

  private static PlateConstruction plate(Vehicle vehicle, String panel) {
    return ConstructionEdit.of(vehicle, panel).orElseThrow();
  }

  private static Settings settings(Vehicle vehicle, String id) {
    return TreeEdit.find(vehicle, id).orElseThrow().node().settings();
  }

  @Test
  void theFirstChangeMakesACopyAndLaterOnesChangeIt() {
    Vehicle once = ConstructionEdit.thickness(example, CROWN, 0.0016);
    PlateConstruction copy = plate(once, CROWN);
    assertThat(copy.id()).isEqualTo("skin-1-2-crown-a");
    assertThat(copy.name()).isEqualTo("Aluminium skin 1.6 mm (Crown, station A)");
    assertThat(copy.thickness()).isEqualTo(0.0016);
    assertThat(copy.tension()).isEqualTo(plate(example, CROWN).tension());
    assertThat(once.constructions())
        .startsWith(example.constructions().toArray(new eddyledger.model.Construction[0]));
    Vehicle twice = ConstructionEdit.thickness(once, CROWN, 0.002);
    assertThat(twice.constructions()).hasSameSizeAs(once.constructions());
    assertThat(plate(twice, CROWN).name()).isEqualTo("Aluminium skin 2 mm (Crown, station A)");
    assertThat(ConstructionEdit.original(twice, CROWN)).contains(plate(example, CROWN));
    assertThat(ConstructionEdit.back(twice, CROWN)).isEqualTo(example);
  }

  @Test
  void anEqualThicknessChangesNothing() {
    assertThat(ConstructionEdit.thickness(example, CROWN, 0.0012)).isSameAs(example);
    assertThat(ConstructionEdit.back(example, CROWN)).isSameAs(example);
  }

  @Test
  void aConstructionOfOnePanelIsChangedInPlace() {
    Vehicle alone = TreeEdit.settings(example, CROWN, it -> it.edit().construction("only").build());
    var all = new java.util.ArrayList<>(example.constructions());
    all.add(CopyName.copy(plate(example, CROWN), "only", "alone"));
    Vehicle vehicle = alone.edit().constructions(all).build();
    Vehicle changed = ConstructionEdit.thickness(vehicle, CROWN, 0.003);
    assertThat(settings(changed, CROWN).construction()).isEqualTo("only");
    assertThat(plate(changed, CROWN).thickness()).isEqualTo(0.003);
    assertThat(ConstructionEdit.original(changed, CROWN)).isEmpty();
  }

  @Test
  void anInheritedConstructionComesBackAsInherited() {
    Vehicle inherited =
        TreeEdit.settings(
            TreeEdit.settings(
                example, "station-a", it -> it.edit().construction("skin-1-2").build()),
            CROWN,
            it -> it.edit().construction(null).build());
    Vehicle changed = ConstructionEdit.thickness(inherited, CROWN, 0.002);
    assertThat(settings(changed, CROWN).construction()).isEqualTo("skin-1-2-crown-a");
    assertThat(ConstructionEdit.back(changed, CROWN)).isEqualTo(inherited);
  }

  @Test
  void theCopyOfALongIdStaysAValidIdAndFindsItsOriginal() {
    String panel = "p".repeat(60);
    Vehicle long1 =
        TreeEdit.change(example, CROWN, node -> ((eddyledger.model.Panel) node).withId(panel));
    Vehicle changed = ConstructionEdit.thickness(long1, panel, 0.002);
    String id = plate(changed, panel).id();
    assertThat(id).matches("[A-Za-z0-9][A-Za-z0-9._-]{0,63}").startsWith("skin-1-2-ppp");
    assertThat(ConstructionEdit.original(changed, panel)).contains(plate(example, CROWN));
    assertThat(ConstructionEdit.back(changed, panel)).isEqualTo(long1);
  }

  @Test
  void aTakenIdIsNumbered() {
    Vehicle taken = example.edit().name("x").build();
    taken =
        TreeEdit.change(
            taken,
            "crown-b-forward",
            node -> ((eddyledger.model.Panel) node).withId("SKIN-1-2-crown-a"));
    Vehicle changed = ConstructionEdit.thickness(taken, CROWN, 0.002);
    assertThat(plate(changed, CROWN).id()).isEqualTo("skin-1-2-crown-a-2");
    assertThat(ConstructionEdit.back(changed, CROWN)).isEqualTo(taken);
  }

  @Test
  void allPanelsOfAConstructionChangeTogether() {
    Vehicle changed = ConstructionEdit.thicknessOfAll(example, CROWN, 0.0015);
    assertThat(plate(changed, "crown-b-forward").thickness()).isEqualTo(0.0015);
    assertThat(plate(changed, CROWN).id()).isEqualTo("skin-1-2");
    assertThat(plate(changed, CROWN).name()).isEqualTo("Aluminium skin 1.5 mm");
    assertThat(changed.tree()).isEqualTo(example.tree());
  }

  @Test
  void aCopyThatAnotherPanelWasGivenStays() {
    Vehicle changed = ConstructionEdit.thickness(example, CROWN, 0.002);
    Vehicle shared =
        TreeEdit.settings(
            changed, "upper-side-left-a", it -> it.edit().construction("skin-1-2-crown-a").build());
    Vehicle chosen = ConstructionEdit.choose(shared, CROWN, "skin-1-2");
    assertThat(plate(chosen, "upper-side-left-a").thickness()).isEqualTo(0.002);
  }
}
