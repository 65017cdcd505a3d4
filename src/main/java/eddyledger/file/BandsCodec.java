package eddyledger.file;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.BandTable;
import eddyledger.model.Evidence;
import eddyledger.model.JudgedBands;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** Judged values per band: a plain number, or a table with low, high and the evidence. */
final class BandsCodec implements ValueCodec<JudgedBands> {
  static final BandsCodec BANDS = new BandsCodec();

  private BandsCodec() {}

  @Override
  public Set<String> keys() {
    return Stream.concat(
            TableCodec.KEYS.stream(),
            Stream.of("low", "high", EvidenceCodec.GRADE, EvidenceCodec.KIND, EvidenceCodec.SOURCE))
        .collect(Collectors.toSet());
  }

  @Override
  public JudgedBands read(JsonValue value) {
    if (!value.isObject()) {
      return JudgedBands.of(TableCodec.plain(value));
    }
    JsonObject object = value.object();
    BandTable low = TableCodec.read(object.value("low"));
    BandTable high = TableCodec.read(object.value("high"));
    Evidence evidence = EvidenceCodec.read(object, EvidenceCodec.KIND);
    return new JudgedBands(TableCodec.TABLE.read(object), low, high, evidence);
  }

  @Override
  public ObjectNode write(JudgedBands value) {
    JsonBuilder builder =
        TableCodec.content(value.best()).table("low", value.low()).table("high", value.high());
    EvidenceCodec.write(builder, value.evidence(), EvidenceCodec.KIND);
    return builder.with(value.best().extras());
  }

  @Override
  public JsonNode brief(ObjectNode full) {
    return TableCodec.brief(full);
  }
}
