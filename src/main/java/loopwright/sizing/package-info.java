/**
 * Values to choose: feedback dividers for a wanted gain, cures for an amplifier that oscillates.
 * Each proposal is a list of changes to the design. May import everything up to {@code predict}.
 */
package loopwright.sizing;
