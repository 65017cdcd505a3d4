/**
 * The project file: JSON text in UTF-8, SI units, the unit in the key; read with every fault named
 * at once, written so that the same vehicle gives the same bytes, replaced on disk in one step.
 *
 * <p>Whatever a file holds that this version does not know, or cannot read, is kept in the {@link
 * eddyledger.model.Extras} of the record it stands in and written back under its own key, unless
 * something readable has been set there since. Of a list only the members are kept that cannot be
 * read, in their positions, and an override that cannot be read is kept by the record around it.
 * Unknown properties of an object that has no record of its own (the vehicle object, a pass rule,
 * an object with overrides only) are kept in the record around it, as a map under that object's
 * key.
 */
package eddyledger.file;
