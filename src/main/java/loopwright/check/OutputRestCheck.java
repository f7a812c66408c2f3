package loopwright.check;

import java.util.List;
import loopwright.design.Design;
import loopwright.predict.HookupPrediction;

/** An output that rests at a rail. */
final class OutputRestCheck implements Check {
  /** Nearer to a rail than this nothing is left to swing, V; common practice, no source. */
  private static final double CLOSE = 0.5;

  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    if (prediction.rest().isEmpty()) {
      return List.of();
    }
    double out = prediction.rest().get().nodes().getOrDefault("out", 0.0);
    double high = design.rails().positive().value();
    double low = design.rails().negative().value();
    if (out < high - CLOSE && out > low + CLOSE) {
      return List.of();
    }
    String rail = out >= high - CLOSE ? "positive" : "negative";
    return List.of(
        new Finding(
            Finding.Severity.FAILS,
            "out",
            "The output rests at "
                + Say.volts(out)
                + ", at the "
                + rail
                + " rail: the loop cannot bring it back.",
            "Look first at the gain stage's current, the pair's balance and the dc path of both"
                + " inputs."));
  }
}
