package loopwright.view.chart;

import java.util.stream.DoubleStream;

/**
 * What an axis shows.
 *
 * @param lower its lower end
 * @param upper its upper end, above the lower
 */
record Span(double lower, double upper) {
  /** Checks the order. */
  Span {
    if (!(lower < upper)) {
      throw new IllegalArgumentException(
          "found a span from " + lower + " to " + upper + ", expected a lower end below the upper");
    }
  }

  /** From the least to the greatest finite value; of a single value, some room around it. */
  static Span of(DoubleStream values) {
    double[] finite = values.filter(Double::isFinite).toArray();
    if (finite.length == 0) {
      return new Span(-1, 1);
    }
    double lower = DoubleStream.of(finite).min().getAsDouble();
    double upper = DoubleStream.of(finite).max().getAsDouble();
    // Rounding noise on a straight line is not to fill the plot.
    double least = 1e-9 * Math.max(Math.abs(lower), Math.abs(upper));
    if (upper - lower > least) {
      return new Span(lower, upper);
    }
    double room = lower == 0 ? 1 : Math.abs(lower) * 0.1;
    return new Span(lower - room, upper + room);
  }

  /** Wide enough to hold this value too. */
  Span with(double value) {
    return new Span(Math.min(lower, value), Math.max(upper, value));
  }

  /** No shorter than this, about the same middle. */
  Span atLeast(double least) {
    double missing = Math.max(0, least - length()) / 2;
    return new Span(lower - missing, upper + missing);
  }

  /** With room at both ends, each a share of the whole. */
  Span padded(double share) {
    return padded(share, share);
  }

  /** With room below and above, as shares of the whole. */
  Span padded(double below, double above) {
    double whole = upper - lower;
    return new Span(lower - below * whole, upper + above * whole);
  }

  /** Its length. */
  double length() {
    return upper - lower;
  }
}
