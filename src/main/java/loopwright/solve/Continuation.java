package loopwright.solve;

import java.util.Arrays;
import loopwright.circuit.CircuitState;

/**
 * Follows the solution of a circuit continuously as a drive moves one way: tangent predictor,
 * Newton corrector, step length by the predictor's error.
 *
 * <p>A stage that the loop leaves alone in its dead zone can have so much gain that no value of the
 * drive is exact enough to hold its output anywhere: Newton's steps only waver. There the drive is
 * let move with the unknowns, in the plane normal to the tangent, until the steep place is passed.
 *
 * <p>A corrector that lands on another branch would give plausible wrong figures. Two things tell:
 * the predictor's error does not shrink with the step, and the determinant's sign, which changes at
 * a fold and nowhere else. Either ends the walk at the last point of the branch.
 */
public final class Continuation {
  private static final int CORRECTOR_STEPS = 12;

  /**
   * A node further from ground than this, V, is driven by a current that nothing takes up; there
   * the error counts as a share of its voltage, or the walk would never end.
   */
  private static final double ORDINARY = 1e3;

  /** A walk to one value that takes more steps leads nowhere. */
  private static final int MOST_STEPS = 50_000;

  /** Shortest step, as a share of the drive's scale. */
  private static final double SHORTEST = 1e-11;

  /** How far a node is predicted to move while the drive moves along, V: some thermal voltages. */
  private static final double SLIDE = 0.06;

  /** A slide that is refused is shortened so often. */
  private static final int SHORTENINGS = 10;

  /** A walk that slides further than this runs away. */
  private static final int MOST_SLIDES = 2000;

  private final StaticSolver solver;
  private final CircuitState state;
  private final Drive drive;
  private final double scale;
  private final double largestError;
  private final CircuitState backup;
  private final double[] tangent;
  private final double[] predicted;
  private int sign;
  private double stride;
  private boolean ready;
  private boolean wavered;
  private int slides;

  /**
   * A walk that starts at a solved state.
   *
   * @param state solved; it moves with the walk
   * @param drive what moves
   * @param scale typical size of the drive's values, in its unit
   * @param largestError largest accepted distance between prediction and solution at any node, V;
   *     at a node beyond 1000 V that share of a thousandth of its voltage
   */
  Continuation(
      StaticSolver solver, CircuitState state, Drive drive, double scale, double largestError) {
    this.solver = solver;
    this.state = state;
    this.drive = drive;
    this.scale = scale;
    this.largestError = largestError;
    this.backup = state.copy();
    this.tangent = new double[state.circuit().unknowns()];
    this.predicted = new double[tangent.length];
    this.stride = scale / 16;
  }

  /** The state, at the last solution of the branch. */
  public CircuitState state() {
    return state;
  }

  /** Value of the drive at the state. */
  public double drive() {
    return drive.get(state);
  }

  /**
   * ∂x/∂(drive) at the state, by unknown. Valid until the next step; not to be changed.
   *
   * @throws IllegalStateException when the circuit's matrix is singular here
   */
  public double[] tangent() {
    prepare();
    return tangent;
  }

  /**
   * Walks to a value of the drive.
   *
   * @return true when it got there; false when the branch ends before (a fold), with the state at
   *     its last point
   */
  public boolean advance(double target) {
    for (int steps = 0; drive() != target; steps++) {
      if (steps == MOST_STEPS || !step(target)) {
        return false;
      }
    }
    return true;
  }

  /**
   * Takes one step toward a value of the drive, as long as the branch's bend allows.
   *
   * @return false when the branch ends here
   */
  public boolean step(double target) {
    prepare();
    double from = drive();
    double remaining = target - from;
    double shortest = SHORTEST * Math.max(scale, Math.abs(from));
    backup.copyFrom(state);
    while (true) {
      boolean last = Math.abs(remaining) <= stride;
      double length = last ? remaining : Math.copySign(stride, remaining);
      double error = correct(last ? target : from + length, length);
      if (error <= largestError) {
        adapt(error, Math.abs(length), last);
        return true;
      }
      restore();
      if (wavered && slides++ < MOST_SLIDES) {
        return slide(target);
      }
      if (Math.abs(length) <= shortest) {
        return false;
      }
      stride = Math.abs(length) * (error < Double.POSITIVE_INFINITY ? 0.4 : 0.25);
    }
  }

  /** Goes back to the last point of the branch. */
  private void restore() {
    state.copyFrom(backup);
    if (ready) {
      // The factors and the tangent may be those of the point that was refused.
      ready = false;
      prepare();
    }
  }

  /**
   * Takes a step in which the drive moves with the unknowns.
   *
   * @return false when none is found, with the state where it was
   */
  private boolean slide(double target) {
    double from = drive();
    double length = Math.copySign(SLIDE / steepest(), target - from);
    for (int i = 0; i < SHORTENINGS; i++) {
      predict(from + length, length);
      boolean solved = solver.solveInPlane(state, drive, tangent, 1, CORRECTOR_STEPS);
      boolean onward = (drive() - from) * length > 0 && (target - drive()) * length > 0;
      if (solved && onward && judge() <= largestError) {
        stride = Math.abs(length);
        return true;
      }
      restore();
      length /= 4;
    }
    return false;
  }

  /** Largest movement of a node per unit of the drive. */
  private double steepest() {
    double steepest = 0;
    for (int node = 0; node < state.circuit().nodes(); node++) {
      steepest = Math.max(steepest, Math.abs(tangent[node]));
    }
    return steepest;
  }

  /** Predicts and corrects; the largest distance between the two, or infinite where that failed. */
  private double correct(double value, double length) {
    predict(value, length);
    boolean solved = solver.solve(state, CORRECTOR_STEPS);
    wavered = !solved && solver.wavers();
    return solved ? judge() : Double.POSITIVE_INFINITY;
  }

  private void predict(double value, double length) {
    double[] unknowns = state.unknowns();
    for (int i = 0; i < unknowns.length; i++) {
      unknowns[i] += tangent[i] * length;
    }
    System.arraycopy(unknowns, 0, predicted, 0, unknowns.length);
    drive.set(state, value);
  }

  /** Distance of the solution from the prediction; infinite where it lies beyond a fold. */
  private double judge() {
    double error = 0;
    for (int node = 0; node < state.circuit().nodes(); node++) {
      double volts = state.unknowns()[node];
      double beyond = Math.max(1, Math.abs(volts) / ORDINARY);
      error = Math.max(error, Math.abs(volts - predicted[node]) / beyond);
    }
    if (error > largestError) {
      return error;
    }
    int before = sign;
    ready = false;
    boolean regular = tryPrepare();
    ready = true;
    return regular && sign == before ? error : Double.POSITIVE_INFINITY;
  }

  private void adapt(double error, double length, boolean last) {
    double wish =
        error < largestError / 8 ? 3 * length : error < largestError / 3 ? 1.5 * length : length;
    stride = last ? Math.max(stride, wish) : wish;
    stride = Math.min(stride, scale);
  }

  private void prepare() {
    if (!ready && !tryPrepare()) {
      throw new IllegalStateException("the circuit's matrix is singular at this point");
    }
  }

  private boolean tryPrepare() {
    if (!ready) {
      state.evaluate();
      if (!solver.factor(state)) {
        return false;
      }
      sign = solver.determinantSign();
      Arrays.fill(tangent, 0);
      drive.excite(state, tangent);
      solver.backSolve(tangent);
      ready = true;
    }
    return true;
  }
}
