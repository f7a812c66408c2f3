package loopwright.task;

/**
 * Carries out work at once, on the thread that asks for it: for the command line and for tests,
 * where the result is there when the request returns.
 */
public final class SameThreadRunner implements TaskRunner {
  private Object newest = new Object();

  @Override
  public <T> void run(Work<T> work, Receiver<T> receiver) {
    Object ticket = new Object();
    newest = ticket;
    T result;
    try {
      result = work.carryOut(new Reporting(ticket, receiver));
    } catch (CancelledException e) {
      return;
    } catch (RuntimeException e) {
      if (newest == ticket) {
        receiver.failed(e);
      }
      return;
    }
    if (newest == ticket) {
      receiver.finished(result);
    }
  }

  @Override
  public void cancel() {
    newest = new Object();
  }

  @Override
  public void close() {
    cancel();
  }

  /** What the work itself asks for while it runs replaces it, as anywhere else. */
  private final class Reporting implements Progress {
    private final Object ticket;
    private final Receiver<?> receiver;

    Reporting(Object ticket, Receiver<?> receiver) {
      this.ticket = ticket;
      this.receiver = receiver;
    }

    @Override
    public void report(double share, String says) {
      if (!cancelled()) {
        receiver.progressed(share, says);
      }
    }

    @Override
    public boolean cancelled() {
      return newest != ticket;
    }
  }
}
