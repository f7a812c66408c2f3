package loopwright.session;

import java.time.Duration;
import java.util.Optional;
import loopwright.design.Design;
import loopwright.predict.HookupPrediction;

/**
 * A result for one hookup.
 *
 * @param assessment what came out
 * @param took how long it took
 */
public record Solved(Assessment assessment, Duration took) {
  /** The design that was solved. */
  public Design design() {
    return assessment.prediction().design();
  }

  /** What was predicted for that hookup. */
  Optional<HookupPrediction> of(String hookup) {
    return assessment.prediction().hookups().stream()
        .filter(prediction -> prediction.hookup().name().equals(hookup))
        .findFirst();
  }
}
