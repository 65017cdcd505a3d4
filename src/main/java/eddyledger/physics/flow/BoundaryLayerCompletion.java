package eddyledger.physics.flow;

import static eddyledger.physics.Wording.number;

import eddyledger.physics.Remark;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A complete boundary layer from whatever is known of it; what is given is never altered.
 *
 * <p>Rules: with no thickness or one, {@link WallWakeClosure} is anchored on that thickness, else
 * on the running length through {@link WhiteFriction}, else on the wall shear stress, and gives
 * what is missing. With two thicknesses, {@link ShapeRelation} gives the third; with two or three,
 * {@link LudwiegTillmann} gives missing friction. A missing running length is the one that would
 * lead to the momentum thickness. All formulas are incompressible ones at {@link EckertReference}'s
 * temperature: kinematic thicknesses come out as they are, τ_w = ρ* U_e² C_f/2.
 *
 * <p>Source: the combination and its order are this program's own rules; the parts name theirs.
 *
 * <p>Range: H from 1.15 to 2.4, δ/δ* from 3 to 12, C_f from 5e-4 to 6e-3, Re_x from 5e5 to 1e9;
 * outside, a remark. What no layer can have throws.
 *
 * <p>Checked by {@code BoundaryLayerReferenceTest} and {@code BoundaryLayerCompletionTest}.
 */
public final class BoundaryLayerCompletion {
  /** Ratio of lengths from which on a given thickness and a given length are called at odds. */
  private static final double CONTRADICTION = 2.0;

  private final EdgeFlow edge;
  private final LayerAir air;
  private final BoundaryLayerInput input;
  private final double unitReynolds;
  private final List<Remark> remarks = new ArrayList<>();

  private BoundaryLayerCompletion(EdgeFlow edge, LayerAir air, BoundaryLayerInput input) {
    this.edge = edge;
    this.air = air;
    this.input = input;
    this.unitReynolds = edge.speed() / air.reference().kinematicViscosity();
  }

  /**
   * Fills in what is missing.
   *
   * @param edge flow at the edge
   * @param input what is known of the layer
   * @return the layer; every quantity that was filled in has its remark
   * @throws IllegalArgumentException if no boundary layer has what is given
   */
  public static BoundaryLayer complete(EdgeFlow edge, BoundaryLayerInput input) {
    return complete(edge, EckertReference.adiabatic(edge), input);
  }

  /** As {@link #complete(EdgeFlow, BoundaryLayerInput)}, with the airs of the layer as given. */
  static BoundaryLayer complete(EdgeFlow edge, LayerAir air, BoundaryLayerInput input) {
    return new BoundaryLayerCompletion(edge, air, input).layer();
  }

  private BoundaryLayer layer() {
    return input.thicknessCount() < 2 ? fromAnchor() : fromThicknesses();
  }

  private BoundaryLayer fromAnchor() {
    WallWakeClosure closure =
        new WallWakeClosure(edge.speed(), air.reference().kinematicViscosity());
    WallWakeState anchor;
    String rule = "from the law of the wall with wake, anchored on the ";
    if (input.thickness() != null) {
      anchor = closure.fromThickness(input.thickness());
      rule += "boundary-layer thickness";
    } else if (input.displacementThickness() != null) {
      anchor = closure.fromDisplacementThickness(input.displacementThickness());
      rule += "displacement thickness";
    } else if (input.momentumThickness() != null) {
      anchor = closure.fromMomentumThickness(input.momentumThickness());
      rule += "momentum thickness";
    } else if (input.runningLength() != null) {
      double momentum = WhiteFriction.momentumThickness(input.runningLength(), unitReynolds);
      anchor = closure.fromMomentumThickness(momentum);
      rule += "running length";
    } else {
      anchor = closure.fromSpeedRatio(Math.sqrt(stressAt(1.0) * 2.0 / input.wallShearStress()));
      rule += "wall shear stress";
    }
    double friction = 2.0 / (anchor.speedRatio() * anchor.speedRatio());
    return finish(
        given("boundary-layer thickness", input.thickness(), anchor.thickness(), "m", rule),
        given(
            "displacement thickness",
            input.displacementThickness(),
            anchor.displacementThickness(),
            "m",
            rule),
        given(
            "momentum thickness", input.momentumThickness(), anchor.momentumThickness(), "m", rule),
        given("wall shear stress", input.wallShearStress(), stressAt(friction), "Pa", rule));
  }

