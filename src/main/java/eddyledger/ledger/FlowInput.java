package eddyledger.ledger;

import eddyledger.model.EdgeSpeed;
import eddyledger.physics.flow.AirState;
import eddyledger.physics.flow.BoundaryLayer;
import eddyledger.physics.flow.BoundaryLayerCompletion;
import eddyledger.physics.flow.BoundaryLayerInput;
import eddyledger.physics.flow.EdgeFlow;

/**
 * The flow over a panel as it is computed with.
 *
 * @param outside the air far from the vehicle
 * @param vehicleSpeed speed of the vehicle, m/s
 * @param way how the local speed is given
 * @param value speed in m/s, ratio or pressure coefficient, as the way says
 * @param layer what is known of the boundary layer
 */
record FlowInput(
    AirState outside,
    double vehicleSpeed,
    EdgeSpeed.Way way,
    double value,
    BoundaryLayerInput layer) {

  /** The flow at the edge of the boundary layer. */
  EdgeFlow edge() {
    return switch (way) {
      case SPEED -> EdgeFlow.fromSpeed(outside, vehicleSpeed, value);
      case RATIO -> EdgeFlow.fromSpeedRatio(outside, vehicleSpeed, value);
      case PRESSURE_COEFFICIENT -> EdgeFlow.fromPressureCoefficient(outside, vehicleSpeed, value);
      case PRESSURE_COEFFICIENT_INCOMPRESSIBLE ->
          EdgeFlow.incompressible(outside, vehicleSpeed, value);
    };
  }

  /** The whole boundary layer. */
  BoundaryLayer boundaryLayer() {
    return BoundaryLayerCompletion.complete(edge(), layer);
  }
}
