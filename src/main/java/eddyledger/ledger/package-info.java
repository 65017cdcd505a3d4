/**
 * The one result: every panel's and section's contribution to the level at every receiver and
 * condition, with its sums, margins, findings and the account of every step.
 *
 * <p>The model is resolved first (SI, inheritance, defaults filled in), then the physics runs panel
 * by panel, in parallel and cached by resolved input, then the contributions are carried through
 * the cabin and summed up the tree as energies. What is not in the ledger cannot be shown, and
 * nothing that shows it adds decibels of its own.
 */
package eddyledger.ledger;
