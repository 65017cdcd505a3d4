package eddyledger.ledger;

import eddyledger.physics.Remark;
import eddyledger.physics.flow.BoundaryLayer;
import java.util.List;
import java.util.Set;

/**
 * What one piece of a panel does, computed or from a measurement. All arrays are per band, shape
 * [28]; they are not to be changed.
 *
 * @param layer the flow and the boundary layer over it
 * @param wallPressureDensity one-sided wall-pressure spectral density at the exact mid-band
 *     frequency, Pa²/Hz
 * @param wallPressure mean-square wall pressure in the band, Pa²
 * @param convectionSpeed convection speed at mid-band, m/s; NaN for a measured panel
 * @param velocitySquared space-mean-square velocity in the band, m²/s²; NaN for a measured panel
 * @param power radiated power in the band, W, for each choice in the order of {@link Choice#all()},
 *     shape [choices][28]
 * @param modes modes summed in the band; 0 for a measured panel
 * @param plate key numbers of the plate; null for a measured panel
 * @param remarks what the formulas say of their use
 * @param beyond ids of the wall-pressure spectra, chosen or alternative, that leave their range
 */
record PanelResult(
    BoundaryLayer layer,
    double[] wallPressureDensity,
    double[] wallPressure,
    double[] convectionSpeed,
    double[] velocitySquared,
    double[][] power,
    int[] modes,
    PlateNumbers plate,
    List<Remark> remarks,
    Set<String> beyond) {

  /**
   * Key numbers of a plate.
   *
   * @param surfaceMass mass per area, kg/m²
   * @param bendingStiffness bending stiffness, N m
   * @param criticalFrequency critical frequency in the cabin's air, Hz
   * @param firstMode natural frequency of the first mode, Hz
   */
  record PlateNumbers(
      double surfaceMass, double bendingStiffness, double criticalFrequency, double firstMode) {}
}
