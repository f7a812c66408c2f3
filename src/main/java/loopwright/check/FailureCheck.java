package loopwright.check;

import java.util.List;
import loopwright.design.Design;
import loopwright.predict.HookupPrediction;

/** A hookup that cannot be solved. */
final class FailureCheck implements Check {
  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    if (prediction.rest().isPresent()) {
      return List.of();
    }
    return List.of(
        new Finding(
            Finding.Severity.FAILS,
            "hookups." + prediction.hookup().name(),
            "No operating point: " + prediction.failure() + ".",
            ""));
  }
}
