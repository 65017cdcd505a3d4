package eddyledger.app;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.file.ProjectReader;
import eddyledger.model.ByCondition;
import eddyledger.model.Held;
import eddyledger.model.Judged;
import eddyledger.model.Settings;
import eddyledger.model.TreeEdit;
import eddyledger.model.Vehicle;
import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Setting a value in one condition changes what is seen there, and in no other condition. */
class VaryingSlotTest {
  private static final String PANEL = "crown-a";

  private final Vehicle example =
      new Projects(new ProjectReader())
          .open(Path.of("examples", "quillon-82.eddyledger"))
          .vehicle()
          .orElseThrow();

  private static VaryingSlot<Judged> slot(String node, String condition) {
    return new VaryingSlot<>(
        node,
        condition,
        Settings::convectionRatio,
        (settings, value) -> settings.edit().convectionRatio(value).build());
  }

  private static Vehicle holding(Vehicle vehicle, String node, ByCondition<Judged> value) {
    return TreeEdit.settings(vehicle, node, it -> it.edit().convectionRatio(value).build());
  }

  private static double value(Vehicle vehicle, String condition) {
    return slot(PANEL, condition).read(vehicle).map(Held::value).orElseThrow().best();
  }

  @Test
  void overTheValueOfAllConditionsItIsSetForAll() {
    Vehicle set = slot(PANEL, "cruise").write(example, Judged.of(0.75));
    assertThat(value(set, "cruise")).isEqualTo(0.75);
    assertThat(value(set, "hold")).isEqualTo(0.75);
    assertThat(slot(PANEL, "hold").back(set)).isEqualTo(example);
  }

  @Test
  void anOverrideFromASectionOutlivesAValueSetBelowIt() {
    ByCondition<Judged> above = new ByCondition<>(Judged.of(0.7), Map.of("hold", Judged.of(0.6)));
    Vehicle vehicle = holding(example, "station-a", above);
    Vehicle set = slot(PANEL, "cruise").write(vehicle, Judged.of(0.75));
    assertThat(value(set, "cruise")).isEqualTo(0.75);
    assertThat(value(set, "hold")).isEqualTo(0.6);
    assertThat(slot(PANEL, "cruise").back(set)).isEqualTo(vehicle);
  }

  @Test
  void anOwnOverrideIsChangedAndTheRestStays() {
    ByCondition<Judged> own = new ByCondition<>(Judged.of(0.7), Map.of("hold", Judged.of(0.6)));
    Vehicle vehicle = holding(example, PANEL, own);
    Vehicle set = slot(PANEL, "hold").write(vehicle, Judged.of(0.65));
    assertThat(value(set, "hold")).isEqualTo(0.65);
    assertThat(value(set, "cruise")).isEqualTo(0.7);
    Vehicle back = slot(PANEL, "hold").back(set);
    assertThat(value(back, "hold")).isEqualTo(0.7);
    assertThat(slot(PANEL, "hold").read(back).orElseThrow().override()).isFalse();
  }

  @Test
  void theWayBackOfTheBaseLeavesAnOverrideThatDiffers() {
    ByCondition<Judged> own = new ByCondition<>(Judged.of(0.75), Map.of("hold", Judged.of(0.6)));
    Vehicle back = slot(PANEL, "cruise").back(holding(example, PANEL, own));
    assertThat(value(back, "cruise")).isEqualTo(0.7);
    assertThat(value(back, "hold")).isEqualTo(0.6);
  }

  @Test
  void onTheVehicleItselfNothingIsAbove() {
    VaryingSlot<Judged> slot = slot(example.id(), "cruise");
    assertThat(slot.read(example).orElseThrow().own()).isTrue();
    Vehicle bare = slot.back(example);
    assertThat(slot.read(bare)).isEmpty();
    assertThat(bare.settings().convectionRatio()).isNull();
    assertThat(slot.write(bare, Judged.of(0.8)).settings().convectionRatio())
        .isEqualTo(ByCondition.always(Judged.of(0.8)));
  }

  @Test
  void madeSpecialItKeepsItsValue() {
    Vehicle special = slot(PANEL, "hold").onlyHere(example);
    Held<Judged> held = slot(PANEL, "hold").read(special).orElseThrow();
    assertThat(held.own() && held.override()).isTrue();
    assertThat(held.value()).isEqualTo(slot(PANEL, "hold").read(example).orElseThrow().value());
    assertThat(slot(PANEL, "hold").back(special)).isEqualTo(example);
  }
}
