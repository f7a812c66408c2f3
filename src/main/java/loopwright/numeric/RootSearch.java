package loopwright.numeric;

import java.util.function.DoubleUnaryOperator;

/**
 * Root of a continuous function between two points where its sign differs: bisection, secant and
 * inverse quadratic interpolation (Brent, Algorithms for Minimization without Derivatives, 1973,
 * chapter 4; written from memory).
 */
public final class RootSearch {
  private static final int ITERATIONS = 200;

  private RootSearch() {}

  /**
   * Finds a root.
   *
   * @param function continuous between the bounds
   * @param low one bound
   * @param high the other bound
   * @param tolerance greatest error of the result, in the unit of the bounds
   * @return the point where the function changes sign, or NaN where the function itself is NaN on
   *     the way
   * @throws IllegalArgumentException when the function has the same sign at both bounds
   */
  public static double find(
      DoubleUnaryOperator function, double low, double high, double tolerance) {
    double a = low;
    double b = high;
    double fa = function.applyAsDouble(a);
    double fb = function.applyAsDouble(b);
    if (fa == 0) {
      return a;
    }
    if (fb == 0) {
      return b;
    }
    if (fa * fb > 0) {
      throw new IllegalArgumentException("no change of sign between " + low + " and " + high);
    }
    double c = a;
    double fc = fa;
    double step = b - a;
    double previous = step;
    for (int i = 0; i < ITERATIONS; i++) {
      if (fb * fc > 0) {
        c = a;
        fc = fa;
        step = b - a;
        previous = step;
      }
      if (Math.abs(fc) < Math.abs(fb)) {
        a = b;
        b = c;
        c = a;
        fa = fb;
        fb = fc;
        fc = fa;
      }
      double least = 2 * Math.ulp(b) + 0.5 * tolerance;
      double half = 0.5 * (c - b);
      if (Math.abs(half) <= least || fb == 0) {
        return b;
      }
      if (Double.isNaN(fb)) {
        return Double.NaN;
      }
      if (Math.abs(previous) < least || Math.abs(fa) <= Math.abs(fb)) {
        step = half;
        previous = half;
      } else {
        double s = fb / fa;
        double p;
        double q;
        if (a == c) {
          p = 2 * half * s;
          q = 1 - s;
        } else {
          double t = fa / fc;
          double r = fb / fc;
          p = s * (2 * half * t * (t - r) - (b - a) * (r - 1));
          q = (t - 1) * (r - 1) * (s - 1);
        }
        if (p > 0) {
          q = -q;
        } else {
          p = -p;
        }
        if (2 * p < Math.min(3 * half * q - Math.abs(least * q), Math.abs(previous * q))) {
          previous = step;
          step = p / q;
        } else {
          step = half;
          previous = half;
        }
      }
      a = b;
      fa = fb;
      b += Math.abs(step) > least ? step : Math.copySign(least, half);
      fb = function.applyAsDouble(b);
    }
    return b;
  }
}
