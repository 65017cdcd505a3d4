package eddyledger.physics.vibration;

import eddyledger.physics.Remark;
import eddyledger.physics.wallpressure.SeparableCrossSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Progress;
import java.util.List;

/**
 * Sound power radiated by a panel, and its mean-square velocity, under a wall pressure of unit
 * density, by the sum over its modes.
 *
 * <p>Formula: G_v²(f) = Σ_mn 4ω² G_pp j_m j_n / {m''² [(ω_mn² − ω²)² + (η ω_mn²)²]} and W(f) = ρc S
 * Σ_mn σ_mn G_v²,mn, with η ω_mn² = η_s ω_mn² + Σ_faces ρc σ_mn(ω/c) ω/m''. Each band is cut into
 * slices; everything but the resonance is frozen at a slice's geometric centre, the resonance is
 * integrated over the slice.
 *
 * <p>Symbols: G_pp one-sided wall-pressure density, Pa²/Hz, as on a rigid wall; j_m, j_n joint
 * acceptances ({@link JointAcceptance}); σ_mn radiation efficiency ({@link RadiationEfficiency});
 * ρ, c of the cabin in W and of each loading face in the damping; m'' surface mass, kg/m²; S area,
 * m²; η_s structural loss factor.
 *
 * <p>Source: modal theory of a panel under random pressure (F. Fahy and P. Gardonio, "Sound and
 * Structural Vibration", 2nd ed. 2007, chapters 2 and 3, from memory), summed in closed form.
 *
 * <p>Range: light fluid; modes radiate each by themselves. The coupling left out is at most 0.1 dB
 * under a cross-spectrum of order 1, up to 1.7 dB in the lowest two bands with modes under orders
 * (2, 1), 0.2 dB above (measured on three panels). The outside face only damps: within 0.8 to 1.2
 * times a slice's frequency by its own σ, farther off, where damping hardly counts, by the cabin's.
 * Any number of modes; above 20000 a remark proposes bays.
 *
 * <p>One-sided, per hertz; power in W, velocity as mean square over time and area.
 *
 * <p>Checked by {@code PanelResponseReferenceTest}.
 */
public final class PanelResponse {
  private static final int MANY_MODES = 20_000;

  /** Squares of the frequency ratios between which a mode is damped by the outside's own σ. */
  private static final double NEAR_BELOW = 0.64;

  private static final double NEAR_ABOVE = 1.44;

  private final RadiationCache cache;

  /** With radiation efficiencies kept in a cache, which several threads may use at once. */
  public PanelResponse(RadiationCache cache) {
    this.cache = cache;
  }

  /**
   * Computes one piece of panel; the result does not depend on threads or on the cache's content.
   *
   * @param panel what to compute
   * @param progress told of each band, asked before each
   * @throws java.util.concurrent.CancellationException if it was cancelled
   * @throws IllegalArgumentException if a convection speed is not above 0
   */
  public PanelTransfer of(PanelCase panel, Progress progress) {
    return new Run(panel, cache).all(progress);
  }

  /** State of one computation. */
  private static final class Run {
    private final PanelCase panel;
    private final ModeGrid grid;
    private final ModalSum sum;
    private final FaceRadiation cabin;
    private final FaceRadiation outside;
    private final double[][] power;
    private final double[][] velocity;

    Run(PanelCase panel, RadiationCache cache) {
      this.panel = panel;
      grid = new ModeGrid(panel.plate());
      int count = panel.crossSpectra().size();
      sum = new ModalSum(grid.modesAlong(), count);
      RadiationTable table = cache.table(panel.plate().length(), panel.plate().width());
      cabin = panel.cabin().map(fluid -> new FaceRadiation(table, fluid)).orElse(null);
      outside = panel.outside().map(fluid -> new FaceRadiation(table, fluid)).orElse(null);
      power = new double[count][panel.slices().count()];
      velocity = new double[count][panel.slices().count()];
    }

