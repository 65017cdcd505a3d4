package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.NewVehicle;
import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.model.Vehicle;
import org.junit.jupiter.api.Test;

class FindingWordsTest {
  private final Vehicle vehicle = NewVehicle.empty();

  private static Finding at(String place, String subject) {
    return new Finding(Severity.NOTE, "code", subject, place, "what", "remedy");
  }

  @Test
  void aZoneIsToldByItsNameWhereThePlaceIsAZones() {
    String id = vehicle.zones().get(0).id();
    assertThat(FindingWords.name(vehicle, at("zones[0]", id)))
        .isEqualTo(vehicle.zones().get(0).name());
    assertThat(FindingWords.name(vehicle, at("tree[0].length_m", id))).isEmpty();
    assertThat(FindingWords.name(vehicle, at("zones[7]", "nobody"))).isEmpty();
  }

  @Test
  void conditionsAreToldByTheirShortNameAndPowersAreRaised() {
    String id = vehicle.conditions().get(0).id();
    String name = Readable.brief(vehicle.conditions().get(0).name());
    assertThat(FindingWords.sentence(vehicle, "In condition \"" + id + "\": 2.1e+07"))
        .isEqualTo("In condition " + name + ": 2.1·10⁷");
    assertThat(FindingWords.sentence(vehicle, "In condition \"other\": 3"))
        .isEqualTo("In condition \"other\": 3");
  }
}
