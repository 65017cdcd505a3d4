package eddyledger.model;

/** What lies between a panel's construction and its zone. The kinds are open to additions. */
public sealed interface LayUp permits TabulatedLayUp {
  /** Identity. */
  String id();

  /** Name shown. */
  String name();

  /** Unknown properties. */
  Extras extras();
}
