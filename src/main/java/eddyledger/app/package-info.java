/**
 * Use cases of the program, without a window: open a project, compute it, save it. The file
 * system's failures are caught here and turned into a sentence for the user.
 */
package eddyledger.app;
