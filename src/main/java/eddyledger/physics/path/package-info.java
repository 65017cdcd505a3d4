/**
 * What lies between a panel and its zone: losses that act on the sound power a panel radiates, and
 * panels known by measurement instead of by their construction.
 */
package eddyledger.physics.path;
