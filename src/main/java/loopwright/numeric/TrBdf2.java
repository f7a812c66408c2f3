package loopwright.numeric;

import java.util.Arrays;

/**
 * Integrates d/dt q(x) + f(x, t) = 0 by TR-BDF2: the trapezoidal rule over the first 2 − √2 of a
 * step, then the second backward difference over the whole of it (Bank, Coughran, Fichtner, Grosse,
 * Rose and Smith, IEEE Transactions on Computer-Aided Design 4, 1985, 436–451). Second order,
 * L-stable, one-step: a corner of f costs it nothing but a shorter step.
 *
 * <p>Written as the Runge–Kutta method of Hosea and Shampine (Applied Numerical Mathematics 20,
 * 1996), with w = √2/4 and d = 1 − √2/2, both stages solve with the same C + d h G:
 *
 * <pre>
 * q(x_γ) = q_n − h d (f_n + f_γ)
 * q(x_n+1) = q_n − h (w f_n + w f_γ + d f_n+1)
 * </pre>
 *
 * <p>What is stepped is the charge itself, so that none is lost however q depends on x. The error
 * is the difference to their embedded third-order formula, filtered by (C + d h G)⁻¹; each unknown
 * may be off by a share of how far it has moved since the start, plus its own tolerance.
 *
 * <p>It owns its work arrays and serves one thread; a step allocates nothing.
 */
public final class TrBdf2 {
  /** Where the first stage ends, as a share of the step. */
  private static final double GAMMA = 2 - Math.sqrt(2);

  private static final double W = Math.sqrt(2) / 4;
  private static final double D = 1 - Math.sqrt(2) / 2;

  private static final int MOST_ITERATIONS = 25;

  /** There is no shorter step to fall back to. */
  private static final int MOST_ITERATIONS_OF_JUMP = 200;

  /** A Newton step of this share of what is allowed leaves a far smaller error behind. */
  private static final double CONVERGED = 1e-2;

  private static final double SAFETY = 0.9;
  private static final double MOST_GROWTH = 4;
  private static final double LEAST_SHARE = 0.1;

  /** No unknown is asked to be better than this share of itself. */
  private static final double ROUNDING = 1e-12;

  /** What a step is cut to when Newton's method fails in it. */
  private static final double CUT = 0.25;

  private final ChargeEquations equations;
  private final double relative;
  private final RealSystem system;
  private final double[] matrix;
  private final double[] x;
  private final double[] origin;
  private final double[] moved;
  private final double[] last;
  private final double[] before;
  private final double[] middle;
  private final double[] qLast;
  private final double[] fLast;
  private final double[] fMiddle;
  private final double[] base;
  private final double[] step;
  private double time;
  private double lastLength;
  private double nextLength;
  private boolean hasSlope;
  private long accepted;
  private long rejected;
  private long iterations;

  /**
   * @param relative what an unknown may be off in a step, as a share of how far it has moved since
   *     the start
   */
  public TrBdf2(ChargeEquations equations, double relative) {
    int size = equations.systems().pattern().size();
    this.equations = equations;
    this.relative = relative;
    this.system = equations.systems().real();
    this.matrix = new double[equations.systems().pattern().slots()];
    this.x = equations.unknowns();
    this.origin = new double[size];
    this.moved = new double[size];
    this.last = new double[size];
    this.before = new double[size];
    this.middle = new double[size];
    this.qLast = new double[size];
    this.fLast = new double[size];
    this.fMiddle = new double[size];
    this.base = new double[size];
    this.step = new double[size];
  }

  /**
   * Starts at the equations' unknowns, which have to satisfy the algebraic conditions.
   *
   * @param time of the start, s
   * @param firstLength of the first step tried, s
   */
  public void start(double time, double firstLength) {
    this.time = time;
    this.nextLength = firstLength;
    System.arraycopy(x, 0, origin, 0, x.length);
    Arrays.fill(moved, 0);
    settleEvaluation(time);
    keep();
    hasSlope = false;
  }

  /**
   * Carries the unknowns over a jump of f at the present time: charges stay, all else follows. Two
   * backward Euler steps of a vanishing length do it; the second clears the impulses that the first
   * leaves in currents.
   *
   * @param instant length of those steps, s; short against everything that the equations do
   * @param nextLength of the next step tried, s
   * @throws ArithmeticException when no solution is found
   */
  public void jump(double instant, double nextLength) {
    for (int i = 0; i < 2; i++) {
      System.arraycopy(qLast, 0, base, 0, base.length);
      if (!solveStage(instant, time, MOST_ITERATIONS_OF_JUMP)) {
        throw new ArithmeticException("no solution is found after the jump at " + time + " s");
      }
      keep();
    }
    this.nextLength = nextLength;
    hasSlope = false;
  }

