package eddyledger.ledger;

import eddyledger.model.CrossSpectrumChoice;
import eddyledger.physics.flow.AirState;
import eddyledger.quantity.BandSpectrum;

/**
 * Everything that decides what one piece of a panel radiates, and nothing else: two panels with
 * equal inputs share one computation.
 *
 * @param flow the flow over it
 * @param spectrum id of the chosen wall-pressure spectrum
 * @param cross the chosen cross-spectrum
 * @param convectionRatio convection speed over local flow speed
 * @param plate the plate
 * @param lossFactor damping loss factor per band, without radiation
 * @param cabin the air it radiates into
 */
record PanelInput(
    FlowInput flow,
    String spectrum,
    CrossSpectrumChoice cross,
    double convectionRatio,
    PlateInput plate,
    BandSpectrum lossFactor,
    AirState cabin) {}
