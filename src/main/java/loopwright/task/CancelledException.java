package loopwright.task;

/** Unwinds work whose result is no longer wanted. */
public final class CancelledException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** Without a stack trace: it is no error. */
  public CancelledException() {
    super("cancelled", null, false, false);
  }
}
