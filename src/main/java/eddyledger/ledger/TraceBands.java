package eddyledger.ledger;

import eddyledger.quantity.BandSpectrum;

/**
 * The numbers of a contribution band by band; velocity is the mean over all pieces, power their
 * sum.
 *
 * @param wallPressureDensity one-sided wall-pressure spectral density at the exact mid-band
 *     frequency, Pa²/Hz
 * @param wallPressure mean-square wall pressure of the band, Pa²
 * @param convectionSpeed convection speed, m/s; NaN for a measured panel
 * @param velocitySquared space-mean-square velocity of the band, m²/s²; NaN for a measured panel
 * @param radiatedPower power radiated by all pieces before the lay-up, W
 * @param insertionLoss insertion loss of the lay-up, dB
 * @param zonePower power let into the zone, W
 * @param meanSquare mean-square pressure at the receiver, Pa²
 */
public record TraceBands(
    BandSpectrum wallPressureDensity,
    BandSpectrum wallPressure,
    BandSpectrum convectionSpeed,
    BandSpectrum velocitySquared,
    BandSpectrum radiatedPower,
    BandSpectrum insertionLoss,
    BandSpectrum zonePower,
    BandSpectrum meanSquare) {}
