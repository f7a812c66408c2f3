package loopwright.view.chart;

import java.util.Map;
import java.util.OptionalDouble;
import loopwright.predict.FigureResult;
import loopwright.predict.HookupPrediction;

/** Figures by key, for the marks and words of a picture. */
final class Figures {
  private final Map<String, FigureResult> results;

  Figures(HookupPrediction prediction) {
    this.results = prediction.figures();
  }

  /** The solved value; empty where there is none. */
  OptionalDouble solved(String key) {
    FigureResult result = results.get(key);
    return result == null ? OptionalDouble.empty() : result.solved().number();
  }

  /** The value by hand formula; empty where there is none. */
  OptionalDouble formula(String key) {
    FigureResult result = results.get(key);
    return result == null ? OptionalDouble.empty() : result.formula().number();
  }

  /** Why there is no solved value, or the remark that goes with it; empty text for none. */
  String says(String key) {
    FigureResult result = results.get(key);
    return result == null ? "" : result.solved().says();
  }
}
