package loopwright.sheet;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Root;
import loopwright.predict.SwingLevel;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;

/** What scope and supply should tell about oscillation. */
final class OscillationWatch {
  private static final String STOP =
      "Do not connect what it could harm; expect a supply current and readings other than these.";

  /** How to look; the same for every hookup. */
  static final String CHECK =
      "Look with a wide-band probe at out over the whole swing: a thick or fuzzy trace, or a supply"
          + " current that rises, means oscillation.";

  private OscillationWatch() {}

  static List<String> of(HookupPrediction prediction) {
    if (prediction.rest().isEmpty()) {
      return List.of("No operating point: " + prediction.failure() + ".");
    }
    for (Root root : prediction.unstablePoles()) {
      return List.of(
          root.im() == 0
              ? "Expected to latch as soon as it is powered: it has no stable rest. " + STOP
              : "Expected to oscillate as soon as it is powered, near "
                  + hertz(root.im() / (2 * Math.PI))
                  + ". "
                  + STOP);
    }
    List<SwingLevel> growing =
        prediction.overSwing().stream().filter(level -> !level.stable()).toList();
    if (!growing.isEmpty()) {
      return List.of(overSwing(growing));
    }
    if (prediction.overSwing().isEmpty()) {
      String remark = prediction.swingRemark();
      return List.of(
          "Whether it oscillates over the swing is not known"
              + (remark.isEmpty() ? "" : ": " + remark)
              + ".");
    }
    return List.of(quiet(prediction.overSwing()));
  }

  private static String overSwing(List<SwingLevel> growing) {
    double low = growing.stream().mapToDouble(SwingLevel::output).min().orElseThrow();
    double high = growing.stream().mapToDouble(SwingLevel::output).max().orElseThrow();
    Optional<SwingLevel> fastest =
        growing.stream()
            .filter(level -> level.growth().isPresent() && level.frequency().isPresent())
            .max(Comparator.comparingDouble(level -> level.growth().getAsDouble()));
    return "Quiet at rest, but expected to oscillate while out is between "
        + volts(low)
        + " and "
        + volts(high)
        + fastest.map(level -> ", near " + hertz(level.frequency().getAsDouble())).orElse("")
        + ". "
        + STOP;
  }

  private static String quiet(List<SwingLevel> levels) {
    double low = levels.stream().mapToDouble(SwingLevel::output).min().orElseThrow();
    double high = levels.stream().mapToDouble(SwingLevel::output).max().orElseThrow();
    Optional<SwingLevel> tightest =
        levels.stream()
            .filter(level -> level.phaseMargin().isPresent())
            .min(Comparator.comparingDouble(level -> level.phaseMargin().getAsDouble()));
    return "No oscillation expected"
        + (levels.size() == 1
            ? " at rest"
            : " while out is between " + volts(low) + " and " + volts(high))
        + tightest
            .map(
                level ->
                    "; smallest phase margin "
                        + margin(level.phaseMargin())
                        + " at "
                        + volts(level.output()))
            .orElse("")
        + ".";
  }

  private static String margin(OptionalDouble degrees) {
    return EngineeringFormat.format(degrees.getAsDouble(), Unit.DEGREE, 3);
  }

  private static String hertz(double frequency) {
    return EngineeringFormat.format(frequency, Unit.HERTZ, 3);
  }

  private static String volts(double value) {
    return EngineeringFormat.format(value, Unit.VOLT, 3);
  }
}
