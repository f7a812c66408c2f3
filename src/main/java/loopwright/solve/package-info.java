/**
 * From a circuit to its operating point, linear network, responses, natural frequencies, loop gain
 * and static sweeps. May import everything up to {@code assembly}.
 */
package loopwright.solve;
