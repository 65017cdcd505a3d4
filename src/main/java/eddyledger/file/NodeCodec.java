package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.Evidence;
import eddyledger.model.MeasuredPanel;
import eddyledger.model.Node;
import eddyledger.model.Panel;
import eddyledger.model.Section;
import eddyledger.model.Settings;
import java.util.List;

/** A section or a panel. Where the kind is not said, children make a section. */
final class NodeCodec implements RecordCodec<Node> {
  static final NodeCodec NODE = new NodeCodec();

  private static final String KIND = "kind";
  private static final String CHILDREN = "children";
  private static final String COUNT = "count";
  private static final String MEASURED = "measured";
  private static final int ONE = 1;

  private enum Kind {
    SECTION("section"),
    PANEL("panel");

    private final String text;

    Kind(String text) {
      this.text = text;
    }
  }

  private NodeCodec() {}

  @Override
  public Node read(JsonObject object) {
    Kind kind = object.choice(KIND, Kind.values(), it -> it.text);
    if (kind == null) {
      object.value(KIND).missing();
      kind = object.has(CHILDREN) ? Kind.SECTION : Kind.PANEL;
    }
    String id = object.text("id");
    String name = object.requiredText("name");
    if (kind == Kind.SECTION) {
      Settings settings = SettingsCodec.read(object);
      List<Node> children = object.records(CHILDREN, this);
      return new Section(id, name, settings, children, object.extras());
    }
    if (object.has(CHILDREN)) {
      object
          .value(CHILDREN)
          .fault("wrong-type", "A panel has no children.", "Write \"kind\": \"section\".");
    }
    int count = object.wholeOr(COUNT, ONE);
    Settings settings = SettingsCodec.read(object);
    MeasuredPanel measured = object.record(MEASURED, MeasuredCodec.MEASURED);
    Evidence evidence = EvidenceCodec.read(object, EvidenceCodec.VALUE_KIND);
    return new Panel(id, name, count, settings, measured, evidence, object.extras());
  }

  @Override
  public ObjectNode write(Node node) {
    boolean section = node instanceof Section;
    JsonBuilder builder =
        new JsonBuilder()
            .text(KIND, section ? Kind.SECTION.text : Kind.PANEL.text)
            .text("id", node.id())
            .name("name", node.name());
    if (node instanceof Panel panel) {
      if (panel.count() != ONE) {
        builder.whole(COUNT, panel.count());
      }
      SettingsCodec.write(builder, panel.settings());
      builder.record(MEASURED, panel.measured(), MeasuredCodec.MEASURED);
      EvidenceCodec.write(builder, panel.evidence(), EvidenceCodec.VALUE_KIND);
    } else {
      SettingsCodec.write(builder, node.settings());
    }
    if (node instanceof Section inner) {
      builder.allRecords(CHILDREN, inner.children(), this);
    }
    return builder.with(node.extras());
  }
}