  private BoundaryLayer fromThicknesses() {
    Double delta = input.thickness();
    Double displacement = input.displacementThickness();
    Double momentum = input.momentumThickness();
    String rule = "from the two other thicknesses by the shape relation of Drela and Giles";
    if (delta == null) {
      double found = ShapeRelation.thickness(displacement, momentum);
      delta = given("boundary-layer thickness", null, found, "m", rule);
    } else if (displacement == null) {
      double found = ShapeRelation.displacement(delta, momentum);
      displacement = given("displacement thickness", null, found, "m", rule);
    } else if (momentum == null) {
      double found = ShapeRelation.momentum(delta, displacement);
      momentum = given("momentum thickness", null, found, "m", rule);
    }
    if (input.wallShearStress() != null) {
      return finish(delta, displacement, momentum, input.wallShearStress());
    }
    double reynolds = unitReynolds * momentum;
    double friction = LudwiegTillmann.skinFriction(displacement / momentum, reynolds);
    remarks.addAll(LudwiegTillmann.remarks(reynolds));
    rule = "from shape factor and momentum thickness after Ludwieg and Tillmann";
    double stress = given("wall shear stress", null, stressAt(friction), "Pa", rule);
    return finish(delta, displacement, momentum, stress);
  }

  /** The given value, or the found one with a remark that it was filled in. */
  private double given(String quantity, Double given, double found, String unit, String rule) {
    if (given != null) {
      return given;
    }
    remarks.add(
        Remark.filledIn(
            quantity, quantity + " " + number(found) + " " + unit + " filled in " + rule));
    return found;
  }

  private double stressAt(double skinFriction) {
    return 0.5 * air.reference().density() * edge.speed() * edge.speed() * skinFriction;
  }

  private BoundaryLayer finish(double delta, double displacement, double momentum, double stress) {
    OptionalDouble length = runningLength(momentum);
    remarks.addAll(
        BoundaryLayerRange.remarks(
            edge, delta, displacement, momentum, stress, length, unitReynolds));
    return new BoundaryLayer(
        edge,
        delta,
        displacement,
        momentum,
        EckertReference.compressibleDisplacement(air, displacement, momentum),
        stress,
        air.wall().density(),
        air.wall().kinematicViscosity(),
        length,
        remarks);
  }

  private OptionalDouble runningLength(double momentum) {
    OptionalDouble implied = WhiteFriction.runningLength(momentum, unitReynolds);
    Double given = input.runningLength();
    if (given != null) {
      implied.ifPresent(length -> noteContradiction(given, length));
      return OptionalDouble.of(given);
    }
    if (implied.isPresent()) {
      String rule = "as the length of turbulent flow that would give this momentum thickness";
      given("running length", null, implied.getAsDouble(), "m", rule);
    } else {
      remarks.add(
          Remark.note(
              "no running length",
              "no running length of turbulent flow gives so thin a momentum thickness"));
    }
    return implied;
  }

  private void noteContradiction(double given, double implied) {
    double ratio = implied / given;
    if (ratio > CONTRADICTION || ratio < 1.0 / CONTRADICTION) {
      String thickness = "the given thickness belongs to a running length of ";
      String length = number(implied) + " m, the given running length is " + number(given) + " m";
      remarks.add(Remark.note("thickness at odds with the running length", thickness + length));
    }
  }
}
