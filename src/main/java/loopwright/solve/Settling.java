package loopwright.solve;

import loopwright.circuit.CircuitState;

/**
 * Lets a circuit settle from where it stands: every node is tied to its last voltage by a
 * conductance, as if by a capacitance in steps of time, and the conductance falls as the circuit
 * comes to rest (pseudo-transient continuation: Kelley and Keyes, SIAM Journal on Numerical
 * Analysis 35, 1998).
 */
final class Settling {
  private static final double FIRST = 1e-3;
  private static final double STRONGEST = 1e3;
  private static final double WEAKEST = 1e-15;
  private static final int MOST_STEPS = 400;
  private static final int NEWTON_STEPS = 30;

  private Settling() {}

  /**
   * Settles.
   *
   * @param state start on entry; where it came to rest on return, whether it did or not
   * @return whether it came to rest at a solution
   */
  static boolean settle(StaticSolver solver, CircuitState state) {
    CircuitState backup = state.copy();
    double tether = FIRST;
    for (int step = 0; step < MOST_STEPS; step++) {
      backup.copyFrom(state);
      state.anchor();
      state.setTether(tether);
      if (solver.solve(state, NEWTON_STEPS)) {
        tether /= 3;
        if (tether < WEAKEST) {
          break;
        }
      } else {
        state.copyFrom(backup);
        tether *= 10;
        if (tether > STRONGEST) {
          break;
        }
      }
    }
    state.setTether(0);
    return solver.solve(state, NEWTON_STEPS);
  }
}
