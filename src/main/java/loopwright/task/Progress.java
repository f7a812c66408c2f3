package loopwright.task;

/**
 * Handle that long work reports to, and by which it learns that nobody wants its result any more.
 */
public interface Progress {
  /**
   * Says how far the work is.
   *
   * @param share 0 to 1
   * @param says what is being done
   */
  void report(double share, String says);

  /** Whether the result is no longer wanted. */
  boolean cancelled();

  /**
   * Ends the work when its result is no longer wanted.
   *
   * @throws CancelledException when {@link #cancelled()}
   */
  default void check() {
    if (cancelled()) {
      throw new CancelledException();
    }
  }

  /** A handle that nobody listens to and nobody cancels. */
  static Progress none() {
    return new Progress() {
      @Override
      public void report(double share, String says) {
        // Nobody listens.
      }

      @Override
      public boolean cancelled() {
        return false;
      }
    };
  }
}
