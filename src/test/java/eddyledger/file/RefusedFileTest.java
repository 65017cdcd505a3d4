package eddyledger.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Files that cannot be used at all give one plain finding and no vehicle, never an exception. */
class RefusedFileTest {
  private static final String NAME = "plan.eddyledger";

  private final ProjectReader reader = new ProjectReader();

  private Finding refused(byte[] bytes) {
    ReadResult result = reader.read(bytes, NAME);
    assertThat(result.vehicle()).isEmpty();
    assertThat(result.fatal()).isTrue();
    assertThat(result.findings()).hasSize(1);
    Finding finding = result.findings().get(0);
    assertThat(finding.severity()).isEqualTo(Severity.FATAL);
    assertThat(finding.subject()).isEqualTo(NAME);
    assertThat(finding.remedy()).endsWith(".");
    assertThat(finding.text())
        .startsWith("cannot be used at ")
        .contains(NAME)
        .doesNotContainIgnoringCase("exception")
        .doesNotContain("jackson", "java.", "com.", "StreamRead", "maximum", "Source");
    return finding;
  }

  private Finding refused(String text) {
    return refused(text.getBytes(StandardCharsets.UTF_8));
  }

  @ParameterizedTest
  @ValueSource(strings = {"", " \n\t ", "\uFEFF"})
  void emptyFile(String text) {
    assertThat(refused(text).code()).isEqualTo("empty-file");
  }

  @Test
  void binaryFile() {
    byte[] zip = {'P', 'K', 3, 4, 20, 0, 0, 0, (byte) 0xff, (byte) 0xfe};
    assertThat(refused(zip).code()).isEqualTo("not-text");
    assertThat(refused("{\"a\":\0}").code()).isEqualTo("not-text");
  }

  @Test
  void notUtf8() {
    Finding finding = refused("{\"name\": \"Möwe\"}".getBytes(StandardCharsets.ISO_8859_1));
    assertThat(finding.code()).isEqualTo("not-text");
    assertThat(finding.remedy()).contains("UTF-8");
  }

  @ParameterizedTest
  @ValueSource(strings = {"[1, 2]", "5", "\"text\"", "null"})
  void noObject(String text) {
    assertThat(refused(text).code()).isEqualTo("no-object");
  }

  @Test
  void otherProgramsFile() {
    assertThat(refused("{}").code()).isEqualTo("other-format");
    assertThat(refused("{\"format\": 7}").what()).contains("7");
    Finding finding = refused("{\"format\": \"geojson\", \"vehicle\": {}}");
    assertThat(finding.what()).contains("\"geojson\"").contains("not an Eddyledger project");
    assertThat(finding.place()).isEqualTo("format");
  }

  @ParameterizedTest
  @ValueSource(strings = {"2", "1.5", "1e30"})
  void newerVersion(String version) {
    Finding finding = refused(SmallFile.text().replace("_version\": 1", "_version\": " + version));
    assertThat(finding.code()).isEqualTo("newer-version");
    assertThat(finding.place()).isEqualTo("format_version");
    assertThat(finding.what()).contains("this program reads version 1");
    assertThat(finding.remedy()).contains("newer Eddyledger");
  }

  @ParameterizedTest
  @ValueSource(strings = {"0", "-1", "0.5", "\"1\"", "null", "true"})
  void noVersion(String version) {
    Finding finding = refused(SmallFile.text().replace("_version\": 1", "_version\": " + version));
    assertThat(finding.code()).isEqualTo("bad-version");
    assertThat(finding.remedy()).contains("\"format_version\": 1");
  }

  @Test
  void tooLarge(@TempDir Path folder) throws IOException {
    byte[] bytes = SmallFile.text().getBytes(StandardCharsets.UTF_8);
    Path file = Files.write(folder.resolve(NAME), bytes);
    ReadResult result = new ProjectReader(bytes.length - 1).read(file);
    assertThat(result.vehicle()).isEmpty();
    assertThat(result.findings()).singleElement().extracting(Finding::code).isEqualTo("too-large");
    assertThat(new ProjectReader(bytes.length - 1).read(bytes, NAME)).isEqualTo(result);
    assertThat(new ProjectReader(bytes.length).read(file).findings()).isEmpty();
  }

  @Test
  void nestingBomb() {
    Finding finding = refused("{\"format\":\"eddyledger\",\"x\":" + "[".repeat(1_000_000));
    assertThat(finding.code()).isEqualTo("nested-too-deep");
    assertThat(finding.place()).startsWith("line 1, column ");
  }

