package loopwright.predict;

import java.util.List;
import loopwright.design.Design;

/**
 * What a design should show at the bench.
 *
 * @param design the very design that was solved
 * @param hookups one for each hookup asked for, in the design's order
 */
public record Prediction(Design design, List<HookupPrediction> hookups) {
  /** Keeps its own copy. */
  public Prediction {
    hookups = List.copyOf(hookups);
  }
}
