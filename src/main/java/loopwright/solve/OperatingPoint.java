package loopwright.solve;

import loopwright.circuit.CircuitState;

/** The outcome of solving a circuit at rest. */
public sealed interface OperatingPoint {
  /**
   * A solution.
   *
   * @param state the circuit at rest, blocking capacitors open
   * @param remark what is to be said about how it was reached, or empty
   */
  record Found(CircuitState state, String remark) implements OperatingPoint {}

  /**
   * No solution.
   *
   * @param reason where the circuit stands and why, in a sentence
   */
  record NotFound(String reason) implements OperatingPoint {}
}
