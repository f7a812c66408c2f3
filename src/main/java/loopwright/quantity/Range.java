package loopwright.quantity;

/** The values that make sense for a field. */
public enum Range {
  ANY("any value"),
  NOT_NEGATIVE("zero or more"),
  POSITIVE("more than zero"),
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

  /** Whether the value lies inside; a NaN never does. */
  public boolean contains(double value) {
    return switch (this) {
      case ANY -> !Double.isNaN(value);
      case NOT_NEGATIVE -> value >= 0;
      case POSITIVE -> value > 0;
      case FRACTION -> value >= 0 && value <= 1;
    };
  }
}
