package loopwright.session;

import java.util.List;
import loopwright.design.Design;
import loopwright.task.Progress;

/** Solves designs. */
@FunctionalInterface
public interface PredictionSource {
  /**
   * Predicts a design in some of its hookups.
   *
   * @param design what to solve
   * @param hookups names of the hookups wanted
   * @param progress to report to, and to learn from whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   * @throws RuntimeException with a message for a person, when the design stands for no circuit
   */
  Assessment assess(Design design, List<String> hookups, Progress progress);

  /** Whether an assessment leaves out figures that take longer than an edit should wait for. */
  default boolean leavesOut(Assessment first) {
    return false;
  }

  /**
   * The same assessment with what it leaves out.
   *
   * @param first what was shown meanwhile
   * @param progress to report to, and to learn from whether the result is still wanted
   * @throws loopwright.task.CancelledException when it is not
   */
  default Assessment complete(Assessment first, Progress progress) {
    return first;
  }
}
