package loopwright.quantity;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * The series of preferred values of IEC 60063. E3 to E24 are tables, because eight values of E24
 * are not what rounding gives; E48 and E96 are the rounded powers 10^(i/48) and 10^(i/96).
 */
public enum PreferredValues {
  E3(2, 10, 22, 47),
  E6(2, 10, 15, 22, 33, 47, 68),
  E12(2, 10, 12, 15, 18, 22, 27, 33, 39, 47, 56, 68, 82),
  E24(
      2, 10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82,
      91),
  E48(3, rounded(48)),
  E96(3, rounded(96));

  /** Two values closer than this, relatively, are one and the same. */
  private static final double SAME = 1e-9;

  private final int digits;
  private final int[] decade;

  PreferredValues(int digits, int... decade) {
    this.digits = digits;
    this.decade = decade;
  }

  private static int[] rounded(int count) {
    int[] values = new int[count];
    for (int i = 0; i < count; i++) {
      values[i] = (int) Math.round(100 * Math.pow(10, (double) i / count));
    }
    return values;
  }

  /** The series of that name, for example {@code E24}. */
  public static Optional<PreferredValues> named(String name) {
    return Arrays.stream(values()).filter(series -> series.name().equals(name)).findFirst();
  }

  /** The values of one decade as the standard prints them: two digits to E24, three from E48. */
  public List<Integer> decade() {
    return Arrays.stream(decade).boxed().toList();
  }

  /**
   * All values from {@code low} to {@code high}, both included, rising.
   *
   * @param low more than zero
   * @param high finite
   */
  public List<Double> between(double low, double high) {
    requirePositive(low);
    requirePositive(high);
    List<Double> values = new ArrayList<>();
    int last = decadeOf(high);
    for (int power = decadeOf(low); power <= last; power++) {
      for (int mantissa : decade) {
        double value = value(mantissa, power);
        if (value >= low * (1 - SAME) && value <= high * (1 + SAME)) {
          values.add(value);
        }
      }
    }
    return values;
  }

  /** The value whose ratio to the given one is nearest to 1. */
  public double nearest(double value) {
    requirePositive(value);
    if (contains(value)) {
      return next(value * (1 - 10 * SAME));
    }
    double above = next(value);
    double below = previous(value);
    return above / value < value / below ? above : below;
  }

  /** The first value of the series above the given one. */
  public double next(double value) {
    requirePositive(value);
    for (int power = decadeOf(value); ; power++) {
      for (int mantissa : decade) {
        double candidate = value(mantissa, power);
        if (candidate > value * (1 + SAME)) {
          return candidate;
        }
      }
    }
  }

  /** The last value of the series below the given one. */
  public double previous(double value) {
    requirePositive(value);
    for (int power = decadeOf(value); ; power--) {
      for (int i = decade.length - 1; i >= 0; i--) {
        double candidate = value(decade[i], power);
        if (candidate < value * (1 - SAME)) {
          return candidate;
        }
      }
    }
  }

  /** Whether the value is one of the series. */
  public boolean contains(double value) {
    return value > 0 && !between(value, value).isEmpty();
  }

  /** In decimal, so that 4.7 kΩ is exactly 4700. */
  private double value(int mantissa, int power) {
    return Double.parseDouble(mantissa + "e" + (power - digits + 1));
  }

  /** A decade at or below that of the value, whatever the logarithm's last bit says. */
  private static int decadeOf(double value) {
    return (int) Math.floor(Math.log10(value) + SAME);
  }

  private static void requirePositive(double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(
          "found " + value + ", expected a finite value above zero to look for in the series");
    }
  }
}
