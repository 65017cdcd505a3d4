package eddyledger.file;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.model.Vehicle;
import eddyledger.model.Zone;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Values of the wrong kind, in every place at once, and what becomes of the rest of the file. */
class WrongKindTest {
  @ParameterizedTest
  @CsvSource({
    "conditions[0].occupied, '\"yes\"', True or false is wanted here",
    "conditions[0].outside_air, 5, An object in braces is wanted here",
    "conditions[0].name, 5, A text is wanted here",
    "receivers[0].direct, {}, A list in brackets is wanted here",
    "lay_ups[0].includes, '\"mass\"', A list in brackets is wanted here",
    "vehicle.description, [], A text is wanted here",
    "vehicle.loss_factor, [], A number is wanted here",
    "vehicle.wall_pressure, 1, A text is wanted here",
    "vehicle.local_speed, 1.1, An object in braces is wanted here",
    "vehicle.convection_ratio, \"0.7\", A number is wanted here",
    "tree[0].children[1].measured, 40, An object in braces is wanted here",
    "targets[0].pass_rule, 1, An object in braces is wanted here",
    "change_log, {}, A list in brackets is wanted here",
  })
  void theKindIsNamed(String place, String json, String says) {
    SmallFile file = new SmallFile().with(place, json);
    assertThat(file.read().findings())
        .anySatisfy(
            finding -> {
              assertThat(finding.place()).isEqualTo(place);
              assertThat(finding.what()).startsWith(says).endsWith(".");
              assertThat(finding.severity()).isEqualTo(Severity.ERROR);
            });
    Vehicle vehicle = file.read().vehicle().orElseThrow();
    String saved = ProjectWriter.toText(vehicle);
    assertThat(new ProjectReader().read(saved, "saved").findings())
        .isEqualTo(file.read().findings());
  }

  @ParameterizedTest
  @ValueSource(strings = {"constructions[0].type", "lay_ups[0].type"})
  void aTypeThatIsNotKnownIsToldAndKept(String place) {
    SmallFile file = new SmallFile().with(place, "\"woven\"");
    assertThat(file.read().findings()).extracting(Finding::place).contains(place);
    String saved = ProjectWriter.toText(file.read().vehicle().orElseThrow());
    assertThat(saved).contains("\"type\": \"woven\"");
    assertThat(new ProjectReader().read(saved, "saved").findings())
        .extracting(Finding::place)
        .contains(place);
  }

  @ParameterizedTest
  @ValueSource(strings = {"7", "null", "\"cabin\"", "[]"})
  void aMemberThatIsNoObjectKeepsThePositionsOfTheOthers(String json) {
    SmallFile file = new SmallFile().with("zones[0]", json).with("zones[1].volume_m3", "-1");
    List<Finding> findings = file.read().findings();
    assertThat(findings).extracting(Finding::place).contains("zones[0]", "zones[1].volume_m3");
    assertThat(findings).filteredOn(it -> it.place().startsWith("zones[0]")).hasSize(1);
    assertThat(file.read().vehicle().orElseThrow().zones())
        .hasSize(2)
        .last()
        .extracting(Zone::id)
        .isEqualTo("boot");
  }

  @ParameterizedTest
  @CsvSource({
    "vehicle.id, FATAL",
    "vehicle.name, ERROR",
    "zones[1].name, ERROR",
    "zones[1].absorption_area_m2, ERROR",
    "conditions[0].outside_air, ERROR",
    "apertures[0].area_m2, ERROR",
    "receivers[0].direct[0].distance_m, ERROR",
    "receivers[0].direct[0].panel, ERROR",
    "receivers[0].zone, ERROR",
    "constructions[0].type, ERROR",
    "constructions[0].thickness_m, ERROR",
    "constructions[0].youngs_modulus_Pa, ERROR",
    "constructions[0].density_kg_per_m3, ERROR",
    "constructions[0].poisson_ratio, ERROR",
    "lay_ups[0].type, ERROR",
    "lay_ups[0].insertion_loss_dB, ERROR",
    "other_sources[0].levels_dB, ERROR",
    "other_sources[0].receiver, ERROR",
    "targets[0].value, ERROR",
    "targets[0].rating, ERROR",
    "targets[0].receivers, ERROR",
    "allowances[0].level_dBA, ERROR",
    "tree[0].kind, ERROR",
    "tree[0].children[0].kind, ERROR",
    "tree[0].children[1].measured.level_difference_dB, ERROR",
    "change_log[0].when, ERROR",
    "change_log[0].who, ERROR",
    "change_log[0].what, ERROR",
    "change_log[0].reason, ERROR",
  })
  void whatMustBeThere(String place, Severity severity) {
    Finding finding = new SmallFile().without(place).onlyFinding();
    assertThat(finding.place()).isEqualTo(place);
    assertThat(finding.severity()).isEqualTo(severity);
    assertThat(finding.what()).isNotBlank();
    assertThat(finding.remedy()).isNotBlank();
  }

  @Test
  void withoutTheVehicleObjectTheRestIsReadAllTheSame() {
    SmallFile file = new SmallFile().without("vehicle");
    assertThat(file.read().vehicle().orElseThrow().zones()).hasSize(2);
    assertThat(file.read().findings().get(0).place()).isEqualTo("vehicle");
    assertThat(file.read().findings()).noneMatch(it -> it.place().startsWith("vehicle."));
  }

  @Test
  void nullIsTheSameAsLeftOut() {
    SmallFile file = new SmallFile().with("zones[0].volume_m3", "null");
    file.with("vehicle.description", "null").with("targets[0].pass_rule", "null");
    assertThat(file.read().findings()).isEmpty();
    Vehicle vehicle = file.read().vehicle().orElseThrow();
    assertThat(ProjectWriter.toText(vehicle)).doesNotContain("null");
  }

  @Test
  void tenFaultsAreToldAtOnceInOneReading() {
    SmallFile file =
        new SmallFile()
            .with("conditions[0].speed_m_per_s", "\"fast\"")
            .with("zones[0].volume_m3", "-3")
            .with("zones[1].absorption_area_m2.values[3]", "true")
            .with("apertures[0].zones", "[\"cabin\", \"cabin\"]")
            .with("receivers[0].direct[0].panel", "\"windw\"")
            .with("constructions[0].thickness_m", "40")
            .with("constructions[0].radus_m", "2")
            .with(
                "lay_ups[0].insertion_loss_dB",
                "{\"bands\":\"third-octave\",\"first\":\"25\",\"values\":[1]}")
            .with("targets[0].rating", "\"loud\"")
            .with("tree[0].children[0].count", "1.5")
            .with("tree[0].children[1].id", "\"works\"")
            .with("change_log[0].when", "\"today\"");
    assertThat(file.read().findings())
        .extracting(Finding::place)
        .containsExactlyInAnyOrder(
            "conditions[0].speed_m_per_s",
            "zones[0].volume_m3",
            "zones[1].absorption_area_m2.values[3]",
            "apertures[0].zones",
            "receivers[0].direct[0].panel",
            "constructions[0].thickness_m",
            "constructions[0].radus_m",
            "lay_ups[0].insertion_loss_dB",
            "targets[0].rating",
            "tree[0].children[0].count",
            "tree[0].children[1].id",
            "change_log[0].when");
  }
}