  /**
   * Takes one step.
   *
   * @param limit time not to step beyond, s; it is hit exactly
   * @param longest length of a step, s
   * @throws ArithmeticException when the step would have to be shorter than the clock can tell
   */
  public void step(double limit, double longest) {
    double length = Math.min(nextLength, longest);
    while (true) {
      double left = limit - time;
      boolean arrives = length >= left * (1 - 1e-12);
      if (arrives) {
        length = left;
      } else if (length > left / 2) {
        // Two steps of like length, rather than a long one and a crumb.
        length = left / 2;
      }
      double end = arrives ? limit : time + length;
      if (!(end > time)) {
        throw new ArithmeticException(
            "the time step at " + time + " s would have to be shorter than can be told");
      }
      boolean solved = stages(length, end);
      double error = solved ? error(length) : Double.NaN;
      if (error <= 1) {
        accept(length, end, error, arrives);
        return;
      }
      rejected++;
      System.arraycopy(last, 0, x, 0, x.length);
      hasSlope &= solved;
      length *= Double.isNaN(error) ? CUT : Math.max(LEAST_SHARE, SAFETY / Math.cbrt(error));
    }
  }

  private void accept(double length, double end, double error, boolean arrives) {
    accepted++;
    System.arraycopy(last, 0, before, 0, last.length);
    time = end;
    lastLength = length;
    hasSlope = true;
    keep();
    for (int i = 0; i < x.length; i++) {
      moved[i] = Math.max(moved[i], Math.abs(x[i] - origin[i]));
    }
    double grown = length * Math.min(MOST_GROWTH, SAFETY / Math.cbrt(Math.max(error, 1e-9)));
    // A step cut short by its limit says nothing about how long the next one must be.
    nextLength = arrives ? Math.max(grown, Math.min(nextLength, length * MOST_GROWTH)) : grown;
  }

  private boolean stages(double length, double end) {
    predict(GAMMA * length);
    for (int i = 0; i < base.length; i++) {
      base[i] = qLast[i] - D * length * fLast[i];
    }
    if (!solveStage(D * length, end - (1 - GAMMA) * length, MOST_ITERATIONS)) {
      return false;
    }
    System.arraycopy(x, 0, middle, 0, x.length);
    System.arraycopy(equations.f(), 0, fMiddle, 0, fMiddle.length);
    for (int i = 0; i < x.length; i++) {
      x[i] = last[i] + (middle[i] - last[i]) / GAMMA;
      base[i] = qLast[i] - W * length * (fLast[i] + fMiddle[i]);
    }
    return solveStage(D * length, end, MOST_ITERATIONS);
  }

  /** Guesses the end of the first stage from the step before. */
  private void predict(double ahead) {
    double share = hasSlope ? ahead / lastLength : 0;
    for (int i = 0; i < x.length; i++) {
      x[i] = last[i] + share * (last[i] - before[i]);
    }
  }

  /** Newton's method on q(x) + weight f(x, t) = base; false when it does not converge. */
  private boolean solveStage(double weight, double at, int most) {
    double size = Double.POSITIVE_INFINITY;
    for (int i = 0; i < most; i++) {
      equations.evaluate(at);
      if (size < CONVERGED && !equations.limited()) {
        return true;
      }
      double[] g = equations.g();
      double[] c = equations.c();
      for (int slot = 0; slot < matrix.length; slot++) {
        matrix[slot] = c[slot] + weight * g[slot];
      }
      if (!system.factor(matrix)) {
        return false;
      }
      double[] q = equations.q();
      double[] f = equations.f();
      for (int row = 0; row < step.length; row++) {
        step[row] = base[row] - q[row] - weight * f[row];
      }
      system.solve(step);
      iterations++;
      size = size(step);
      if (!(size < Double.POSITIVE_INFINITY)) {
        return false;
      }
      for (int k = 0; k < x.length; k++) {
        x[k] += step[k];
      }
    }
    return false;
  }

  /** The error of the step just solved, as a multiple of what is allowed. */
  private double error(double length) {
    double[] f = equations.f();
    for (int row = 0; row < step.length; row++) {
      step[row] = length * ((4 * W - 1) / 3 * fLast[row] - fMiddle[row] / 3 + 2 * D / 3 * f[row]);
    }
    system.solve(step);
    return size(step);
  }

  private double size(double[] vector) {
    double most = 0;
    for (int i = 0; i < vector.length; i++) {
      double reach = Math.max(moved[i], Math.abs(x[i] - origin[i]));
      double allowed = relative * reach + equations.tolerance(i) + ROUNDING * Math.abs(x[i]);
      if (!Double.isFinite(vector[i])) {
        return Double.NaN;
      }
      most = Math.max(most, Math.abs(vector[i]) / allowed);
    }
    return most;
  }

  /** An evaluation may be limited where the point was reached by another road. */
  private void settleEvaluation(double at) {
    for (int i = 0; i < MOST_ITERATIONS; i++) {
      equations.evaluate(at);
      if (!equations.limited()) {
        return;
      }
    }
  }

  private void keep() {
    System.arraycopy(x, 0, last, 0, x.length);
    System.arraycopy(equations.q(), 0, qLast, 0, qLast.length);
    System.arraycopy(equations.f(), 0, fLast, 0, fLast.length);
  }

  /** Present time, s. */
  public double time() {
    return time;
  }

  /** Steps that were kept. */
  public long accepted() {
    return accepted;
  }

  /** Steps that were taken back and tried again shorter. */
  public long rejected() {
    return rejected;
  }

  /** Newton steps over all stages. */
  public long iterations() {
    return iterations;
  }
}
