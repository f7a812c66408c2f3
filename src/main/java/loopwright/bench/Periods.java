package loopwright.bench;

import java.util.Arrays;

/** Counts the periods of a record by its passages through the middle of its range. */
final class Periods {
  /** Share of the range that a passage must clear on each side, so that noise makes none. */
  private static final double CLEAR = 0.2;

  private Periods() {}

  /**
   * Periods in a whole record of evenly spaced samples; 0 when it does not pass the middle twice.
   */
  static double of(double[] values) {
    double high = Arrays.stream(values).max().orElse(0);
    double low = Arrays.stream(values).min().orElse(0);
    double middle = (high + low) / 2;
    double clear = CLEAR * (high - low);
    int side = 0;
    int candidate = -1;
    int passages = 0;
    int first = -1;
    int last = -1;
    for (int i = 0; i < values.length; i++) {
      double away = values[i] - middle;
      if (i > 0 && away * (values[i - 1] - middle) <= 0) {
        candidate = i;
      }
      int now = away > clear ? 1 : away < -clear ? -1 : 0;
      if (now != 0 && now != side) {
        if (side != 0) {
          passages++;
          first = first < 0 ? candidate : first;
          last = candidate;
        }
        side = now;
      }
    }
    if (passages < 2) {
      return passages == 0 ? 0 : 1;
    }
    return (passages - 1) / 2.0 * (values.length - 1) / Math.max(1, last - first);
  }
}
