package eddyledger.model;

import java.util.List;

/**
 * A named group of panels or sections.
 *
 * @param id identity
 * @param name name shown
 * @param settings what holds below it unless set again
 * @param children its sections and panels, in order
 * @param extras unknown properties
 */
public record Section(String id, String name, Settings settings, List<Node> children, Extras extras)
    implements Node {
  public Section {
    children = List.copyOf(children);
  }

  /** The same section with other children. */
  public Section withChildren(List<Node> others) {
    return new Section(id, name, settings, others, extras);
  }

  /** The same section with other settings. */
  public Section withSettings(Settings others) {
    return new Section(id, name, others, children, extras);
  }

  /** The same section under another name. */
  public Section withName(String other) {
    return new Section(id, other, settings, children, extras);
  }
}
