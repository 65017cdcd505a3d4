package eddyledger.ledger;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.model.AirGiven;
import eddyledger.model.ByCondition;
import eddyledger.model.CrossSpectrumChoice.Rule;
import eddyledger.model.EdgeSpeed;
import eddyledger.model.Extras;
import eddyledger.model.LayerGiven;
import eddyledger.model.OperatingCondition;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Receiver;
import eddyledger.model.Settings;
import eddyledger.model.SettingsBuilder;
import eddyledger.model.Tension;
import eddyledger.model.Vehicle;
import eddyledger.model.VehicleBuilder;
import eddyledger.model.WallPressureChoice;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.util.List;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** A row of the model range is the ledger of the vehicle with that model chosen everywhere. */
class ModelRangeTest {
  private static final double TIGHT = 1.0e-12;

  static Stream<Arguments> alternatives() {
    return Stream.of(
        alternative("orders-1-1", it -> orders(it, 1, 1, Rule.HALF_POWER_WIDTH)),
        alternative("orders-2-1", it -> orders(it, 2, 1, Rule.HALF_POWER_WIDTH)),
        alternative(
            "orders-2-1-correlation-length", it -> orders(it, 2, 1, Rule.CORRELATION_LENGTH)),
        alternative("spectrum-goody", it -> spectrum(it, "goody")),
        alternative("spectrum-efimtsov", it -> spectrum(it, "efimtsov")));
  }

  private static Arguments alternative(String choice, Consumer<SettingsBuilder> change) {
    return Arguments.of(choice, change);
  }

  private static void orders(SettingsBuilder settings, int along, int across, Rule rule) {
    settings.crossSpectrum(ByCondition.always(SampleTree.orders(along, across, rule)));
  }

  private static void spectrum(SettingsBuilder settings, String id) {
    settings.wallPressure(ByCondition.always(WallPressureChoice.of(id)));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("alternatives")
  void anAlternativeIsTheLedgerOfThatChoice(String choice, Consumer<SettingsBuilder> change) {
    for (Vehicle vehicle : List.of(SampleVehicle.vehicle(), RandomVehicle.of(5))) {
      Ledger ledger = Ledger.of(vehicle);
      Ledger chosen =
          Ledger.of(Edits.panels(vehicle, panel -> List.of(Edits.settings(panel, change))));
      for (int i = 0; i < ledger.sheets().size(); i++) {
        LedgerRow total = chosen.sheets().get(i).total();
        BandSpectrum alternative = range(ledger.sheets().get(i), choice).meanSquares();
        Sheets.assertClose(alternative, total.meanSquares(), TIGHT, choice);
        // chosen everywhere, the alternative is the chosen one
        assertThat(range(chosen.sheets().get(i), choice).meanSquares())
            .isEqualTo(total.meanSquares());
      }
    }
    // and it is no alternative in name only
    ReceiverSheet sheet = Ledger.of(SampleVehicle.vehicle()).sheets().get(0);
    assertThat(range(sheet, choice).meanSquares()).isNotEqualTo(sheet.total().meanSquares());
  }

  @Test
  void theRangeNamesEveryAlternativeOnce() {
    for (ReceiverSheet sheet : Ledger.of(SampleVehicle.vehicle()).sheets()) {
      assertThat(sheet.total().choice()).isEqualTo("chosen");
      assertThat(sheet.range().stream().map(LedgerRow::choice))
          .containsExactlyElementsOf(alternatives().map(it -> (String) it.get()[0]).toList());
    }
  }

  /**
   * Slow flow: an independent computation of the published formulas gives 15.8 to 17.0 dB between
   * the orders at 200 Hz to 2 kHz, for a pane of 0.9 m by 0.45 m and a convection speed of 28 m/s.
   * Where the plate's waves are long against the convected ones, only the tails of the two
   * wavenumber spectra count, α/(π(1+α²)) and √2 α³/π: they end up 10 lg 1/(√2 α²(1+α²)) apart.
   */
  @Test
  void slowFlowIsRuledByTheOrderOfTheCrossSpectrum() {
    double squared = 0.116 * 0.116;
    double limit = -10.0 * Math.log10(Math.sqrt(2.0) * squared * (1.0 + squared));
    ReceiverSheet sheet = sheet(slow());
    BandSpectrum corcos = range(sheet, "orders-1-1").levels();
    BandSpectrum steeper = range(sheet, "orders-2-1").levels();
    for (int band = Bands.position("250"); band <= Bands.position("2000"); band++) {
      assertThat(corcos.value(band) - steeper.value(band))
          .as(Bands.label(band) + " Hz")
          .isBetween(12.0, limit);
    }
    assertThat(corcos.value(Bands.COUNT - 1) - steeper.value(Bands.COUNT - 1))
        .isCloseTo(limit, within(0.05));
  }

  /** A fuselage bay in cruise: the plate's own waves run as fast as the convected ones. */
  @Test
  void fastFlowIsNot() {
    ReceiverSheet sheet = sheet(fast());
    double corcos = range(sheet, "orders-1-1").level();
    double steeper = range(sheet, "orders-2-1").level();
    assertThat(Math.abs(corcos - steeper)).isLessThan(3.0);
    assertThat(Math.abs(range(sheet, "orders-1-1").levelA() - range(sheet, "orders-2-1").levelA()))
        .isLessThan(3.0);
  }

  private static Vehicle slow() {
    OperatingCondition condition =
        SampleVehicle.condition(
            "only", 24.0, null, AirGiven.atAltitude(0.0), AirGiven.of(293.15, 101_325.0));
    return one(
        condition,
        SampleTree.plate("plate", 0.004, 70.0e9, 2500.0, 0.23, null, null),
        0.6,
        0.4,
        LayerGiven.thickness(0.02));
  }

  private static Vehicle fast() {
    OperatingCondition condition =
        SampleVehicle.condition(
            "only", null, 0.74, AirGiven.atAltitude(10_700.0), AirGiven.of(295.15, 80_723.0));
    return one(
        condition,
        SampleTree.plate(
            "plate", 0.0016, 71.0e9, 2780.0, 0.33, 1.5, Tension.fromCabinPressure(0.6)),
        0.5,
        0.2,
        LayerGiven.thickness(0.1));
  }

  private static Vehicle one(
      OperatingCondition condition,
      PlateConstruction plate,
      double length,
      double width,
      LayerGiven layer) {
    Settings settings =
        SampleTree.settings()
            .zone("zone")
            .construction("plate")
            .size(length, width)
            .localSpeed(ByCondition.always(EdgeSpeed.ratio(1.0)))
            .boundaryLayer(ByCondition.always(layer))
            .lossFactor(ByCondition.always(SampleVehicle.single(0.02)))
            .build();
    return VehicleBuilder.named("one", "one")
        .conditions(List.of(condition))
        .zones(List.of(SampleVehicle.zone("zone", 3.0, 14.0, SampleVehicle.single(3.0))))
        .receivers(List.of(new Receiver("ear", "ear", "zone", List.of(), Extras.NONE)))
        .constructions(List.of(plate))
        .tree(List.of(SampleTree.panel("panel", 1, settings)))
        .build();
  }

  private static ReceiverSheet sheet(Vehicle vehicle) {
    return Sheets.sheet(Ledger.of(vehicle), "only", "ear");
  }

  private static LedgerRow range(ReceiverSheet sheet, String choice) {
    return sheet.range().stream()
        .filter(row -> row.choice().equals(choice))
        .findFirst()
        .orElseThrow();
  }
}
