/**
 * Point spectra and cross-spectra of the wall pressure under a turbulent boundary layer: one
 * interface for each question, one class for each published answer.
 */
package eddyledger.physics.wallpressure;
