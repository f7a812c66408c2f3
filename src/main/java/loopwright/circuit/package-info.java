/**
 * Circuits: nodes, elements and device equations with their currents, charges and derivatives. May
 * import {@code quantity}, {@code task}, {@code part}, {@code design} and {@code numeric}; knows no
 * stage, no hookup and no solver.
 */
package loopwright.circuit;
