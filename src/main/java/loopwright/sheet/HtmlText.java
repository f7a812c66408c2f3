package loopwright.sheet;

/** Text as it may stand in HTML and XML: markup in it is shown, not obeyed. */
final class HtmlText {
  private static final char UNKNOWN = '\uFFFD';

  private HtmlText() {}

  /** For an element's content or a quoted attribute. */
  static String escaped(String text) {
    StringBuilder escaped = new StringBuilder(text.length());
    text.codePoints()
        .forEach(
            sign -> {
              switch (sign) {
                case '&' -> escaped.append("&amp;");
                case '<' -> escaped.append("&lt;");
                case '>' -> escaped.append("&gt;");
                case '"' -> escaped.append("&quot;");
                case '\'' -> escaped.append("&#39;");
                default -> escaped.appendCodePoint(isAllowed(sign) ? sign : UNKNOWN);
              }
            });
    return escaped.toString();
  }

  /**
   * Characters that a document may hold (XML 1.0, production 2), without controls and without signs
   * that would turn the direction of what follows.
   */
  private static boolean isAllowed(int sign) {
    if (Character.getType(sign) == Character.FORMAT) {
      return false;
    }
    return sign == '\t'
        || sign == '\n'
        || sign >= 0x20 && sign < 0x7F
        || sign >= 0xA0 && sign <= 0xD7FF
        || sign >= 0xE000 && sign <= 0xFFFD
        || sign >= 0x10000;
  }
}