  @Test
  void sectionsTooDeepWithinOneAnother() {
    String open = "{\"kind\":\"section\",\"id\":\"s\",\"name\":\"s\",\"children\":[";
    String tree = open.repeat(300) + "]}".repeat(300);
    String text = SmallFile.text().replace("\"tree\": [", "\"tree\": [" + tree + ",");
    assertThat(refused(text).code()).isEqualTo("nested-too-deep");
  }

  @Test
  void tooManyValues() {
    assertThat(refused("{\"x\":[" + "1,".repeat(2_500_000) + "1]}").code()).isEqualTo("too-large");
  }

  @ParameterizedTest
  @ValueSource(strings = {"NaN", "Infinity", "-Infinity", "+1", "1,5", "0x10", ".5", "1e", "--1"})
  void whatIsNoNumberInJson(String token) {
    Finding finding = refused("{\n  \"volume_m3\": " + token + "\n}");
    assertThat(finding.code()).isEqualTo("not-json");
    assertThat(finding.place()).matches("line [23], column \\d+");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {"{'a': 1 'b': 2}", "{'a' 1}", "{a: 1}", "{'a': 1,}", "{'a': [1, 2}", "{'a': tru}"})
  void brokenJson(String text) {
    Finding finding = refused(text.replace('\'', '"'));
    assertThat(finding.code()).isEqualTo("not-json");
    assertThat(finding.place()).matches("line 1, column \\d+");
  }

  @Test
  void thePlaceOfBrokenJsonIsNamed() {
    Finding finding = refused("{\n  \"a\": 1,\n  \"b\": oops\n}");
    assertThat(finding.place()).startsWith("line 3, column ");
    assertThat(finding.where()).isEqualTo(finding.place() + " (" + NAME + ")");
  }

  @Test
  void duplicateKey() {
    Finding finding = refused("{\n  \"a\": 1,\n  \"b\": {\"c\": 1,\n \"c\": 2}\n}");
    assertThat(finding.code()).isEqualTo("duplicate-property");
    assertThat(finding.place()).startsWith("line 4, column ");
  }

  @ParameterizedTest
  @ValueSource(strings = {"{}", "x", ",", "]", "\"more", "1e99999999999"})
  void trailingGarbage(String rest) {
    Finding finding = refused(SmallFile.text() + rest);
    assertThat(finding.code()).isEqualTo("trailing-text");
    assertThat(finding.place()).startsWith("line " + SmallFile.text().lines().count());
  }

  @Test
  void cutOffAnywhere() {
    String text = SmallFile.text().strip();
    for (int length = 1; length < text.length(); length++) {
      Finding finding = refused(text.substring(0, length));
      assertThat(finding.code()).as("cut at " + length).isIn("cut-off", "not-json");
      assertThat(finding.place()).matches("line \\d+, column \\d+");
    }
  }

  @Test
  void tooLongTextKeyOrNumber() {
    assertThat(refused("{\"a\": \"" + "x".repeat(200_000) + "\"}").code()).isEqualTo("too-long");
    assertThat(refused("{\"a\": " + "1".repeat(2_000) + "}").code()).isEqualTo("too-long");
    assertThat(refused("{\"" + "x".repeat(2_000) + "\": 1}").code()).isEqualTo("too-long");
  }

  @Test
  void aByteOrderMarkIsNoFault() {
    assertThat(reader.read("\uFEFF" + SmallFile.text(), NAME).findings()).isEmpty();
  }

  @Test
  void spoiltBytesNeverThrow() {
    byte[] sound = SmallFile.text().getBytes(StandardCharsets.UTF_8);
    long seed = 20260331;
    Random random = new Random(seed);
    for (int trial = 0; trial < 3_000; trial++) {
      byte[] spoilt = sound.clone();
      for (int change = random.nextInt(4); change >= 0; change--) {
        spoilt[random.nextInt(spoilt.length)] = (byte) random.nextInt(32, 128);
      }
      ReadResult result = reader.read(spoilt, NAME);
      assertThat(result.vehicle().isPresent() || result.fatal())
          .as("seed %d, trial %d", seed, trial)
          .isTrue();
    }
  }

  @Test
  void aFileThatIsNotThereIsTheFileSystemsAffair(@TempDir Path folder) {
    assertThatThrownBy(() -> reader.read(folder.resolve("none.eddyledger")))
        .isInstanceOf(NoSuchFileException.class);
    assertThatThrownBy(() -> reader.read(folder)).isInstanceOf(IOException.class);
  }
}
