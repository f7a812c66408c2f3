/**
 * Findings: what is wrong or risky before power, each with where, why, how much and a remedy. May
 * import everything up to {@code predict}.
 */
package loopwright.check;
