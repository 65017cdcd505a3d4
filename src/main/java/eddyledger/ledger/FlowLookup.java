package eddyledger.ledger;

import eddyledger.model.EdgeSpeed;
import eddyledger.model.Judged;
import eddyledger.model.LayerGiven;
import eddyledger.model.Settings;
import eddyledger.model.WallPressureChoice;
import eddyledger.physics.flow.BoundaryLayerInput;

/**
 * What computed and measured panels alike look up: the flow over them and the zone below.
 *
 * @param zone id of the zone; null if nobody set it
 * @param speed local flow speed; null if nobody set it
 * @param layer boundary layer; null if nobody set it
 * @param spectrum id of the wall-pressure spectrum
 */
record FlowLookup(String zone, EdgeSpeed speed, LayerGiven layer, String spectrum) {
  /** Wall-pressure spectrum where none is chosen. */
  static final String SPECTRUM = "goody";

  static FlowLookup of(PanelLookup look) {
    String zone = look.fixed("zone", Settings::zone);
    if (zone != null) {
      look.origins().uses(zone);
    }
    return new FlowLookup(
        zone,
        look.varying("local_speed", Settings::localSpeed),
        look.varying("boundary_layer", Settings::boundaryLayer),
        look.orDefault("wall_pressure", Settings::wallPressure, WallPressureChoice.of(SPECTRUM))
            .model());
  }

  /** The flow in a condition, once it is known that nothing of it is missing. */
  FlowInput input(ResolvedCondition condition) {
    return new FlowInput(
        condition.outside(),
        condition.speed(),
        speed.way(),
        speed.value().best(),
        new BoundaryLayerInput(
            best(layer.runningLength()),
            best(layer.thickness()),
            best(layer.displacementThickness()),
            best(layer.momentumThickness()),
            best(layer.wallShear())));
  }

  private static Double best(Judged value) {
    return value == null ? null : Double.valueOf(value.best());
  }
}
