package eddyledger.model;

/** The structural part of a panel. The kinds of construction are open to additions. */
public sealed interface Construction permits PlateConstruction {
  /** Identity. */
  String id();

  /** Name shown. */
  String name();

  /** Unknown properties. */
  Extras extras();

  /** Mass per area, kg/m². */
  double surfaceMass();
}
