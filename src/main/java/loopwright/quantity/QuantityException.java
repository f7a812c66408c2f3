package loopwright.quantity;

/**
 * A text that is no value of the wanted unit; the message says what was found and what was
 * expected.
 */
public final class QuantityException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /**
   * @param message one sentence with what was found and what was expected
   */
  public QuantityException(String message) {
    super(message);
  }
}
