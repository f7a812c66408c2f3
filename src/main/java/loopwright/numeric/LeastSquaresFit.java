package loopwright.numeric;

import java.util.Arrays;

/**
 * Least squares of any residuals: damped Gauss-Newton steps (Levenberg 1944, Marquardt 1963) with
 * columns scaled as by Moré (The Levenberg-Marquardt algorithm: implementation and theory, 1978),
 * the damping led by the ratio of won to promised reduction (Nielsen 1999), each step by QR and
 * never through the normal equations. What ends anywhere but at a minimum says so.
 */
public final class LeastSquaresFit {
  private static final int MOST_STEPS = 2000;

  /** A start that fails is tried again with shorter first steps. */
  private static final double[] FIRST_DAMPING = {1e-3, 1e1, 1e3, 1e5, 1e7};

  private static final double MOST_DAMPING = 1e60;

  /** A step smaller than this share of the unknowns is rounding. */
  private static final double SETTLED = 1e-13;

  /** Promised reduction, as a share of the sum of squares, that a double cannot show. */
  private static final double INVISIBLE = 1e-17;

  /** Steps of differences, in standard uncertainties of an unknown alone. */
  private static final double FINE = 0.05;

  /** Share of the usual step below which rounding would spoil the differences. */
  private static final double FINEST = 1e-3;

  /** Residuals that are so small beside what the unknowns do are rounding. */
  private static final double EXACT = 1e-12;

  private static final int MOST_POLISHING = 8;

  /** Change of the sum of squares, as a share of it, that is rounding. */
  private static final double FLAT = 1e-12;

  /** Cosine between residuals and a column of slopes that still passes for a right angle. */
  private static final double RIGHT_ANGLE = 1e-5;

  /** Columns of unit length that are this near to dependent are dependent. */
  private static final double DEPENDENT = 1e-11;

  private final Residuals residuals;
  private final double[] sizes;
  private final int mostSteps;
  private int evaluations;

  private LeastSquaresFit(Residuals residuals, double[] sizes, int mostSteps) {
    this.mostSteps = mostSteps;
    this.residuals = residuals;
    this.sizes = sizes;
  }

  /** What is to be made small. */
  @FunctionalInterface
  public interface Residuals {
    /**
     * The residuals.
     *
     * @param unknowns not to be modified
     * @return as many for any unknowns; a value that is not finite marks them as out of reach
     */
    double[] at(double[] unknowns);
  }

  /**
   * How a fit ended.
   *
   * @param converged whether the sum of squares is least here, to working precision
   * @param reason why not; empty when it is
   * @param values the unknowns where it ended
   * @param sumOfSquares of the residuals there
   * @param degreesOfFreedom residuals less unknowns
   * @param covariance of the unknowns, for residuals of equal variance that is estimated from them;
   *     NaN throughout when there is none
   * @param evaluations of the residuals, those for slopes included
   */
  public record Fit(
      boolean converged,
      String reason,
      double[] values,
      double sumOfSquares,
      int degreesOfFreedom,
      double[][] covariance,
      int evaluations) {
    /** Standard uncertainty of an unknown. */
    public double standard(int unknown) {
      return Math.sqrt(covariance[unknown][unknown]);
    }

    private Fit after(int allEvaluations) {
      return new Fit(
          converged, reason, values, sumOfSquares, degreesOfFreedom, covariance, allEvaluations);
    }

    /** Standard deviation of the residuals. */
    public double deviation() {
      return Math.sqrt(sumOfSquares / degreesOfFreedom);
    }
  }

  /**
   * Makes the sum of squares least.
   *
   * @param residuals more of them than unknowns
   * @param start first guess; not modified
   * @return where it ended, and whether that is a minimum
   */
  public static Fit of(Residuals residuals, double... start) {
    double[] sizes = Arrays.stream(start).map(x -> x == 0 ? 1 : Math.abs(x)).toArray();
    return of(residuals, start, sizes, MOST_STEPS);
  }

  /**
   * Makes the sum of squares least.
   *
   * @param residuals more of them than unknowns
   * @param start first guess; not modified
   * @param sizes of the unknowns where they are at home, above 0: what a small step is small
   *     beside, also where an unknown passes through 0
   * @param mostSteps after so many it gives up
   * @return where it ended, and whether that is a minimum
   */
  public static Fit of(Residuals residuals, double[] start, double[] sizes, int mostSteps) {
    LeastSquaresFit fit = new LeastSquaresFit(residuals, sizes.clone(), mostSteps);
    Fit first = null;
    for (double damping : FIRST_DAMPING) {
      Fit next = fit.from(start, damping);
      if (next.converged()) {
        return next;
      }
      first = first == null ? next : first;
    }
    return first.after(fit.evaluations);
  }

