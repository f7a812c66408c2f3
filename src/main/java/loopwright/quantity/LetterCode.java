package loopwright.quantity;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The mark on a part in the letter code of IEC 60062: the letter stands where the decimal point
 * would, and a tolerance letter may follow. {@code 4K7K} is 4.7 kΩ ±10 %: the first K multiplies,
 * the second is a tolerance.
 *
 * @param value in the plain unit
 * @param tolerance the tolerance that was marked
 */
public record LetterCode(double value, Optional<ToleranceLetter> tolerance) {
  private static final Pattern CODE =
      Pattern.compile("(?<code>\\d*[A-Za-z\u00B5]\\d*) *(?<tolerance>[A-Z]?)");

  /**
   * Reads a mark. An F behind a capacitor's value is taken for farad, as people write {@code
   * 100nF}, not for ±1 %.
   *
   * @param text for example {@code 4K7K}, {@code 470R}, {@code p47}
   * @param unit Ω or F
   * @throws QuantityException when it is no such mark
   */
  public static LetterCode parse(String text, Unit unit) {
    Matcher matcher = CODE.matcher(Spelling.normal(text));
    if (!matcher.matches()) {
      throw wrong(text, unit);
    }
    String letter = matcher.group("tolerance");
    boolean unitSymbol = unit == Unit.FARAD && letter.equals(unit.symbol());
    double value = QuantityParser.parse(matcher.group("code"), unit);
    if (letter.isEmpty() || unitSymbol) {
      return new LetterCode(value, Optional.empty());
    }
    return new LetterCode(
        value,
        Optional.of(ToleranceLetter.fromLetter(letter).orElseThrow(() -> wrong(text, unit))));
  }

  private static QuantityException wrong(String text, Unit unit) {
    return new QuantityException(
        "found \""
            + text
            + "\", expected "
            + unit.says()
            + " in letter code, such as 4K7 or 4K7J with a tolerance");
  }
}
