package eddyledger.check;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The word somebody may have meant. */
class NearMissTest {
  private static final List<String> KNOWN = List.of("thickness_m", "radius_m", "zone", "zones");

  @ParameterizedTest
  @CsvSource({
    "thicknes_m, thickness_m",
    "thikcness_m, thickness_m",
    "THICKNESS_M, thickness_m",
    "radius, radius_m",
    "zome, zone",
    "zoness, zones",
    "zone, zone",
  })
  void theNearest(String word, String meant) {
    assertThat(NearMiss.nearest(word, KNOWN)).isEqualTo(meant);
    assertThat(NearMiss.of(word, KNOWN)).isEqualTo(" Did you mean \"" + meant + "\"?");
  }

  @ParameterizedTest
  @CsvSource({"colour", "mass_kg", "x", "z", "''"})
  void noneIsNear(String word) {
    assertThat(NearMiss.nearest(word, KNOWN)).isNull();
    assertThat(NearMiss.of(word, KNOWN)).isEmpty();
  }

  @Test
  void nothingIsKnown() {
    assertThat(NearMiss.nearest("zone", Set.of())).isNull();
  }

  @Test
  void amongEquallyNearOnesTheFirstByTheAlphabet() {
    assertThat(NearMiss.nearest("bat", List.of("cat", "bad", "rat"))).isEqualTo("bad");
    assertThat(NearMiss.nearest("bat", List.of("rat", "cat", "bad"))).isEqualTo("bad");
  }
}
