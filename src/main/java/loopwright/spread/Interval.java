package loopwright.spread;

import java.util.Arrays;

/** The interval that covers 95 % of the samples, as many left out below as above. */
final class Interval {
  private static final double COVERED = 0.95;

  private Interval() {}

  /**
   * The probabilistically symmetric coverage interval (JCGM 101:2008, 7.7.2): of M values in
   * ascending order the one numbered r and the one numbered r + q, with q the integer part of 0.95
   * M + 1/2 and r half of M − q, rounded up.
   *
   * @param values at least one, in any order; not modified
   * @return lower and upper end
   */
  static double[] of(double[] values) {
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    int count = sorted.length;
    int covered = (int) (COVERED * count + 0.5);
    int first = Math.max(1, (count - covered + 1) / 2);
    int last = Math.min(count, first + covered);
    return new double[] {sorted[first - 1], sorted[last - 1]};
  }
}