  private Fit from(double[] start, double firstDamping) {
    double[] at = start.clone();
    double[] residual = evaluate(at);
    double cost = square(residual);
    if (residual.length <= at.length) {
      throw new IllegalArgumentException(
          residual.length + " residuals for " + at.length + " unknowns, expected more");
    }
    if (!Double.isFinite(cost)) {
      return failed("the residuals have no value at the start", at, residual, cost);
    }
    double[] scale = new double[at.length];
    double damping = firstDamping;
    double growth = 2;
    double[][] slopes = slopes(at, residual.length);
    for (int step = 0; step < mostSteps; step++) {
      if (!isFinite(slopes)) {
        return failed("the residuals have no slope where it ended", at, residual, cost);
      }
      widen(scale, slopes);
      if (cost == 0) {
        return ended(at, residual, cost, slopes);
      }
      double[] move = move(slopes, residual, scale, damping);
      double promised = cost - square(linear(slopes, residual, move));
      double[] next = new double[at.length];
      double moved = 0;
      double size = 0;
      for (int i = 0; i < at.length; i++) {
        next[i] = at[i] + move[i];
        moved = Math.hypot(moved, scale[i] * move[i]);
        size = Math.hypot(size, scale[i] * at[i]);
      }
      double[] nextResidual = evaluate(next);
      double nextCost = square(nextResidual);
      double ratio = (cost - nextCost) / promised;
      boolean settled = moved <= SETTLED * size || promised <= INVISIBLE * cost;
      if (nextCost < cost && ratio > 0) {
        at = next;
        residual = nextResidual;
        cost = nextCost;
        damping *= Math.max(1.0 / 3, 1 - Math.pow(2 * ratio - 1, 3));
        growth = 2;
        slopes = slopes(at, residual.length);
      } else {
        damping *= growth;
        growth *= 2;
      }
      if (settled || damping > MOST_DAMPING) {
        return polished(at, residual, slopes);
      }
    }
    return failed("it had not settled after " + mostSteps + " steps", at, residual, cost);
  }

  /**
   * Full steps from where the sum of squares has become flat to rounding: slopes and residuals are
   * at right angles more exactly than the sum of squares can show. Each must halve the one before.
   */
  private Fit polished(double[] from, double[] itsResidual, double[][] itsSlopes) {
    double[] at = from;
    double[] residual = itsResidual;
    double[][] slopes = slopes(from, itsResidual.length, fine(from, itsResidual, itsSlopes));
    double allowed = Double.POSITIVE_INFINITY;
    for (int step = 0; step < MOST_POLISHING; step++) {
      double[] scale = new double[at.length];
      widen(scale, slopes);
      double[] move = move(slopes, residual, scale, 0);
      double[] next = new double[at.length];
      double moved = 0;
      for (int i = 0; i < at.length; i++) {
        next[i] = at[i] + move[i];
        moved = Math.hypot(moved, scale[i] * move[i]);
      }
      double[] nextResidual = evaluate(next);
      boolean same = square(nextResidual) <= (1 + FLAT) * square(residual);
      if (!(moved < allowed) || !same) {
        break;
      }
      at = next;
      residual = nextResidual;
      slopes = slopes(at, residual.length, fine(at, residual, slopes));
      allowed = moved / 2;
    }
    return ended(at, residual, square(residual), slopes);
  }

  /** A minimum, if the residuals stand at right angles to all slopes and these are independent. */
  private Fit ended(double[] at, double[] residual, double cost, double[][] slopes) {
    double[] lengths = new double[at.length];
    widen(lengths, slopes);
    double[][] unit = new double[slopes.length][at.length];
    double steepest = 0;
    for (int j = 0; j < at.length; j++) {
      if (lengths[j] == 0 || !Double.isFinite(lengths[j])) {
        return failed("unknown " + (j + 1) + " has no effect where it ended", at, residual, cost);
      }
      double along = 0;
      for (int i = 0; i < slopes.length; i++) {
        unit[i][j] = slopes[i][j] / lengths[j];
        along += unit[i][j] * residual[i];
      }
      steepest = Math.max(steepest, cost == 0 ? 0 : Math.abs(along) / Math.sqrt(cost));
    }
    HouseholderQr factors = new HouseholderQr(unit);
    for (int j = 0; j < at.length; j++) {
      if (Math.abs(factors.r(j, j)) < DEPENDENT) {
        return failed(
            "the slopes are singular where it ended: unknown "
                + (j + 1)
                + " cannot be told from those before it",
            at,
            residual,
            cost);
      }
    }
    double reach = 0;
    for (int j = 0; j < at.length; j++) {
      reach = Math.max(reach, lengths[j] * Math.max(Math.abs(at[j]), sizes[j]));
    }
    // Residuals that are rounding themselves stand at no angle to anything.
    boolean exact = Math.sqrt(cost) <= EXACT * reach;
    if (steepest > RIGHT_ANGLE && !exact) {
      return failed("no step, however short, leads further down", at, residual, cost);
    }
    double variance = cost / (residual.length - at.length);
    double[][] covariance = factors.inverseOfSquare();
    for (int i = 0; i < at.length; i++) {
      for (int j = 0; j < at.length; j++) {
        covariance[i][j] *= variance / (lengths[i] * lengths[j]);
      }
    }
    return new Fit(true, "", at, cost, residual.length - at.length, covariance, evaluations);
  }

