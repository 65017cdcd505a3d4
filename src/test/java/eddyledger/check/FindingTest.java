package eddyledger.check;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import eddyledger.file.SmallFile;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What a finding says, and that its place is one of the file. */
class FindingTest {
  @ParameterizedTest
  @CsvSource({
    "'', tree, tree",
    "window, '', window",
    "window, tree[0].count, tree[0].count (window)",
    "'', '', ''",
  })
  void whereItIs(String subject, String place, String where) {
    Finding finding = new Finding(Severity.ERROR, "code", subject, place, "What.", "Remedy.");
    assertThat(finding.where()).isEqualTo(where);
    assertThat(finding.text()).isEqualTo("error at " + where + ": What. Remedy.");
  }

  @Test
  void severitiesAreOrdered() {
    assertThat(Severity.FATAL.atLeast(Severity.ERROR)).isTrue();
    assertThat(Severity.ERROR.atLeast(Severity.ERROR)).isTrue();
    assertThat(Severity.WARNING.atLeast(Severity.ERROR)).isFalse();
    assertThat(Severity.NOTE.atLeast(Severity.WARNING)).isFalse();
  }

  @Test
  void manyFaultsAreToldAtOnceAndEveryPlaceIsInTheFile() {
    SmallFile file =
        new SmallFile()
            .with("conditions[0].mach", "7")
            .with("conditions[0].outside_air", "{}")
            .with("zones[0].id", "null")
            .with("zones[0].volume_m3", "-1")
            .with("zones[1].absorption_area_m2.values[5]", "-1")
            .with("apertures[0].zones", "[\"boot\", \"boot\"]")
            .with("receivers[0].direct[0].distance_m", "-1")
            .with("constructions[0].tension", "{\"along_N_per_m\": -1}")
            .with("lay_ups[0].insertion_loss_dB", "999")
            .with("other_sources[0].receiver", "\"nobody\"")
            .with("targets[0].receivers", "[]")
            .with("allowances[0].level_dBA", "-999")
            .with("tree[0].children[0].count", "0")
            .with("tree[0].children[0].boundary_layer", "{}")
            .with("tree[0].children[1].id", "\"-\"")
            .without("tree[0].construction")
            .without("tree[0].children[0].length_m");
    List<Finding> findings = VehicleCheck.of(file.vehicle());
    assertThat(findings).hasSizeGreaterThanOrEqualTo(17).doesNotHaveDuplicates();
    for (Finding finding : findings) {
      assertThat(standsIn(file.root(), finding.place())).as(finding.place()).isTrue();
      assertThat(finding.subject()).isNotNull();
      assertThat(finding.text()).contains(finding.place());
      assertThat(finding.remedy()).isNotBlank();
    }
  }

  /** Whether a place is in the file, or what it is missing from is. */
  private static boolean standsIn(JsonNode root, String place) {
    String[] steps = place.replace("]", "").split("[.\\[]");
    JsonNode node = root;
    for (int i = 0; i < steps.length; i++) {
      JsonNode next = node.isArray() ? node.get(Integer.parseInt(steps[i])) : node.get(steps[i]);
      if (next == null) {
        return i == steps.length - 1 && node.isObject();
      }
      node = next;
    }
    return true;
  }
}
