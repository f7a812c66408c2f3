package loopwright.bench;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A record that rests at two levels and passes between them: its state levels by the histogram
 * (IEEE Std 181), its edges from 10 % to 90 %.
 *
 * @param low lower state level
 * @param high upper state level
 * @param rising times from 10 % to 90 % of each rising edge, s
 * @param falling of each falling edge, s
 * @param standard standard uncertainty of one of these times, s
 * @param between share of the samples between 10 % and 90 %
 */
record StepShape(
    double low,
    double high,
    List<Double> rising,
    List<Double> falling,
    double standard,
    double between) {
  private static final int BINS = 100;

  static StepShape of(double[] times, double[] values) {
    double most = Arrays.stream(values).max().orElse(0);
    double least = Arrays.stream(values).min().orElse(0);
    double low = mode(values, least, (least + most) / 2);
    double high = mode(values, (least + most) / 2, most);
    double tenth = low + 0.1 * (high - low);
    double ninetieth = low + 0.9 * (high - low);
    List<Double> rising = new ArrayList<>();
    List<Double> falling = new ArrayList<>();
    double upAt = Double.NaN;
    double downAt = Double.NaN;
    int inside = 0;
    for (int i = 0; i < values.length; i++) {
      inside += values[i] > tenth && values[i] < ninetieth ? 1 : 0;
      if (i == 0) {
        continue;
      }
      if (values[i - 1] <= tenth && values[i] > tenth) {
        upAt = passage(times, values, i, tenth);
      }
      if (values[i - 1] < ninetieth && values[i] >= ninetieth && !Double.isNaN(upAt)) {
        rising.add(passage(times, values, i, ninetieth) - upAt);
        upAt = Double.NaN;
      }
      if (values[i - 1] >= ninetieth && values[i] < ninetieth) {
        downAt = passage(times, values, i, ninetieth);
      }
      if (values[i - 1] > tenth && values[i] <= tenth && !Double.isNaN(downAt)) {
        falling.add(passage(times, values, i, tenth) - downAt);
        downAt = Double.NaN;
      }
    }
    double spacing = (times[times.length - 1] - times[0]) / (times.length - 1);
    // Each passage lies uniformly within a sample's spacing; the straight line between two samples
    // does better than that, which is not relied on.
    double standard = Math.sqrt(2) * spacing / Math.sqrt(12);
    return new StepShape(
        low, high, rising, falling, standard, inside / (double) Math.max(1, values.length));
  }

  /** Whether it rests at two levels: hardly a sample lies between them. */
  boolean isStep(double mostBetween) {
    return between < mostBetween && !(rising.isEmpty() && falling.isEmpty());
  }

  private static double mode(double[] values, double from, double to) {
    double width = (to - from) / BINS;
    int[] count = new int[BINS];
    double[] sum = new double[BINS];
    for (double value : values) {
      if (value >= from && value <= to) {
        int bin = width == 0 ? 0 : (int) Math.min(BINS - 1, (value - from) / width);
        count[bin]++;
        sum[bin] += value;
      }
    }
    int best = 0;
    for (int i = 1; i < BINS; i++) {
      best = count[i] > count[best] ? i : best;
    }
    return count[best] == 0 ? from : sum[best] / count[best];
  }

  private static double passage(double[] times, double[] values, int i, double level) {
    double share = (level - values[i - 1]) / (values[i] - values[i - 1]);
    return times[i - 1] + share * (times[i] - times[i - 1]);
  }
}
