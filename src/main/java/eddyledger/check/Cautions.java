package eddyledger.check;

import java.util.List;

/** The cautions that stand on every output. */
public final class Cautions {
  /** The short form, as lines. */
  public static final List<String> SHORT =
      List.of(
          "Budget figures for engineering use. Not evidence of compliance, hearing safety, fire,",
          "glazing, structural or airworthiness approval. Conditions and uncertainty as stated.",
          "Local codes and licensed practice decide.");

  private Cautions() {}

  /** The short form as one paragraph. */
  public static String text() {
    return String.join(" ", SHORT);
  }
}
