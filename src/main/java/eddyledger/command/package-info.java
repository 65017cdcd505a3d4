/**
 * The command line: check, ledger and trace. Commands parse, call one use case and print what the
 * ledger says; they compute nothing themselves.
 */
package eddyledger.command;
