package loopwright.command;

import static loopwright.quantity.EngineeringFormat.format;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import loopwright.design.Feedback;
import loopwright.predict.HookupPrediction;
import loopwright.predict.Root;
import loopwright.predict.SwingLevel;
import loopwright.quantity.Unit;

/** The verdict on stability, in sentences. */
final class StabilityText {
  private StabilityText() {}

  static void print(HookupPrediction hookup, TextPage page) {
    page.heading("Stability");
    sentences(hookup).forEach(page::paragraph);
  }

  static List<String> sentences(HookupPrediction hookup) {
    List<String> sentences = new ArrayList<>();
    for (Root root : hookup.unstablePoles()) {
      sentences.add(atRest(root));
    }
    List<List<SwingLevel>> growing = growingRanges(hookup.overSwing());
    growing.forEach(range -> sentences.add(growingFrom(range)));
    if (sentences.isEmpty()) {
      sentences.add(quiet(hookup));
    }
    if (!hookup.swingRemark().isBlank()) {
      sentences.add(hookup.swingRemark());
    }
    return sentences;
  }

  private static String atRest(Root root) {
    if (root.im() == 0) {
      return "Latches at rest: a voltage runs away by the factor e every "
          + format(1 / root.re(), Unit.SECOND)
          + ".";
    }
    return "Oscillates at rest: starts at "
        + format(root.im() / (2 * Math.PI), Unit.HERTZ)
        + " and grows by the factor e every "
        + format(1 / root.re(), Unit.SECOND)
        + ".";
  }

  /** Neighbouring levels at which something grows. */
  private static List<List<SwingLevel>> growingRanges(List<SwingLevel> levels) {
    List<List<SwingLevel>> ranges = new ArrayList<>();
    boolean grows = false;
    for (SwingLevel level : levels) {
      if (!level.stable()) {
        if (!grows) {
          ranges.add(new ArrayList<>());
        }
        ranges.get(ranges.size() - 1).add(level);
      }
      grows = !level.stable();
    }
    return ranges;
  }

  private static String growingFrom(List<SwingLevel> range) {
    String where = "with the output " + span(range);
    Optional<SwingLevel> fastest =
        range.stream()
            .filter(level -> level.growth().isPresent() && level.growth().getAsDouble() > 0)
            .max(Comparator.comparingDouble(level -> level.growth().getAsDouble()));
    if (fastest.isEmpty()) {
      return "Latches " + where + ".";
    }
    SwingLevel worst = fastest.get();
    return "Oscillation grows "
        + where
        + "; fastest at "
        + format(worst.output(), Unit.VOLT)
        + (worst.frequency().isPresent()
            ? ", at " + format(worst.frequency().getAsDouble(), Unit.HERTZ)
            : "")
        + ", by the factor e every "
        + format(1 / worst.growth().getAsDouble(), Unit.SECOND)
        + ".";
  }

  private static String quiet(HookupPrediction hookup) {
    if (hookup.rest().isEmpty()) {
      return "No verdict: " + hookup.failure();
    }
    List<SwingLevel> levels = hookup.overSwing();
    if (levels.isEmpty()) {
      return "No verdict: no output level was solved.";
    }
    String where =
        levels.size() == 1
            ? "Stable at rest; without an amplitude no other level was looked at"
            : "Stable at all " + levels.size() + " output levels " + span(levels);
    if (hookup.hookup().feedback() instanceof Feedback.Open) {
      return where + ". There is no loop to have a margin.";
    }
    return where
        + levels.stream()
            .filter(level -> level.phaseMargin().isPresent())
            .min(Comparator.comparingDouble(level -> level.phaseMargin().getAsDouble()))
            .map(StabilityText::smallestMargin)
            .orElse("; the loop gain never passes 1")
        + ".";
  }

  private static String smallestMargin(SwingLevel level) {
    return "; smallest phase margin "
        + format(level.phaseMargin().getAsDouble(), Unit.DEGREE)
        + " at "
        + format(level.output(), Unit.VOLT);
  }

  private static String span(List<SwingLevel> levels) {
    double low = levels.stream().mapToDouble(SwingLevel::output).min().orElseThrow();
    double high = levels.stream().mapToDouble(SwingLevel::output).max().orElseThrow();
    return low == high
        ? "at " + format(low, Unit.VOLT)
        : "from " + format(low, Unit.VOLT) + " to " + format(high, Unit.VOLT);
  }
}
