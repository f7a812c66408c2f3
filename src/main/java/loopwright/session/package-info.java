/**
 * The open design: its history, the chosen hookup, the newest results, and the background work that
 * renews them. Knows no window and no drawing. May import everything up to {@code sheet}.
 */
package loopwright.session;
