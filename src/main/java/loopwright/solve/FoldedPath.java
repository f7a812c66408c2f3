package loopwright.solve;

import java.util.Arrays;
import loopwright.circuit.CircuitState;

/**
 * Follows the curve of solutions through its folds: the drive turns back there and later forward
 * again. Unknowns and drive move together, in steps along the curve (Keller 1977: pseudo-arclength
 * continuation). What it passes between two folds is a solution that no circuit would hold; where
 * it ends is one that the sources reach, though not without a jump on the way.
 */
final class FoldedPath {
  private static final int CORRECTOR_STEPS = 12;
  private static final double FIRST_STEP = 1e-3;
  private static final double LONGEST_STEP = 2;
  private static final double SHORTEST_STEP = 1e-12;

  /** Least cosine between the directions at both ends of a step. */
  private static final double LEAST_COSINE = 0.5;

  private final StaticSolver solver;
  private final CircuitState state;
  private final Drive drive;
  private final CircuitState backup;
  private final double[] direction;
  private final double[] next;
  private double driveDirection;
  private double length = FIRST_STEP;

  /**
   * A path from a solved state.
   *
   * @param state solved; it moves along
   */
  FoldedPath(StaticSolver solver, CircuitState state, Drive drive) {
    this.solver = solver;
    this.state = state;
    this.drive = drive;
    this.backup = state.copy();
    this.direction = new double[state.circuit().unknowns()];
    this.next = new double[direction.length];
  }

  /**
   * Follows the curve, the drive rising at first, until it stands at a value above the start's.
   *
   * @param mostSteps steps at the most
   * @return whether it came there; if not, the state is the last solution on the way
   */
  boolean follow(double target, int mostSteps) {
    double weight = direct(direction);
    if (!(weight > 0)) {
      return false;
    }
    driveDirection = weight;
    for (int step = 0; step < mostSteps; step++) {
      backup.copyFrom(state);
      while (!step(target)) {
        state.copyFrom(backup);
        length /= 4;
        if (length < SHORTEST_STEP) {
          return false;
        }
      }
      if (drive.get(state) == target) {
        return true;
      }
    }
    return false;
  }

  /** Takes one step of the present length; false when it is refused, the state being anywhere. */
  private boolean step(double target) {
    double from = drive.get(backup);
    double[] unknowns = state.unknowns();
    for (int i = 0; i < unknowns.length; i++) {
      unknowns[i] += length * direction[i];
    }
    drive.set(state, from + length * driveDirection);
    if (!solver.solveInPlane(state, drive, direction, driveDirection, CORRECTOR_STEPS)) {
      return false;
    }
    double reached = drive.get(state);
    if (reached >= target) {
      return land(target, from, reached);
    }
    double weight = direct(next);
    double cosine = solver.along(direction, next) + driveDirection * weight;
    if (!(Math.abs(cosine) > LEAST_COSINE)) {
      return false;
    }
    double sign = Math.signum(cosine);
    for (int i = 0; i < next.length; i++) {
      direction[i] = sign * next[i];
    }
    driveDirection = sign * weight;
    length = Math.min(LONGEST_STEP, length * (Math.abs(cosine) > 0.95 ? 2 : 1));
    return true;
  }

  /** Solves at the target, which the step has passed, from between its ends. */
  private boolean land(double target, double from, double reached) {
    double share = (target - from) / (reached - from);
    double[] unknowns = state.unknowns();
    for (int i = 0; i < unknowns.length; i++) {
      double start = backup.unknowns()[i];
      unknowns[i] = start + share * (unknowns[i] - start);
    }
    drive.set(state, target);
    return solver.solve(state, 2 * CORRECTOR_STEPS);
  }

  /**
   * The direction of the curve at the state, of length one over nodes and drive.
   *
   * @param unit filled with the unknowns' part
   * @return the drive's part; not a number where the matrix is singular
   */
  private double direct(double[] unit) {
    state.evaluate();
    if (!solver.factor(state)) {
      return Double.NaN;
    }
    Arrays.fill(unit, 0);
    drive.excite(state, unit);
    solver.backSolve(unit);
    double weight = 1 / Math.sqrt(1 + solver.along(unit, unit));
    for (int i = 0; i < unit.length; i++) {
      unit[i] *= weight;
    }
    return weight;
  }
}
