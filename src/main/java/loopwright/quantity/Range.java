package loopwright.quantity;

/** The values that make sense for a field. */
public enum Range {
  /** Any finite value. */
  ANY("any value"),
  /** Zero or more, finite. */
  NOT_NEGATIVE("zero or more"),
  /** More than zero, finite. */
  POSITIVE("more than zero"),
  /** More than zero; {@code infinite} where the effect is absent. */
  POSITIVE_OR_INFINITE("more than zero, or infinite"),
  /** Any value but zero; {@code infinite} where the effect is absent. */
  NOT_ZERO_OR_INFINITE("not zero, or infinite"),
  /** A share of a whole: 0 to 1, written as a fraction or in per cent. */
  FRACTION("a fraction from 0 to 1, or per cent");

  private final String says;

  Range(String says) {
    this.says = says;
  }

  /** The range in words, for messages. */
  public String says() {
    return says;
  }

  /** Whether the field may be infinite. */
  public boolean allowsInfinity() {
    return this == POSITIVE_OR_INFINITE || this == NOT_ZERO_OR_INFINITE;
  }

  /** Whether the value lies inside; a NaN never does, an infinity only where the range says so. */
  public boolean contains(double value) {
    return switch (this) {
      case ANY -> Double.isFinite(value);
      case NOT_NEGATIVE -> value >= 0 && Double.isFinite(value);
      case POSITIVE -> value > 0 && Double.isFinite(value);
      case POSITIVE_OR_INFINITE -> value > 0;
      case NOT_ZERO_OR_INFINITE ->
          value != 0 && !Double.isNaN(value) && value != Double.NEGATIVE_INFINITY;
      case FRACTION -> value >= 0 && value <= 1;
    };
  }
}
