package eddyledger.check;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.file.SmallFile;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Every kind of finding, made by one change in a vehicle that has none. */
class KindsOfFindingTest {
  private static final String ALLOWANCE =
      "{\"node\": \"%s\", \"receiver\": \"driver\", \"condition\": \"cruise\", \"level_dBA\": %s}";

  private static Finding only(SmallFile file) {
    List<Finding> findings = VehicleCheck.of(file.vehicle());
    assertThat(findings).hasSize(1);
    Finding finding = findings.get(0);
    assertThat(finding.text()).contains(finding.place()).endsWith(finding.remedy());
    assertThat(finding.what()).matches("[A-Z\"].*\\.( Did you mean .*)?");
    assertThat(finding.remedy()).matches("[A-Z].*[.?]");
    return finding;
  }

  private static void assertOnly(SmallFile file, String code, String place, String subject) {
    Finding finding = only(file);
    assertThat(finding.code()).isEqualTo(code);
    assertThat(finding.place()).isEqualTo(place);
    assertThat(finding.subject()).isEqualTo(subject);
  }

  @Test
  void aSoundVehicleHasNone() {
    assertThat(VehicleCheck.of(new SmallFile().vehicle())).isEmpty();
  }

  @ParameterizedTest
  @CsvSource({
    "'zones[1].id', '\"Works\"', duplicate-id, suppliers[0].id",
    "'apertures[0].id', '\"a/b\"', bad-id, apertures[0].id",
    "'apertures[0].id', null, bad-id, apertures[0].id",
    "'tree[0].id', '\"QUIET\"', duplicate-id, tree[0].id",
  })
  void idsStopEverything(String changed, String id, String code, String place) {
    List<Finding> findings = VehicleCheck.of(new SmallFile().with(changed, id).vehicle());
    assertThat(findings).extracting(Finding::code).contains(code);
    Finding finding = findings.get(0);
    assertThat(finding.place()).isEqualTo(place);
    assertThat(finding.severity()).isEqualTo(Severity.FATAL);
  }

  @Test
  void bothPlacesOfADuplicateAreNamed() {
    SmallFile file = new SmallFile().with("targets[0].id", "\"Tyres\"");
    assertOnly(file, "duplicate-id", "targets[0].id", "Tyres");
    assertThat(only(file).what())
        .contains("\"Tyres\"")
        .contains("other_sources[0].id (as \"tyres\")");
  }

  @ParameterizedTest
  @CsvSource({
    "vehicle.zone, small",
    "apertures[0].zones[0], shelf",
    "receivers[0].zone, driver",
    "receivers[0].direct[0].panel, driver",
    "other_sources[0].receiver, tyres",
    "other_sources[0].condition, tyres",
    "targets[0].condition, quiet",
    "targets[0].receivers[0], quiet",
    "allowances[0].node, nowhere",
    "allowances[0].receiver, window",
    "allowances[0].condition, window",
    "tree[0].construction, side",
    "tree[0].children[0].construction, window",
    "tree[0].children[0].lay_up, window",
    "tree[0].children[0].zone, window",
    "tree[0].children[0].supplier, window",
  })
  void aReferenceThatLeadsNowhere(String place, String subject) {
    SmallFile file = new SmallFile().with(place, "\"nowhere\"");
    assertOnly(file, "missing-reference", place, subject);
    assertThat(only(file).what()).contains("\"nowhere\"");
    assertThat(only(file).severity()).isEqualTo(Severity.ERROR);
  }

  @ParameterizedTest
  @CsvSource({
    "vehicle.local_speed, '{\"speed_ratio\": 1, ', {\"speed_ratio\": 1}",
    "vehicle.boundary_layer, '{\"thickness_m\": 0.1, ', {\"thickness_m\": 0.1}",
    "vehicle.wall_pressure, '{\"model\": \"goody\", ', \"goody\"",
    "vehicle.cross_spectrum, '{\"order_along\": 1, ', {}",
    "vehicle.convection_ratio, '{\"best\": 0.7, ', 0.6",
    "vehicle.loss_factor, '{\"bands\": \"single\", \"value\": 0.1, ', 0.2",
    "zones[0].absorption_area_m2, '{\"bands\": \"single\", \"value\": 1, ', 2",
  })
  void anOverrideForAConditionThatIsNot(String place, String begin, String override) {
    String json = begin + "\"by_condition\": {\"criuse\": " + override + "}}";
    SmallFile file = new SmallFile().with(place, json);
    String subject = place.startsWith("vehicle") ? "small" : "cabin";
    assertOnly(file, "missing-reference", place + ".by_condition.criuse", subject);
    assertThat(only(file).what()).endsWith("Did you mean \"cruise\"?");
  }

  @ParameterizedTest
  @CsvSource({
    "receivers[0].zone, driver, The id of a zone is missing.",
    "allowances[0].condition, window, The id of a condition is missing.",
    "targets[0].condition, quiet, The id of a condition is missing.",
  })
  void aReferenceThatIsMissing(String place, String subject, String what) {
    SmallFile file = new SmallFile().without(place);
    assertOnly(file, "missing-value", place, subject);
    assertThat(only(file).what()).isEqualTo(what);
  }

