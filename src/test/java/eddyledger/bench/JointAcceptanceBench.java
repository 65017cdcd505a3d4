package eddyledger.bench;

import eddyledger.physics.vibration.JointAcceptance;
import eddyledger.physics.wallpressure.ButterworthCrossSpectrum;
import eddyledger.physics.wallpressure.ExponentialTerms;
import java.util.concurrent.TimeUnit;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/**
 * Joint acceptance along the flow of the first 40 modes of 0.9 m at 1 kHz and 28 m/s, order 2: the
 * closed form against adaptive quadrature of the autocorrelation form, to 1e-8. Time for one mode.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class JointAcceptanceBench {
  private static final int MODES = 40;
  private static final double LENGTH = 0.9;

  private final ExponentialTerms terms =
      new ButterworthCrossSpectrum(2, 1, 0.116, 0.7).alongFlow(2.0 * Math.PI * 1000.0, 28.0);

  @Benchmark
  @OperationsPerInvocation(MODES)
  public double[] closedForm() {
    return JointAcceptance.all(terms, LENGTH, MODES);
  }

  @Benchmark
  @OperationsPerInvocation(MODES)
  public double[] closedFormOneByOne() {
    double[] all = new double[MODES];
    for (int m = 1; m <= MODES; m++) {
      all[m - 1] = JointAcceptance.of(terms, LENGTH, m);
    }
    return all;
  }

  @Benchmark
  @OperationsPerInvocation(MODES)
  public double[] adaptiveQuadrature() {
    double[] all = new double[MODES];
    for (int m = 1; m <= MODES; m++) {
      all[m - 1] = quadrature(m);
    }
    return all;
  }

  /** ∫_0^1 [(1 − u) cos Mu + sin(Mu)/M] f(uL) cos(k_c uL) du. */
  private double quadrature(int mode) {
    double pole = mode * Math.PI;
    return new IterativeLegendreGaussIntegrator(20, 1e-8, 1e-14, 2, 64)
        .integrate(
            1_000_000,
            u ->
                ((1.0 - u) * Math.cos(pole * u) + Math.sin(pole * u) / pole)
                    * terms.coherence(u * LENGTH)
                    * Math.cos(terms.wavenumber() * u * LENGTH),
            0.0,
            1.0);
  }
}
