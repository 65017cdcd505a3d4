package eddyledger.ledger;

import eddyledger.ledger.ResolvedPanel.Failure;
import eddyledger.model.Receiver;
import eddyledger.physics.path.InsertionLoss;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;

/**
 * The steps that carry a panel's power to a receiver, per band, shape [28] each; their product with
 * the power of one piece is the mean square at the receiver.
 *
 * @param power radiated power of one piece, W
 * @param count number of pieces
 * @param pathFactor factor of the lay-up on the power, 10^(−IL/10)
 * @param perWatt Pa² at the receiver per watt in the zone
 */
record PanelShare(double[] power, int count, double[] pathFactor, double[] perWatt) {

  /** The steps for a panel that has a result, under a choice of models by its position. */
  static PanelShare of(
      ResolvedPanel panel, PanelResult result, int choice, CabinResponse cabin, Receiver receiver) {
    return new PanelShare(
        result.power()[choice],
        panel.panel().count(),
        pathFactor(panel),
        cabin.perWatt(receiver, panel.zone(), panel.panel().id(), area(panel)));
  }

  /** Area of one piece, m²; NaN for a measured panel. */
  static double area(ResolvedPanel panel) {
    return panel.input() == null
        ? Double.NaN
        : panel.input().plate().length() * panel.input().plate().width();
  }

  /** Insertion loss of the panel's lay-up, dB; zero without one. */
  static BandSpectrum insertionLoss(ResolvedPanel panel) {
    return panel.layUp() == null
        ? BandSpectrum.constant(0.0)
        : panel.layUp().insertionLoss().best().spectrum();
  }

  private static double[] pathFactor(ResolvedPanel panel) {
    double[] ones = new double[Bands.COUNT];
    Arrays.fill(ones, 1.0);
    return InsertionLoss.powers(ones, insertionLoss(panel));
  }

  private PanelShare withPower(double[] other) {
    return new PanelShare(other, count, pathFactor, perWatt);
  }

  /** Mean square at the receiver, Pa². */
  double[] meanSquares() {
    double[] meanSquares = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      meanSquares[band] = power[band] * count * pathFactor[band] * perWatt[band];
    }
    return meanSquares;
  }

  /** The contributions of a panel at a receiver, one for each choice of models. */
  static List<Contribution> contributions(
      LedgerRun run, String panelId, String condition, Receiver receiver) {
    int choices = Choice.all().size();
    Failure failure = failure(run, panelId, condition, receiver);
    if (failure != null) {
      Contribution none = Contribution.none(failure.status(), failure.reason());
      return Collections.nCopies(choices, none);
    }
    ResolvedPanel panel = run.resolved(panelId, condition);
    PanelResult result = run.outcome(panelId, condition).result();
    CabinResponse cabin = run.cabin(condition);
    List<Contribution> contributions = new ArrayList<>();
    PanelShare chosen = of(panel, result, 0, cabin, receiver);
    for (int c = 0; c < choices; c++) {
      double[] meanSquares = chosen.withPower(result.power()[c]).meanSquares();
      contributions.add(
          Contribution.of(
              meanSquares,
              "a band of the absorption, the transmission loss, the insertion loss or the"
                  + " measurement is missing"));
    }
    return contributions;
  }

  /** Why a panel has no contribution at a receiver; null if it has one. */
  static Failure failure(LedgerRun run, String panelId, String condition, Receiver receiver) {
    if (run.failure(condition).isPresent()) {
      return run.failure(condition).get();
    }
    if (run.receiverError(receiver.id()).isPresent()) {
      return new Failure(Status.FAILED, run.receiverError(receiver.id()).get().what());
    }
    return run.outcome(panelId, condition).failure();
  }
}
