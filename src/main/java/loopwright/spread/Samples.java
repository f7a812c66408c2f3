package loopwright.spread;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.predict.FigureValue;
import loopwright.predict.TolerancedPart;

/**
 * The values of one node or figure, one for each build; NaN where a build has none. Builds are
 * written from several threads, each its own.
 */
final class Samples {
  /** A part with less than this share of the variance is left out. */
  private static final double LEAST_SHARE = 0.01;

  /**
   * A share below this over the number of builds may be chance: the squared correlation of
   * independent samples has mean 1/M, and 99.5 % of them lie below 8/M (chi-squared, one degree of
   * freedom).
   */
  private static final double CHANCE = 8;

  private static final int FEWEST_FOR_SHARES = 30;

  private final double[] values;

  Samples(int count) {
    values = new double[count];
    Arrays.fill(values, Double.NaN);
  }

  int count() {
    return values.length;
  }

  void set(int build, FigureValue value) {
    values[build] = value.number().orElse(Double.NaN);
  }

  double get(int build) {
    return values[build];
  }

  /**
   * The band.
   *
   * @param nominal value with every part as the design says
   * @param parts what spreads
   * @param deviations by build, then by part
   */
  Band band(FigureValue nominal, List<TolerancedPart> parts, double[][] deviations) {
    double[] present = Arrays.stream(values).filter(Double::isFinite).toArray();
    String reason = nominal.number().isPresent() ? "" : nominal.says();
    if (present.length == 0) {
      return new Band(
          nominal.number(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          0,
          reason.isEmpty() ? "no build has this figure" : reason,
          List.of(),
          List.of());
    }
    double[] interval = Interval.of(present);
    if (present.length < values.length) {
      reason = (values.length - present.length) + " of " + values.length + " builds do not have it";
    }
    return new Band(
        nominal.number(),
        OptionalDouble.of(interval[0]),
        OptionalDouble.of(interval[1]),
        present.length,
        reason,
        matters(present.length, parts, deviations),
        Arrays.stream(present).boxed().toList());
  }

  private List<Band.Matter> matters(
      int present, List<TolerancedPart> parts, double[][] deviations) {
    List<Band.Matter> matters = new ArrayList<>();
    if (present < FEWEST_FOR_SHARES) {
      return matters;
    }
    double least = Math.max(LEAST_SHARE, CHANCE / present);
    for (int part = 0; part < parts.size(); part++) {
      double share = squaredCorrelation(part, deviations);
      if (share > least) {
        matters.add(new Band.Matter(parts.get(part).says(), share));
      }
    }
    matters.sort(Comparator.comparingDouble(Band.Matter::share).reversed());
    return matters;
  }

  private double squaredCorrelation(int part, double[][] deviations) {
    double count = 0;
    double meanX = 0;
    double meanY = 0;
    double xx = 0;
    double yy = 0;
    double xy = 0;
    for (int build = 0; build < values.length; build++) {
      double y = values[build];
      if (Double.isFinite(y)) {
        double x = deviations[build][part];
        count++;
        double dx = x - meanX;
        double dy = y - meanY;
        meanX += dx / count;
        meanY += dy / count;
        xx += dx * (x - meanX);
        yy += dy * (y - meanY);
        xy += dx * (y - meanY);
      }
    }
    return xx > 0 && yy > 0 ? xy * xy / (xx * yy) : 0;
  }
}