    /** From the highest band down, as {@link FaceRadiation} wants it. */
    PanelTransfer all(Progress progress) {
      int[] summed = new int[Bands.COUNT];
      int[] inBand = new int[Bands.COUNT];
      for (int band = Bands.COUNT - 1; band >= 0; band--) {
        progress.check();
        int[] kept = grid.kept(band);
        int modesAlong = 0;
        for (int row : kept) {
          modesAlong = Math.max(modesAlong, row);
          summed[band] += row;
        }
        for (int i = panel.slices().perBand() - 1; i >= 0; i--) {
          slice(band, band * panel.slices().perBand() + i, kept, modesAlong);
        }
        inBand[band] = grid.inBand(band);
        progress.done(Bands.COUNT - band, Bands.COUNT);
      }
      double first = grid.lowest() / (2.0 * Math.PI);
      return new PanelTransfer(
          panel.slices(), power, velocity, summed, inBand, first, remarks(summed));
    }

    private void slice(int band, int slice, int[] kept, int modesAlong) {
      double omega = 2.0 * Math.PI * panel.slices().centre(slice);
      double speed = panel.convectionSpeed().applyAsDouble(panel.slices().centre(slice));
      Require.positive(speed, "convection speed");
      List<SeparableCrossSpectrum> spectra = panel.crossSpectra();
      double[][] along = new double[spectra.size()][];
      double[][] across = new double[spectra.size()][];
      for (int i = 0; i < along.length; i++) {
        SeparableCrossSpectrum spectrum = spectra.get(i);
        along[i] =
            JointAcceptance.all(
                spectrum.alongFlow(omega, speed), panel.plate().length(), modesAlong);
        across[i] =
            JointAcceptance.all(
                spectrum.acrossFlow(omega, speed), panel.plate().width(), kept.length);
      }
      double load = omega / panel.plate().surfaceMass();
      double cabinLoad = turn(cabin, omega, kept, modesAlong) * load;
      double outsideLoad = turn(outside, omega, kept, modesAlong) * load;
      sum.clear();
      double[] acrossRow = new double[along.length];
      for (int n = 0; n < kept.length; n++) {
        radiation(n, kept[n], omega);
        for (int i = 0; i < acrossRow.length; i++) {
          acrossRow[i] = across[i][n];
        }
        sum.addRow(
            grid.squares()[n],
            kept[n],
            panel.lossFactor()[band],
            cabinLoad,
            outsideLoad,
            2.0 * Math.PI * panel.slices().lower(slice),
            2.0 * Math.PI * panel.slices().upper(slice),
            acrossRow);
      }
      double mass = panel.plate().surfaceMass();
      // 4/m''² of the formula, and 1/2π from the integral over angular frequency
      double scale = 2.0 / (Math.PI * mass * mass);
      double impedance = cabin == null ? 0.0 : cabin.impedance() * panel.plate().area();
      for (int i = 0; i < along.length; i++) {
        velocity[i][slice] = scale * sum.velocity(i, along[i]);
        power[i][slice] = scale * impedance * sum.power(i, along[i]);
      }
    }

    /** Turns a face to the slice's frequency; ρc of the face, 0 if there is none. */
    private static double turn(FaceRadiation face, double omega, int[] kept, int modesAlong) {
      if (face == null) {
        return 0.0;
      }
      face.turnTo(omega, modesAlong, kept.length);
      return face.impedance();
    }

    /**
     * Reads σ of a row. The outside face only damps, and damping only counts near resonance:
     * farther off the cabin's σ stands in for the outside's, which differs by the air alone.
     */
    private void radiation(int n, int count, double omega) {
      if (cabin != null) {
        cabin.read(n, 0, count, sum.cabin());
      }
      if (outside == null) {
        return;
      }
      int from = 0;
      int to = count;
      if (cabin != null) {
        System.arraycopy(sum.cabin(), 0, sum.outside(), 0, count);
        double[] squares = grid.squares()[n];
        from = Math.min(count, ModeGrid.below(squares, NEAR_BELOW * omega * omega));
        to = Math.min(count, ModeGrid.below(squares, NEAR_ABOVE * omega * omega));
      }
      outside.read(n, from, to, sum.outside());
    }

    private static List<Remark> remarks(int[] summed) {
      int most = summed[Bands.COUNT - 1];
      if (most <= MANY_MODES) {
        return List.of();
      }
      return List.of(
          Remark.note(
              "very many modes",
              "The highest band sums "
                  + most
                  + " modes. Entered as several equal bays with a count, the panel takes less"
                  + " time."));
    }
  }
}
