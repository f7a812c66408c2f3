package loopwright.file;

/**
 * Where a value starts in the text it was read from.
 *
 * @param line from 1; 0 for a value that the program made
 * @param column from 1, in characters; 0 for a value that the program made
 */
public record Position(int line, int column) {
  /** The position of what the program made and nobody wrote. */
  public static final Position NONE = new Position(0, 0);

  /** For messages: {@code line 3, column 7}. */
  public String says() {
    return "line " + line + ", column " + column;
  }
}
