package eddyledger.ledger;

import eddyledger.model.CrossSpectrumChoice;
import eddyledger.physics.wallpressure.ButterworthCrossSpectrum;
import eddyledger.physics.wallpressure.DecayRule;
import eddyledger.physics.wallpressure.SeparableCrossSpectrum;

/**
 * A cross-spectrum as it is computed with: the decay rates already carried to the orders used.
 *
 * @param orderAlong order along the flow
 * @param orderAcross order across it
 * @param decayAlong decay rate along the flow at that order
 * @param decayAcross decay rate across it at that order
 */
record CrossInput(int orderAlong, int orderAcross, double decayAlong, double decayAcross) {

  static CrossInput of(CrossSpectrumChoice choice) {
    DecayRule rule =
        switch (choice.rule()) {
          case HALF_POWER_WIDTH -> DecayRule.HALF_POWER_WIDTH;
          case CORRELATION_LENGTH -> DecayRule.CORRELATION_LENGTH;
        };
    return new CrossInput(
        choice.orderAlong(),
        choice.orderAcross(),
        rule.carry(choice.decayAlong().best(), choice.fittedOrderAlong(), choice.orderAlong()),
        rule.carry(choice.decayAcross().best(), choice.fittedOrderAcross(), choice.orderAcross()));
  }

  SeparableCrossSpectrum spectrum() {
    return new ButterworthCrossSpectrum(orderAlong, orderAcross, decayAlong, decayAcross);
  }
}
