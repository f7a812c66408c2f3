package loopwright.view.chart;

import java.math.BigDecimal;
import java.math.RoundingMode;
import loopwright.quantity.Unit;

/**
 * The one prefix that all numbers along an axis share.
 *
 * @param exponent power of ten of the prefix
 * @param onTicks what follows every number, its gap included; empty when the axis names the unit
 * @param onAxis the unit that the axis names; empty when the numbers carry it
 */
record AxisScale(int exponent, String onTicks, String onAxis) {
  private static final String PREFIXES = "fpnµm kMG";
  private static final int LEAST = -15;
  private static final int GREATEST = 9;
  private static final String SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

  /**
   * The scale for an axis.
   *
   * @param unit its unit
   * @param largest the largest magnitude on it, in the unit
   */
  static AxisScale of(Unit unit, double largest) {
    return switch (unit) {
      case DEGREE, CELSIUS, DECIBEL -> new AxisScale(0, gap(unit) + unit.symbol(), "");
      case ONE ->
          largest < 1e5 && largest >= 1e-3 || largest == 0 ? plain() : power(largest, "×", "");
      case PER_SECOND -> power(largest, "", "/s");
      default -> prefixed(unit, largest);
    };
  }

  /** A number of the axis in words of this scale, to the decimals that the step needs. */
  String say(double value, double step) {
    BigDecimal number = new BigDecimal(value).movePointLeft(exponent);
    int decimals = Math.max(0, -leadingPower(step) + exponent);
    BigDecimal rounded = number.setScale(decimals, RoundingMode.HALF_EVEN);
    if (rounded.signum() == 0) {
      return "0" + onTicks;
    }
    String digits = rounded.toPlainString();
    return (digits.startsWith("-") ? "\u2212" + digits.substring(1) : digits) + onTicks;
  }

  /** The power of ten of the first digit. */
  static int leadingPower(double value) {
    // Steps are 1, 2 or 5 times a power of ten, whose logarithm may fall a hair short.
    return (int) Math.floor(Math.log10(value) + 1e-9);
  }

  private static AxisScale plain() {
    return new AxisScale(0, "", "");
  }

  private static AxisScale prefixed(Unit unit, double largest) {
    int exponent = thousands(largest);
    char prefix = PREFIXES.charAt((exponent - LEAST) / 3);
    return new AxisScale(
        exponent, " " + (exponent == 0 ? "" : String.valueOf(prefix)) + unit.symbol(), "");
  }

  private static AxisScale power(double largest, String before, String after) {
    int exponent = thousands(largest);
    String ten = exponent == 0 ? (after.isEmpty() ? "" : "1") : before + "10" + raised(exponent);
    return new AxisScale(exponent, "", ten + after);
  }

  private static int thousands(double largest) {
    if (largest == 0) {
      return 0;
    }
    int exponent = Math.floorDiv(leadingPower(largest), 3) * 3;
    return Math.max(LEAST, Math.min(GREATEST, exponent));
  }

  private static String raised(int exponent) {
    StringBuilder text = new StringBuilder(exponent < 0 ? "⁻" : "");
    for (char digit : Integer.toString(Math.abs(exponent)).toCharArray()) {
      text.append(SUPERSCRIPTS.charAt(digit - '0'));
    }
    return text.toString();
  }

  private static String gap(Unit unit) {
    return unit == Unit.DEGREE ? "" : " ";
  }
}
