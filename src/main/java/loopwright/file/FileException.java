package loopwright.file;

/**
 * A file that cannot be read as what it should be, or cannot be written. The message is one
 * sentence for the person who gave the file: which file, where in it, what was found and what was
 * expected.
 */
public final class FileException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /**
   * @param message one sentence that starts with the name of the file
   */
  public FileException(String message) {
    super(message);
  }

  /**
   * @param message one sentence that starts with the name of the file
   * @param cause what went wrong underneath
   */
  public FileException(String message, Throwable cause) {
    super(message, cause);
  }
}
