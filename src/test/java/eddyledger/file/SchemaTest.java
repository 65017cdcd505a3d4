package eddyledger.file;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.networknt.schema.Error;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import eddyledger.model.BandTable;
import eddyledger.model.CrossSpectrumChoice;
import eddyledger.model.EvidenceGrade;
import eddyledger.model.PassRule;
import eddyledger.model.Rating;
import eddyledger.model.TableContent;
import eddyledger.model.ValueKind;
import eddyledger.model.VehicleBuilder;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** The JSON Schema says the same as reader and writer, and cannot lag behind them. */
class SchemaTest {
  private static final Path FILE = Path.of("templates", "eddyledger.schema.json");

  private final Schema schema = schema();

  private static Schema schema() {
    return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
        .getSchema(text(FILE), InputFormat.JSON);
  }

  private static String text(Path file) {
    try {
      return Files.readString(file);
    } catch (IOException missing) {
      throw new AssertionError(missing);
    }
  }

  private List<Error> faults(String json) {
    return schema.validate(json, InputFormat.JSON);
  }

  static List<Path> examples() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("examples"))) {
      return files.filter(file -> file.toString().endsWith(".eddyledger")).sorted().toList();
    }
  }

  @Test
  void thereAreExamples() throws IOException {
    assertThat(examples()).isNotEmpty();
  }

  @ParameterizedTest
  @MethodSource("examples")
  void everyExampleFits(Path example) throws IOException {
    assertThat(faults(text(example))).isEmpty();
    ReadResult result = new ProjectReader().read(example);
    assertThat(faults(ProjectWriter.toText(result.vehicle().orElseThrow()))).isEmpty();
  }

  @Test
  void whateverIsWrittenFits() {
    assertThat(faults(ProjectWriter.toText(RichVehicle.vehicle()))).isEmpty();
    assertThat(faults(ProjectWriter.toText(VehicleBuilder.named("v", "v").build()))).isEmpty();
    assertThat(faults(SmallFile.text())).isEmpty();
  }

  @Test
  void everyKeyThatIsWrittenIsDescribedAndNoOther() {
    SchemaKeys keys = new SchemaKeys(SmallFile.parse(text(FILE)));
    JsonNode rich = SmallFile.parse(ProjectWriter.toText(RichVehicle.vehicle()));
    assertThat(keys.undescribedIn(rich)).isEmpty();
    // "weighting" is read and not written: a table without it is unweighted
    assertThat(keys.neverMet()).allMatch(key -> key.endsWith(".weighting")).hasSize(1);
  }

  @Test
  void theWordsAreThoseOfTheProgram() {
    JsonNode defs = SmallFile.parse(text(FILE)).get("$defs");
    assertWords(defs.at("/grade"), EvidenceGrade.values(), EvidenceGrade::text);
    assertWords(defs.at("/valueKind"), ValueKind.values(), ValueKind::text);
    assertWords(defs.at("/target/properties/rating"), Rating.values(), Rating::text);
    JsonNode rule = defs.at("/target/properties/pass_rule/properties");
    assertWords(rule.get("rounding"), PassRule.Rounding.values(), PassRule.Rounding::text);
    assertWords(rule.get("across"), PassRule.Across.values(), PassRule.Across::text);
    JsonNode carried = defs.at("/oneCrossSpectrum/properties/rule");
    assertWords(carried, CrossSpectrumChoice.Rule.values(), CrossSpectrumChoice.Rule::text);
    JsonNode includes = defs.at("/layUp/properties/includes/items");
    assertWords(includes, TableContent.values(), TableContent::text);
    JsonNode bands = defs.at("/tableObject/properties/bands");
    assertWords(bands, BandTable.Resolution.values(), BandTable.Resolution::text);
  }

  private static <E> void assertWords(JsonNode schema, E[] values, Function<E, String> word) {
    List<String> words = new ArrayList<>();
    schema.get("enum").forEach(node -> words.add(node.textValue()));
    assertThat(words).containsExactlyInAnyOrderElementsOf(Stream.of(values).map(word).toList());
  }

  @ParameterizedTest
  @CsvSource({
    "format, '\"other\"'",
    "format_version, 2",
    "vehicle.id, '\"a b\"'",
    "vehicle.local_speed.speed_m_per_s, 30",
    "vehicle.local_speed, {}",
    "vehicle.boundary_layer.thickness_m, '\"2 cm\"'",
    "vehicle.boundary_layer.thickness_m.grade, '\"sure\"'",
    "vehicle.loss_factor.first, '\"126\"'",
    "vehicle.loss_factor.values[0], '\"NaN\"'",
    "vehicle.loss_factor.weighting, '\"A\"'",
    "vehicle.cross_spectrum, '{\"order_along\": 6}'",
    "vehicle.wall_pressure, 5",
    "conditions[0].mach, 0.1",
    "conditions[0].outside_air.temperature_K, '\"warm\"'",
    "zones[1].absorption_area_m2.values, '[1, 2]'",
    "zones[1].absorption_area_m2.first, '\"31.5\"'",
    "apertures[0].zones, '[\"cabin\"]'",
    "apertures[0].zones, '[\"cabin\", \"cabin\"]'",
    "receivers[0].direct[0].distance_m, '\"near\"'",
    "constructions[0].type, '\"shell\"'",
    "constructions[0].tension, {}",
    "lay_ups[0].includes, '[\"stiffness\"]'",
    "targets[0].rating, '\"loud\"'",
    "targets[0].pass_rule.across, '\"best\"'",
    "tree[0].kind, '\"panel\"'",
    "tree[0].children[0].kind, '\"door\"'",
    "tree[0].children[0].count, 0",
    "tree[0].children[1].measured, {}",
    "change_log[0].when, '\"2026-03-31T14:05:00+02:00\"'",
    "zones, {}",
  })
  void whatTheReaderRefusesTheSchemaRefuses(String place, String json) {
    SmallFile file = new SmallFile().with(place, json);
    assertThat(faults(file.root().toString())).isNotEmpty();
    assertThat(file.read().findings()).isNotEmpty();
  }

  @Test
  void unknownPropertiesAreAllowed() {
    SmallFile file = new SmallFile().with("zones[0].colour", "{\"a\": [1]}");
    file.with("tree[0].children[0].later", "1").with("vehicle.loss_factor.note", "\"n\"");
    assertThat(faults(file.root().toString())).isEmpty();
    assertThat(new SchemaKeys(SmallFile.parse(text(FILE))).undescribedIn(file.root()))
        .contains(".zones[0].colour", ".tree[0].children[0].later", ".vehicle.loss_factor.note");
  }
}
