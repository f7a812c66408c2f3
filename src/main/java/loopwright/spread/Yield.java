package loopwright.spread;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import loopwright.design.Limit;

/**
 * How many builds meet every limit of a hookup. A build that lacks a figure does not meet its
 * limits. Guard bands belong to the judgement of measured values and do not count here.
 *
 * @param share 0 to 1; empty when there is none
 * @param says what it rests on, or why there is none
 */
record Yield(OptionalDouble share, String says) {
  /**
   * Counts.
   *
   * @param limits of this hookup
   * @param nodes samples by node
   * @param figures samples by key; those that are not sampled are missing
   */
  static Yield of(List<Limit> limits, Map<String, Samples> nodes, Map<String, Samples> figures) {
    if (limits.isEmpty()) {
      return new Yield(OptionalDouble.empty(), "the design states no limits for this hookup");
    }
    int builds = Integer.MAX_VALUE;
    for (Limit limit : limits) {
      Samples samples = samples(limit, nodes, figures);
      if (samples == null) {
        return new Yield(OptionalDouble.empty(), what(limit) + " has a limit but is not sampled");
      }
      builds = Math.min(builds, samples.count());
    }
    int met = 0;
    for (int build = 0; build < builds; build++) {
      int at = build;
      if (limits.stream().allMatch(limit -> meets(limit, samples(limit, nodes, figures).get(at)))) {
        met++;
      }
    }
    return new Yield(OptionalDouble.of((double) met / builds), met + " of " + builds + " builds");
  }

  private static Samples samples(
      Limit limit, Map<String, Samples> nodes, Map<String, Samples> figures) {
    return limit.node().isPresent()
        ? nodes.get(limit.node().get())
        : figures.get(limit.figure().orElse(""));
  }

  private static String what(Limit limit) {
    return limit.node().or(limit::figure).orElse("something");
  }

  private static boolean meets(Limit limit, double value) {
    return Double.isFinite(value)
        && limit.minimum().filter(minimum -> value < minimum.value()).isEmpty()
        && limit.maximum().filter(maximum -> value > maximum.value()).isEmpty();
  }
}
