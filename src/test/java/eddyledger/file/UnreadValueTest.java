package eddyledger.file;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.Status;
import eddyledger.ledger.Way;
import eddyledger.model.BandTable;
import eddyledger.model.ByCondition;
import eddyledger.model.JudgedBands;
import eddyledger.model.Target;
import eddyledger.model.Vehicle;
import eddyledger.model.Zone;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What cannot be read is written back as it stood, beside what can. */
class UnreadValueTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "vehicle.loss_factor | {`by_condition`:{`cruise`:`about 0.02`}}",
        "vehicle.loss_factor | {`by_condition`:{`cruise`:`high`},`x-note`:1}",
        "vehicle.loss_factor | {`bands`:`single`,`value`:0.1,`by_condition`:{`cruise`:[0.1]}}",
        "vehicle.convection_ratio | {`best`:0.7,`by_condition`:{`cruise`:`0.8`}}",
        "vehicle.wall_pressure | {`model`:`goody`,`by_condition`:{`cruise`:7}}",
        "vehicle.local_speed | {`speed_ratio`:1,`by_condition`:{`cruise`:1.2}}",
        "vehicle.local_speed | {`speed_ratio`:1,`by_condition`:{`cruise`:{`speed_ratio`:`1`}}}",
        "vehicle.boundary_layer | {`thickness_m`:0.1,`by_condition`:{`cruise`:`thick`}}",
        "vehicle.cross_spectrum | {`by_condition`:{`cruise`:`(2,1)`}}",
        "vehicle.cross_spectrum | `(2,1)`",
        "vehicle.convection_ratio | {`best`:0.7,`by_condition`:`none`}",
        "zones[1].absorption_area_m2 | {`by_condition`:{`cruise`:`4 m2`}}",
        "tree[0].children[0].local_speed | {`by_condition`:{`cruise`:1.2}}",
        "tree[0].children[0].construction | 7",
        "tree[0].children[0].lay_up | [`none`]",
        "tree[0].children[0].zone | {}",
        "tree[0].children[0].zone | ``",
        "tree[0].children[0].count | `two`",
        "tree[0].children[0].count | 2.5",
        "targets[0].receivers | [`driver`,7]",
        "targets[0].receivers | [{`id`:`driver`},`driver`]",
        "targets[0].receivers | [`driver`,null]",
        "apertures[0].zones | [7,`boot`]",
        "apertures[0].zones | [`cabin`]",
        "lay_ups[0].includes | [`mas`]",
        "lay_ups[0].includes | [`mass`,`stiffness`,3]",
        "other_sources[0].levels_dB | {`bands`:`octave`,`first`:`63`,`values`:[1,`2 dB`,null,1e999]}",
      })
  void itSurvivesSaving(String place, String single) {
    String json = single.strip().replace('`', '"');
    Vehicle vehicle = new SmallFile().with(place.strip(), json).vehicle();
    String saved = ProjectWriter.toText(vehicle);
    assertThat(at(SmallFile.parse(saved), place.strip())).isEqualTo(SmallFile.parse(json));
    Vehicle again = new ProjectReader().read(saved, "saved").vehicle().orElseThrow();
    assertThat(again).isEqualTo(vehicle);
    assertThat(ProjectWriter.toText(again)).isEqualTo(saved);
  }

  @ParameterizedTest
  @ValueSource(strings = {"construction", "lay_up", "zone"})
  void theValueOfASectionDoesNotTakeItsPlace(String key) {
    SmallFile file = new SmallFile().with("tree[0].children[0]." + key, "7");
    assertThat(file.onlyFinding().code()).isEqualTo("wrong-type");
    Ledger ledger = Ledger.of(file.vehicle());
    LedgerRow window = ledger.sheets().get(0).row("window", Way.ALL).orElseThrow();
    assertThat(window.status()).isEqualTo(Status.FAILED);
    assertThat(window.reason()).startsWith("tree[0].children[0]." + key + " (window): ");
  }

  @Test
  void whatWasSetSinceTakesItsPlace() {
    SmallFile file =
        new SmallFile()
            .with("zones[1].absorption_area_m2", "{\"by_condition\": {\"cruise\": \"four\"}}")
            .with("targets[0].receivers", "[\"driver\", 7]");
    Vehicle vehicle = file.vehicle();
    List<Zone> zones = new ArrayList<>(vehicle.zones());
    Zone boot = zones.get(1);
    JudgedBands four = JudgedBands.of(BandTable.single(4.0));
    ByCondition<JudgedBands> area = boot.absorptionArea().map(unread -> four);
    zones.set(
        1,
        new Zone(boot.id(), boot.name(), boot.volume(), boot.innerSurface(), area, boot.extras()));
    Target target = vehicle.targets().get(0);
    Target mended =
        new Target(
            target.id(),
            target.name(),
            target.condition(),
            List.of("driver"),
            target.rating(),
            target.value(),
            target.reserve(),
            target.rule(),
            target.evidence(),
            target.extras());
    Vehicle set = vehicle.edit().zones(zones).targets(List.of(mended)).build();
    String saved = ProjectWriter.toText(set);
    assertThat(new ProjectReader().read(saved, "saved").findings()).isEmpty();
    assertThat(saved).doesNotContain("four");
  }

  @Test
  void anotherBandOfTheSameTableCanBeChanged() {
    String octaves = "{\"bands\":\"octave\",\"first\":\"63\",\"values\":[1,\"2 m2\",3]}";
    Vehicle vehicle = new SmallFile().with("zones[1].absorption_area_m2", octaves).vehicle();
    Zone boot = vehicle.zones().get(1);
    BandTable table = boot.absorptionArea().base().best();
    List<Double> values = new ArrayList<>(table.values());
    values.set(2, 5.0);
    BandTable changed =
        new BandTable(
            table.resolution(),
            table.first(),
            values,
            table.quantity(),
            table.unit(),
            table.extras());
    Zone other =
        new Zone(
            boot.id(),
            boot.name(),
            boot.volume(),
            boot.innerSurface(),
            ByCondition.always(JudgedBands.of(changed)),
            boot.extras());
    Vehicle set = vehicle.edit().zones(List.of(vehicle.zones().get(0), other)).build();
    JsonNode saved = SmallFile.parse(ProjectWriter.toText(set));
    assertThat(at(saved, "zones[1].absorption_area_m2.values"))
        .isEqualTo(SmallFile.parse("[1,\"2 m2\",5]"));
  }

  private static JsonNode at(JsonNode root, String place) {
    JsonNode node = root;
    for (String step : place.replace("]", "").split("[.\\[]")) {
      node = node.isArray() ? node.get(Integer.parseInt(step)) : node.get(step);
    }
    return node;
  }
}
