package loopwright.view.frame;

import loopwright.task.Receiver;
import loopwright.task.SameThreadRunner;
import loopwright.task.TaskRunner;
import loopwright.task.Work;

/** Keeps the newest request until the test wants it done. */
final class WaitingRunner implements TaskRunner {
  private final SameThreadRunner later = new SameThreadRunner();
  private Runnable newest = () -> {};

  @Override
  public <T> void run(Work<T> work, Receiver<T> receiver) {
    newest = () -> later.run(work, receiver);
  }

  /** Carries out what was asked for last. */
  void finish() {
    newest.run();
  }

  @Override
  public void cancel() {
    newest = () -> {};
  }

  @Override
  public void close() {
    cancel();
  }
}
