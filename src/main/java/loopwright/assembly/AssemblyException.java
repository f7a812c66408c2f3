package loopwright.assembly;

/**
 * A design of which no circuit can be made; the message says where, what was found and expected.
 */
public final class AssemblyException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /**
   * @param message one sentence
   */
  public AssemblyException(String message) {
    super(message);
  }
}
