package eddyledger.physics.cabin;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import eddyledger.physics.cabin.ZoneBalance.Coupling;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What the power balance refuses, and in which words. */
class ZoneBalanceInputTest {
  private static final double IMPEDANCE = 413.3;

  @ParameterizedTest
  @ValueSource(doubles = {-0.1, Double.NaN, Double.POSITIVE_INFINITY})
  void anAbsorptionAreaThatIsNone(double area) {
    refuses("zone 1", new double[] {1.0, area}, new Coupling(0, 1, 1.0));
  }

  @ParameterizedTest
  @ValueSource(doubles = {-0.1, Double.NaN, Double.POSITIVE_INFINITY})
  void aCouplingThatIsNone(double area) {
    refuses("zones 0 and 1", new double[] {1.0, 1.0}, new Coupling(0, 1, area));
  }

  @ParameterizedTest
  @CsvSource({"0, 2, zone 2", "-1, 0, zone -1", "1, 1, itself"})
  void aCouplingThatJoinsNoTwoZones(int first, int second, String word) {
    refuses(word, new double[] {1.0, 1.0}, new Coupling(first, second, 1.0));
  }

  @Test
  void zonesThatAbsorbNothing() {
    refuses("no absorption", new double[] {0.0});
    refuses("zone 0", new double[] {0.0, 0.0}, new Coupling(0, 1, 1.0));
    refuses("zone 1", new double[] {1.0, 0.0});
    refuses("zone 2", new double[] {1.0, 0.0, 0.0}, new Coupling(0, 1, 1.0));
    refuses("zone 1", new double[] {1.0, 0.0}, new Coupling(0, 1, 0.0));
  }

  @Test
  void noZoneAtAll() {
    refuses("at least one zone", new double[0]);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.0, -413.0, Double.NaN, Double.POSITIVE_INFINITY})
  void airWithoutImpedance(double impedance) {
    assertThatThrownBy(() -> new ZoneBalance(new double[] {1.0}, List.of(), impedance))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("impedance");
  }

  @Test
  void keepsWhatItWasGiven() {
    double[] absorption = {1.0, 2.0};
    ZoneBalance balance = new ZoneBalance(absorption, List.of(), IMPEDANCE);
    absorption[0] = 5.0;
    assertThat(balance.zones()).isEqualTo(2);
    assertThat(balance.characteristicImpedance()).isEqualTo(IMPEDANCE);
    assertThat(balance.meanSquarePerWatt(0, 0)).isEqualTo(4.0 * IMPEDANCE);
  }

  private static void refuses(String word, double[] absorption, Coupling... couplings) {
    assertThatThrownBy(() -> new ZoneBalance(absorption, List.of(couplings), IMPEDANCE))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining(word);
  }
}
