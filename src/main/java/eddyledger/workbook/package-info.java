/**
 * The budget workbook: what the ledger holds as a spreadsheet with live formulas. Every formula
 * carries the program's own value as its stored result, so that it is right before anything
 * recalculates it. Text of users is only ever written as text, never as part of a formula.
 */
package eddyledger.workbook;
