package eddyledger.ledger;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.ledger.TraceStep.Role;
import eddyledger.model.Extras;
import eddyledger.model.MeasuredPanel;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Panel;
import eddyledger.model.Receiver;
import eddyledger.model.Vehicle;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** The account of every contribution gives that contribution, with no hidden gain in between. */
class TraceTest {
  private static final double TIGHT = 1.0e-12;
  private static final Ledger LEDGER = Ledger.of(SampleVehicle.vehicle());

  static Stream<Arguments> traces() {
    List<String> panels = new ArrayList<>(SampleTree.COMPUTED);
    panels.add(SampleTree.MEASURED);
    List<Arguments> traces = new ArrayList<>();
    for (OperatingCondition condition : LEDGER.vehicle().conditions()) {
      for (Receiver receiver : LEDGER.vehicle().receivers()) {
        panels.forEach(id -> traces.add(Arguments.of(id, condition.id(), receiver.id())));
      }
    }
    return traces.stream();
  }

  @ParameterizedTest
  @MethodSource("traces")
  void startTimesFactorsIsTheRow(String panel, String condition, String receiver) {
    Trace trace = LEDGER.trace(panel, condition, receiver).orElseThrow();
    LedgerRow row = Sheets.row(LEDGER, condition, receiver, panel);
    assertThat(trace.hasValue()).isTrue();
    assertThat(trace.status()).isEqualTo(Status.OK);
    assertThat(trace.steps()).filteredOn(step -> step.role() == Role.START).hasSize(1);
    double[] product = new double[Bands.COUNT];
    Arrays.fill(product, 1.0);
    for (TraceStep step : trace.steps()) {
      if (step.role() == Role.START || step.role() == Role.FACTOR) {
        for (int band = 0; band < Bands.COUNT; band++) {
          product[band] *= step.values().value(band);
        }
      }
    }
    Sheets.assertClose(BandSpectrum.of(product), row.meanSquares(), TIGHT, panel);
    assertThat(trace.product()).isEqualTo(BandSpectrum.of(product));
    BandSpectrum level = step(trace, "L").values();
    for (int band = 0; band < Bands.COUNT; band++) {
      double expected = 10.0 * Math.log10(product[band] / (20.0e-6 * 20.0e-6));
      assertThat(level.value(band)).isCloseTo(expected, within(1.0e-10));
      assertThat(row.levels().value(band)).isCloseTo(expected, within(1.0e-10));
    }
  }

  @ParameterizedTest
  @MethodSource("traces")
  void theNumbersOfEachBandBelongTogether(String panel, String condition, String receiver) {
    Trace trace = LEDGER.trace(panel, condition, receiver).orElseThrow();
    TraceBands bands = trace.bands();
    BandSpectrum start = step(trace, "p²_wall").values();
    BandSpectrum onePiece = step(trace, "W1/p²").values();
    BandSpectrum answer = step(trace, "p²/W").values();
    assertThat(start).isEqualTo(bands.wallPressure());
    for (int band = 0; band < Bands.COUNT; band++) {
      double radiated =
          bands.wallPressure().value(band) * onePiece.value(band) * trace.panel().count();
      close(bands.radiatedPower().value(band), radiated);
      double zone = radiated * Math.pow(10.0, -bands.insertionLoss().value(band) / 10.0);
      close(bands.zonePower().value(band), zone);
      close(bands.meanSquare().value(band), zone * answer.value(band));
      // the density at mid-band times the bandwidth is near the sum over the band's slices
      double width = Bands.upper(band) - Bands.lower(band);
      double flat = bands.wallPressureDensity().value(band) * width;
      assertThat(bands.wallPressure().value(band)).isCloseTo(flat, within(0.05 * flat));
    }
  }

  @ParameterizedTest
  @MethodSource("traces")
  void everyStepSaysWhatItIs(String panel, String condition, String receiver) {
    Trace trace = LEDGER.trace(panel, condition, receiver).orElseThrow();
    for (TraceStep step : trace.steps()) {
      assertThat(step.symbol()).isNotBlank();
      assertThat(step.meaning()).as(step.symbol()).isNotBlank();
      assertThat(step.unit()).as(step.symbol()).isNotNull();
      assertThat(step.note()).as(step.symbol()).isNotNull();
      if (!step.varies()) {
        assertThat(step.values()).isEqualTo(BandSpectrum.constant(step.value()));
      }
    }
    // the units of start and factors multiply to those of a mean square
    List<String> units =
        trace.steps().stream()
            .filter(step -> step.role() == Role.START || step.role() == Role.FACTOR)
            .map(TraceStep::unit)
            .toList();
    assertThat(units).containsExactly("Pa²", "W/Pa²", "", "", "Pa²/W");
    assertThat(trace.steps().stream().map(TraceStep::symbol)).doesNotHaveDuplicates();
  }

  @Test
  void filledInQuantitiesAreNotedAndGivenOnesAreNot() {
    Trace thickness = trace("side-glass", "road", "driver");
    assertThat(step(thickness, "delta").note()).isEmpty();
    assertThat(step(thickness, "delta").source()).isEqualTo("from sample, as given");
    for (String symbol : List.of("delta*", "theta", "tau_w")) {
      assertThat(step(thickness, symbol).note()).as(symbol).contains("filled in");
    }
    Trace length = trace("floor", "road", "driver");
    assertThat(step(length, "delta").note()).contains("boundary-layer thickness", "filled in");
    assertThat(step(trace(SampleTree.MEASURED, "road", "driver"), "theta").note())
        .contains("filled in");
  }

