/**
 * Swing views: they lay out what presenters say, paint it and hand on what the user does. No
 * arithmetic, no state of the project.
 */
package eddyledger.window;
