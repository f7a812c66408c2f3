package loopwright.quantity;

import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads values as people write them: plain and scientific numbers, prefixes, units, the letter code
 * of IEC 60062, per cent.
 */
final class QuantityParser {
  private static final Pattern PLAIN =
      Pattern.compile(
          "(?<number>[+-]?(?:\\d+(?:[.,]\\d*)?|[.,]\\d+))(?:[eE](?<exponent>[+-]?\\d{1,4}))?"
              + " *(?<suffix>.*)");

  private static final Pattern LETTER_CODE =
      Pattern.compile("(?<whole>[+-]?\\d*)(?<letter>[A-Za-z\u00B5])(?<part>\\d+) *(?<unit>\\D*)");

  /** Three digits after a comma and one to three before it: may as well be thousands. */
  private static final Pattern MAYBE_THOUSANDS = Pattern.compile("[+-]?[1-9]\\d{0,2},\\d{3}");

  private QuantityParser() {}

  /** The value in the plain unit; infinite only when the text says so in words. */
  static double parse(String text, Unit unit) {
    Found found = read(text, unit.expectation());
    if (found.unit().isPresent() && found.unit().get() != unit) {
      throw wrong(text, "", unit.expectation());
    }
    // A thermal resistance of "200 K" is a slip for K/W, not two hundred thousand.
    if (found.unit().isEmpty() && found.prefixed() && !unit.isPrefixed()) {
      throw wrong(text, "", unit.expectation());
    }
    return found.value();
  }

  /** The value and the unit that was written, for a caller who expects none in particular. */
  static WrittenValue parseAny(String text) {
    Found found = read(text, "a value, such as 4.7k or -6.1 mV");
    return new WrittenValue(new Quantity(found.value(), text, false), found.unit());
  }

  private record Found(double value, Optional<Unit> unit, boolean prefixed) {}

  private static Found read(String text, String expected) {
    String normal = Spelling.normal(text);
    Optional<Double> infinity = infinity(normal);
    if (infinity.isPresent()) {
      return new Found(infinity.get(), Optional.empty(), false);
    }
    Matcher code = LETTER_CODE.matcher(normal);
    if (code.matches()) {
      Optional<Found> found = letterCode(code, text, expected);
      if (found.isPresent()) {
        return found.get();
      }
    }
    Matcher plain = PLAIN.matcher(normal);
    if (!plain.matches()) {
      throw wrong(text, "", expected);
    }
    String number = plain.group("number");
    if (MAYBE_THOUSANDS.matcher(number).matches()) {
      throw wrong(
          text,
          ", which may mean " + number.replace(',', '.') + " or " + number.replace(",", ""),
          expected);
    }
    if (number.endsWith(",")) {
      throw wrong(text, "", expected);
    }
    Suffixes.Meaning meaning =
        Suffixes.meaning(plain.group("suffix")).orElseThrow(() -> wrong(text, "", expected));
    int exponent = plain.group("exponent") == null ? 0 : Integer.parseInt(plain.group("exponent"));
    double value = scaled(number.replace(',', '.'), exponent + meaning.exponent(), text, expected);
    boolean prefixed = meaning.unit().isEmpty() && meaning.exponent() != 0;
    return new Found(value, meaning.unit(), prefixed);
  }

  private static Optional<Found> letterCode(Matcher code, String text, String expected) {
    String letter = code.group("letter");
    Optional<Unit> letterUnit =
        switch (letter) {
          case "R" -> Optional.of(Unit.OHM);
          case "F" -> Optional.of(Unit.FARAD);
          default -> Optional.empty();
        };
    Optional<Integer> prefix = letterUnit.isPresent() ? Optional.of(0) : Suffixes.prefix(letter);
    if (prefix.isEmpty()) {
      return Optional.empty();
    }
    String suffix = code.group("unit");
    Optional<Unit> unit = letterUnit;
    if (!suffix.isEmpty()) {
      Optional<Unit> written = suffix.equals("R") ? Optional.empty() : Suffixes.unitAlone(suffix);
      if (written.isEmpty() || (unit.isPresent() && !unit.equals(written))) {
        throw wrong(text, "", expected);
      }
      unit = written;
    }
    String number = code.group("whole") + "." + code.group("part");
    return Optional.of(
        new Found(scaled(number, prefix.get(), text, expected), unit, letterUnit.isEmpty()));
  }

  private static Optional<Double> infinity(String normal) {
    return switch (normal.toLowerCase(Locale.ROOT)) {
      case "infinite", "infinity", "+infinite", "\u221E", "+\u221E" ->
          Optional.of(Double.POSITIVE_INFINITY);
      case "-infinite", "-infinity", "-\u221E" -> Optional.of(Double.NEGATIVE_INFINITY);
      default -> Optional.empty();
    };
  }

  /** Scales in decimal, so that 4.7k is the double nearest to 4700 and not a rounding away. */
  private static double scaled(String number, int exponent, String text, String expected) {
    double value = Double.parseDouble(number + "e" + exponent);
    boolean lost = value == 0 && number.chars().anyMatch(digit -> digit >= '1' && digit <= '9');
    if (!Double.isFinite(value) || lost) {
      throw wrong(text, ", which no computer number can hold", expected);
    }
    return value;
  }

  private static QuantityException wrong(String text, String why, String expected) {
    return new QuantityException("found \"" + text + "\"" + why + ", expected " + expected);
  }
}
