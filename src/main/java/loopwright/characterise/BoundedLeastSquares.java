package loopwright.characterise;

import java.util.function.UnaryOperator;

/**
 * Least squares of a few unknowns within bounds: damped Gauss-Newton steps (Levenberg 1944,
 * Marquardt 1963) on the unknowns that no bound holds back. Unknowns should be scaled so that a
 * change of one tenth matters.
 */
final class BoundedLeastSquares {
  private static final int STEPS = 300;
  private static final double DIFFERENCE = 1e-6;
  private static final double LEAST_STEP = 1e-13;
  private static final double LEAST_DAMPING = 1e-14;
  private static final double MOST_DAMPING = 1e12;

  private final UnaryOperator<double[]> residuals;
  private final double[] low;
  private final double[] high;

  /**
   * @param residuals from the unknowns to the residuals; a NaN marks a point as out of reach
   * @param low lower bounds
   * @param high upper bounds
   */
  BoundedLeastSquares(UnaryOperator<double[]> residuals, double[] low, double[] high) {
    this.residuals = residuals;
    this.low = low.clone();
    this.high = high.clone();
  }

  /**
   * Half the sum of squares is least here, or as near as rounding lets it come.
   *
   * @param start inside the bounds and within reach; not modified
   * @return the unknowns
   */
  double[] solve(double[] start) {
    double[] at = start.clone();
    double cost = cost(at);
    double damping = 1e-3;
    for (int step = 0; step < STEPS && cost > 0; step++) {
      double[] residual = residuals.apply(at);
      double[][] slopes = slopes(at);
      boolean moved = false;
      while (!moved) {
        double[] next = clamp(at, direction(at, residual, slopes, damping));
        boolean settled = distance(at, next) < LEAST_STEP || damping > MOST_DAMPING;
        double nextCost = cost(next);
        if (nextCost < cost) {
          at = next;
          cost = nextCost;
          damping = Math.max(LEAST_DAMPING, damping * 0.1);
          moved = true;
        } else {
          damping *= 10;
        }
        if (settled) {
          return at;
        }
      }
    }
    return at;
  }

  /** Half the sum of the squared residuals; infinite where they are out of reach. */
  double cost(double[] at) {
    double sum = 0;
    for (double residual : residuals.apply(at)) {
      sum += 0.5 * residual * residual;
    }
    return Double.isNaN(sum) ? Double.POSITIVE_INFINITY : sum;
  }

  private double[] direction(double[] at, double[] residual, double[][] slopes, double damping) {
    int count = at.length;
    double[] gradient = new double[count];
    double[][] normal = new double[count][count];
    for (int i = 0; i < count; i++) {
      for (int k = 0; k < residual.length; k++) {
        gradient[i] += slopes[i][k] * residual[k];
        for (int j = 0; j < count; j++) {
          normal[i][j] += slopes[i][k] * slopes[j][k];
        }
      }
    }
    for (int i = 0; i < count; i++) {
      boolean held =
          at[i] <= low[i] && gradient[i] >= 0
              || at[i] >= high[i] && gradient[i] <= 0
              || normal[i][i] == 0;
      if (held) {
        gradient[i] = 0;
        for (int j = 0; j < count; j++) {
          normal[i][j] = 0;
          normal[j][i] = 0;
        }
        normal[i][i] = 1;
      } else {
        normal[i][i] *= 1 + damping;
      }
    }
    return solveSymmetric(normal, gradient);
  }

  /** Slopes of all residuals by each unknown, by central differences where the bounds allow. */
  private double[][] slopes(double[] at) {
    double[][] slopes = new double[at.length][];
    for (int i = 0; i < at.length; i++) {
      double[] above = at.clone();
      double[] below = at.clone();
      above[i] = Math.min(high[i], at[i] + DIFFERENCE);
      below[i] = Math.max(low[i], at[i] - DIFFERENCE);
      double[] upper = residuals.apply(above);
      double[] lower = residuals.apply(below);
      slopes[i] = new double[upper.length];
      for (int k = 0; k < upper.length; k++) {
        slopes[i][k] = (upper[k] - lower[k]) / (above[i] - below[i]);
      }
    }
    return slopes;
  }

  private double[] clamp(double[] at, double[] direction) {
    double[] next = new double[at.length];
    for (int i = 0; i < at.length; i++) {
      next[i] = Math.max(low[i], Math.min(high[i], at[i] - direction[i]));
    }
    return next;
  }

  private static double distance(double[] from, double[] to) {
    double most = 0;
    for (int i = 0; i < from.length; i++) {
      most = Math.max(most, Math.abs(to[i] - from[i]) / Math.max(1, Math.abs(to[i])));
    }
    return most;
  }

  /**
   * Solves a positive definite system of a few unknowns by elimination; modifies both arguments.
   */
  private static double[] solveSymmetric(double[][] matrix, double[] right) {
    int count = right.length;
    for (int pivot = 0; pivot < count; pivot++) {
      for (int row = pivot + 1; row < count; row++) {
        double factor = matrix[row][pivot] / matrix[pivot][pivot];
        for (int column = pivot; column < count; column++) {
          matrix[row][column] -= factor * matrix[pivot][column];
        }
        right[row] -= factor * right[pivot];
      }
    }
    for (int row = count - 1; row >= 0; row--) {
      for (int column = row + 1; column < count; column++) {
        right[row] -= matrix[row][column] * right[column];
      }
      right[row] /= matrix[row][row];
    }
    return right;
  }
}
