/**
 * From sound power let into the zones of a cabin to the mean-square pressure at a receiver: power
 * balance of coupled zones, direct field, and what says how far a zone may be trusted to be
 * diffuse.
 */
package eddyledger.physics.cabin;
