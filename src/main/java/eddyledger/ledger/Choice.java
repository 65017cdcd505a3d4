package eddyledger.ledger;

import eddyledger.model.CrossSpectrumChoice;
import eddyledger.model.CrossSpectrumChoice.Rule;
import eddyledger.physics.wallpressure.WallPressureSpectra;
import eddyledger.physics.wallpressure.WallPressureSpectrum;
import java.util.ArrayList;
import java.util.List;

/**
 * A choice of models for the whole vehicle: the chosen one, or an alternative of the model range
 * that replaces one of its parts on every panel.
 *
 * @param name name in tables and files
 * @param words what it means, in words
 * @param orders orders along and across the flow that replace the chosen ones; null to keep them
 * @param rule how decay rates are carried to those orders; null to keep the chosen one
 * @param spectrum id of the wall-pressure spectrum that replaces the chosen one; null to keep it
 */
public record Choice(String name, String words, Orders orders, Rule rule, String spectrum) {

  /** A pair of Butterworth orders. */
  public record Orders(int along, int across) {}

  /** What the lead chose, panel by panel. */
  public static final Choice CHOSEN = new Choice("chosen", "as chosen", null, null, null);

  private static final List<Choice> ALL = gather();

  /** The chosen models first, then every alternative of the model range. */
  public static List<Choice> all() {
    return ALL;
  }

  private static List<Choice> gather() {
    List<Choice> all = new ArrayList<>();
    all.add(CHOSEN);
    Rule width = Rule.HALF_POWER_WIDTH;
    all.add(
        new Choice(
            "orders-1-1", "cross-spectrum of orders (1,1), Corcos", new Orders(1, 1), width, null));
    all.add(
        new Choice(
            "orders-2-1",
            "orders (2,1), decay rates as published (same half-power width)",
            new Orders(2, 1),
            width,
            null));
    all.add(
        new Choice(
            "orders-2-1-correlation-length",
            "orders (2,1), decay rates carried to the same correlation length",
            new Orders(2, 1),
            Rule.CORRELATION_LENGTH,
            null));
    for (WallPressureSpectrum spectrum : WallPressureSpectra.all()) {
      all.add(
          new Choice(
              "spectrum-" + spectrum.id(),
              "wall-pressure spectrum of " + spectrum.name(),
              null,
              null,
              spectrum.id()));
    }
    return List.copyOf(all);
  }

  /** The cross-spectrum under this choice, where another one was chosen on the panel. */
  CrossInput cross(CrossSpectrumChoice chosen) {
    return CrossInput.of(
        orders == null ? chosen : chosen.at(orders.along(), orders.across(), rule));
  }

  /** The id of the wall-pressure spectrum under this choice. */
  String spectrum(String chosen) {
    return spectrum == null ? chosen : spectrum;
  }
}
