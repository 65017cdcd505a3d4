package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.Construction;
import eddyledger.model.Extras;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Tension;

/** A construction; the type says of which kind. */
final class ConstructionCodec implements RecordCodec<Construction> {
  static final ConstructionCodec CONSTRUCTION = new ConstructionCodec();

  private static final String TYPE = "type";
  private static final String[] TYPES = {"plate"};
  private static final String THICKNESS = "thickness_m";
  private static final String YOUNGS_MODULUS = "youngs_modulus_Pa";
  private static final String DENSITY = "density_kg_per_m3";
  private static final String POISSON_RATIO = "poisson_ratio";
  private static final String RADIUS = "radius_m";
  private static final String TENSION = "tension";

  private ConstructionCodec() {}

  @Override
  public Construction read(JsonObject object) {
    object.requiredChoice(TYPE, TYPES);
    return new PlateConstruction(
        object.text("id"),
        object.requiredText("name"),
        object.requiredNumber(THICKNESS),
        object.requiredNumber(YOUNGS_MODULUS),
        object.requiredNumber(DENSITY),
        object.requiredNumber(POISSON_RATIO),
        object.number(RADIUS),
        object.record(TENSION, TensionCodec.IN_PLANE),
        EvidenceCodec.read(object, EvidenceCodec.KIND),
        object.extras());
  }

  /** The type, unless another one was read that this version does not know: that one is kept. */
  private static String typeUnless(Extras extras) {
    return extras.properties().containsKey(TYPE) ? null : TYPES[0];
  }

  @Override
  public ObjectNode write(Construction construction) {
    PlateConstruction plate = (PlateConstruction) construction;
    JsonBuilder builder =
        new JsonBuilder()
            .text("id", plate.id())
            .name("name", plate.name())
            .text(TYPE, typeUnless(plate.extras()))
            .number(THICKNESS, plate.thickness())
            .number(YOUNGS_MODULUS, plate.youngsModulus())
            .number(DENSITY, plate.density())
            .number(POISSON_RATIO, plate.poissonRatio())
            .number(RADIUS, plate.radius())
            .record(TENSION, plate.tension(), TensionCodec.IN_PLANE);
    EvidenceCodec.write(builder, plate.evidence(), EvidenceCodec.KIND);
    return builder.with(plate.extras());
  }

  /** An in-plane tension. */
  private static final class TensionCodec implements RecordCodec<Tension> {
    static final TensionCodec IN_PLANE = new TensionCodec();

    private static final String SKIN_SHARE = "skin_share";
    private static final String ALONG = "along_N_per_m";
    private static final String ACROSS = "across_N_per_m";

    @Override
    public Tension read(JsonObject object) {
      return new Tension(
          object.read(SKIN_SHARE, NumberCodec.NUMBER),
          object.byCondition(ALONG, NumberCodec.NUMBER),
          object.byCondition(ACROSS, NumberCodec.NUMBER),
          object.extras());
    }

    @Override
    public ObjectNode write(Tension tension) {
      return new JsonBuilder()
          .value(SKIN_SHARE, tension.skinShare(), NumberCodec.NUMBER)
          .byCondition(ALONG, tension.along(), NumberCodec.NUMBER)
          .byCondition(ACROSS, tension.across(), NumberCodec.NUMBER)
          .with(tension.extras());
    }
  }
}
