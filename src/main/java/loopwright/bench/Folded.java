package loopwright.bench;

/**
 * A periodic record folded onto one period: means of the samples whose phase is alike. The noise of
 * single samples then does not widen its range.
 *
 * @param means by phase
 * @param standards standard uncertainty of each mean
 */
record Folded(double[] means, double[] standards) {
  private static final int MOST = 64;
  private static final int FEWEST = 8;
  private static final int SAMPLES = 8;

  static Folded of(double[] times, double[] values, double frequency) {
    int bins = Math.max(FEWEST, Math.min(MOST, values.length / SAMPLES));
    double[] sum = new double[bins];
    double[] square = new double[bins];
    int[] count = new int[bins];
    for (int i = 0; i < values.length; i++) {
      double cycles = (times[i] - times[0]) * frequency;
      int bin = (int) Math.min(bins - 1, (cycles - Math.floor(cycles)) * bins);
      sum[bin] += values[i];
      square[bin] += values[i] * values[i];
      count[bin]++;
    }
    double[] means = new double[bins];
    double[] standards = new double[bins];
    for (int bin = 0; bin < bins; bin++) {
      means[bin] = count[bin] == 0 ? Double.NaN : sum[bin] / count[bin];
      double variance =
          count[bin] < 2
              ? 0
              : Math.max(0, square[bin] - sum[bin] * means[bin]) / (count[bin] - 1.0);
      standards[bin] = count[bin] == 0 ? 0 : Math.sqrt(variance / count[bin]);
    }
    return new Folded(means, standards);
  }

  /** Half the range. */
  double halfRange() {
    return (means[highest(1)] - means[highest(-1)]) / 2;
  }

  /** Standard uncertainty of half the range. */
  double halfRangeStandard() {
    return Math.hypot(standards[highest(1)], standards[highest(-1)]) / 2;
  }

  private int highest(int way) {
    int best = -1;
    for (int i = 0; i < means.length; i++) {
      if (!Double.isNaN(means[i]) && (best < 0 || way * means[i] > way * means[best])) {
        best = i;
      }
    }
    return best;
  }
}
