/**
 * The air and the flow next to the skin: atmosphere, edge of the boundary layer, and the boundary
 * layer itself with whatever was not given filled in by stated rules.
 */
package eddyledger.physics.flow;
