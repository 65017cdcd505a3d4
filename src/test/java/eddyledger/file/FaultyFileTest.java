package eddyledger.file;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * A fault inside a project gives one finding with its place, its subject and a remedy; the vehicle
 * is there all the same, and nothing of the file is lost when it is saved.
 */
class FaultyFileTest {
  private static final String ONES = "1,".repeat(26);

  private static void check(SmallFile file, Finding finding, String code, String place) {
    assertThat(finding.code()).isEqualTo(code);
    assertThat(finding.place()).isEqualTo(place);
    assertThat(finding.text()).contains(place);
    assertThat(finding.remedy()).isNotBlank();
    ReadResult again = file.read();
    String saved = ProjectWriter.toText(again.vehicle().orElseThrow());
    assertThat(new ProjectReader().read(saved, "saved").findings())
        .as("the fault survives saving")
        .extracting(Finding::place)
        .containsExactly(place);
  }

  private static Finding only(String place, String json, String code) {
    SmallFile file = new SmallFile().with(place, json);
    Finding finding = file.onlyFinding();
    check(file, finding, code, finding.place());
    return finding;
  }

  @Test
  void theSmallFileHasNoFault() {
    assertThat(new SmallFile().read().findings()).isEmpty();
  }

  @ParameterizedTest
  @CsvSource({
    "zones[0].volume_m3, cabin",
    "constructions[0].thickness_m, glass",
    "constructions[0].radius_m, glass",
    "apertures[0].area_m2, shelf",
    "apertures[0].transmission_loss_dB, shelf",
    "receivers[0].direct[0].distance_m, driver",
    "zones[0].absorption_area_m2, cabin",
    "lay_ups[0].insertion_loss_dB, trim",
    "other_sources[0].levels_dB, tyres",
    "targets[0].value, quiet",
    "targets[0].reserve_dB, quiet",
    "targets[0].pass_rule.tolerance_dB, quiet",
    "allowances[0].level_dBA, ''",
    "conditions[0].outside_air.altitude_m, cruise",
    "vehicle.tight_band_dB, small",
    "vehicle.local_speed.speed_ratio, small",
    "vehicle.boundary_layer.thickness_m.low, small",
    "vehicle.loss_factor.values[1], small",
    "tree[0].children[0].length_m, window",
    "tree[0].children[0].count, window",
    "tree[0].children[1].measured.level_difference_dB, door",
  })
  void aTextInTheNumbersPlace(String place, String subject) {
    for (String text : List.of("\"NaN\"", "\"Infinity\"", "\"12 mm\"", "true", "\"\"")) {
      Finding finding = only(place, text, "not-a-number");
      assertThat(finding.place()).isEqualTo(place);
      assertThat(finding.subject()).isEqualTo(subject);
      assertThat(finding.severity()).isEqualTo(Severity.ERROR);
      assertThat(finding.what()).startsWith("A number is wanted here, not ");
    }
    assertThat(only(place, "\"1.5\"", "not-a-number").remedy()).isEqualTo("Take the quotes away.");
  }

  @ParameterizedTest
  @ValueSource(strings = {"1e999", "-1e999", "1e999999999"})
  void aNumberBeyondAllNumbers(String number) {
    Finding finding = only("zones[0].volume_m3", number, "not-a-number");
    assertThat(finding.what()).contains("too large");
  }

  @ParameterizedTest
  @CsvSource({
    "zones[0].volume_m3, -3, 0.001 m³",
    "zones[0].inner_surface_m2, 1e12, m²",
    "constructions[0].thickness_m, 40, millimetres",
    "constructions[0].youngs_modulus_Pa, 70, gigapascals",
    "conditions[0].speed_m_per_s, -10, m/s",
    "vehicle.loss_factor.values[0], 2, percent",
    "tree[0].children[0].count, 0, whole number",
    "zones[0].volume_m3, 1e-999, m³",
  })
  void anAbsurdValue(String place, String value, String says) {
    Finding finding = only(place, value, "absurd-value");
    assertThat(finding.place()).isEqualTo(place);
    assertThat(finding.text()).contains(says);
  }

  @ParameterizedTest
  @ValueSource(strings = {"2.5", "1e10", "-1e300"})
  void aCountThatIsNotWhole(String count) {
    assertThat(only("tree[0].children[0].count", count, "not-a-number").remedy())
        .isEqualTo("Enter a whole number.");
  }

  @ParameterizedTest
  @CsvSource({
    "zones[1].id, '\"cabin\"', zones[1].id, duplicate-id",
    "zones[1].id, '\"Window\"', tree[0].children[0].id, duplicate-id",
    "suppliers[0].id, '\"-works\"', suppliers[0].id, bad-id",
    "lay_ups[0].id, '\"a b\"', lay_ups[0].id, bad-id",
    "lay_ups[0].id, '\"\"', lay_ups[0].id, bad-id",
    "lay_ups[0].id, null, lay_ups[0].id, bad-id",
    "lay_ups[0].id, 7, lay_ups[0].id, wrong-type",
  })
  void anIdThatCannotBe(String changed, String id, String place, String code) {
    List<Finding> findings = new SmallFile().with(changed, id).read().findings();
    List<Finding> told = findings.stream().filter(it -> it.place().equals(place)).toList();
    assertThat(told).singleElement().extracting(Finding::code).isEqualTo(code);
  }

