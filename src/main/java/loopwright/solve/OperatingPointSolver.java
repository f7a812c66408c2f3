package loopwright.solve;

import loopwright.circuit.Circuit;
import loopwright.circuit.CircuitState;

/**
 * Finds the operating point that is reached continuously from all sources at zero: the sources are
 * stepped up together along the solution. Where that path ends at a fold, the circuit would jump;
 * the jump is followed by {@link Settling} and the path goes on from there. Where that fails,
 * settling is tried at full supply. A result that was not reached continuously says so.
 */
public final class OperatingPointSolver {
  private static final double SOURCE_PATH_ERROR = 0.3;
  private static final int NEAR_STEPS = 20;
  private static final int MOST_JUMPS = 5;
  private static final int MOST_FOLDED_STEPS = 5000;

  /** How far beyond a fold the jump is followed, as a share of the supply. */
  private static final double BEYOND_FOLD = 1e-3;

  /** A node further from ground than this, V, is no place where a circuit rests. */
  private static final double FAR_AWAY = 10e3;

  private OperatingPointSolver() {}

  /** The operating point of a circuit. */
  public static OperatingPoint solve(Circuit circuit) {
    StaticSolver solver = new StaticSolver(circuit);
    CircuitState state = circuit.newState();
    state.setSourceScale(0);
    if (!solver.solve(state, NEAR_STEPS)) {
      return settled(solver, 0);
    }
    StringBuilder remark = new StringBuilder();
    CircuitState fold = null;
    for (int jumps = 0; jumps <= MOST_JUMPS; jumps++) {
      Continuation path = new Continuation(solver, state, Drive.sources(), 1, SOURCE_PATH_ERROR);
      if (follow(path)) {
        return new OperatingPoint.Found(state, remark.toString());
      }
      double reached = state.sourceScale();
      if (fold == null) {
        fold = state.copy();
      }
      remark.append(remark.isEmpty() ? "the path from all sources at zero jumps at " : " and ");
      remark.append(Math.round(100 * reached)).append(" % of the supply");
      state.setSourceScale(Math.min(1, reached + BEYOND_FOLD));
      if (!Settling.settle(solver, state)) {
        break;
      }
    }
    return throughFolds(solver, fold);
  }

  /**
   * The operating point of a circuit that differs little from one already solved, such as the same
   * at another temperature: Newton from there, and from all sources at zero where that fails.
   *
   * @param near solved state of a circuit; no help where that has other unknowns
   */
  public static OperatingPoint solveNear(Circuit circuit, CircuitState near) {
    if (!circuit.isLike(near.circuit())) {
      return solve(circuit);
    }
    CircuitState state = circuit.newState();
    state.startFrom(near);
    return new StaticSolver(circuit).solve(state, NEAR_STEPS)
        ? new OperatingPoint.Found(state, "")
        : solve(circuit);
  }

  /**
   * Newton's method alone, from a state whose circuit has changed a little.
   *
   * @param state start on entry, solution on return
   * @return whether it converged; if not, the state is where it stopped
   */
  public static boolean solvedNear(CircuitState state) {
    return new StaticSolver(state.circuit()).solve(state, NEAR_STEPS);
  }

  /**
   * Solves again from a state whose conditions have changed a little: Newton from there, and where
   * that fails by letting the circuit settle.
   *
   * @param state start on entry, solution on return
   * @return whether it was solved
   */
  public static boolean solveAgain(CircuitState state) {
    StaticSolver solver = new StaticSolver(state.circuit());
    CircuitState start = state.copy();
    if (solver.solve(state, NEAR_STEPS)) {
      return true;
    }
    state.copyFrom(start);
    return Settling.settle(solver, state);
  }

  /** Where settling after a jump fails: along the curve through its folds, from the first one. */
  private static OperatingPoint throughFolds(StaticSolver solver, CircuitState fold) {
    double reached = fold.sourceScale();
    if (new FoldedPath(solver, fold, Drive.sources()).follow(1, MOST_FOLDED_STEPS)) {
      return new OperatingPoint.Found(
          fold,
          "the path from all sources at zero turns back at "
              + Math.round(100 * reached)
              + " % of the supply and was followed until it came to full supply");
    }
    return settled(solver, reached);
  }

  private static boolean follow(Continuation path) {
    try {
      return path.advance(1);
    } catch (IllegalStateException singular) {
      return false;
    }
  }

  /** Last resort: let the circuit settle at full supply from every node at zero. */
  private static OperatingPoint settled(StaticSolver solver, double reached) {
    String where = Math.round(100 * reached) + " % of the supply";
    CircuitState state = solver.circuit().newState();
    if (Settling.settle(solver, state)) {
      return new OperatingPoint.Found(
          state, "the path from all sources at zero ends at " + where + "; found by settling");
    }
    return new OperatingPoint.NotFound(
        "no operating point found: the sources could be raised to "
            + where
            + ", and "
            + unresolved(solver, state));
  }

  /** Why a state is no solution. */
  private static String unresolved(StaticSolver solver, CircuitState state) {
    int farthest = 0;
    for (int node = 1; node < state.circuit().nodes(); node++) {
      if (Math.abs(state.voltage(node)) > Math.abs(state.voltage(farthest))) {
        farthest = node;
      }
    }
    double volts = state.voltage(farthest);
    return Math.abs(volts) > FAR_AWAY
        ? "nothing takes up the current at node "
            + state.circuit().nodeName(farthest)
            + ", which it drives beyond "
            + (volts < 0 ? "−" : "")
            + Math.round(FAR_AWAY / 1000)
            + " kV"
        : "the currents at node " + solver.worstNode(state) + " do not balance";
  }
}
