package loopwright.quantity;

/** One code point for each sign that people type in several ways. */
final class Spelling {
  private static final char MICRO = '\u00B5';
  private static final char GREEK_MU = '\u03BC';
  private static final char OMEGA = '\u03A9';
  private static final char OHM_SIGN = '\u2126';
  private static final char MINUS = '\u2212';

  private Spelling() {}

  /**
   * The text without spaces around it, with the Greek mu as the micro sign, the ohm sign as omega,
   * the typographic minus as a hyphen, and every kind of space as an ordinary one.
   */
  static String normal(String text) {
    StringBuilder normal = new StringBuilder(text.length());
    for (int i = 0; i < text.length(); i++) {
      char character = text.charAt(i);
      normal.append(
          switch (character) {
            case GREEK_MU -> MICRO;
            case OHM_SIGN -> OMEGA;
            case MINUS -> '-';
            default -> Character.isSpaceChar(character) ? ' ' : character;
          });
    }
    return normal.toString().strip();
  }
}
