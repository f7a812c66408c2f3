package loopwright.task;

/**
 * Carries out one line of work in which only the newest request counts: a new request cancels the
 * one before, whose result is never delivered. Called from one thread only, the one that results
 * are delivered to.
 */
public interface TaskRunner extends AutoCloseable {
  /**
   * Asks for work in place of whatever was asked for before.
   *
   * @param work what is to be done
   * @param receiver who gets the result
   */
  <T> void run(Work<T> work, Receiver<T> receiver);

  /** Gives up the present work, if there is any; nothing of it is delivered any more. */
  void cancel();

  /** Gives up the present work and takes no more. */
  @Override
  void close();
}