  private Fit failed(String reason, double[] at, double[] residual, double cost) {
    double[][] none = new double[at.length][at.length];
    for (double[] row : none) {
      Arrays.fill(row, Double.NaN);
    }
    return new Fit(false, reason, at, cost, residual.length - at.length, none, evaluations);
  }

  /** The x that makes |J x + r|² + damping |D x|² least. */
  private static double[] move(
      double[][] slopes, double[] residual, double[] scale, double damping) {
    int rows = slopes.length;
    int columns = scale.length;
    double[][] stacked = new double[rows + columns][];
    double[] right = new double[rows + columns];
    for (int i = 0; i < rows; i++) {
      stacked[i] = slopes[i];
      right[i] = -residual[i];
    }
    for (int j = 0; j < columns; j++) {
      stacked[rows + j] = new double[columns];
      stacked[rows + j][j] = Math.sqrt(damping) * (scale[j] == 0 ? 1 : scale[j]);
    }
    return new HouseholderQr(stacked).solve(right);
  }

  private static double[] linear(double[][] slopes, double[] residual, double[] move) {
    double[] value = residual.clone();
    for (int i = 0; i < value.length; i++) {
      for (int j = 0; j < move.length; j++) {
        value[i] += slopes[i][j] * move[j];
      }
    }
    return value;
  }

  /** Raises each scale to the length of its column, if that is longer. */
  private static void widen(double[] scale, double[][] slopes) {
    for (int j = 0; j < scale.length; j++) {
      double length = 0;
      for (double[] row : slopes) {
        length = Math.hypot(length, row[j]);
      }
      scale[j] = Math.max(scale[j], length);
    }
  }

  private double[][] slopes(double[] at, int rows) {
    double[] steps = new double[at.length];
    for (int j = 0; j < at.length; j++) {
      steps[j] = relative(at[j], j);
    }
    return slopes(at, rows, steps);
  }

  private double relative(double value, int j) {
    return Math.pow(Math.ulp(1.0), 0.2) * Math.max(Math.abs(value), 0.01 * sizes[j]);
  }

  /** Steps that are small beside what the unknowns are known to, where that is less. */
  private double[] fine(double[] at, double[] residual, double[][] slopes) {
    double[] lengths = new double[at.length];
    widen(lengths, slopes);
    double deviation = Math.sqrt(square(residual) / (residual.length - at.length));
    double[] steps = new double[at.length];
    for (int j = 0; j < at.length; j++) {
      double known = FINE * deviation / lengths[j];
      double usual = relative(at[j], j);
      steps[j] = Math.min(usual, Math.max(FINEST * usual, known));
    }
    return steps;
  }

  /** Central differences of fourth order: (8 (f₁ − f₋₁) − (f₂ − f₋₂))/12h. */
  private double[][] slopes(double[] at, int rows, double[] steps) {
    double[][] slopes = new double[rows][at.length];
    for (int j = 0; j < at.length; j++) {
      double[] moved = at.clone();
      double[][] values = new double[5][];
      for (int k : new int[] {-2, -1, 1, 2}) {
        moved[j] = at[j] + k * steps[j];
        values[k + 2] = evaluate(moved);
      }
      for (int i = 0; i < rows; i++) {
        slopes[i][j] =
            (8 * (values[3][i] - values[1][i]) - (values[4][i] - values[0][i])) / (12 * steps[j]);
      }
    }
    return slopes;
  }

  private double[] evaluate(double[] at) {
    evaluations++;
    return residuals.at(at);
  }

  private static boolean isFinite(double[][] slopes) {
    return Arrays.stream(slopes).flatMapToDouble(Arrays::stream).allMatch(Double::isFinite);
  }

  private static double square(double[] values) {
    double sum = 0;
    for (double value : values) {
      sum += value * value;
    }
    return sum;
  }
}
