/**
 * Dialogs beside the window that work something out on request: dividers, cures, bands, and the
 * bench. Each runs in the background, can be stopped, and proposes edits. May import everything up
 * to {@code session}, {@code view.theme} and Swing.
 */
package loopwright.view.study;
