package eddyledger.ledger;

import eddyledger.physics.flow.AirState;
import eddyledger.physics.flow.BoundaryLayer;
import eddyledger.physics.flow.BoundaryLayerCompletion;
import eddyledger.physics.flow.BoundaryLayerInput;
import eddyledger.physics.flow.EdgeFlow;
import eddyledger.physics.flow.StandardAtmosphere;
import eddyledger.physics.vibration.BandSlices;
import eddyledger.physics.vibration.FluidFace;
import eddyledger.physics.vibration.PanelCase;
import eddyledger.physics.vibration.PanelResponse;
import eddyledger.physics.vibration.PanelTransfer;
import eddyledger.physics.vibration.Plate;
import eddyledger.physics.vibration.RadiationCache;
import eddyledger.physics.wallpressure.ButterworthCrossSpectrum;
import eddyledger.physics.wallpressure.EfimtsovSpectrum;
import eddyledger.physics.wallpressure.GoodySpectrum;
import eddyledger.physics.wallpressure.WallPressureSpectrum;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Progress;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.IntToDoubleFunction;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.junit.jupiter.api.Test;

/**
 * Some panels of {@link SampleVehicle} computed a second time, straight from the physics with the
 * numbers written out here; octaves, insertion loss, cabin balance and direct sound without it.
 */
class ChainTest {
  private static final double TIGHT = 1.0e-10;
  private static final int FRONT = 0;
  private static final int REAR = 1;
  private static final int TRUNK = 2;
  private static final double[] OCTAVES = {63, 125, 250, 500, 1000, 2000, 4000};
  private static final AirState ROAD = new AirState(283.15, 100_400.0);
  private static final AirState ROAD_CABIN = new AirState(295.15, 100_400.0);
  private static final AirState FLIGHT = StandardAtmosphere.at(9_000.0, 0.0);
  private static final AirState FLIGHT_CABIN = new AirState(296.15, 81_000.0);
  private static final double FLIGHT_SPEED = 0.62 * FLIGHT.soundSpeed();
  private static final Ledger LEDGER = Ledger.of(SampleVehicle.vehicle());

