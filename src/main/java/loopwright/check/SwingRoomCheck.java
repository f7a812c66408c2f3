package loopwright.check;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Design;
import loopwright.design.Feedback;
import loopwright.predict.HookupGains;
import loopwright.predict.HookupPrediction;

/** An output that clips before it reaches the peak that the generator asks for. */
final class SwingRoomCheck implements Check {
  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    double amplitude = prediction.hookup().source().amplitude().value();
    OptionalDouble ideal = new HookupGains(prediction.hookup()).idealGain();
    if (amplitude == 0
        || ideal.isEmpty()
        || prediction.hookup().feedback() instanceof Feedback.Open) {
      return List.of();
    }
    double peak = Math.abs(ideal.getAsDouble()) * amplitude;
    double centre = centre(prediction);
    List<Finding> findings = new ArrayList<>();
    side(prediction, "clipHigh", centre + peak, 1, findings);
    side(prediction, "clipLow", centre - peak, -1, findings);
    return findings;
  }

  /** What the output stands at, without its offset: the reference. */
  private static double centre(HookupPrediction prediction) {
    double out = prediction.rest().map(rest -> rest.nodes().getOrDefault("out", 0.0)).orElse(0.0);
    return out - Solved.of(prediction, "outputOffset").orElse(0);
  }

  private static void side(
      HookupPrediction prediction,
      String key,
      double wanted,
      int direction,
      List<Finding> findings) {
    OptionalDouble limit = Solved.of(prediction, key);
    if (limit.isEmpty() || direction * (wanted - limit.getAsDouble()) <= 0) {
      return;
    }
    findings.add(
        new Finding(
            Finding.Severity.FAILS,
            "hookups." + prediction.hookup().name(),
            "The output clips at "
                + Say.volts(limit.getAsDouble())
                + ", before the peak of "
                + Say.volts(wanted)
                + " that the generator asks for: "
                + prediction.figures().get(key).solved().says()
                + ".",
            "An amplitude of "
                + Say.volts(
                    prediction.hookup().source().amplitude().value()
                        * 0.95
                        * Math.abs(limit.getAsDouble() / wanted))
                + " stays within; or more supply voltage."));
  }
}
