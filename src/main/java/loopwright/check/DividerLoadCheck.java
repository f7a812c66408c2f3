package loopwright.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import loopwright.design.Change;
import loopwright.design.Design;
import loopwright.design.Feedback;
import loopwright.design.OutputStage;
import loopwright.design.StagesAmplifier;
import loopwright.predict.DeviceState;
import loopwright.predict.HookupGains;
import loopwright.predict.HookupPrediction;
import loopwright.quantity.PreferredValues;
import loopwright.quantity.Unit;

/** A divider that takes a good part of what the gain stage gives: there is no follower to help. */
final class DividerLoadCheck implements Check {
  /** More than this share of the gain stage's current is too much; common practice, no source. */
  private static final double SHARE = 0.2;

  /** What the remedy leaves, a share of the same current. */
  private static final double WANTED = 0.1;

  @Override
  public List<Finding> check(Design design, HookupPrediction prediction) {
    boolean follower =
        design.amplifier() instanceof StagesAmplifier stages
            && stages.outputStage() instanceof OutputStage.PushPull;
    HookupGains gains = new HookupGains(prediction.hookup());
    if (follower
        || gains.upper() == 0
        || prediction.rest().isEmpty()
        || !(prediction.rest().get().devices().get("gain.q1")
            instanceof DeviceState.TransistorState gain)
        || !(gain.collectorCurrent() > 0)) {
      return List.of();
    }
    boolean inverting = prediction.hookup().feedback() instanceof Feedback.Inverting;
    double foot = inverting || Double.isInfinite(gains.lower()) ? 0 : gains.lower();
    double amplitude = prediction.hookup().source().amplitude().value();
    double peak = amplitude == 0 ? 1 : Math.abs(gains.idealGain().orElse(1)) * amplitude;
    double taken = peak / (gains.upper() + foot);
    if (taken <= SHARE * gain.collectorCurrent()) {
      return List.of();
    }
    double factor = taken / (WANTED * gain.collectorCurrent());
    return List.of(
        new Finding(
            Finding.Severity.RISKY,
            "hookups." + prediction.hookup().name() + ".feedback",
            "The divider is heavy: at a peak of "
                + Say.volts(peak)
                + " it takes "
                + Say.amperes(taken)
                + " of the "
                + Say.amperes(gain.collectorCurrent())
                + " that the gain stage carries.",
            "Resistors "
                + String.format(Locale.ROOT, "%.1f", factor)
                + " times as large take a tenth of it.",
            changes(prediction, gains, inverting, factor)));
  }

  private static List<Change> changes(
      HookupPrediction prediction, HookupGains gains, boolean inverting, double factor) {
    String at = "hookups." + prediction.hookup().name() + ".feedback.";
    List<Change> changes = new ArrayList<>();
    double ratio = gains.upper() / gains.lower();
    double lower =
        Double.isInfinite(gains.lower()) ? 0 : PreferredValues.E24.next(gains.lower() * factor);
    double upper = lower == 0 ? gains.upper() * factor : lower * ratio;
    changes.add(Say.change(at + "upper", PreferredValues.E96.nearest(upper), Unit.OHM));
    if (lower > 0) {
      changes.add(Say.change(at + (inverting ? "inputResistor" : "lower"), lower, Unit.OHM));
    }
    return changes;
  }
}
