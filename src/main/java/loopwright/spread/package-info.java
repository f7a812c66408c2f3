/**
 * Tolerances to bands: samples of builds, the interval in which each node and figure lies, which
 * part matters, how many builds meet the limits. May import everything up to {@code predict}.
 */
package loopwright.spread;
