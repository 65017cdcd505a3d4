package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import eddyledger.quantity.Bands;
import eddyledger.quantity.Progress;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;

/** Laws and limits of a panel's response. */
class PanelResponseTest {
  private final PanelResponse response = new PanelResponse(new RadiationCache());

  @Test
  void severalCrossSpectraTogetherAreTheSameBitsAsEachAlone() {
    BandSlices slices = new BandSlices(6);
    PanelCase all =
        withSlices(
            Panels.panelCase(
                Panels.glass(),
                0.02,
                Panels.orders(1, 1),
                Panels.orders(2, 1),
                Panels.orders(3, 2)),
            slices);
    PanelTransfer together = response.of(all, Progress.NONE);
    for (int i = 0; i < 3; i++) {
      PanelCase alone =
          withSlices(Panels.panelCase(Panels.glass(), 0.02, all.crossSpectra().get(i)), slices);
      PanelTransfer single = response.of(alone, Progress.NONE);
      assertThat(together.radiatedPower()[i]).isEqualTo(single.radiatedPower()[0]);
      assertThat(together.meanSquareVelocity()[i]).isEqualTo(single.meanSquareVelocity()[0]);
    }
  }

  @Test
  void oneThreadAndTwoGiveEqualBits() throws Exception {
    List<PanelCase> cases = new ArrayList<>();
    for (int i = 0; i < 6; i++) {
      Plate plate = Plate.isotropic(0.5, 0.3, 0.001 + 0.0003 * i, 71e9, 2780.0, 0.33);
      cases.add(Panels.panelCase(plate, 0.03, Panels.orders(1, 1)));
    }
    List<double[]> one = new ArrayList<>();
    for (PanelCase panel : cases) {
      one.add(response.of(panel, Progress.NONE).radiatedPower()[0]);
    }
    PanelResponse common = new PanelResponse(new RadiationCache());
    ExecutorService threads = Executors.newFixedThreadPool(2);
    try {
      List<Future<double[]>> two = new ArrayList<>();
      for (PanelCase panel : cases) {
        two.add(threads.submit(() -> common.of(panel, Progress.NONE).radiatedPower()[0]));
      }
      for (int i = 0; i < cases.size(); i++) {
        assertThat(two.get(i).get(60, TimeUnit.SECONDS)).isEqualTo(one.get(i));
      }
    } finally {
      threads.shutdownNow();
    }
  }

  /**
   * In vacuo ⟨v²⟩ falls as 1/m''² when stiffness rises with mass, the modes staying where they are.
   */
  @Test
  void heavierPlateWithTheSameModesMovesLessByTheSquareOfItsMass() {
    Plate light = Panels.glass();
    Plate heavy = Plate.uniform(0.9, 0.45, 4.0 * light.stiffnessAlong(), 4.0 * light.surfaceMass());
    double[] first = response.of(inVacuo(light, 0.02), Progress.NONE).meanSquareVelocity()[0];
    double[] second = response.of(inVacuo(heavy, 0.02), Progress.NONE).meanSquareVelocity()[0];
    for (int i = 0; i < first.length; i++) {
      assertThat(first[i] / second[i]).isCloseTo(16.0, within(1e-9));
    }
  }

  /** At resonance halving the loss factor doubles ⟨v²⟩; off resonance it changes nothing. */
  @Test
  void dampingActsAtResonanceOnly() {
    double[] more =
        response
            .of(inVacuo(Panels.glass(), 0.02), Progress.NONE)
            .bandMeanSquareVelocity(ones(6), 0);
    double[] less =
        response
            .of(inVacuo(Panels.glass(), 0.01), Progress.NONE)
            .bandMeanSquareVelocity(ones(6), 0);
    int far = Bands.position("25");
    int many = Bands.position("4000");
    assertThat(less[far] / more[far]).isCloseTo(1.0, within(0.01));
    assertThat(less[many] / more[many]).isCloseTo(2.0, within(0.1));
  }

  @Test
  void airOutsideOnlyTakesAwayAndNoCabinMeansNoPower() {
    PanelCase one = Panels.panelCase(Panels.glass(), 0.005, Panels.orders(1, 1));
    PanelCase both = withFaces(one, Optional.of(new FluidFace(1.3, 330.0)), one.cabin());
    PanelCase none = withFaces(one, Optional.empty(), Optional.empty());
    double[] power = response.of(one, Progress.NONE).bandPower(ones(6), 0);
    double[] loaded = response.of(both, Progress.NONE).bandPower(ones(6), 0);
    for (int i = 0; i < power.length; i++) {
      assertThat(loaded[i]).as(Bands.label(i)).isLessThan(power[i]).isPositive();
    }
    assertThat(response.of(none, Progress.NONE).bandPower(ones(6), 0)).containsOnly(0.0);
  }

  /** The same air on both sides damps twice as much as on one. */
  @Test
  void twoEqualFacesAreTwiceTheDensityOnOne() {
    FluidFace air = Panels.AIR;
    PanelCase one = Panels.panelCase(Panels.glass(), 0.005, Panels.orders(2, 1));
    PanelCase both = withFaces(one, Optional.of(air), Optional.of(air));
    FluidFace dense = new FluidFace(2.0 * air.density(), air.soundSpeed());
    PanelCase twice = withFaces(one, Optional.empty(), Optional.of(dense));
    double[] first = response.of(both, Progress.NONE).meanSquareVelocity()[0];
    double[] second = response.of(twice, Progress.NONE).meanSquareVelocity()[0];
    for (int i = 0; i < first.length; i++) {
      assertThat(first[i]).isCloseTo(second[i], within(1e-12 * second[i]));
    }
  }

