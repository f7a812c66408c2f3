/**
 * The main window: menu, hookups, status, figures in three columns, findings, and the layout of all
 * views. May import {@code quantity}, {@code task}, {@code part}, {@code design}, {@code predict},
 * {@code check}, {@code session} and every other view.
 */
package loopwright.view.frame;
