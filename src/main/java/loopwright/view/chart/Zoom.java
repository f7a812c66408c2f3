package loopwright.view.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.ValueAxis;

/**
 * What part of a chart is shown.
 *
 * @param places along the shared axis
 * @param values on the axis of each strip
 */
record Zoom(Span places, List<Span> values) {
  /** How much of an axis a step of the keyboard takes away. */
  private static final double STEP = 0.5;

  /** What a chart shows; empty for a chart of bars. */
  static Optional<Zoom> of(JFreeChart chart) {
    List<DrawnStrip> strips = strips(chart);
    return strips.isEmpty()
        ? Optional.empty()
        : Optional.of(
            new Zoom(
                span(strips.get(0).domain()),
                strips.stream().map(strip -> span(strip.plot().getRangeAxis())).toList()));
  }

  /** Shows this part, if the chart has as many strips. */
  void applyTo(JFreeChart chart) {
    List<DrawnStrip> strips = strips(chart);
    if (strips.size() != values.size()) {
      return;
    }
    strips.get(0).domain().setRange(places.lower(), places.upper());
    for (int i = 0; i < strips.size(); i++) {
      strips.get(i).plot().getRangeAxis().setRange(values.get(i).lower(), values.get(i).upper());
    }
  }

  /** The same with other places. */
  Zoom withPlaces(Span others) {
    return new Zoom(others, values);
  }

  /** The same with other values of one strip. */
  Zoom withValues(int strip, Span others) {
    List<Span> changed = new ArrayList<>(values);
    changed.set(strip, others);
    return new Zoom(places, changed);
  }

  /**
   * Half of the places, about one of them.
   *
   * @param isLogarithmic whether halves are taken of the logarithm
   */
  Zoom about(double place, boolean isLogarithmic) {
    if (!isLogarithmic) {
      return withPlaces(half(places, place));
    }
    Span logs = new Span(Math.log(places.lower()), Math.log(places.upper()));
    Span half = half(logs, Math.log(place));
    return withPlaces(new Span(Math.exp(half.lower()), Math.exp(half.upper())));
  }

  private static Span half(Span span, double middle) {
    double share = Math.max(0, Math.min(1, (middle - span.lower()) / span.length()));
    double length = STEP * span.length();
    double lower = span.lower() + share * (span.length() - length);
    return new Span(lower, lower + length);
  }

  private static List<DrawnStrip> strips(JFreeChart chart) {
    return DrawnStrip.of(chart, new ChartRenderingInfo());
  }

  private static Span span(ValueAxis axis) {
    return new Span(axis.getLowerBound(), axis.getUpperBound());
  }
}
