/**
 * The acoustics, one folder for each physical question. Nothing below this package knows a vehicle,
 * a file or a window: a published case needs a handful of numbers, not a project.
 */
package eddyledger.physics;
