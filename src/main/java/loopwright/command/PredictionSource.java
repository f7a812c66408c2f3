package loopwright.command;

import java.util.List;
import loopwright.design.Design;
import loopwright.predict.Prediction;
import loopwright.task.Progress;

/** Where predictions come from. */
@FunctionalInterface
public interface PredictionSource {
  /**
   * Predicts.
   *
   * @param design what to solve
   * @param hookups names of its hookups; empty for all
   * @param frequencies Hz, where response and loop gain are wanted; empty for a grid that fits; not
   *     modified
   * @param progress told how far the work is
   * @return one entry for each hookup; what could not be solved is in it with the reason
   */
  Prediction predict(Design design, List<String> hookups, double[] frequencies, Progress progress);
}
