package eddyledger.ledger;

import eddyledger.ledger.ResolvedPanel.MeasuredInput;
import eddyledger.model.JudgedBands;
import eddyledger.physics.Remark;
import eddyledger.physics.flow.BoundaryLayer;
import eddyledger.physics.path.LevelDifference;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;

/** What one piece of a panel does that is given by a measured level difference. */
final class MeasuredPhysics {
  private MeasuredPhysics() {}

  /**
   * The result of a measured panel.
   *
   * @throws IllegalArgumentException if the flow cannot be
   */
  static PanelResult compute(ResolvedPanel panel, CabinResponse cabin) {
    MeasuredInput input = panel.measured();
    BoundaryLayer layer = input.flow().boundaryLayer();
    JudgedBands stated = input.data().absorptionArea();
    BandSpectrum area = stated == null ? cabin.absorption(panel.zone()) : stated.best().spectrum();
    BandSpectrum difference = input.data().levelDifference().best().spectrum();
    List<Choice> choices = Choice.all();
    Map<String, WallPressureBands> walls =
        WallPressureBands.under(layer, choices, input.spectrum());
    WallPressureBands chosen = walls.get(input.spectrum());
    double[][] power = new double[choices.size()][Bands.COUNT];
    for (int c = 0; c < choices.size(); c++) {
      double[] wall = walls.get(choices.get(c).spectrum(input.spectrum())).meanSquares();
      for (int band = 0; band < Bands.COUNT; band++) {
        boolean known = difference.has(band) && area.has(band);
        power[c][band] =
            known
                ? LevelDifference.power(
                    wall[band], difference.value(band), area.value(band), cabin.impedance())
                : Double.NaN;
      }
    }
    List<Remark> remarks = new ArrayList<>(layer.edge().remarks());
    remarks.addAll(layer.remarks());
    remarks.addAll(chosen.remarks());
    double[] unknown = new double[Bands.COUNT];
    Arrays.fill(unknown, Double.NaN);
    return new PanelResult(
        layer,
        chosen.densities(),
        chosen.meanSquares(),
        unknown,
        unknown,
        power,
        new int[Bands.COUNT],
        null,
        remarks,
        WallPressureBands.beyond(walls));
  }
}
