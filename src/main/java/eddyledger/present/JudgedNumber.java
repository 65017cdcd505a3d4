package eddyledger.present;

import eddyledger.check.Limit;
import eddyledger.model.Judged;
import java.util.Optional;
import java.util.function.Function;

/** The best estimate of a judged number; low, high and evidence stay when it changes. */
record JudgedNumber(
    Quantity quantity, Limit limit, boolean clears, Function<SheetContext, Fallback> otherwise)
    implements NumberIn<Judged> {
  @Override
  public String shown(Judged holder, Unit unit) {
    return NumberText.text(holder.best(), quantity, unit);
  }

  @Override
  public Judged with(Judged holder, double number) {
    return holder == null
        ? Judged.of(number)
        : new Judged(number, holder.low(), holder.high(), holder.evidence(), holder.extras());
  }

  @Override
  public Optional<Range> judged(Judged holder, Unit unit) {
    return range(holder, quantity, unit);
  }

  /** Low and high of a number, if either was judged. */
  static Optional<Range> range(Judged holder, Quantity quantity, Unit unit) {
    if (holder.low() == null && holder.high() == null) {
      return Optional.empty();
    }
    String words =
        NumberText.text(holder.lowOrBest(), quantity, unit)
            + " to "
            + NumberText.text(holder.highOrBest(), quantity, unit);
    boolean outside = holder.best() < holder.lowOrBest() || holder.best() > holder.highOrBest();
    return Optional.of(new Range((words + " " + unit.symbol()).strip(), outside));
  }

  @Override
  public Judged unjudged(Judged holder) {
    return new Judged(holder.best(), null, null, holder.evidence(), holder.extras());
  }

  @Override
  public Fallback fallback(SheetContext context) {
    return otherwise.apply(context);
  }
}
