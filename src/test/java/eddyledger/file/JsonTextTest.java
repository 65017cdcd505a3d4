package eddyledger.file;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.model.Extras;
import eddyledger.model.Vehicle;
import eddyledger.model.VehicleBuilder;
import eddyledger.model.Zone;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The written text: readable, in a fixed order, with the shortest numbers. */
class JsonTextTest {
  private static Vehicle ofVolume(double volume) {
    return VehicleBuilder.named("v", "v")
        .zones(List.of(new Zone("z", "z", volume, null, null, Extras.NONE)))
        .build();
  }

  private static double volumeAgain(double volume) {
    String text = ProjectWriter.toText(ofVolume(volume));
    Vehicle back = new ProjectReader().read(text, "v").vehicle().orElseThrow();
    return back.zones().get(0).volume();
  }

  @ParameterizedTest
  @CsvSource({
    "0.050000, 0.05",
    "17.0, 17",
    "-3.0, -3",
    "0.0, 0",
    "-0.0, 0",
    "9999999.0, 9999999",
    "70000000000.0, 7.0E10",
    "0.0001, 1.0E-4",
    "0.1, 0.1",
    "2.0E23, 2.0E23",
    "4.9E-324, 4.9E-324",
    "1.7976931348623157E308, 1.7976931348623157E308",
  })
  void numbersHaveTheFewestDigits(double number, String written) {
    assertThat(ProjectWriter.toText(ofVolume(number)))
        .contains("{\"id\": \"z\", \"name\": \"z\", \"volume_m3\": " + written + "}");
  }

  @Test
  void everyNumberComesBackToTheLastBit() {
    long seed = 3141592653L;
    Random random = new Random(seed);
    for (int trial = 0; trial < 2_000; trial++) {
      double number = Double.longBitsToDouble(random.nextLong());
      if (Double.isFinite(number)) {
        assertThat(volumeAgain(number)).as("seed %d, trial %d", seed, trial).isEqualTo(number);
      }
    }
  }

  @Test
  void anythingTypedComesBack() {
    long seed = 2718281828L;
    Random random = new Random(seed);
    for (int trial = 0; trial < 2_000; trial++) {
      StringBuilder name = new StringBuilder("=");
      for (int i = random.nextInt(12); i >= 0; i--) {
        name.append((char) (random.nextBoolean() ? random.nextInt(1, 128) : random.nextInt(65536)));
      }
      Vehicle vehicle = VehicleBuilder.named("v", name.toString()).build();
      assertThat(new ProjectReader().read(ProjectWriter.toText(vehicle), "v").vehicle())
          .as("seed %d, trial %d", seed, trial)
          .hasValue(vehicle);
    }
  }

  @Test
  void theTextIsIndentedByTwoSpacesWithLineFeeds() {
    String text = ProjectWriter.toText(RichVehicle.vehicle());
    assertThat(text).startsWith("{\n  \"format\": \"eddyledger\",\n  \"format_version\": 1,\n");
    assertThat(text).endsWith("\n}\n").doesNotContain("\r").doesNotContain("\t");
    assertThat(text.lines()).noneMatch(line -> line.endsWith(" "));
    assertThat(text.lines())
        .allMatch(line -> (line.length() - line.stripLeading().length()) % 2 == 0);
  }

  @Test
  void aRowOfNumbersStandsOnOneLine() {
    assertThat(ProjectWriter.toText(RichVehicle.vehicle()).lines())
        .filteredOn(line -> line.contains("\"values\": ["))
        .isNotEmpty()
        .allMatch(line -> line.endsWith("],") || line.endsWith("]"));
  }

  @Test
  void theKeysStandInTheOrderOfTheFormat() {
    String text = ProjectWriter.toText(RichVehicle.vehicle());
    List<String> keys = new ArrayList<>();
    text.lines()
        .filter(line -> line.startsWith("  \"") && !line.startsWith("  \"x-"))
        .forEach(line -> keys.add(line.split("\"")[1]));
    assertThat(keys)
        .containsExactly(
            "format",
            "format_version",
            "vehicle",
            "conditions",
            "zones",
            "apertures",
            "receivers",
            "constructions",
            "lay_ups",
            "suppliers",
            "other_sources",
            "targets",
            "allowances",
            "tree",
            "change_log");
  }

  @Test
  void unknownPropertiesComeAfterTheKnownOnes() {
    List<String> lines = ProjectWriter.toText(RichVehicle.vehicle()).lines().toList();
    for (int i = 0; i + 1 < lines.size(); i++) {
      String line = lines.get(i);
      int indent = line.indexOf('"');
      if (indent > 2 && line.startsWith("\"x-", indent) && line.endsWith(",")) {
        assertThat(lines.get(i + 1).strip()).as(line).startsWith("\"x-");
      }
    }
  }

  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY})
  void whatIsNoNumberIsNeverWritten(double number) {
    Extras extras = new Extras(Map.of("x", number));
    Vehicle vehicle = ofVolume(number).edit().extras(extras).build();
    assertThat(ProjectWriter.toText(vehicle)).doesNotContain("NaN").doesNotContain("Infinity");
  }
}
