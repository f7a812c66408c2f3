/**
 * Dialogs beside the window: dividers, cures, bands, the bench, the whole design. Each runs in the
 * background, can be stopped, and proposes edits. May import everything up to {@code session},
 * {@code view.theme}, {@code view.form} and Swing.
 */
package loopwright.view.study;
