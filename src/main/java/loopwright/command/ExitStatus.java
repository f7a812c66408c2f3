package loopwright.command;

/** How a call ended. */
final class ExitStatus {
  /** Done; a solve that failed has left its reasons in the result. */
  static final int DONE = 0;

  /** The design, its data or the file is wrong or missing. */
  static final int INPUT_WRONG = 1;

  /** The call is wrong. */
  static final int CALL_WRONG = 2;

  private ExitStatus() {}
}
