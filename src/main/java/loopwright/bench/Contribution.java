package loopwright.bench;

/**
 * One contribution to an uncertainty.
 *
 * @param cause where it comes from
 * @param standard its standard uncertainty times the magnitude of its sensitivity, in the unit of
 *     the result
 * @param degreesOfFreedom infinite for a limit that is stated
 * @param rectangular whether it is uniform between two limits
 */
public record Contribution(
    String cause, double standard, double degreesOfFreedom, boolean rectangular) {
  /** Uniform within ± a half-width (JCGM 100:2008, 4.3.7): a/√3. */
  public static Contribution rectangular(String cause, double halfWidth) {
    return new Contribution(
        cause, Math.abs(halfWidth) / Math.sqrt(3), Double.POSITIVE_INFINITY, true);
  }

  /** Triangular within ± a half-width (JCGM 100:2008, 4.3.9): a/√6. */
  public static Contribution triangular(String cause, double halfWidth) {
    return new Contribution(
        cause, Math.abs(halfWidth) / Math.sqrt(6), Double.POSITIVE_INFINITY, false);
  }

  /** A cycle between two limits, mostly near its ends: a/√2. */
  public static Contribution uShaped(String cause, double halfWidth) {
    return new Contribution(
        cause, Math.abs(halfWidth) / Math.sqrt(2), Double.POSITIVE_INFINITY, false);
  }

  /** A standard uncertainty, known with so many degrees of freedom. */
  public static Contribution normal(String cause, double standard, double degreesOfFreedom) {
    return new Contribution(cause, Math.abs(standard), degreesOfFreedom, false);
  }
}
