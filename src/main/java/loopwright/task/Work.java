package loopwright.task;

/**
 * Work that may take a while.
 *
 * @param <T> what it gives; immutable, since it passes from thread to thread
 */
@FunctionalInterface
public interface Work<T> {
  /**
   * Does the work.
   *
   * @param progress to report to, and to ask from time to time whether the result is still wanted
   * @throws CancelledException when it is not
   */
  T carryOut(Progress progress);
}
