/**
 * Whether what the lead described can be used: checks of the model that give findings, all at once,
 * each naming the place and the remedy.
 */
package eddyledger.check;