  @ParameterizedTest
  @CsvSource({
    "receivers[0].zone, cabinn, missing-reference, cabin",
    "apertures[0].zones[1], boots, missing-reference, boot",
    "targets[0].receivers[0], drive, missing-reference, driver",
    "tree[0].construction, glas, missing-reference, glass",
    "tree[0].children[0].supplier, work, missing-reference, works",
    "targets[0].rating, overal-a, unknown-word, overall-a",
    "targets[0].pass_rule.rounding, 0.10, unknown-word, 0.1",
    "constructions[0].type, plat, unknown-word, plate",
    "constructions[0].grade, parts, unknown-word, part",
    "tree[0].children[0].kind, panels, unknown-word, panel",
    "lay_ups[0].includes[0], mas, unknown-word, mass",
    "vehicle.loss_factor.first, 126, unknown-word, 125",
  })
  void aWordThatIsNearlyRight(String place, String word, String code, String meant) {
    SmallFile file = new SmallFile().with(place, "\"" + word + "\"");
    Finding finding = file.onlyFinding();
    assertThat(finding.code()).isEqualTo(code);
    assertThat(finding.what()).endsWith("Did you mean \"" + meant + "\"?");
    assertThat(place).startsWith(finding.place());
  }

  @ParameterizedTest
  @CsvSource({
    "zones[0].volumen_m3, volume_m3",
    "vehicle.local_speed.by_conditions, by_condition",
    "vehicle.boundary_layer.thickness_m.hight, high",
    "vehicle.loss_factor.weigthing, weighting",
    "targets[0].pass_rule.roundin, rounding",
    "vehicle.nam, name",
    "zone, zones",
    "tree[0].children[0].lenght_m, length_m",
  })
  void anUnknownPropertyIsAWarningAndKept(String place, String meant) {
    SmallFile file = new SmallFile().with(place, "{\"a\": [1, null, \"ü\"]}");
    Finding finding = file.onlyFinding();
    check(file, finding, "unknown-property", place);
    assertThat(finding.severity()).isEqualTo(Severity.WARNING);
    assertThat(finding.what()).endsWith("Did you mean \"" + meant + "\"?");
    assertThat(ProjectWriter.toText(file.read().vehicle().orElseThrow())).contains("null, \"ü\"");
  }

  @ParameterizedTest
  @ValueSource(strings = {"27", "29", "0"})
  void aSpectrumOfTheWrongLength(int count) {
    String values = "[" + String.join(",", Collections.nCopies(count, "1")) + "]";
    Finding finding = only("zones[1].absorption_area_m2.values", values, "spectrum-length");
    assertThat(finding.place()).isEqualTo("zones[1].absorption_area_m2");
    assertThat(finding.what()).contains("There are " + count + " third-octave values from 25 Hz");
    assertThat(finding.remedy()).contains("28");
  }

  @Test
  void aSpectrumOfTheWrongBands() {
    String place = "zones[1].absorption_area_m2";
    assertThat(only(place + ".first", "\"31.5\"", "spectrum-length").what()).contains("31.5 Hz");
    assertThat(only(place + ".bands", "\"twelfth\"", "unknown-word").place())
        .isEqualTo(place + ".bands");
    String octaves = "{\"bands\":\"octave\",\"first\":\"4000\",\"values\":[1,1,1]}";
    assertThat(only(place, octaves, "spectrum-length").what()).contains("pass 8000 Hz");
    String nothing = "{\"bands\":\"octave\",\"first\":\"4000\",\"values\":[null]}";
    assertThat(only(place, nothing, "spectrum-length").what()).contains("no value");
    String weighted = "{\"bands\":\"single\",\"value\":1,\"weighting\":\"A\"}";
    assertThat(only(place, weighted, "weighting").place()).isEqualTo(place + ".weighting");
    assertThat(
            only(place, "{\"first\":\"25\",\"values\":[" + ONES + "1,1]}", "missing-value").what())
        .contains("how the bands are given");
    only(place, "{\"bands\":\"single\"}", "missing-value");
  }

  @Test
  void aLocalSpeedGivenTwiceOrNotAtAll() {
    Finding twice = only("vehicle.local_speed.pressure_coefficient", "-0.5", "one-of");
    assertThat(twice.what()).isEqualTo("The local speed is given twice.");
    assertThat(only("vehicle.local_speed", "{}", "one-of").what()).contains("missing");
  }

  @Test
  void aCircularReference() {
    Finding finding = only("apertures[0].zones", "[\"boot\", \"boot\"]", "circular-reference");
    assertThat(finding.subject()).isEqualTo("shelf");
    assertThat(only("apertures[0].zones", "[\"boot\"]", "aperture-zones").what()).contains("1");
    only("apertures[0].zones", "[\"boot\", \"cabin\", \"boot\"]", "aperture-zones");
  }

  @Test
  void aPanelWithoutZone() {
    List<Finding> findings = new SmallFile().without("vehicle.zone").read().findings();
    assertThat(findings).extracting(Finding::subject).containsExactly("window", "door");
    assertThat(findings).allMatch(finding -> finding.what().equals("The panel has no zone."));
  }

  @Test
  void anEmptyVehicle() {
    SmallFile file = new SmallFile().with("tree", "[]").with("receivers[0].direct", "[]");
    file.with("allowances", "[]");
    assertThat(file.onlyFinding().code()).isEqualTo("empty-vehicle");
    assertThat(file.read().fatal()).isTrue();
    assertThat(file.read().vehicle()).isPresent();
  }

  @Test
  void aPanelWithChildren() {
    Finding finding = only("tree[0].children[1].children", "[]", "wrong-type");
    assertThat(finding.place()).isEqualTo("tree[0].children[1].children");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"2026-03-31", "2026-03-31T14:05:00+02:00", "yesterday", "2026-02-30T00:00:00Z"})
  void anInstantThatIsNone(String when) {
    assertThat(only("change_log[0].when", "\"" + when + "\"", "bad-instant").remedy())
        .contains("2026-03-31T14:05:00Z");
  }
}
