package loopwright.task;

/**
 * Who waits for the result of some {@link Work}. All calls come on the one thread that the runner
 * delivers to, and only while the work is the newest.
 *
 * @param <T> what the work gives
 */
public interface Receiver<T> {
  /**
   * The work has come this far.
   *
   * @param share 0 to 1
   * @param says what is being done
   */
  default void progressed(double share, String says) {
    // Most receivers wait for the end.
  }

  /** The work is done. */
  void finished(T result);

  /** The work ended with an exception. */
  void failed(RuntimeException cause);
}