  @Test
  void anApertureIntoItsOwnZone() {
    SmallFile file = new SmallFile().with("apertures[0].zones", "[\"boot\", \"boot\"]");
    assertOnly(file, "circular-reference", "apertures[0].zones", "shelf");
    assertThat(only(file).what()).contains("\"boot\"");
  }

  @Test
  void neitherSpeedNorMachOrBoth() {
    SmallFile neither = new SmallFile().without("conditions[0].speed_m_per_s");
    assertOnly(neither, "speed", "conditions[0]", "cruise");
    assertThat(only(neither).what()).startsWith("Neither");
    SmallFile both = new SmallFile().with("conditions[0].mach", "0.5");
    assertOnly(both, "speed", "conditions[0]", "cruise");
    assertThat(only(both).what()).startsWith("Both");
  }

  @ParameterizedTest
  @CsvSource({
    "conditions[0].outside_air, {}, air, conditions[0].outside_air",
    "conditions[0].cabin_air, {}, air, conditions[0].cabin_air",
    "conditions[0].outside_air.pressure_Pa, 1e5, air, conditions[0].outside_air",
    "conditions[0].outside_air, null, missing-value, conditions[0].outside_air",
    "conditions[0].outside_air, '{\"temperature_K\": 280}', missing-value,"
        + " conditions[0].outside_air.pressure_Pa",
    "conditions[0].outside_air, '{\"pressure_Pa\": 1e5}', missing-value,"
        + " conditions[0].outside_air.temperature_K",
  })
  void airThatIsNotGivenInOneWay(String changed, String json, String code, String place) {
    assertOnly(new SmallFile().with(changed, json), code, place, "cruise");
  }

  @ParameterizedTest
  @CsvSource({
    "'{}', tension",
    "'{\"skin_share\": 0.5}', radius_m",
    "'{\"along_N_per_m\": 1}', tension.across_N_per_m",
    "'{\"across_N_per_m\": 1}', tension.along_N_per_m",
    "'{\"along_N_per_m\": 1, \"across_N_per_m\": {\"by_condition\": {}}}',"
        + " tension.across_N_per_m",
  })
  void aTensionThatIsNotGivenInOneWay(String json, String place) {
    SmallFile file = new SmallFile().with("constructions[0].tension", json);
    Finding finding = only(file);
    assertThat(finding.place()).isEqualTo("constructions[0]." + place);
    assertThat(finding.subject()).isEqualTo("glass");
    assertThat(finding.code()).isIn("tension", "missing-value");
  }

  @Test
  void aTensionGivenBothWays() {
    String both = "{\"skin_share\": 0.5, \"along_N_per_m\": 1, \"across_N_per_m\": 1}";
    SmallFile file = new SmallFile().with("constructions[0].radius_m", "2");
    assertOnly(
        file.with("constructions[0].tension", both),
        "tension",
        "constructions[0].tension",
        "glass");
  }

  @Test
  void lowBestAndHighOutOfOrder() {
    String judged = "{\"best\": 1.1, \"low\": 1.2, \"high\": 1.3}";
    String place = "vehicle.local_speed.speed_ratio";
    assertOnly(new SmallFile().with(place, judged), "low-above-high", place, "small");
    String high = "{\"best\": 1.1, \"high\": 1.0}";
    assertOnly(new SmallFile().with(place, high), "low-above-high", place, "small");
  }

  @Test
  void aMeasurementWithoutTheAbsorptionAreaOfItsRoom() {
    String place = "tree[0].children[1].measured.absorption_area_m2";
    SmallFile file = new SmallFile().without(place);
    assertOnly(file, "absorption-assumed", place, "door");
    assertThat(only(file).severity()).isEqualTo(Severity.WARNING);
    assertThat(only(file).what()).contains("absorption added to the zone does not lower");
  }

  @Test
  void anAllowanceThatIsGivenTwice() {
    SmallFile file = new SmallFile().with("allowances[1]", ALLOWANCE.formatted("window", "60"));
    assertOnly(file, "duplicate-allowance", "allowances[1]", "window");
    assertThat(only(file).severity()).isEqualTo(Severity.ERROR);
    assertThat(only(file).what()).contains("\"driver\"", "\"cruise\"", "at allowances[0]");
    SmallFile other = new SmallFile().with("allowances[1]", ALLOWANCE.formatted("side", "60"));
    assertThat(VehicleCheck.of(other.vehicle())).isEmpty();
  }

  @Test
  void levelsAreNotGivenInOctaves() {
    String octaves = "{\"bands\": \"octave\", \"first\": \"63\", \"values\": [50, 50]}";
    String place = "other_sources[0].levels_dB";
    assertOnly(new SmallFile().with(place, octaves), "octave-levels", place, "tyres");
  }
}
