package eddyledger.app;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.ledger.Ledger;
import eddyledger.model.Allowance;
import eddyledger.model.Evidence;
import eddyledger.model.Extras;
import eddyledger.model.Panel;
import eddyledger.model.Section;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Panels and sections added, copied and taken out. */
class TreeEditsTest {
  private static Vehicle apply(Vehicle vehicle, Edit edit) {
    return edit.change().apply(vehicle);
  }

  private static List<String> ids(Vehicle vehicle) {
    return TreePath.of(vehicle).stream().map(path -> path.node().id()).toList();
  }

  @Test
  void theFirstPanelOfANewVehicleHasALevel() {
    Vehicle vehicle = NewVehicle.empty();
    Vehicle one = apply(vehicle, TreeEdits.addPanel(vehicle, vehicle.id()));
    Ledger ledger = Ledger.of(one);
    assertThat(ledger.worst().total().levelA()).isBetween(20.0, 60.0);
    assertThat(ledger.findings())
        .noneMatch(f -> f.severity().atLeast(eddyledger.check.Severity.ERROR));
  }

  @Test
  void aPanelGoesIntoTheSectionOrBesideThePanelSelected() {
    Vehicle vehicle = NewVehicle.empty();
    vehicle = apply(vehicle, TreeEdits.addSection(vehicle, vehicle.id()));
    vehicle = apply(vehicle, TreeEdits.addPanel(vehicle, "section-1"));
    vehicle = apply(vehicle, TreeEdits.addPanel(vehicle, "panel-1"));
    Section section = (Section) vehicle.tree().get(0);
    assertThat(section.children()).extracting("id").containsExactly("panel-1", "panel-2");
  }

  @Test
  void aCopyHasItsOwnIdAndTheSameValues() {
    Vehicle vehicle = NewVehicle.empty();
    vehicle = apply(vehicle, TreeEdits.addPanel(vehicle, vehicle.id()));
    vehicle = apply(vehicle, TreeEdits.duplicate(vehicle, "panel-1").orElseThrow());
    assertThat(ids(vehicle)).containsExactly("panel-1", "panel-2");
    assertThat(((Panel) vehicle.tree().get(1)).settings())
        .isEqualTo(((Panel) vehicle.tree().get(0)).settings());
    assertThat(vehicle.tree().get(1).name()).isEqualTo("New panel, copy");
  }

  @Test
  void aSectionIsTakenOutWithAllBelowItAndTheirAllowances() {
    Vehicle vehicle = NewVehicle.empty();
    vehicle = apply(vehicle, TreeEdits.addSection(vehicle, vehicle.id()));
    vehicle = apply(vehicle, TreeEdits.addPanel(vehicle, "section-1"));
    vehicle = apply(vehicle, TreeEdits.addPanel(vehicle, vehicle.id()));
    vehicle =
        vehicle.edit().allowances(List.of(allowance("panel-1"), allowance("panel-2"))).build();
    vehicle = apply(vehicle, TreeEdits.remove(vehicle, "section-1").orElseThrow());
    assertThat(ids(vehicle)).containsExactly("panel-2");
    assertThat(vehicle.allowances()).extracting("node").containsExactly("panel-2");
  }

  private static Allowance allowance(String node) {
    return new Allowance(node, "seat-1", "cruise", 50.0, Evidence.NONE, Extras.NONE);
  }

  @Test
  void idsAreFreeWithoutRegardToCaseAndNeverTooLong() {
    Vehicle vehicle = NewVehicle.empty();
    assertThat(TreeEdits.freeId(vehicle, "Seat")).isEqualTo("Seat-2");
    assertThat(TreeEdits.freeId(vehicle, "x".repeat(64))).hasSizeLessThanOrEqualTo(64);
  }

  @Test
  void theTotalIsNeitherCopiedNorTakenOut() {
    Vehicle vehicle = NewVehicle.empty();
    assertThat(TreeEdits.remove(vehicle, vehicle.id())).isEmpty();
    assertThat(TreeEdits.duplicate(vehicle, vehicle.id())).isEmpty();
  }
}
