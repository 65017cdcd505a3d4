package eddyledger.physics.wallpressure;

import com.fasterxml.jackson.databind.JsonNode;
import eddyledger.physics.flow.AirState;
import eddyledger.physics.flow.BoundaryLayer;
import eddyledger.physics.flow.EdgeFlow;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/** Boundary layers and integrals that several tests of the point spectra need. */
final class LayerStates {
  private LayerStates() {}

  /** A layer whose whole state is given by reference data. */
  static BoundaryLayer of(JsonNode state) {
    double speed = state.get("Ue").asDouble();
    double sound = speed / state.get("Me").asDouble();
    double temperature = sound * sound / (AirState.HEAT_RATIO * AirState.GAS_CONSTANT);
    double pressure = state.get("rhoe").asDouble() * AirState.GAS_CONSTANT * temperature;
    return new BoundaryLayer(
        EdgeFlow.of(new AirState(temperature, pressure), speed),
        state.get("delta").asDouble(),
        state.get("dstar").asDouble(),
        state.get("theta").asDouble(),
        state.get("dstar_c").asDouble(),
        state.get("tau_w").asDouble(),
        state.get("rhow").asDouble(),
        state.get("nuw").asDouble(),
        OptionalDouble.empty(),
        List.of());
  }

  /**
   * The same layer seen in other units: lengths grow by the first factor, times by the second,
   * masses by the third. Temperatures grow with the square of a speed, so that the gas constant
   * keeps its number.
   */
  static BoundaryLayer inOtherUnits(BoundaryLayer layer, double length, double time, double mass) {
    double speed = length / time;
    double pressure = mass / (length * time * time);
    AirState air = layer.edge().air();
    EdgeFlow edge =
        EdgeFlow.of(
            new AirState(air.temperature() * speed * speed, air.pressure() * pressure),
            layer.edgeSpeed() * speed);
    return new BoundaryLayer(
        edge,
        layer.thickness() * length,
        layer.displacementThickness() * length,
        layer.momentumThickness() * length,
        layer.compressibleDisplacementThickness() * length,
        layer.wallShearStress() * pressure,
        layer.wallDensity() * mass / (length * length * length),
        layer.wallKinematicViscosity() * length * speed,
        OptionalDouble.empty(),
        List.of());
  }

  /** Integral over frequency from low to high, Hz, in equal steps of ln f of 16 points each. */
  static double integral(DoubleUnaryOperator density, double low, double high, int steps) {
    GaussIntegratorFactory rules = new GaussIntegratorFactory();
    double width = Math.log(high / low) / steps;
    double sum = 0.0;
    for (int i = 0; i < steps; i++) {
      double start = Math.log(low) + i * width;
      GaussIntegrator rule = rules.legendre(16, start, start + width);
      sum += rule.integrate(x -> density.applyAsDouble(Math.exp(x)) * Math.exp(x));
    }
    return sum;
  }
}
