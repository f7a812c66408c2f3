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

  /** A number literal as it stands in a file. */
  public static Quantity literal(String number) {
    return new Quantity(Double.parseDouble(number), number, true);
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

  private static String plain(double value) {
    if (value == Math.rint(value) && Math.abs(value) < 1e7) {
      return Long.toString((long) value);
    }
    return Double.toString(value).toLowerCase(Locale.ROOT);
  }
}
