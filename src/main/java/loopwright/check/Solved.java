package loopwright.check;

import java.util.OptionalDouble;
import loopwright.predict.FigureResult;
import loopwright.predict.HookupPrediction;

/** Solved figures of a prediction. */
final class Solved {
  private Solved() {}

  /** The solved value of a figure, if it has one. */
  static OptionalDouble of(HookupPrediction prediction, String key) {
    FigureResult result = prediction.figures().get(key);
    return result == null ? OptionalDouble.empty() : result.solved().number();
  }
}
