/**
 * What a panel makes of the pressure on it: modes, joint acceptance with the wall pressure,
 * radiation efficiency, damping by structure and air, and from these the sound power radiated and
 * the mean-square velocity.
 */
package eddyledger.physics.vibration;
