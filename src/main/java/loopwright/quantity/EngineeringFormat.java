package loopwright.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * Writes values as the trade does: a number from 1 to below 1000, a prefix, the unit. Ratios,
 * temperatures, angles and levels get no prefix.
 */
public final class EngineeringFormat {
  /** Significant digits at most, where the caller does not say. */
  public static final int DIGITS = 4;

  private static final String PREFIXES = "pnµm kMG";
  private static final int LEAST = -12;
  private static final int GREATEST = 9;
  private static final char MINUS = '\u2212';

  private EngineeringFormat() {}

  /** The value to at most four significant digits, for example {@code 4.7 kΩ}, {@code −6.1 mV}. */
  public static String format(double value, Unit unit) {
    return format(value, unit, DIGITS);
  }

  /**
   * The value to at most so many significant digits; trailing zeros are dropped.
   *
   * @param value in the plain unit; infinity is written ∞
   * @param unit its unit
   * @param digits 1 or more
   */
  public static String format(double value, Unit unit, int digits) {
    if (!Double.isFinite(value)) {
      return notFinite(value);
    }
    return pretty(
        BigDecimal.valueOf(value).round(new MathContext(digits, RoundingMode.HALF_UP)), unit);
  }

  /** Every digit that the value has, for a reader who asks for them. */
  public static String full(double value, Unit unit) {
    return Double.isFinite(value) ? pretty(BigDecimal.valueOf(value), unit) : notFinite(value);
  }

  /** A fraction in per cent, for example {@code 0.2 %}, to at most four significant digits. */
  public static String percent(double fraction) {
    if (!Double.isFinite(fraction)) {
      return notFinite(fraction);
    }
    BigDecimal rounded =
        BigDecimal.valueOf(fraction).round(new MathContext(DIGITS, RoundingMode.HALF_UP));
    return signed(number(rounded.scaleByPowerOfTen(2))) + " %";
  }

  /**
   * The value as one would type it, every digit kept, for example {@code 4.7k}, {@code -6.1m},
   * {@code 22p}; reading it in the same unit gives the same value.
   */
  public static String spelling(double value, Unit unit) {
    if (!Double.isFinite(value)) {
      return Quantity.of(value).spelling();
    }
    BigDecimal exact = BigDecimal.valueOf(value);
    int exponent = unit.isPrefixed() && unit != Unit.ONE ? exponent(exact, unit) : 0;
    if (isBeyondPrefixes(exact, exponent) || exponent == 0) {
      return number(exact);
    }
    return number(exact.scaleByPowerOfTen(-exponent)) + (exponent == -6 ? 'u' : prefix(exponent));
  }

  private static String pretty(BigDecimal value, Unit unit) {
    if (unit == Unit.VOLT_PER_SECOND && value.abs().compareTo(BigDecimal.valueOf(10_000)) >= 0) {
      return signed(number(value.scaleByPowerOfTen(-6))) + " V/µs";
    }
    int exponent = unit.isPrefixed() && unit != Unit.ONE ? exponent(value, unit) : 0;
    if (exponent == 0 || isBeyondPrefixes(value, exponent)) {
      return signed(number(value)) + gap(unit) + unit.symbol();
    }
    return signed(number(value.scaleByPowerOfTen(-exponent)))
        + " "
        + prefix(exponent)
        + unit.symbol();
  }

  private static String gap(Unit unit) {
    return unit == Unit.ONE || unit == Unit.DEGREE ? "" : " ";
  }

  /** Power of ten of the prefix: a multiple of three within what the trade uses. */
  private static int exponent(BigDecimal value, Unit unit) {
    if (value.signum() == 0) {
      return 0;
    }
    int power = leadingPower(value);
    // Capacitors are marked 2200 µF, not 2.2 mF.
    if (unit == Unit.FARAD && power == -3) {
      return -6;
    }
    return Math.max(LEAST, Math.min(GREATEST, Math.floorDiv(power, 3) * 3));
  }

  private static boolean isBeyondPrefixes(BigDecimal value, int exponent) {
    int power = leadingPower(value) - exponent;
    return value.signum() != 0 && (power < -3 || power > 4);
  }

  private static int leadingPower(BigDecimal value) {
    return value.precision() - value.scale() - 1;
  }

  private static char prefix(int exponent) {
    return PREFIXES.charAt((exponent - LEAST) / 3);
  }

  /** Plain digits where they can be read at a glance, else a power of ten divisible by three. */
  private static String number(BigDecimal value) {
    if (value.signum() == 0) {
      return "0";
    }
    BigDecimal stripped = value.stripTrailingZeros();
    int power = leadingPower(stripped);
    if (power >= -4 && power < 7) {
      return stripped.toPlainString();
    }
    int exponent = Math.floorDiv(power, 3) * 3;
    return stripped.scaleByPowerOfTen(-exponent).toPlainString() + "e" + exponent;
  }

  private static String signed(String number) {
    return number.startsWith("-") ? MINUS + number.substring(1) : number;
  }

  private static String notFinite(double value) {
    if (Double.isNaN(value)) {
      throw new IllegalArgumentException("found no number, expected a value to write");
    }
    return value > 0 ? "\u221E" : MINUS + "\u221E";
  }
}
