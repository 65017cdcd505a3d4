package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Units against their definitions, all exact: BIPM, The International System of Units (SI
 * Brochure), 9th edition 2019, table 8, and NIST Special Publication 811 (2008), appendix B.8: 1 in
 * = 0.0254 m, 1 ft = 0.3048 m, 1 mi = 1609.344 m, 1 nautical mile = 1852 m. Tolerance: none; the
 * expected value is the double nearest to the exact quotient.
 */
class UnitReferenceTest {
  @ParameterizedTest
  @CsvSource({
    "INCH, 1, 0.0254",
    "INCH, 0.055, 0.001397",
    "FOOT, 1, 0.3048",
    "FOOT, 10, 3.048",
    "MILLIMETRE, 1.2, 0.0012",
    "MILLIMETRE, 0.1, 0.0001",
    "METRE, 0.18, 0.18",
    "KILOMETRE_PER_HOUR, 900, 250",
    "KILOMETRE_PER_HOUR, 3.6, 1",
    "KNOT, 3600, 1852",
    "KNOT, 900, 463",
    "MILE_PER_HOUR, 3600, 1609.344",
    "MILE_PER_HOUR, 1, 0.44704",
    "FOOT_PER_SECOND, 1, 0.3048",
    "PERCENT, 4, 0.04",
    "PASCAL, 20.5, 20.5",
    "DECIBEL, -3.25, -3.25",
  })
  void toTheUnitOfTheModel(Unit unit, String number, double expected) {
    assertThat(unit.toModel(new BigDecimal(number))).isEqualTo(expected);
    assertThat(unit.fromModel(expected)).isEqualByComparingTo(number);
  }

  @ParameterizedTest
  @CsvSource({"KNOT, 1, 0.514444444444444444", "KILOMETRE_PER_HOUR, 1, 0.277777777777777778"})
  void whereTheQuotientDoesNotEnd(Unit unit, String number, double nearest) {
    assertThat(unit.toModel(new BigDecimal(number))).isEqualTo(nearest);
  }
}
