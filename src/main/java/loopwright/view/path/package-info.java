/**
 * The signal path: a design and its prediction as blocks in signal order, with the feedback
 * beneath, drawn by the theme and walked with the arrow keys. May import everything before {@code
 * view} but {@code command}, and {@code view.theme}.
 */
package loopwright.view.path;
