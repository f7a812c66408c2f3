package loopwright.file;

/** What a person would call the slip that keeps a text from being JSON, and where it is. */
final class Malformed {
  private static final String ENDS_A_WORD = ",:{}[]\"";

  private final String text;
  private final int start;
  private final int end;

  /**
   * @param offset where reading stopped: at, in or just behind what is wrong
   */
  Malformed(String text, int offset) {
    this.text = text;
    int from = Math.min(offset, text.length());
    boolean atDelimiter = from < text.length() && !isWordAt(from);
    int wordStart = wordStart(from);
    if (!atDelimiter || isBadWordBefore(from, wordStart)) {
      this.start = wordStart;
      this.end = wordEnd(from);
    } else {
      this.start = from;
      this.end = from + 1;
    }
  }

  /** Whether nothing is wrong but that the rest is missing. */
  boolean isCutShort() {
    boolean atEnd = text.substring(end).isBlank();
    boolean isWord = start == end || isWordAt(start);
    return atEnd && isWord && !text.substring(0, start).isBlank();
  }

  /** Where the slip begins. */
  Position position() {
    String before = text.substring(0, start);
    int line = (int) before.chars().filter(character -> character == '\n').count() + 1;
    return new Position(line, start - before.lastIndexOf('\n'));
  }

  /** What was found. */
  String found() {
    String word = text.substring(start, end);
    return switch (first()) {
      case '\n', '\r' -> "a line break inside a text";
      case '\t' -> "a tabulator inside a text";
      default ->
          Character.isISOControl(first()) ? "an unprintable character" : JsonText.shortened(word);
    };
  }

  /** What was expected instead. */
  String expected() {
    if (text.substring(start, end).indexOf('\\') >= 0) {
      return "after a backslash in a text one of \" \\ / b f n r t, or u and four digits";
    }
    return switch (first()) {
      case '\n', '\r', '\t' -> "a closing quote before it";
      case '\'' -> "double quotes around a text";
      case '/', '#' -> "a value (a file has no comments; the field notes is for them)";
      case '"' -> "a comma or a colon before it";
      case '}', ']' -> "a value, or the bracket that is open, and no comma before it";
      case '{', '[', ',', ':' -> "a comma, a colon or a value in its place";
      default -> "a plain number, or text in double quotes such as \"4k7\"";
    };
  }

  private char first() {
    return start < text.length() ? text.charAt(start) : ' ';
  }

  private int wordStart(int index) {
    int from = index;
    while (from > 0 && isWordAt(from - 1)) {
      from--;
    }
    return from;
  }

  private int wordEnd(int index) {
    int to = index;
    while (to < text.length() && isWordAt(to)) {
      to++;
    }
    return to;
  }

  /** A word such as NaN is refused only when its end is reached. */
  private boolean isBadWordBefore(int index, int wordStart) {
    String word = text.substring(wordStart, index);
    return ENDS_A_WORD.indexOf(text.charAt(index)) >= 0
        && !word.isEmpty()
        && !word.matches("true|false|null")
        && !JsonText.isNumber(word);
  }

  private boolean isWordAt(int index) {
    char character = text.charAt(index);
    return !Character.isWhitespace(character)
        && !Character.isISOControl(character)
        && ENDS_A_WORD.indexOf(character) < 0;
  }
}
