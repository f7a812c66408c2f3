package loopwright.characterise;

import java.util.Optional;
import loopwright.quantity.Quantity;

/**
 * The nominal value of a printed figure: the typical one; where only minimum and maximum are
 * printed their mean, geometric for current gains; where only a minimum is printed 1.5 times it. A
 * maximum alone says how bad a part may be, not what it is, and gives no nominal value.
 *
 * @param value nominal value in the figure's unit; NaN where the origin gives none
 * @param origin how it was taken
 */
record Nominal(double value, Origin origin) {
  /** A minimum is taken to lie this far below what is usual. */
  static final double ABOVE_MINIMUM = 1.5;

  /** How a nominal value was taken. */
  enum Origin {
    TYPICAL(""),
    MEASURED(", measured"),
    GEOMETRIC_MEAN(" (geometric mean of minimum and maximum)"),
    MEAN(" (mean of minimum and maximum)"),
    ABOVE_MINIMUM(" (1.5 × minimum)"),
    MAXIMUM_ALONE(" (maximum alone)"),
    NOTHING(" (no value)");

    private final String says;

    Origin(String says) {
      this.says = says;
    }

    /** To be put behind the figure's name. */
    String says() {
      return says;
    }
  }

  /** Nominal value of a current gain. */
  static Nominal ofGain(
      Optional<Quantity> minimum, Optional<Quantity> typical, Optional<Quantity> maximum) {
    return of(minimum, typical, maximum, Origin.GEOMETRIC_MEAN);
  }

  /** Nominal value of any other figure. */
  static Nominal of(
      Optional<Quantity> minimum, Optional<Quantity> typical, Optional<Quantity> maximum) {
    return of(minimum, typical, maximum, Origin.MEAN);
  }

  /** A value that a tester showed. */
  static Nominal measured(Quantity value) {
    return new Nominal(value.value(), Origin.MEASURED);
  }

  /** Whether there is a value to fit. */
  boolean isUsable() {
    return !Double.isNaN(value);
  }

  private static Nominal of(
      Optional<Quantity> minimum,
      Optional<Quantity> typical,
      Optional<Quantity> maximum,
      Origin mean) {
    if (typical.isPresent()) {
      return new Nominal(typical.get().value(), Origin.TYPICAL);
    }
    if (minimum.isPresent() && maximum.isPresent()) {
      double low = minimum.get().value();
      double high = maximum.get().value();
      return new Nominal(
          mean == Origin.GEOMETRIC_MEAN ? Math.sqrt(low * high) : 0.5 * (low + high), mean);
    }
    if (minimum.isPresent()) {
      return new Nominal(ABOVE_MINIMUM * minimum.get().value(), Origin.ABOVE_MINIMUM);
    }
    return new Nominal(Double.NaN, maximum.isPresent() ? Origin.MAXIMUM_ALONE : Origin.NOTHING);
  }
}
