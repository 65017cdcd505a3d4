package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.file.ProjectReader;
import eddyledger.ledger.Ledger;
import eddyledger.present.TraceNote.Kind;
import eddyledger.present.TraceStage.LevelKind;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;

/** Accounts of measured panels, of defaults, of panels without a value or with bands missing. */
class UnusualAccountTest {
  private static final String SMALL = read();
  private static final int AT_1_KHZ = 16;

  private static String read() {
    try (InputStream text =
        UnusualAccountTest.class.getResourceAsStream("/file/small.eddyledger")) {
      return new String(text.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static TraceAccount account(String text, String panel) {
    Ledger ledger = Ledger.of(new ProjectReader().read(text, "small").vehicle().orElseThrow());
    return TraceAccount.of(ledger, panel, "cruise", "driver", AT_1_KHZ).orElseThrow();
  }

  private static String changed(String old, String other) {
    assertThat(SMALL).contains(old);
    return SMALL.replace(old, other);
  }

  private static TraceStage stage(TraceAccount account, int number) {
    return account.stages().get(number - 1);
  }

  @Test
  void aMeasuredPanelSaysSo() {
    TraceAccount account = account(SMALL, "door");
    assertThat(account.stages()).hasSize(9);
    assertThat(stage(account, 5).sentence())
        .isEqualTo("Not needed: the panel is given by measurement.");
    assertThat(stage(account, 6).sentence())
        .isEqualTo("Measured level difference between wall and zone, one piece.");
    assertThat(stage(account, 6).numbers()).startsWith("D = 40.0 dB in the band 1 kHz,");
    assertThat(stage(account, 7).sentence())
        .isEqualTo("Held by the measurement, so not taken off again.");
    assertThat(stage(account, 7).stepText()).isEqualTo("0.0");
    assertThat(account.stages().stream().flatMap(stage -> stage.notes().stream()))
        .noneMatch(note -> note.kind() == Kind.DOUBT);
    assertThat(stage(account, 6).notes()).isEmpty();
  }

  @Test
  void anAbsorptionThatIsTakenForTheMeasurementsIsSeen() {
    TraceAccount account = account(changed(", \"absorption_area_m2\": 9}", "}"), "door");
    assertThat(stage(account, 6).notes())
        .containsExactly(
            new TraceNote(
                Kind.NOTE, "A of the measurement was not given: that of zone cabin is taken"));
    // measured in the zone itself: the wall's level less 40 dB, and a little less for the aperture
    double difference = stage(account, 4).level() - stage(account, 8).level();
    assertThat(difference).isBetween(40.0, 41.5);
  }

  @Test
  void defaultsAreSeen() {
    TraceAccount account = account(SMALL, "window");
    assertThat(stage(account, 5).notes())
        .contains(
            new TraceNote(
                Kind.DEFAULT,
                "nobody set the convection speed over local flow speed, the orders and decay rates"
                    + " of the cross-spectrum"));
    assertThat(stage(account, 5).origin())
        .isEqualTo("Orders, decay rates and convection ratio by default");
    assertThat(stage(account, 8).notes())
        .contains(
            new TraceNote(
                Kind.DEFAULT, "nobody set the cabin's air: 20 °C at the outside pressure"));
    String unset = changed("\"wall_pressure\": \"goody\",", "");
    assertThat(stage(account(unset, "window"), 4).notes())
        .containsExactly(
            new TraceNote(Kind.DEFAULT, "nobody set the model of the wall-pressure spectrum"));
    assertThat(stage(account, 4).notes()).isEmpty();
  }

  @Test
  void octavesThatWereInterpolatedAreSeen() {
    assertThat(stage(account(SMALL, "window"), 6).notes())
        .containsExactly(
            new TraceNote(Kind.INTERPOLATED, "loss factor from octaves, linear in lg f"));
  }

  @Test
  void valuesFromOnePlaceAreToldTogether() {
    String same =
        changed(
            "\"length_m\": 0.9, \"width_m\": 0.5,",
            "\"length_m\": 0.9, \"width_m\": 0.5, \"construction\": \"glass\",");
    assertThat(stage(account(same, "window"), 6).origin())
        .isEqualTo("Construction and size set here; loss factor from the vehicle");
    assertThat(stage(account(SMALL, "window"), 6).origin())
        .isEqualTo("Construction from side; size set here; loss factor from the vehicle");
  }

  @Test
  void withoutLayUpNothingIsTakenOff() {
    TraceStage layUp = stage(account(SMALL, "window"), 7);
    assertThat(layUp.sentence()).isEqualTo("None: the panel radiates straight into the zone.");
    assertThat(layUp.stepText()).isEqualTo("0.0");
    assertThat(layUp.notes()).isEmpty();
    String unset = changed("\"lay_up\": \"none\", ", "");
    assertThat(stage(account(unset, "window"), 7).notes())
        .containsExactly(new TraceNote(Kind.DEFAULT, "nobody set the lay-up"));
  }

  @Test
  void directSoundIsToldOnlyIfItIsCounted() {
    // small zone without inner surface: the run refuses the line of sight
    TraceStage refused = stage(account(SMALL, "window"), 8);
    assertThat(refused.sentence()).doesNotContain("direct");
    assertThat(refused.notes().stream().map(TraceNote::text))
        .anyMatch(text -> text.contains("is not counted"));
    assertThat(stage(account(SMALL, "door"), 8).notes().stream().map(TraceNote::text))
        .noneMatch(text -> text.contains("is not counted"));
    String surface = changed("\"volume_m3\": 3,", "\"volume_m3\": 3, \"inner_surface_m2\": 14,");
    assertThat(stage(account(surface, "window"), 8).sentence())
        .isEqualTo("Power meets the absorption of cabin; direct sound from 500 mm.");
  }

  @Test
  void otherWaysToGiveTheSpeed() {
    String speed = changed("{\"speed_ratio\": 1.1}", "{\"speed_m_per_s\": 45}");
    assertThat(stage(account(speed, "window"), 2).sentence())
        .isEqualTo("Local flow speed 45 m/s as given.");
    String pressure = changed("{\"speed_ratio\": 1.1}", "{\"pressure_coefficient\": -0.4}");
    assertThat(stage(account(pressure, "window"), 2).sentence())
        .isEqualTo("38.9 m/s at the pressure coefficient −0.4.");
  }

  @Test
  void airThatIsNotGivenByAltitude() {
    String air =
        changed("{\"altitude_m\": 0}", "{\"temperature_K\": 293.15, \"pressure_Pa\": 101325}");
    TraceStage ambient = stage(account(air, "window"), 1);
    assertThat(ambient.sentence()).isEqualTo("Air as entered, by temperature and pressure.");
    assertThat(ambient.rule()).doesNotContain("288.15");
    assertThat(ambient.picture().kind()).isEqualTo(StagePicture.Kind.NONE);
  }

  @Test
  void aPanelWithoutValueGivesTheReason() {
    TraceAccount account = account(changed("\"zone\": \"cabin\",\n", "\n"), "window");
    assertThat(account.hasValue()).isFalse();
    assertThat(account.reason()).isNotBlank();
    assertThat(account.subtitle()).endsWith("there is no value to account for.");
    assertThat(account.total().level()).isEqualTo("no level: missing");
    assertThat(account.total().share()).isEqualTo("Share of the energy at driver not known");
    assertThat(account.total().stateWord()).isEqualTo("not known");
    assertThat(account.text()).contains(account.reason());
  }

  @Test
  void aMissingBandIsNeverALevel() {
    String bands = "1, ".repeat(AT_1_KHZ) + "null" + ", 1".repeat(27 - AT_1_KHZ);
    String gap =
        changed(
            "\"level_difference_dB\": 40",
            "\"level_difference_dB\": {\"bands\": \"third-octave\", \"first\": \"25\","
                + " \"values\": ["
                + bands
                + "]}");
    TraceAccount account = account(gap, "door");
    assertThat(account.hasValue()).isTrue();
    assertThat(stage(account, 4).levelText()).isNotEqualTo("—");
    assertThat(stage(account, 6).levelText()).isEqualTo("—");
    assertThat(stage(account, 9).levelText()).isEqualTo("—");
    assertThat(stage(account, 9).kind()).isEqualTo(LevelKind.WEIGHTED);
    assertThat(stage(account, 9).notes())
        .anyMatch(note -> note.kind() == Kind.MISSING && note.text().contains("1000"));
    assertThat(account.total().level()).isEqualTo("no level: partial");
  }
}
