package loopwright.file;

import java.util.regex.Pattern;

/** Spelling of single JSON values. */
final class JsonText {
  private static final int LONGEST_IN_A_MESSAGE = 40;

  /** RFC 8259, section 6. */
  private static final Pattern NUMBER =
      Pattern.compile("-?(?:0|[1-9]\\d*)(?:\\.\\d+)?(?:[eE][+-]?\\d+)?");

  private JsonText() {}

  static boolean isNumber(String literal) {
    return NUMBER.matcher(literal).matches();
  }

  /** The text as a JSON string (RFC 8259, section 7): quoted, control characters escaped. */
  static String quoted(String text) {
    StringBuilder quoted = new StringBuilder(text.length() + 2).append('"');
    for (int i = 0; i < text.length(); i++) {
      char character = text.charAt(i);
      switch (character) {
        case '"' -> quoted.append("\\\"");
        case '\\' -> quoted.append("\\\\");
        case '\n' -> quoted.append("\\n");
        case '\r' -> quoted.append("\\r");
        case '\t' -> quoted.append("\\t");
        default -> {
          if (character < ' ' || isLoneSurrogate(text, i)) {
            quoted.append(String.format("\\u%04x", (int) character));
          } else {
            quoted.append(character);
          }
        }
      }
    }
    return quoted.append('"').toString();
  }

  /** At most one line's worth of it, for a message. */
  static String shortened(String text) {
    if (text.length() <= LONGEST_IN_A_MESSAGE) {
      return text;
    }
    int end = LONGEST_IN_A_MESSAGE - 1;
    if (Character.isHighSurrogate(text.charAt(end - 1))) {
      end--;
    }
    return text.substring(0, end) + "…";
  }

  /** Such a half character has no UTF-8 form and must be escaped. */
  private static boolean isLoneSurrogate(String text, int index) {
    char character = text.charAt(index);
    if (Character.isHighSurrogate(character)) {
      return index + 1 == text.length() || !Character.isLowSurrogate(text.charAt(index + 1));
    }
    return Character.isLowSurrogate(character)
        && (index == 0 || !Character.isHighSurrogate(text.charAt(index - 1)));
  }
}
