package loopwright.characterise;

/**
 * Figures that no set of parameters can give, or too few of them. The message is one sentence that
 * says what was found and what is missing or in the way.
 */
public final class FitException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /**
   * @param message one sentence for the person who wrote the record
   */
  public FitException(String message) {
    super(message);
  }
}
