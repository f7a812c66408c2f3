package loopwright.numeric;

/** The chi-squared distribution. */
public final class ChiSquared {
  private static final int MOST_TERMS = 10_000;
  private static final double SMALL = 1e-300;
  private static final double EXACT = 1e-15;

  private ChiSquared() {}

  /**
   * Probability that the sum of squares of independent standard normal variables is larger: Q(k/2,
   * x/2), the regularised upper incomplete gamma function, by its series (Abramowitz and Stegun,
   * Handbook of Mathematical Functions, 6.5.29) or continued fraction (6.5.31).
   *
   * @param value x, not negative
   * @param degreesOfFreedom k, above zero
   */
  public static double exceeded(double value, int degreesOfFreedom) {
    if (!(value >= 0) || degreesOfFreedom < 1) {
      throw new IllegalArgumentException(value + " with " + degreesOfFreedom + " degrees");
    }
    double a = degreesOfFreedom / 2.0;
    double x = value / 2;
    if (x == 0) {
      return 1;
    }
    double front = Math.exp(a * Math.log(x) - x - logGammaOfHalves(degreesOfFreedom));
    return x < a + 1 ? 1 - front * series(a, x) : front * fraction(a, x);
  }

  private static double series(double a, double x) {
    double term = 1 / a;
    double sum = term;
    for (int n = 1; n < MOST_TERMS && term > EXACT * sum; n++) {
      term *= x / (a + n);
      sum += term;
    }
    return sum;
  }

  /** By the modified method of Lentz. */
  private static double fraction(double a, double x) {
    double b = x + 1 - a;
    double c = 1 / SMALL;
    double d = 1 / b;
    double value = d;
    for (int n = 1; n < MOST_TERMS; n++) {
      double an = n * (a - n);
      b += 2;
      d = 1 / nonZero(an * d + b);
      c = nonZero(b + an / c);
      double factor = c * d;
      value *= factor;
      if (Math.abs(factor - 1) < EXACT) {
        break;
      }
    }
    return value;
  }

  private static double nonZero(double value) {
    return Math.abs(value) < SMALL ? SMALL : value;
  }

  /** ln Γ(k/2), from Γ(1) or Γ(1/2) upward. */
  static double logGammaOfHalves(int k) {
    double sum = k % 2 == 0 ? 0 : Math.log(Math.PI) / 2;
    for (int n = k % 2 == 0 ? 2 : 1; n < k; n += 2) {
      sum += Math.log(n / 2.0);
    }
    return sum;
  }
}
