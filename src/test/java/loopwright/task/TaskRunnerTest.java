package loopwright.task;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;

/** Both runners: the newest request wins, and results come back on one thread. */
class TaskRunnerTest {
  private final List<String> heard = new ArrayList<>();

  @Test
  void theSameThreadTwinIsDoneWhenItReturns() {
    try (TaskRunner runner = new SameThreadRunner()) {
      runner.run(
          progress -> {
            progress.report(0.5, "half");
            return "done";
          },
          listener());
    }
    assertThat(heard).containsExactly("0.5 half", "done");
  }

  @Test
  void theSameThreadTwinDeliversAFailure() {
    try (TaskRunner runner = new SameThreadRunner()) {
      runner.run(
          progress -> {
            throw new IllegalArgumentException("no rails");
          },
          listener());
    }
    assertThat(heard).containsExactly("failed: no rails");
  }

  @Test
  void workThatIsReplacedWhileItRunsIsNotDelivered() {
    try (TaskRunner runner = new SameThreadRunner()) {
      runner.run(
          progress -> {
            runner.run(inner -> "newer", listener());
            progress.check();
            return "older";
          },
          listener());
    }
    assertThat(heard).containsExactly("newer");
  }

  @Test
  void theNewestRequestCancelsTheOneThatRuns() throws InterruptedException {
    BlockingQueue<Runnable> eventThread = new LinkedBlockingQueue<>();
    CountDownLatch started = new CountDownLatch(1);
    CountDownLatch unwound = new CountDownLatch(1);
    try (TaskRunner runner = new BackgroundRunner(eventThread::add)) {
      runner.run(
          progress -> {
            started.countDown();
            try {
              while (true) {
                progress.check();
                Thread.onSpinWait();
              }
            } finally {
              unwound.countDown();
            }
          },
          listener());
      assertThat(started.await(5, TimeUnit.SECONDS)).isTrue();
      runner.run(progress -> "newest", listener());
      assertThat(unwound.await(5, TimeUnit.SECONDS)).isTrue();
      eventThread.poll(5, TimeUnit.SECONDS).run();
    }
    assertThat(heard).containsExactly("newest");
    assertThat(eventThread).isEmpty();
  }

  @Test
  void aResultOnItsWayIsDroppedWhenANewerRequestComesFirst() throws InterruptedException {
    BlockingQueue<Runnable> eventThread = new LinkedBlockingQueue<>();
    try (TaskRunner runner = new BackgroundRunner(eventThread::add)) {
      runner.run(progress -> "older", listener());
      Runnable olderDelivery = eventThread.poll(5, TimeUnit.SECONDS);
      runner.run(progress -> "newer", listener());
      olderDelivery.run();
      eventThread.poll(5, TimeUnit.SECONDS).run();
    }
    assertThat(heard).containsExactly("newer");
  }

  @Test
  void aFailureInTheBackgroundIsDelivered() throws InterruptedException {
    BlockingQueue<Runnable> eventThread = new LinkedBlockingQueue<>();
    try (TaskRunner runner = new BackgroundRunner(eventThread::add)) {
      runner.run(
          progress -> {
            throw new IllegalStateException("does not converge");
          },
          listener());
      eventThread.poll(5, TimeUnit.SECONDS).run();
    }
    assertThat(heard).containsExactly("failed: does not converge");
  }

  @Test
  void cancelledWorkIsForgotten() throws InterruptedException {
    BlockingQueue<Runnable> eventThread = new LinkedBlockingQueue<>();
    try (TaskRunner runner = new BackgroundRunner(eventThread::add)) {
      runner.run(progress -> "unwanted", listener());
      Runnable delivery = eventThread.poll(5, TimeUnit.SECONDS);
      runner.cancel();
      delivery.run();
    }
    assertThat(heard).isEmpty();
  }

  private Receiver<String> listener() {
    return new Receiver<>() {
      @Override
      public void progressed(double share, String says) {
        heard.add(share + " " + says);
      }

      @Override
      public void finished(String result) {
        heard.add(result);
      }

      @Override
      public void failed(RuntimeException cause) {
        heard.add("failed: " + cause.getMessage());
      }
    };
  }
}
