package eddyledger.command;

import java.util.List;

/** The cautions that stand under every printed ledger and trace. */
final class Cautions {
  /** The short form, as lines. */
  static final List<String> SHORT =
      List.of(
          "Budget figures for engineering use. Not evidence of compliance, hearing safety, fire,",
          "glazing, structural or airworthiness approval. Conditions and uncertainty as stated.",
          "Local codes and licensed practice decide.");

  private Cautions() {}
}
