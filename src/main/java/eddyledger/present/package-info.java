/**
 * Presenters: the project's state into texts and marks, texts back into changes or messages. They
 * know neither Swing nor a display.
 */
package eddyledger.present;
