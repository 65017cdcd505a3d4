package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.Extras;
import eddyledger.model.LayUp;
import eddyledger.model.TableContent;
import eddyledger.model.TabulatedLayUp;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;

/** A lay-up; the type says of which kind. */
final class LayUpCodec implements RecordCodec<LayUp> {
  static final LayUpCodec LAY_UP = new LayUpCodec();

  private static final String TYPE = "type";
  private static final String[] TYPES = {"insertion-loss"};
  private static final String INSERTION_LOSS = "insertion_loss_dB";
  private static final String BASE_MASS = "base_surface_mass_kg_per_m2";
  private static final String INCLUDES = "includes";

  private LayUpCodec() {}

  @Override
  public LayUp read(JsonObject object) {
    object.requiredChoice(TYPE, TYPES);
    return new TabulatedLayUp(
        object.text("id"),
        object.requiredText("name"),
        object.read(INSERTION_LOSS, BandsCodec.BANDS),
        object.number(BASE_MASS),
        includes(object.value(INCLUDES)),
        object.extras());
  }

  private static Set<TableContent> includes(JsonValue value) {
    Set<TableContent> includes = new LinkedHashSet<>();
    for (JsonValue item : value.items()) {
      TableContent content = item.choice(TableContent.values(), TableContent::text);
      if (content == null) {
        item.missing();
      } else {
        includes.add(content);
      }
    }
    return includes;
  }

  /** The type, unless another one was read that this version does not know: that one is kept. */
  private static String typeUnless(Extras extras) {
    return extras.properties().containsKey(TYPE) ? null : TYPES[0];
  }

  /** The members that could not be read; they stand after the others, which have no positions. */
  private static List<?> unreadMembers(Extras extras) {
    return extras.properties().get(INCLUDES) instanceof List<?> members
        ? members.stream().filter(Objects::nonNull).toList()
        : List.of();
  }

  @Override
  public ObjectNode write(LayUp layUp) {
    TabulatedLayUp table = (TabulatedLayUp) layUp;
    // a set has no order of its own, and the same vehicle must give the same bytes
    List<Object> includes = new ArrayList<>();
    table.includes().stream().sorted().map(TableContent::text).forEach(includes::add);
    includes.addAll(unreadMembers(table.extras()));
    JsonBuilder builder =
        new JsonBuilder()
            .text("id", table.id())
            .name("name", table.name())
            .text(TYPE, typeUnless(table.extras()))
            .value(INSERTION_LOSS, table.insertionLoss(), BandsCodec.BANDS)
            .number(BASE_MASS, table.baseSurfaceMass());
    if (!includes.isEmpty()) {
      builder.free(INCLUDES, includes);
    }
    return builder.with(table.extras());
  }
}
