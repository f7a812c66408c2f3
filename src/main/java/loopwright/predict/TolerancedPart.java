package loopwright.predict;

/**
 * Something of a build that spreads. Its deviation from nominal is uniform between two limits, in a
 * measure that makes it so.
 *
 * @param kind what spreads, and in which measure
 * @param name path of a resistor, a capacitor, a rail or the ambient temperature, with the name of
 *     one of several parts behind an {@code @}; role of a transistor
 * @param low least deviation, not above 0 but for an ambient range beside the nominal one
 * @param high largest deviation
 */
public record TolerancedPart(Kind kind, String name, double low, double high) {
  /** What spreads, and how its deviation is measured. */
  public enum Kind {
    /** A share of the nominal resistance. */
    RESISTOR,
    /** A share of the nominal capacitance. */
    CAPACITOR,
    /** V more at equal current. */
    BASE_EMITTER_VOLTAGE,
    /** Natural logarithm of the ratio to the nominal current gain. */
    BETA,
    /** A share of the nominal voltage. */
    RAIL,
    /** K above the nominal temperature. */
    AMBIENT
  }

  /** Checks that the limits are in order. */
  public TolerancedPart {
    if (!(low <= high) || Double.isInfinite(low) || Double.isInfinite(high)) {
      throw new IllegalArgumentException(name + " from " + low + " to " + high);
    }
  }

  /** Standard uncertainty of the deviation: half the width over √3 (JCGM 100:2008, 4.3.7). */
  public double standardUncertainty() {
    return (high - low) / 2 / Math.sqrt(3);
  }

  /** Mean deviation; other than 0 where the nominal value is not in the middle. */
  public double mean() {
    return (low + high) / 2;
  }

  /** What it is, for a person: a part's path, or a transistor's role and which of its figures. */
  public String says() {
    return switch (kind) {
      case BASE_EMITTER_VOLTAGE -> "V_BE of " + name;
      case BETA -> "β of " + name;
      default -> name;
    };
  }
}