  @Test
  void bandsAreSumsOverTheirSlices() {
    PanelTransfer transfer =
        response.of(Panels.panelCase(Panels.glass(), 0.02, Panels.orders(1, 1)), Progress.NONE);
    double[] density = new double[transfer.slices().count()];
    density[6 * 5 + 2] = 3.0;
    double[] power = transfer.bandPower(density, 0);
    assertThat(power[5]).isEqualTo(3.0 * transfer.radiatedPower()[0][32]);
    assertThat(Arrays.stream(power).sum()).isEqualTo(power[5]);
    assertThatIllegalArgumentException().isThrownBy(() -> transfer.bandPower(new double[28], 0));
  }

  @Test
  void tellsItsModes() {
    PanelTransfer transfer =
        response.of(Panels.panelCase(Panels.glass(), 0.02, Panels.orders(1, 1)), Progress.NONE);
    assertThat(transfer.firstModeFrequency()).isCloseTo(58.594394, within(1e-6));
    // up to 10 kHz there are 315, of these 4 up to 200 Hz
    int upTo = Bands.position("10000");
    int below = Arrays.stream(transfer.modesInBand(), 0, upTo + 1).sum();
    assertThat(below).isGreaterThan(315);
    assertThat(transfer.modesInBand()[Bands.position("63")]).isEqualTo(1);
    assertThat(transfer.modesSummed()).isSorted();
    assertThat(transfer.modesSummed()[0]).isEqualTo(3);
    assertThat(transfer.remarks()).isEmpty();
  }

  @Test
  void stopsWhenCancelledAndTellsEachBand() {
    PanelCase panel = Panels.panelCase(Panels.glass(), 0.02, Panels.orders(1, 1));
    AtomicInteger told = new AtomicInteger();
    Progress stopAfterThree =
        new Progress() {
          @Override
          public void done(int steps, int of) {
            assertThat(of).isEqualTo(Bands.COUNT);
            assertThat(steps).isEqualTo(told.incrementAndGet());
          }

          @Override
          public boolean cancelled() {
            return told.get() == 3;
          }
        };
    assertThatThrownBy(() -> response.of(panel, stopAfterThree))
        .isInstanceOf(CancellationException.class);
    assertThat(told.get()).isEqualTo(3);
  }

  @Test
  void inputsAreChecked() {
    PanelCase good = Panels.panelCase(Panels.glass(), 0.02, Panels.orders(1, 1));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Panels.panelCase(Panels.glass(), 0.0, Panels.orders(1, 1)))
        .withMessageContaining("loss factor");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Panels.panelCase(Panels.glass(), 0.02))
        .withMessageContaining("cross-spectrum");
    assertThatIllegalArgumentException()
        .isThrownBy(
            () ->
                PanelCase.of(
                    good.plate(),
                    new double[27],
                    good.outside(),
                    good.cabin(),
                    good.crossSpectra(),
                    good.convectionSpeed()));
    PanelCase still =
        PanelCase.of(
            good.plate(),
            good.lossFactor(),
            good.outside(),
            good.cabin(),
            good.crossSpectra(),
            f -> 0.0);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> response.of(still, Progress.NONE))
        .withMessageContaining("convection speed");
  }

  /** A roof of 3 m x 2 m in 0.8 mm steel: far more modes than one would enter as one piece. */
  @Test
  void aLargeThinPanelIsComputedWithARemark() {
    Plate roof = Plate.isotropic(3.0, 2.0, 0.0008, 210e9, 7850.0, 0.3);
    PanelCase panel =
        withSlices(Panels.panelCase(roof, 0.02, Panels.orders(1, 1)), new BandSlices(1));
    PanelTransfer transfer = response.of(panel, Progress.NONE);
    assertThat(transfer.modesSummed()[Bands.COUNT - 1]).isGreaterThan(40_000);
    assertThat(transfer.remarks()).hasSize(1);
    assertThat(transfer.remarks().get(0).text()).contains("bays");
    assertThat(transfer.bandPower(ones(1), 0)).doesNotContain(0.0).doesNotContain(Double.NaN);
  }

  private static PanelCase inVacuo(Plate plate, double loss) {
    PanelCase panel = Panels.panelCase(plate, loss, Panels.orders(1, 1));
    return withFaces(panel, Optional.empty(), Optional.empty());
  }

  private static PanelCase withFaces(
      PanelCase panel, Optional<FluidFace> outside, Optional<FluidFace> cabin) {
    return new PanelCase(
        panel.plate(),
        panel.lossFactor(),
        outside,
        cabin,
        panel.crossSpectra(),
        panel.convectionSpeed(),
        panel.slices());
  }

  private static PanelCase withSlices(PanelCase panel, BandSlices slices) {
    return new PanelCase(
        panel.plate(),
        panel.lossFactor(),
        panel.outside(),
        panel.cabin(),
        panel.crossSpectra(),
        panel.convectionSpeed(),
        slices);
  }

  private static double[] ones(int perBand) {
    double[] ones = new double[perBand * Bands.COUNT];
    Arrays.fill(ones, 1.0);
    return ones;
  }
}
