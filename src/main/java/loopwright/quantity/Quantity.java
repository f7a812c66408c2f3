package loopwright.quantity;

import java.util.Locale;

/**
 * A value in a plain SI unit together with the spelling that its author gave it.
 *
 * <p>Two quantities are equal when value and spelling are: {@code 4k7} and {@code 4.7k} are the
 * same resistance but not the same text.
 *
 * @param value the value in the plain unit; may be infinite, never NaN
 * @param spelling what the author wrote, or what the program would write
 * @param bare true when it was written as a plain number, false when as text
 */
public record Quantity(double value, String spelling, boolean bare) {
  /** Checks the value. */
  public Quantity {
    if (Double.isNaN(value)) {
      throw new IllegalArgumentException("a quantity must be a number");
    }
  }

  /** A value of the program's own making, written as a plain number. */
  public static Quantity of(double value) {
    if (Double.isInfinite(value)) {
      return new Quantity(value, value > 0 ? "infinite" : "-infinite", false);
    }
    return new Quantity(value, plain(value), true);
  }

  /** A value of the program's own making, written as a person would: {@code 4.7k}. */
  public static Quantity spelled(double value, Unit unit) {
    return new Quantity(value, EngineeringFormat.spelling(value, unit), false);
  }

  /**
   * A number literal as it stands in a file.
   *
   * @throws QuantityException when it is too large for a finite number
   */
  public static Quantity literal(String number) {
    double value = Double.parseDouble(number);
    if (!Double.isFinite(value)) {
      throw new QuantityException("found " + number + ", expected a finite number");
    }
    return new Quantity(value, number, true);
  }

  /**
   * Reads a value as a person would write it.
   *
   * @param text for example {@code 4k7}, {@code 4.7 kΩ}, {@code -6,1 mV}, {@code 1e-12}
   * @param unit the unit that may stand behind the number, and that is meant where none does
   * @throws QuantityException when the text is no value, or carries another unit
   */
  public static Quantity parse(String text, Unit unit) {
    return new Quantity(QuantityParser.parse(text, unit), text, false);
  }

  /**
   * Reads a value that must lie in a range.
   *
   * @throws QuantityException when the text is no value, carries another unit, or lies outside
   */
  public static Quantity parse(String text, Unit unit, Range range) {
    Quantity quantity = parse(text, unit);
    quantity.requireWithin(range, unit);
    return quantity;
  }

  /**
   * Reads a value of any unit, for a caller that learns from the text what was meant.
   *
   * @throws QuantityException when the text is no value
   */
  public static WrittenValue parseAny(String text) {
    return QuantityParser.parseAny(text);
  }

  /**
   * Checks the range.
   *
   * @throws QuantityException when the value lies outside; the message says what was expected
   */
  public void requireWithin(Range range, Unit unit) {
    if (!range.contains(value)) {
      String expected = range == Range.ANY ? "finite" : range.says();
      String unitSays = unit.symbol().isEmpty() ? "" : " in " + unit.symbol();
      throw new QuantityException(
          "found "
              + (bare ? spelling : "\"" + spelling + "\"")
              + ", expected "
              + unit.says()
              + unitSays
              + " that is "
              + expected);
    }
  }

  private static String plain(double value) {
    if (value == Math.rint(value) && Math.abs(value) < 1e7) {
      return Long.toString((long) value);
    }
    return Double.toString(value).toLowerCase(Locale.ROOT);
  }
}
