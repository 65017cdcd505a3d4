package eddyledger.present;

import eddyledger.check.Limit;

/** A number as it is. */
record PlainNumber(Quantity quantity, Limit limit) implements NumberIn<Double> {
  @Override
  public String shown(Double holder, Unit unit) {
    return NumberText.text(holder, quantity, unit);
  }

  @Override
  public Double with(Double holder, double number) {
    return number;
  }
}