  @Test
  void defaultsAndPlacesOfValuesAreTold() {
    Trace floor = trace("floor", "flight", "driver");
    for (String symbol : List.of("Gpp", "Uc/Ue", "order_along", "order_across", "alpha_across")) {
      assertThat(step(floor, symbol).note()).as(symbol).startsWith("default, nobody set it");
      assertThat(step(floor, symbol).source()).as(symbol).isNotEmpty().doesNotContain("default");
    }
    assertThat(step(floor, "Gpp").meaning()).endsWith("after Goody");
    assertThat(step(floor, "Gpp").source()).startsWith("Goody, AIAA J.");
    assertThat(step(floor, "Uc/Ue").source()).contains("literature, 0.6 to 0.85");
    assertThat(step(floor, "order_along").source()).startsWith("Corcos");
    assertThat(step(floor, "alpha_across").source()).startsWith("Corcos");
    assertThat(step(floor, "alpha_along").note()).contains("; fitted at orders (1,1), carried by");
    assertThat(step(floor, "eta").source()).isEqualTo("from body");
    assertThat(step(floor, "IL").note()).contains("interpolated from octaves");
    assertThat(step(floor, "delta").source()).doesNotContain("as given");
    Trace glass = trace("side-glass", "flight", "driver");
    assertThat(step(glass, "delta").source()).isEqualTo("from body, for this condition, as given");
    assertThat(step(glass, "pressure_coefficient").source())
        .isEqualTo("set on the panel, for this condition");
    assertThat(step(glass, "p²/W").meaning()).contains("direct part at 0.7 m");
    assertThat(step(trace("side-glass", "flight", "passenger"), "p²/W").meaning())
        .contains("diffuse")
        .doesNotContain("direct");
    Trace quarter = trace("quarter-glass", "road", "driver");
    assertThat(step(quarter, "Uc/Ue").source()).isEqualTo("set on the panel");
    assertThat(step(quarter, "order_across").source()).startsWith("set on the panel; Corcos");
    assertThat(step(quarter, "alpha_across").source()).startsWith("set on the panel; Corcos");
    for (String symbol : List.of("Uc/Ue", "order_along", "order_across")) {
      assertThat(step(quarter, symbol).note()).as(symbol).isEmpty();
    }
    Trace roof = trace("roof", "road", "driver");
    assertThat(step(roof, "Gpp").source()).startsWith("set on the panel; Efimtsov, ");
    assertThat(step(roof, "Gpp").note()).doesNotContain("default");
  }

  @Test
  void theLayUpIsToldOrWhyThereIsNone() {
    assertThat(step(trace("roof", "flight", "driver"), "IL").note()).isEmpty();
    assertThat(step(trace("roof", "flight", "driver"), "IL").source()).isEqualTo("from aft");
    TraceStep none = step(trace("tail", "road", "trunk-ear"), "IL");
    assertThat(none.note()).isEqualTo("default, nobody set one");
    assertThat(none.source()).isEmpty();
    TraceStep measured = step(trace(SampleTree.MEASURED, "road", "passenger"), "IL");
    assertThat(measured.note()).contains("holds the whole path");
    assertThat(measured.source()).isEmpty();
  }

  @Test
  void anAbsorptionAreaThatWasNotMeasuredIsNoted() {
    assertThat(step(trace(SampleTree.MEASURED, "road", "passenger"), "W1/p²").note()).isEmpty();
    Vehicle vehicle =
        Edits.panel(
            SampleVehicle.vehicle(),
            SampleTree.MEASURED,
            panel ->
                new Panel(
                    panel.id(),
                    panel.name(),
                    panel.count(),
                    panel.settings(),
                    new MeasuredPanel(panel.measured().levelDifference(), null, Extras.NONE),
                    panel.evidence(),
                    panel.extras()));
    Ledger ledger = Ledger.of(vehicle);
    Trace trace = ledger.trace(SampleTree.MEASURED, "road", "passenger").orElseThrow();
    assertThat(step(trace, "W1/p²").note())
        .isEqualTo("A of the measurement was not given: that of zone rear is taken");
    assertThat(step(trace("roof", "road", "passenger"), "W1/p²").note()).isEmpty();
  }

  @Test
  void useOutsideARangeIsNoted() {
    assertThat(step(trace("tail", "flight", "trunk-ear"), "Gpp").note())
        .contains("Goody is used at edge Mach number");
    assertThat(step(trace("roof", "road", "passenger"), "Gpp").note())
        .contains("Efimtsov is used at edge Mach number");
    assertThat(step(trace("tail", "road", "trunk-ear"), "Gpp").note())
        .isEqualTo("default, nobody set it");
  }

  @Test
  void whatDoesNotExistHasNoTrace() {
    assertThat(LEDGER.trace("body", "road", "driver")).isEmpty();
    assertThat(LEDGER.trace("side-glass", "sea", "driver")).isEmpty();
    assertThat(LEDGER.trace("side-glass", "road", "nobody")).isEmpty();
  }

  private static Trace trace(String panel, String condition, String receiver) {
    return LEDGER.trace(panel, condition, receiver).orElseThrow();
  }

  private static TraceStep step(Trace trace, String symbol) {
    return trace.steps().stream()
        .filter(step -> step.symbol().equals(symbol))
        .findFirst()
        .orElseThrow(() -> new AssertionError("no step " + symbol));
  }

  private static void close(double actual, double expected) {
    assertThat(actual).isCloseTo(expected, within(TIGHT * expected));
  }
}
