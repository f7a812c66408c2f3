package loopwright.task;

import java.util.concurrent.Executor;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;

/**
 * Carries out work on a thread of its own and delivers through an executor. The thread is a daemon:
 * unfinished work never keeps the program alive.
 */
public final class BackgroundRunner implements TaskRunner {
  private final Executor delivery;
  private final ExecutorService worker;
  private Request<?> newest;

  /**
   * @param delivery runs what it is given on the thread that calls this runner, in order
   */
  public BackgroundRunner(Executor delivery) {
    this.delivery = delivery;
    this.worker =
        Executors.newSingleThreadExecutor(
            task -> {
              Thread thread = new Thread(task, "solver");
              thread.setDaemon(true);
              return thread;
            });
  }

  @Override
  public <T> void run(Work<T> work, Receiver<T> receiver) {
    cancel();
    Request<T> request = new Request<>(work, receiver);
    newest = request;
    worker.execute(request);
  }

  @Override
  public void cancel() {
    if (newest != null) {
      newest.cancelled = true;
      newest = null;
    }
  }

  @Override
  public void close() {
    cancel();
    worker.shutdown();
  }

  /**
   * One request. It is cancelled on the delivery thread and delivered there, so that a result can
   * never slip past a newer request.
   */
  private final class Request<T> implements Runnable, Progress {
    private final Work<T> work;
    private final Receiver<T> receiver;
    private volatile boolean cancelled;

    Request(Work<T> work, Receiver<T> receiver) {
      this.work = work;
      this.receiver = receiver;
    }

    @Override
    public void run() {
      if (cancelled) {
        return;
      }
      try {
        T result = work.carryOut(this);
        deliver(() -> receiver.finished(result));
      } catch (CancelledException e) {
        // A newer request has taken its place.
      } catch (RuntimeException e) {
        deliver(() -> receiver.failed(e));
      } catch (StackOverflowError | OutOfMemoryError e) {
        deliver(() -> receiver.failed(new IllegalStateException("the work was too large", e)));
      }
    }

    @Override
    public void report(double share, String says) {
      deliver(() -> receiver.progressed(share, says));
    }

    @Override
    public boolean cancelled() {
      return cancelled;
    }

    private void deliver(Runnable message) {
      delivery.execute(
          () -> {
            if (!cancelled) {
              message.run();
            }
          });
    }
  }
}
