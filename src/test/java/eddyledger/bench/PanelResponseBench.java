package eddyledger.bench;

import eddyledger.physics.vibration.BandSlices;
import eddyledger.physics.vibration.FluidFace;
import eddyledger.physics.vibration.PanelCase;
import eddyledger.physics.vibration.PanelResponse;
import eddyledger.physics.vibration.PanelTransfer;
import eddyledger.physics.vibration.Plate;
import eddyledger.physics.vibration.RadiationCache;
import eddyledger.physics.wallpressure.ButterworthCrossSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Progress;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * A side glass, 28 bands in 12 slices, orders (2, 1): with nothing known and with radiation known.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 5, time = 1)
public class PanelResponseBench {
  private final FluidFace cabinAir = new FluidFace(1.2041, 343.21);
  private final FluidFace outsideAir = new FluidFace(1.29, 331.4);
  private final PanelResponse warm = new PanelResponse(new RadiationCache());
  private final PanelCase oneFace = glass(Optional.empty());
  private final PanelCase bothFaces = glass(Optional.of(outsideAir));

  private PanelCase glass(Optional<FluidFace> outside) {
    double[] loss = new double[Bands.COUNT];
    Arrays.fill(loss, 0.02);
    return new PanelCase(
        Plate.isotropic(0.9, 0.45, 0.00385, 70e9, 2500.0, 0.23),
        loss,
        outside,
        Optional.of(cabinAir),
        List.of(new ButterworthCrossSpectrum(2, 1, 0.116, 0.7)),
        f -> 28.0,
        new BandSlices(12));
  }

  @Benchmark
  public PanelTransfer cold() {
    return new PanelResponse(new RadiationCache()).of(oneFace, Progress.NONE);
  }

  @Benchmark
  public PanelTransfer radiationKnown() {
    return warm.of(oneFace, Progress.NONE);
  }

  @Benchmark
  public PanelTransfer coldTwoAirs() {
    return new PanelResponse(new RadiationCache()).of(bothFaces, Progress.NONE);
  }

  @Benchmark
  public PanelTransfer radiationKnownTwoAirs() {
    return warm.of(bothFaces, Progress.NONE);
  }
}
