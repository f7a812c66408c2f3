package loopwright.solve;

import loopwright.circuit.Circuit;
import loopwright.circuit.CircuitState;

/**
 * Finds the operating point that is reached continuously from all sources at zero: the sources are
 * stepped up together along the solution. Where that path ends at a fold, or its steps fail, plain
 * Newton and then a shunt-conductance homotopy are tried, and the result says so.
 */
public final class OperatingPointSolver {
  private static final double SOURCE_PATH_ERROR = 0.3;
  private static final int PLAIN_NEWTON_STEPS = 300;
  private static final double FIRST_SHUNT = 1e-2;
  private static final double LAST_SHUNT = 1e-14;

  private OperatingPointSolver() {}

  /** The operating point of a circuit. */
  public static OperatingPoint solve(Circuit circuit) {
    StaticSolver solver = new StaticSolver(circuit);
    CircuitState state = circuit.newState();
    state.setSourceScale(0);
    double reached = 0;
    if (solver.solve(state, PLAIN_NEWTON_STEPS)) {
      Continuation path = new Continuation(solver, state, Drive.sources(), 1, SOURCE_PATH_ERROR);
      if (follow(path)) {
        return new OperatingPoint.Found(state, "");
      }
      reached = path.drive();
    }
    String where = Math.round(100 * reached) + " % of the supply";
    state.setSourceScale(1);
    if (solver.solve(state, PLAIN_NEWTON_STEPS)) {
      return new OperatingPoint.Found(state, "the path from all sources at zero jumps at " + where);
    }
    CircuitState shunted = circuit.newState();
    if (byShunt(solver, shunted)) {
      return new OperatingPoint.Found(
          shunted, "found by a shunt homotopy; the path from all sources at zero ends at " + where);
    }
    return new OperatingPoint.NotFound(
        "no operating point found: the sources could be raised to "
            + where
            + ", and the currents at node "
            + solver.worstNode(state)
            + " do not balance");
  }

  private static boolean follow(Continuation path) {
    try {
      return path.advance(1);
    } catch (IllegalStateException singular) {
      return false;
    }
  }

  private static boolean byShunt(StaticSolver solver, CircuitState state) {
    for (double shunt = FIRST_SHUNT; shunt > LAST_SHUNT; shunt /= 10) {
      state.setShunt(shunt);
      if (!solver.solve(state, PLAIN_NEWTON_STEPS)) {
        return false;
      }
    }
    state.setShunt(0);
    return solver.solve(state, PLAIN_NEWTON_STEPS);
  }
}