  @Test
  void sideGlassOnTheRoadWithDirectSound() {
    EdgeFlow edge = EdgeFlow.fromSpeed(ROAD, 38.0, 1.2 * 38.0);
    double[] power =
        power(
            edge,
            BoundaryLayerInput.ofThickness(0.02),
            new GoodySpectrum(),
            new ButterworthCrossSpectrum(2, 1, 0.116, 0.7),
            Plate.isotropic(0.32, 0.24, 0.004, 70.0e9, 2500.0, 0.23),
            band -> octaves(band, 125, 0.04, 0.03, 0.02),
            ROAD,
            ROAD_CABIN);
    double area = 0.32 * 0.24;
    double direct =
        ROAD_CABIN.density() * ROAD_CABIN.soundSpeed() / (area + 2.0 * Math.PI * 0.7 * 0.7);
    double[] expected = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      double absorbed = front(band) / 14.0;
      double answer = (1.0 - absorbed) * diffuse(band, FRONT, FRONT, 0.5, ROAD_CABIN) + direct;
      expected[band] = 2.0 * power[band] * answer;
    }
    check("side-glass", "road", "driver", expected);
  }

  @Test
  void floorInFlightHeardInTheNextZone() {
    double[] power =
        power(
            EdgeFlow.fromSpeed(FLIGHT, FLIGHT_SPEED, FLIGHT_SPEED),
            BoundaryLayerInput.ofRunningLength(2.5),
            new GoodySpectrum(),
            new ButterworthCrossSpectrum(2, 1, 0.116, 0.7),
            Plate.isotropic(0.3, 0.2, 0.003, 205.0e9, 7850.0, 0.29),
            band -> octaves(band, 125, 0.04, 0.03, 0.02),
            FLIGHT,
            FLIGHT_CABIN);
    double[] expected = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      double loss = octaves(band, 63, -2.0, 0.0, 4.0, 9.0, 15.0, 20.0);
      double zone = 3.0 * power[band] * Math.pow(10.0, -loss / 10.0);
      expected[band] = zone * diffuse(band, REAR, FRONT, 0.7, FLIGHT_CABIN);
    }
    check("floor", "flight", "passenger", expected);
  }

  @Test
  void roofUnderTensionHeardTwoZonesAway() {
    double load = 0.6 * (81_000.0 - FLIGHT.pressure()) * 1.4;
    double[] power =
        power(
            EdgeFlow.fromSpeed(FLIGHT, FLIGHT_SPEED, FLIGHT_SPEED),
            BoundaryLayerInput.ofThickness(0.02),
            new EfimtsovSpectrum(),
            new ButterworthCrossSpectrum(2, 1, 0.116, 0.7),
            Plate.isotropic(0.3, 0.2, 0.0025, 71.0e9, 2780.0, 0.33)
                .withRadius(71.0e9, 2780.0, 1.4)
                .withTension(load / 2.0, load),
            band -> 0.03,
            FLIGHT,
            FLIGHT_CABIN);
    double[] expected = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      double zone = 4.0 * power[band] * Math.pow(10.0, -(-1.5 + 0.8 * band) / 10.0);
      expected[band] = zone * diffuse(band, TRUNK, REAR, 0.7, FLIGHT_CABIN);
    }
    check("roof", "flight", "trunk-ear", expected);
  }

  @Test
  void measuredHatchOnTheRoad() {
    BoundaryLayer layer =
        BoundaryLayerCompletion.complete(
            EdgeFlow.fromSpeed(ROAD, 38.0, 38.0), BoundaryLayerInput.ofThickness(0.02));
    double[] expected = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      double outside = bandMeanSquare(new GoodySpectrum(), layer, band);
      double inside =
          outside * Math.pow(10.0, -octaves(band, 63, 52.0, 58.0, 64.0, 70.0, 76.0) / 10.0);
      double power = inside * 10.0 / (4.0 * ROAD_CABIN.density() * ROAD_CABIN.soundSpeed());
      expected[band] = power * diffuse(band, REAR, REAR, 0.5, ROAD_CABIN);
    }
    check("hatch", "road", "passenger", expected);
  }

  private static void check(String panel, String condition, String receiver, double[] expected) {
    LedgerRow row = Sheets.row(LEDGER, condition, receiver, panel);
    Sheets.assertClose(row.meanSquares(), BandSpectrum.of(expected), TIGHT, panel);
  }

  private static double[] power(
      EdgeFlow edge,
      BoundaryLayerInput known,
      WallPressureSpectrum spectrum,
      ButterworthCrossSpectrum cross,
      Plate plate,
      IntToDoubleFunction lossFactor,
      AirState outside,
      AirState cabin) {
    BoundaryLayer layer = BoundaryLayerCompletion.complete(edge, known);
    double[] losses = new double[Bands.COUNT];
    Arrays.setAll(losses, lossFactor);
    PanelCase panel =
        PanelCase.of(
            plate,
            losses,
            Optional.of(new FluidFace(outside.density(), outside.soundSpeed())),
            Optional.of(new FluidFace(cabin.density(), cabin.soundSpeed())),
            List.of(cross),
            frequency -> 0.7 * edge.speed());
    PanelTransfer transfer = new PanelResponse(new RadiationCache()).of(panel, Progress.NONE);
    double[] centres = transfer.slices().centres();
    double[] density = new double[centres.length];
    Arrays.setAll(density, i -> spectrum.spectralDensity(centres[i], layer));
    return transfer.bandPower(density, 0);
  }

  private static double bandMeanSquare(
      WallPressureSpectrum spectrum, BoundaryLayer layer, int band) {
    BandSlices slices = new BandSlices(12);
    double sum = 0.0;
    for (int i = band * 12; i < (band + 1) * 12; i++) {
      sum += spectrum.spectralDensity(slices.centre(i), layer) * slices.width(i);
    }
    return sum;
  }

  /** Linear in lg f between octave centres, flat beyond them. */
  private static double octaves(int band, double first, double... values) {
    int from = Arrays.binarySearch(OCTAVES, first);
    double position = (Bands.index(band) + 12) / 3.0 - from;
    int below = Math.max(0, Math.min(values.length - 1, (int) Math.floor(position)));
    int above = Math.min(values.length - 1, below + 1);
    double share = Math.max(0.0, Math.min(1.0, position - below));
    return values[below] + share * (values[above] - values[below]);
  }

  private static double front(int band) {
    return octaves(band, 125, 1.2, 2.0, 3.1, 3.6, 3.9, 4.0);
  }

  /** Pa² in a zone per watt in another, by inverting the balance of the three zones. */
  private static double diffuse(int band, int receiver, int source, double trunk, AirState cabin) {
    double passage = 0.8;
    double shelf =
        0.6 * Math.pow(10.0, -octaves(band, 63, 6.0, 9.0, 12.0, 16.0, 20.0, 24.0) / 10.0);
    double rear = 1.1 + 0.05 * band;
    RealMatrix balance =
        new Array2DRowRealMatrix(
            new double[][] {
              {front(band) + passage, -passage, 0.0},
              {-passage, rear + passage + shelf, -shelf},
              {0.0, -shelf, trunk + shelf}
            });
    double inverse =
        new LUDecomposition(balance).getSolver().getInverse().getEntry(receiver, source);
    return 4.0 * cabin.density() * cabin.soundSpeed() * inverse;
  }
}
