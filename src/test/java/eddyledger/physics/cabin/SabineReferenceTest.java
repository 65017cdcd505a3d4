package eddyledger.physics.cabin;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.quantity.Decibels;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/**
 * Reverberation, levels and the Schroeder frequency of rooms against published examples.
 *
 * <ul>
 *   <li>Room 10 × 8 × 6 m with T = 3 s: a textbook's question bank, A = 25.76 m², ᾱ = 0.068 printed
 *       (0.0685); tolerance half the last digit, one unit for the truncated ᾱ
 *   <li>Room treated with tile: Master Handbook of Acoustics, Examples 1 and 2 (feet and sabins,
 *       turned into SI here; times in s to 0.01): tolerance 0.006 s, half the last digit and the
 *       difference between 0.049 s/ft and 0.161 s/m; its fall of 8.0 dB at 1 kHz to 0.05 dB
 *   <li>Cloth against leather seats, room constants 14.98 and 11.53 m²: Automotive Engineering:
 *       Powertrain, Chassis System and Vehicle Body, ch. 21.1, p. 699, printed 1.1 dB; tolerance
 *       0.05 dB
 *   <li>Schroeder frequency: derivation in Schroeder, J. Acoust. Soc. Am. 99 (1996) 3240, eqs. (1)
 *       to (3): half-power bandwidth 2.2/T against three mode spacings c³/(4πVf²); the rounded
 *       factor 2000 stands for 2093 at 343 m/s, so 5 %
 * </ul>
 */
class SabineReferenceTest {
  private static final double FOOT = 0.3048;
  private static final double IMPEDANCE = 413.3;

  @Test
  void roomOfTheQuestionBank() {
    double volume = 10.0 * 8.0 * 6.0;
    double surface = 2.0 * (10.0 * 8.0 + 10.0 * 6.0 + 8.0 * 6.0);
    double area = Sabine.absorptionArea(volume, 3.0);
    assertThat(area).isCloseTo(25.76, within(0.005));
    assertThat(Sabine.meanAbsorption(area, surface)).isCloseTo(0.068, within(0.001));
    assertThat(Sabine.reverberationTime(volume, area)).isCloseTo(3.0, within(1e-12));
  }

  @ParameterizedTest
  @CsvFileSource(resources = "/reference/sabine-room-treatment.csv", useHeadersInDisplayName = true)
  void roomBareAndTreated(String what, double sabins, double time) {
    double volume = 23.3 * 16.0 * 10.0 * FOOT * FOOT * FOOT;
    assertThat(Sabine.reverberationTime(volume, sabins * FOOT * FOOT))
        .as(what)
        .isCloseTo(time, within(0.006));
  }

  @Test
  void treatmentLowersTheLevel() {
    double fall = level(53.9 * FOOT * FOOT) - level(339.5 * FOOT * FOOT);
    assertThat(fall).isCloseTo(8.0, within(0.05)).isCloseTo(7.99, within(0.005));
  }

  @Test
  void clothAgainstLeatherSeats() {
    assertThat(level(11.53) - level(14.98)).isCloseTo(1.1, within(0.05));
  }

  @Test
  void schroederFrequencyOfASmallCabin() {
    double volume = 3.0;
    double time = 0.08;
    double derived = Math.sqrt(3.0 * Math.pow(343.0, 3) / (4.0 * Math.PI * volume) * time / 2.2);
    double frequency = SchroederFrequency.ofReverberationTime(volume, time);
    assertThat(frequency).isCloseTo(derived, within(0.05 * derived));
    assertThat(frequency).isCloseTo(326.6, within(0.05));
    assertThat(SchroederFrequency.ofAbsorptionArea(volume, Sabine.absorptionArea(volume, time)))
        .isCloseTo(frequency, within(1e-9));
  }

  private static double level(double absorptionArea) {
    ZoneBalance zone = new ZoneBalance(new double[] {absorptionArea}, List.of(), IMPEDANCE);
    return Decibels.pressureLevel(zone.meanSquarePerWatt(0, 0));
  }
}
