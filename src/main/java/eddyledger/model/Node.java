package eddyledger.model;

/** A node of the vehicle's tree: a section or a panel. */
public sealed interface Node permits Section, Panel {
  /** Identity, never changed by renaming or moving. */
  String id();

  /** Name shown. */
  String name();

  /** What it sets for itself and for whatever is below it. */
  Settings settings();

  /** Unknown properties. */
  Extras extras();
}
