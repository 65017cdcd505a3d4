package eddyledger.check;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.file.SmallFile;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The limits of belief: what they say, and that every quantity is held against its own. */
class LimitTest {
  @ParameterizedTest
  @EnumSource
  void noLimitHoldsWhatIsNoNumber(Limit limit) {
    for (double number : new double[] {Double.NaN, 1.0 / 0.0, -1.0 / 0.0}) {
      assertThat(limit.holds(number)).isFalse();
      assertThat(limit.what(number)).endsWith(" is not a number.");
    }
    assertThat(limit.holds(-1.0e9)).isFalse();
    assertThat(limit.holds(1.0e30)).isFalse();
    assertThat(limit.remedy()).startsWith("Correct it: ").matches(".*[.?]");
  }

  @Test
  void theLimitsThemselvesHold() {
    assertThat(Limit.THICKNESS.holds(5.0e-5)).isTrue();
    assertThat(Limit.THICKNESS.holds(0.2)).isTrue();
    assertThat(Limit.THICKNESS.holds(Math.nextUp(0.2))).isFalse();
    assertThat(Limit.THICKNESS.holds(Math.nextDown(5.0e-5))).isFalse();
  }

  @Test
  void theSentenceHasNumbersAndUnits() {
    assertThat(Limit.VOLUME.what(-3.0))
        .isEqualTo("a volume of -3 m³ is not between 0.001 m³ and 100000 m³.");
    assertThat(Limit.POISSON.what(0.5))
        .isEqualTo("a Poisson's ratio of 0.5 is not between 0 and 0.499.");
  }

  @ParameterizedTest
  @CsvSource({
    "conditions[0].speed_m_per_s, 900, a speed",
    "conditions[0].outside_air.altitude_m, 35000, an altitude",
    "conditions[0].outside_air.temperature_offset_K, 300, a temperature offset",
    "conditions[0].outside_air, '{\"temperature_K\": 20, \"pressure_Pa\": 1e5}', a temperature",
    "conditions[0].outside_air, '{\"temperature_K\": 280, \"pressure_Pa\": 1013}', a pressure",
    "conditions[0].yaw_deg, 1000, an angle",
    "conditions[0].incidence_deg, 1000, an angle",
    "conditions[0].skin_temperature_K, 20, a temperature",
    "conditions[0].interlayer_temperature_K, 20, a temperature",
    "zones[0].volume_m3, 0, a volume",
    "zones[0].inner_surface_m2, -1, an area",
    "zones[0].absorption_area_m2, -1, an area",
    "zones[1].absorption_area_m2.values[27], 1e9, an area",
    "apertures[0].area_m2, 0, an area",
    "apertures[0].transmission_loss_dB, 500, a loss",
    "receivers[0].direct[0].distance_m, 0, a distance",
    "constructions[0].thickness_m, 4, a thickness",
    "constructions[0].youngs_modulus_Pa, 70, a Young's modulus",
    "constructions[0].density_kg_per_m3, 2.5, a density",
    "constructions[0].poisson_ratio, 0.5, a Poisson's ratio",
    "constructions[0].radius_m, 2000, a radius",
    "constructions[0].tension, '{\"along_N_per_m\": -1, \"across_N_per_m\": 0}', a tension",
    "constructions[0].tension, '{\"along_N_per_m\": 1, \"across_N_per_m\": 1e9}', a tension",
    "lay_ups[0].insertion_loss_dB, 200, a loss",
    "lay_ups[0].base_surface_mass_kg_per_m2, 0, a surface mass",
    "other_sources[0].levels_dB, 300, a level",
    "targets[0].value, 660, a level",
    "targets[0].reserve_dB, -1, a reserve or tolerance",
    "targets[0].pass_rule.tolerance_dB, -1, a reserve or tolerance",
    "allowances[0].level_dBA, 1000, a level",
    "vehicle.tight_band_dB, -1, a reserve or tolerance",
    "vehicle.local_speed.speed_ratio, 38.9, a speed ratio",
    "vehicle.local_speed, '{\"speed_m_per_s\": 0}', a speed",
    "vehicle.local_speed, '{\"pressure_coefficient\": 1.5}', a pressure coefficient",
    "vehicle.boundary_layer.thickness_m, 20, a boundary-layer thickness",
    "vehicle.boundary_layer.running_length_m, 0, a running length",
    "vehicle.boundary_layer.displacement_thickness_m, 9, a boundary-layer thickness",
    "vehicle.boundary_layer.momentum_thickness_m, 9, a boundary-layer thickness",
    "vehicle.boundary_layer.wall_shear_stress_Pa, -1, a wall shear stress",
    "vehicle.convection_ratio, 27, a convection ratio",
    "vehicle.cross_spectrum, '{\"order_along\": 6}', an order",
    "vehicle.cross_spectrum, '{\"order_across\": 0}', an order",
    "vehicle.cross_spectrum, '{\"fitted_order_along\": -1}', an order",
    "vehicle.cross_spectrum, '{\"fitted_order_across\": 9}', an order",
    "vehicle.cross_spectrum, '{\"decay_along\": 0}', a decay rate",
    "vehicle.cross_spectrum, '{\"decay_across\": 70}', a decay rate",
    "vehicle.loss_factor, 2, a loss factor",
    "vehicle.loss_factor.values[1], 0, a loss factor",
    "tree[0].children[0].length_m, 900, a size",
    "tree[0].children[0].width_m, 0, a size",
    "tree[0].children[0].count, 0, a count",
    "tree[0].children[1].measured.level_difference_dB, 200, a loss",
    "tree[0].children[1].measured.absorption_area_m2, 0, an area",
  })
  void everyQuantityHasItsLimit(String place, String json, String name) {
    assertThat(VehicleCheck.of(new SmallFile().with(place, json).vehicle()))
        .singleElement()
        .satisfies(
            finding -> {
              assertThat(finding.code()).isEqualTo("absurd-value");
              assertThat(finding.severity()).isEqualTo(Severity.ERROR);
              assertThat(finding.place()).startsWith(place);
              assertThat(finding.what().toLowerCase(Locale.ROOT))
                  .startsWith(name.toLowerCase(Locale.ROOT) + " of ");
            });
  }

