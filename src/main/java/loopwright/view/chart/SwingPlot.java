package loopwright.view.chart;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.stream.DoubleStream;
import loopwright.predict.HookupPrediction;
import loopwright.predict.SwingLevel;
import loopwright.quantity.Unit;
import org.jfree.chart.plot.XYPlot;

/** Stability against output level: growth, phase margin, and the gain beside them. */
final class SwingPlot implements PlotSubject {
  /** A gain that changes less, as a share of itself, is drawn as what it is: flat. */
  private static final double LEAST_CHANGE = 1e-3;

  @Override
  public String tab() {
    return "Over swing";
  }

  @Override
  public Picture picture(HookupPrediction prediction, PlotTheme theme) {
    List<SwingLevel> levels = prediction.overSwing();
    if (levels.isEmpty()) {
      return Picture.none(
          "No levels",
          Words.sentences(
              "The circuit could not be solved at any output level", prediction.swingRemark()));
    }
    if (levels.size() == 1) {
      return Picture.none(
          levels.get(0).stable() ? "Stable at rest" : "Grows at rest", atRest(levels.get(0)));
    }
    SwingRegions grows = SwingRegions.of(levels);
    Span outputs = Span.of(levels.stream().mapToDouble(SwingLevel::output));
    return Picture.of(
        title(levels, grows, outputs),
        sentence(prediction, grows),
        ChartStyle.stack(
            new EngineeringAxis(Unit.VOLT, outputs.padded(0.02)),
            strips(levels, grows, theme),
            weights(levels),
            theme));
  }

  private static List<XYPlot> strips(List<SwingLevel> levels, SwingRegions grows, PlotTheme theme) {
    List<XYPlot> strips = new ArrayList<>();
    if (hasGrowth(levels)) {
      strips.add(new GrowthStrip(levels, grows, theme).plot());
    }
    if (hasMargin(levels)) {
      strips.add(margin(levels, grows, theme));
    }
    strips.add(gain(levels, grows, theme));
    return strips;
  }

  private static List<Integer> weights(List<SwingLevel> levels) {
    List<Integer> weights = new ArrayList<>();
    if (hasGrowth(levels)) {
      weights.add(4);
    }
    if (hasMargin(levels)) {
      weights.add(3);
    }
    weights.add(3);
    return weights;
  }

  private static boolean hasGrowth(List<SwingLevel> levels) {
    return levels.stream().anyMatch(level -> level.growth().isPresent());
  }

  private static boolean hasMargin(List<SwingLevel> levels) {
    return levels.stream().anyMatch(level -> level.phaseMargin().isPresent());
  }

  private static XYPlot margin(List<SwingLevel> levels, SwingRegions grows, PlotTheme theme) {
    Curve curve = curve("phase margin", levels, SwingLevel::phaseMargin);
    Span span = Span.of(DoubleStream.of(curve.y())).with(0);
    Strip strip = new Strip(Unit.DEGREE, span.padded(0.1, 0.25), Unit.VOLT, theme);
    shade(strip, grows, theme);
    return strip.level(0, theme.quiet()).curve(curve, 0, 0.25).plot();
  }

  private static XYPlot gain(List<SwingLevel> levels, SwingRegions grows, PlotTheme theme) {
    Curve curve = curve("gain", levels, level -> OptionalDouble.of(level.gain()));
    Span span = Span.of(DoubleStream.of(curve.y()));
    double size = Math.max(Math.abs(span.lower()), Math.abs(span.upper()));
    span = span.atLeast(LEAST_CHANGE * size);
    Strip strip = new Strip(Unit.ONE, span.padded(0.1, 0.25), Unit.VOLT, theme);
    shade(strip, grows, theme);
    return strip.curve(curve, 2, 0.25).plot();
  }

  private static void shade(Strip strip, SwingRegions grows, PlotTheme theme) {
    grows.regions().forEach(region -> strip.shadePlaces(region.shade(), theme.fails()));
  }

  static Curve curve(
      String name, List<SwingLevel> levels, Function<SwingLevel, OptionalDouble> value) {
    return new Curve(
        name,
        levels.stream().mapToDouble(SwingLevel::output).toArray(),
        levels.stream().mapToDouble(level -> value.apply(level).orElse(Double.NaN)).toArray());
  }

  private static String title(List<SwingLevel> levels, SwingRegions grows, Span outputs) {
    if (grows.isEmpty()) {
      return "Stable at every level from "
          + Words.volts(outputs.lower())
          + " to "
          + Words.volts(outputs.upper());
    }
    Optional<SwingLevel> fastest = fastest(levels);
    String frequency =
        fastest.flatMap(SwingPlot::says).map(says -> ", fastest at " + says).orElse("");
    return (fastest.isPresent() ? "Grows " : "Latches ") + grows.says() + frequency;
  }

  /** The level whose oscillation grows fastest; empty where none oscillates. */
  private static Optional<SwingLevel> fastest(List<SwingLevel> levels) {
    return levels.stream()
        .filter(level -> !level.stable() && level.growth().orElse(0) > 0)
        .max(Comparator.comparingDouble(level -> level.growth().orElse(0)));
  }

  private static Optional<String> says(SwingLevel level) {
    return level.frequency().isPresent()
        ? Optional.of(Words.hertz(level.frequency().getAsDouble()))
        : Optional.empty();
  }

  private static String sentence(HookupPrediction prediction, SwingRegions grows) {
    List<SwingLevel> levels = prediction.overSwing();
    String doubling =
        fastest(levels)
            .map(
                level ->
                    "At "
                        + Words.volts(level.output())
                        + " the oscillation doubles every "
                        + Words.seconds(Math.log(2) / level.growth().getAsDouble()))
            .orElse("");
    OptionalDouble least =
        levels.stream()
            .filter(level -> level.phaseMargin().isPresent())
            .mapToDouble(level -> level.phaseMargin().getAsDouble())
            .min();
    String margin =
        grows.isEmpty() && least.isPresent()
            ? "Phase margin nowhere under " + Words.degrees(least.getAsDouble())
            : "";
    return Words.sentences(
        "The small-signal circuit differs at every output level",
        doubling,
        margin,
        prediction.swingRemark());
  }

  private static String atRest(SwingLevel level) {
    String margin =
        level.phaseMargin().isPresent()
            ? "Phase margin " + Words.degrees(level.phaseMargin().getAsDouble()) + " at rest"
            : "";
    String frequency =
        says(level)
            .map(
                hertz ->
                    level.stable()
                        ? "The least damped oscillation, at " + hertz + ", dies away"
                        : "It oscillates at " + hertz)
            .orElse("");
    return Words.sentences(
        "Give the source an amplitude to see whether it stays so over the swing",
        margin,
        frequency);
  }
}
