package loopwright.check;

import java.util.List;
import java.util.OptionalDouble;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.Feedback;
import loopwright.predict.HookupGains;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Unit;

/** A loop gain too low for the accuracy that is wanted of the closed loop. */
final class LoopGainCheck implements Check {
  /** Where the design states no limits for the gain, a tenth is worth a remark. */
  private static final double LARGE = 0.1;

  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    HookupGains gains = new HookupGains(prediction.hookup());
    OptionalDouble a = Solved.of(prediction, "openLoopGain");
    if (gains.noiseGain().isEmpty() || a.isEmpty() || !(a.getAsDouble() > 0)) {
      return List.of();
    }
    double noiseGain = gains.noiseGain().getAsDouble();
    double error = noiseGain / a.getAsDouble() / (1 + noiseGain / a.getAsDouble());
    double wanted = wanted(design, prediction, gains);
    if (error <= wanted) {
      return List.of();
    }
    return List.of(
        new Finding(
            Finding.Severity.RISKY,
            "hookups." + prediction.hookup().name() + ".feedback",
            "Loop gain "
                + Say.change("", Math.round(a.getAsDouble() / noiseGain), Unit.ONE).value()
                + " is low: finite gain alone takes "
                + Say.percent(error)
                + " of the closed-loop gain, where "
                + Say.percent(wanted)
                + " would be accurate enough.",
            remedy(gains, error),
            changes(prediction, gains, noiseGain / a.getAsDouble())));
  }

  /** Half the width of the limits of the closed-loop gain, where the design states any. */
  private static double wanted(Design design, HookupPrediction prediction, HookupGains gains) {
    return design.limits().stream()
        .filter(limit -> limit.hookup().equals(prediction.hookup().name()))
        .filter(limit -> limit.figure().filter("closedLoopGain"::equals).isPresent())
        .filter(limit -> limit.minimum().isPresent() && limit.maximum().isPresent())
        .mapToDouble(
            limit ->
                Math.abs(
                    (limit.maximum().get().value() - limit.minimum().get().value())
                        / 2
                        / gains.idealGain().orElse(1)))
        .min()
        .orElse(LARGE);
  }

  private static String remedy(HookupGains gains, double error) {
    return gains.upper() > 0 && Double.isFinite(gains.lower())
        ? "A feedback resistor larger by as much makes up for it at rest; more gain within the"
            + " amplifier cures it."
        : "More gain within the amplifier cures it: a current source for its load, or a buffer; the"
            + " error is "
            + Say.percent(error)
            + ".";
  }

  private static List<Change> changes(
      HookupPrediction prediction, HookupGains gains, double inverse) {
    boolean divider =
        prediction.hookup().feedback() instanceof Feedback.NonInverting
            && gains.upper() > 0
            && Double.isFinite(gains.lower())
            && inverse < 0.5;
    if (!divider) {
      return List.of();
    }
    double noiseGain = gains.noiseGain().orElseThrow();
    double raised = noiseGain / (1 - inverse);
    double upper = PreferredValues.E96.nearest(gains.lower() * (raised - 1));
    return List.of(
        Say.change("hookups." + prediction.hookup().name() + ".feedback.upper", upper, Unit.OHM));
  }
}