  @Test
  void aMachNumberHasItsLimit() {
    SmallFile file = new SmallFile().without("conditions[0].speed_m_per_s");
    file.with("conditions[0].mach", "38.9");
    assertThat(VehicleCheck.of(file.vehicle()))
        .singleElement()
        .extracting(Finding::what)
        .isEqualTo("A Mach number of 38.9 is not between 0.003 and 2.5.");
  }

  @ParameterizedTest
  @ValueSource(strings = {"low", "high"})
  void lowAndHighHaveTheLimitsOfTheBest(String bound) {
    String judged = "{\"best\": 0.02, \"" + bound + "\": " + (bound.equals("low") ? 0 : 20) + "}";
    String place = "vehicle.boundary_layer.thickness_m";
    assertThat(VehicleCheck.of(new SmallFile().with(place, judged).vehicle()))
        .singleElement()
        .extracting(Finding::place)
        .isEqualTo(place + "." + bound);
    String bands = "{\"bands\": \"single\", \"value\": 0.1, \"" + bound + "\": 7}";
    assertThat(VehicleCheck.of(new SmallFile().with("vehicle.loss_factor", bands).vehicle()))
        .singleElement()
        .extracting(Finding::place)
        .isEqualTo("vehicle.loss_factor." + bound);
  }

  @Test
  void overridesHaveTheLimitsOfTheBase() {
    String judged = "{\"best\": 0.7, \"by_condition\": {\"cruise\": 70}}";
    assertThat(VehicleCheck.of(new SmallFile().with("vehicle.convection_ratio", judged).vehicle()))
        .singleElement()
        .extracting(Finding::place)
        .isEqualTo("vehicle.convection_ratio.by_condition.cruise");
  }
}
