/**
 * Pictures as pure functions of the ledger, and the colours, marks and patterns that pictures and
 * window share.
 */
package eddyledger.chart;
