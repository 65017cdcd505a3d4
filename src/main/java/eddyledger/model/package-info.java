/**
 * What the lead describes, as immutable records in SI units: the vehicle's tree of sections and
 * panels, zones, receivers, operating conditions, constructions, lay-ups, other sources, targets,
 * allowances, suppliers and the change log.
 *
 * <p>The records hold data and no acoustics. They accept what a person may enter, right or wrong;
 * whether it can be used is said by {@code check}. Every record keeps properties of its file object
 * that this version does not know in {@link eddyledger.model.Extras}, so that they survive saving.
 * A component that may be absent is null and says so.
 */
package eddyledger.model;
