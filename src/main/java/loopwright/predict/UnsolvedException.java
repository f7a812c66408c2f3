package loopwright.predict;

/** A figure, or what it needs, cannot be solved; the message is the reason that a person reads. */
final class UnsolvedException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  UnsolvedException(String reason) {
    super(reason, null, false, false);
  }
}
