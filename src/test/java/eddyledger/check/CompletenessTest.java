package eddyledger.check;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.file.SmallFile;
import eddyledger.model.Vehicle;
import eddyledger.model.VehicleBuilder;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What is needed and not there. */
class CompletenessTest {
  private static List<Finding> findings(SmallFile file) {
    return VehicleCheck.of(file.vehicle());
  }

  @Test
  void anEmptyVehicle() {
    Vehicle vehicle = VehicleBuilder.named("v", "v").build();
    List<Finding> findings = VehicleCheck.of(vehicle);
    assertThat(findings)
        .extracting(Finding::code)
        .containsExactly("empty-vehicle", "no-condition", "no-receiver", "no-target");
    assertThat(findings)
        .extracting(Finding::severity)
        .containsExactly(Severity.FATAL, Severity.FATAL, Severity.FATAL, Severity.NOTE);
    assertThat(findings)
        .extracting(Finding::place)
        .containsExactly("tree", "conditions", "receivers", "targets");
  }

  @Test
  void sectionsAloneAreNoVehicle() {
    SmallFile file = new SmallFile().with("tree[0].children", "[]").with("allowances", "[]");
    file.with("receivers[0].direct", "[]");
    assertThat(findings(file)).extracting(Finding::code).containsExactly("empty-vehicle");
  }

  @ParameterizedTest
  @CsvSource({
    "vehicle.zone, zone, 'window,door'",
    "vehicle.local_speed, local flow speed, 'window,door'",
    "vehicle.boundary_layer, boundary layer, 'window,door'",
    "vehicle.loss_factor, damping loss factor, window",
    "tree[0].construction, construction, window",
    "tree[0].children[0].length_m, length, window",
    "tree[0].children[0].width_m, width, window",
  })
  void whatAPanelNeeds(String place, String name, String panels) {
    List<Finding> findings = findings(new SmallFile().without(place));
    assertThat(findings).extracting(Finding::subject).containsExactly(panels.split(","));
    String key = place.substring(place.lastIndexOf('.') + 1);
    assertThat(findings)
        .allMatch(finding -> finding.code().equals("missing-value"))
        .allMatch(finding -> finding.severity() == Severity.ERROR)
        .allMatch(finding -> finding.place().matches("tree\\[0]\\.children\\[[01]]\\." + key))
        .allMatch(finding -> finding.what().contains(name));
  }

  @Test
  void aMeasuredPanelNeedsNoConstruction() {
    SmallFile file = new SmallFile().without("tree[0].construction");
    file.with("tree[0].children[0].construction", "\"glass\"");
    assertThat(findings(file)).isEmpty();
  }

  @Test
  void theConditionWithoutValueIsNamed() {
    SmallFile file = new SmallFile();
    file.with("conditions[1]", file.root().get("conditions").get(0).toString());
    file.with("conditions[1].id", "\"climb\"");
    file.with("vehicle.local_speed", "{\"by_condition\": {\"climb\": {\"speed_m_per_s\": 100}}}");
    file.with("zones[1].absorption_area_m2", "{\"by_condition\": {\"climb\": 1}}");
    List<Finding> findings = findings(file);
    assertThat(findings)
        .extracting(Finding::place)
        .containsExactly(
            "zones[1].absorption_area_m2",
            "tree[0].children[0].local_speed",
            "tree[0].children[1].local_speed");
    assertThat(findings).allMatch(finding -> finding.what().contains("\"cruise\""));
  }

  @ParameterizedTest
  @CsvSource({
    "zones[0].absorption_area_m2, cabin",
    "lay_ups[0].insertion_loss_dB, trim",
    "other_sources[0].levels_dB, tyres",
    "tree[0].children[1].measured.level_difference_dB, door",
    "targets[0].receivers, quiet",
    "targets[0].rating, quiet",
  })
  void whatOtherPartsNeed(String place, String subject) {
    assertThat(findings(new SmallFile().without(place)))
        .singleElement()
        .satisfies(
            finding -> {
              assertThat(finding.code()).isEqualTo("missing-value");
              assertThat(finding.place()).isEqualTo(place);
              assertThat(finding.subject()).isEqualTo(subject);
            });
  }

  @Test
  void aBoundaryLayerOfWhichNothingIsGiven() {
    assertThat(findings(new SmallFile().with("vehicle.boundary_layer", "{}")))
        .singleElement()
        .extracting(Finding::place)
        .isEqualTo("vehicle.boundary_layer");
  }
}
