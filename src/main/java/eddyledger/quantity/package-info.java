/**
 * One-third-octave bands, band spectra, decibels and energy sums, A-weighting and the other
 * ratings.
 *
 * <p>Everything here is plain arithmetic on numbers that the whole program shares. It knows neither
 * the vehicle nor any formula of acoustics beyond the standards of measurement.
 */
package eddyledger.quantity;
