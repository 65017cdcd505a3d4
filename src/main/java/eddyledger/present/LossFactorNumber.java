package eddyledger.present;

import eddyledger.check.Limit;
import eddyledger.model.BandTable;
import eddyledger.model.BandTable.Resolution;
import eddyledger.model.JudgedBands;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.util.DoubleSummaryStatistics;
import java.util.Objects;
import java.util.Optional;

/** A loss factor: one number for all bands, or a table that a typed number replaces. */
record LossFactorNumber() implements NumberIn<JudgedBands> {
  @Override
  public Quantity quantity() {
    return Quantity.LOSS_FACTOR;
  }

  @Override
  public Limit limit() {
    return Limit.LOSS_FACTOR;
  }

  private static boolean single(BandTable table) {
    return table.resolution() == Resolution.SINGLE
        && table.values().size() == 1
        && table.values().get(0) != null;
  }

  @Override
  public String shown(JudgedBands holder, Unit unit) {
    if (single(holder.best())) {
      return NumberText.text(holder.best().values().get(0), quantity(), unit);
    }
    DoubleSummaryStatistics range =
        holder.best().values().stream()
            .filter(Objects::nonNull)
            .mapToDouble(Double::doubleValue)
            .summaryStatistics();
    return range.getCount() == 0
        ? "per band"
        : "per band, "
            + NumberText.text(range.getMin(), quantity(), unit)
            + " to "
            + NumberText.text(range.getMax(), quantity(), unit);
  }

  @Override
  public String tip(JudgedBands holder, Unit unit) {
    if (single(holder.best())) {
      return "";
    }
    StringBuilder list = new StringBuilder("Typing a number replaces the table:");
    try {
      BandSpectrum spectrum = holder.best().spectrum();
      for (int band = 0; band < Bands.COUNT; band++) {
        String value = NumberText.text(spectrum.value(band), quantity(), unit, 3);
        list.append('\n').append(Bands.label(band)).append(" Hz  ");
        list.append(value.isEmpty() ? "missing" : value);
      }
    } catch (IllegalArgumentException e) {
      list.append('\n').append(e.getMessage());
    }
    return list.toString();
  }

  @Override
  public JudgedBands with(JudgedBands holder, double number) {
    BandTable value = BandTable.single(number);
    if (holder == null) {
      return JudgedBands.of(value);
    }
    boolean kept = single(holder.best());
    return new JudgedBands(
        value, kept ? holder.low() : null, kept ? holder.high() : null, holder.evidence());
  }

  @Override
  public Optional<Range> judged(JudgedBands holder, Unit unit) {
    BandTable low = holder.lowOrBest();
    BandTable high = holder.highOrBest();
    boolean judged = holder.low() != null || holder.high() != null;
    if (!judged || !single(holder.best()) || !single(low) || !single(high)) {
      return Optional.empty();
    }
    double least = low.values().get(0);
    double most = high.values().get(0);
    double best = holder.best().values().get(0);
    String words =
        NumberText.text(least, quantity(), unit)
            + " to "
            + (NumberText.text(most, quantity(), unit) + " " + unit.symbol()).strip();
    return Optional.of(new Range(words, best < least || best > most));
  }

  @Override
  public JudgedBands unjudged(JudgedBands holder) {
    return new JudgedBands(holder.best(), null, null, holder.evidence());
  }
}
