package loopwright.numeric;

/** Student's t distribution. */
public final class StudentT {
  private static final int BISECTIONS = 200;
  private static final int MOST_STEPS = 400_000;

  private StudentT() {}

  /**
   * The factor t that covers a share of the distribution on both sides of zero (JCGM 100:2008,
   * Table G.2).
   *
   * @param coverage share, above 0 and below 1
   * @param degreesOfFreedom at least 1; a fraction is truncated (G.4.1)
   */
  public static double factor(double coverage, double degreesOfFreedom) {
    if (!(coverage > 0 && coverage < 1) || !(degreesOfFreedom >= 1)) {
      throw new IllegalArgumentException(coverage + " with " + degreesOfFreedom + " degrees");
    }
    int degrees = (int) Math.min(degreesOfFreedom, MOST_STEPS);
    double low = 0;
    double high = 1;
    while (covered(high, degrees) < coverage) {
      high *= 2;
    }
    for (int i = 0; i < BISECTIONS; i++) {
      double middle = (low + high) / 2;
      if (covered(middle, degrees) < coverage) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return (low + high) / 2;
  }

  /**
   * Share between −t and t: the finite trigonometric sums of Abramowitz and Stegun, Handbook of
   * Mathematical Functions, 26.7.3 and 26.7.4.
   */
  static double covered(double t, int degrees) {
    double angle = Math.atan(t / Math.sqrt(degrees));
    double cosine = Math.cos(angle);
    double square = cosine * cosine;
    if (degrees == 1) {
      return 2 * angle / Math.PI;
    }
    boolean odd = degrees % 2 == 1;
    double term = odd ? cosine : 1;
    double sum = term;
    for (int n = odd ? 3 : 2; n <= degrees - 2; n += 2) {
      term *= square * (n - 1) / n;
      sum += term;
    }
    return odd ? 2 / Math.PI * (angle + Math.sin(angle) * sum) : Math.sin(angle) * sum;
  }
}
