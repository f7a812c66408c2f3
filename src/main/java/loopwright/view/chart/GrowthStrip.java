package loopwright.view.chart;

import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.DoubleStream;
import loopwright.predict.SwingLevel;
import loopwright.quantity.Unit;
import org.jfree.chart.plot.XYPlot;

/** Growth of the fastest oscillation against output level, with frequencies at a few levels. */
final class GrowthStrip {
  private static final double OVERDAMPED = 20;

  private final List<SwingLevel> levels;
  private final SwingRegions grows;
  private final PlotTheme theme;

  GrowthStrip(List<SwingLevel> levels, SwingRegions grows, PlotTheme theme) {
    this.levels = levels;
    this.grows = grows;
    this.theme = theme;
  }

  XYPlot plot() {
    Curve curve = SwingPlot.curve("growth", levels, SwingLevel::growth);
    Span span = Span.of(DoubleStream.of(curve.y())).with(0).padded(0.12, 0.3);
    Strip strip = new Strip(Unit.PER_SECOND, span, Unit.VOLT, theme);
    strip.level(0, theme.quiet()).curve(curve, 1, 0.6).dots(growing());
    if (!grows.isEmpty()) {
      strip.shadeValues(new Span(0, span.upper()), theme.fails());
    }
    double middle = levels.get(levels.size() / 2).output();
    if (!grows.isEmpty()) {
      strip.labelFirst(PlotLabel.at(middle, span.upper(), "grows", theme.fails()).orNone());
    }
    strip.label(PlotLabel.at(middle, span.lower(), "dies away", theme.quiet()).orNone());
    for (SwingLevel level : labelled()) {
      strip.label(
          PlotLabel.at(
                  level.output(),
                  level.growth().getAsDouble(),
                  Words.hertz(level.frequency().getAsDouble()),
                  theme.text())
              .orNone());
    }
    return strip.plot();
  }

  private boolean[] growing() {
    boolean[] growing = new boolean[levels.size()];
    for (int i = 0; i < growing.length; i++) {
      growing[i] = !levels.get(i).stable();
    }
    return growing;
  }

  /** A pair that is damped out within a small part of its period has no frequency to be seen. */
  private static boolean rings(SwingLevel level) {
    return level.growth().isPresent()
        && level.frequency().isPresent()
        && Math.abs(level.growth().getAsDouble())
            < OVERDAMPED * 2 * Math.PI * level.frequency().getAsDouble();
  }

  /** Both ends, the fastest, the slowest, and where growing begins or ends. */
  private Set<SwingLevel> labelled() {
    List<SwingLevel> candidates = levels.stream().filter(GrowthStrip::rings).toList();
    Set<SwingLevel> chosen = new LinkedHashSet<>();
    if (candidates.isEmpty()) {
      return chosen;
    }
    Comparator<SwingLevel> byGrowth =
        Comparator.comparingDouble(level -> level.growth().getAsDouble());
    chosen.add(candidates.stream().max(byGrowth).orElseThrow());
    for (int i = 1; i < candidates.size(); i++) {
      if (candidates.get(i).stable() != candidates.get(i - 1).stable()) {
        chosen.add(candidates.get(candidates.get(i).stable() ? i - 1 : i));
      }
    }
    chosen.add(candidates.get(0));
    chosen.add(candidates.get(candidates.size() - 1));
    chosen.add(candidates.stream().min(byGrowth).orElseThrow());
    return chosen;
  }
}
