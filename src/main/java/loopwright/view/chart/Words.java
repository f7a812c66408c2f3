package loopwright.view.chart;

import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** Numbers as titles and labels say them: three digits, the unit always beside them. */
final class Words {
  private static final int DIGITS = 3;

  private Words() {}

  static String volts(double value) {
    return EngineeringFormat.format(value, Unit.VOLT, DIGITS);
  }

  static String hertz(double value) {
    return EngineeringFormat.format(value, Unit.HERTZ, DIGITS);
  }

  static String seconds(double value) {
    return EngineeringFormat.format(value, Unit.SECOND, DIGITS);
  }

  /** To whole degrees from 10° on, to tenths below. */
  static String degrees(double value) {
    double rounded = Math.abs(value) >= 10 ? Math.rint(value) : Math.rint(value * 10) / 10;
    return EngineeringFormat.format(rounded, Unit.DEGREE);
  }

  static String decibels(double value) {
    return EngineeringFormat.format(Math.rint(value * 10) / 10, Unit.DECIBEL);
  }

  /** A gain, to four digits, since hundredths of it matter. */
  static String gain(double value) {
    return EngineeringFormat.format(value, Unit.ONE);
  }

  /** A ratio of which the size matters only. */
  static String ratio(double value) {
    return EngineeringFormat.format(value, Unit.ONE, DIGITS);
  }

  /** One sentence after another, empty ones left out. */
  static String sentences(String... parts) {
    StringBuilder text = new StringBuilder();
    for (String part : parts) {
      if (!part.isBlank()) {
        text.append(text.isEmpty() ? "" : " ").append(sentence(part.strip()));
      }
    }
    return text.toString();
  }

  private static String sentence(String text) {
    String capital = Character.toUpperCase(text.charAt(0)) + text.substring(1);
    // Node names and figures keep their spelling at the head of a sentence.
    String begun = Character.isLetter(text.charAt(0)) && !isName(text) ? capital : text;
    return begun.endsWith(".") || begun.endsWith("!") ? begun : begun + ".";
  }

  private static boolean isName(String text) {
    return text.startsWith("out ") || text.startsWith("gainOut ");
  }
}
