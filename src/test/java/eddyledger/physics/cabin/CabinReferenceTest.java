package eddyledger.physics.cabin;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import eddyledger.quantity.Decibels;
import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/**
 * Two coupled zones with three panels against an independent computation of the published power
 * balance and of the direct field, in Pa² and dB, printed to twelve digits: tolerance 1e-9
 * relative, and 1e-9 dB.
 *
 * <p>The values at the receivers are for a diffuse part that is not reduced by the mean absorption;
 * the last matrix of the file is for one that is, with ᾱ = 0.12 and 0.18 in the two zones.
 */
class CabinReferenceTest {
  private static final double RELATIVE = 1e-9;
  private static final double[] MEAN_ABSORPTION = {0.12, 0.18};

  private static JsonNode values;
  private static ZoneBalance balance;

  @BeforeAll
  static void read() throws IOException {
    try (InputStream in =
        CabinReferenceTest.class.getResourceAsStream("/reference/cabin-values.json")) {
      values = new ObjectMapper().readTree(in);
    }
    double impedance = values.get("rho0").asDouble() * values.get("c0").asDouble();
    double coupling = values.get("coupling_S_tau").asDouble();
    balance =
        new ZoneBalance(
            new double[] {values.at("/A/0").asDouble(), values.at("/A/1").asDouble()},
            List.of(new ZoneBalance.Coupling(0, 1, coupling)),
            impedance);
  }

  @Test
  void everyZoneFromEveryPanel() {
    forEachEntry(
        (zone, panel) ->
            assertThat(power(panel) * balance.meanSquarePerWatt(zone, zoneOf(panel)))
                .isCloseTo(
                    entry("p2_zone_by_panel", zone, panel),
                    relative(entry("p2_zone_by_panel", zone, panel))));
  }

  @Test
  void everyReceiverFromEveryPanel() {
    forEachEntry(
        (zone, panel) ->
            assertThat(atReceiver(zone, panel, 0.0))
                .isCloseTo(
                    entry("p2_receiver_by_panel", zone, panel),
                    relative(entry("p2_receiver_by_panel", zone, panel))));
  }

  @Test
  void diffusePartReducedByTheMeanAbsorptionOfThePanelsZone() {
    String name = "p2_zone_by_panel_alpha_0p12_0p18";
    forEachEntry(
        (zone, panel) -> {
          double share = 1.0 - MEAN_ABSORPTION[zoneOf(panel)];
          double diffuse = power(panel) * balance.meanSquarePerWatt(zone, zoneOf(panel));
          assertThat(share * diffuse)
              .isCloseTo(entry(name, zone, panel), relative(entry(name, zone, panel)));
        });
  }

  /** With a distance: the reduced matrix plus the direct part, which is the receivers' excess. */
  @Test
  void receiverWithReducedDiffusePartAndDirectField() {
    forEachEntry(
        (zone, panel) -> {
          if (distance(zone, panel).isNull()) {
            return;
          }
          double direct =
              entry("p2_receiver_by_panel", zone, panel) - entry("p2_zone_by_panel", zone, panel);
          double expected = entry("p2_zone_by_panel_alpha_0p12_0p18", zone, panel) + direct;
          assertThat(atReceiver(zone, panel, MEAN_ABSORPTION[zone]))
              .isCloseTo(expected, relative(expected));
        });
  }

  @Test
  void levelsAtTheReceivers() {
    for (int zone = 0; zone < 2; zone++) {
      double sum = 0.0;
      for (int panel = 0; panel < 3; panel++) {
        sum += atReceiver(zone, panel, 0.0);
      }
      assertThat(Decibels.pressureLevel(sum))
          .as("receiver %d", zone)
          .isCloseTo(values.at("/receiver_SPL/" + zone).asDouble(), within(1e-9));
    }
  }

  private interface EntryCheck {
    void check(int zone, int panel);
  }

  private static void forEachEntry(EntryCheck check) {
    for (int zone = 0; zone < 2; zone++) {
      for (int panel = 0; panel < 3; panel++) {
        check.check(zone, panel);
      }
    }
  }

  private static double atReceiver(int zone, int panel, double meanAbsorption) {
    ReceiverTransfer receiver = new ReceiverTransfer(balance, zone);
    JsonNode distance = distance(zone, panel);
    double perWatt =
        distance.isNull()
            ? receiver.diffuse(zoneOf(panel))
            : receiver.withDirect(
                meanAbsorption, values.at("/S_panel/" + panel).asDouble(), distance.asDouble());
    return power(panel) * perWatt;
  }

  private static JsonNode distance(int zone, int panel) {
    return values.at("/distances/" + zone + "/" + panel);
  }

  private static int zoneOf(int panel) {
    return values.at("/zone/" + panel).asInt();
  }

  private static double power(int panel) {
    return values.at("/W/" + panel).asDouble();
  }

  private static double entry(String name, int zone, int panel) {
    JsonNode node = values.at("/" + name + "/" + zone + "/" + panel);
    assertThat(node.isNumber()).as("%s %d %d", name, zone, panel).isTrue();
    return node.asDouble();
  }

  private static Offset<Double> relative(double value) {
    return within(RELATIVE * value);
  }
}
