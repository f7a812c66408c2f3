package loopwright.view.chart;

import java.awt.Graphics2D;
import java.awt.font.FontRenderContext;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import loopwright.quantity.Unit;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.Tick;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;

/**
 * A linear axis in engineering form: steps of 1, 2 or 5, angles in steps of 30, 45 or 90 degrees,
 * one prefix for all its numbers.
 */
final class EngineeringAxis extends NumberAxis implements UnitAxis {
  private static final double[] STEPS = {1, 2, 5, 10};
  private static final double[] ANGLES = {1, 2, 5, 10, 15, 30, 45, 90, 180, 360, 720, 1440};

  /** Room that a tick label keeps to the next, as a multiple of its height. */
  private static final double VERTICAL_ROOM = 1.6;

  private static final double HORIZONTAL_GAP = 18;

  /** However large the plot is: more only make it restless. */
  private static final double MOST_STEPS = 9;

  private final transient Unit unit;
  private final transient AxisScale scale;

  /**
   * @param unit of the values
   * @param span what it shows
   */
  EngineeringAxis(Unit unit, Span span) {
    super(null);
    this.unit = unit;
    this.scale = AxisScale.of(unit, Math.max(Math.abs(span.lower()), Math.abs(span.upper())));
    setAutoRange(false);
    setRange(span.lower(), span.upper());
  }

  @Override
  public Unit unit() {
    return unit;
  }

  /** The prefix and unit of its numbers. */
  AxisScale scale() {
    return scale;
  }

  @Override
  public List<Tick> refreshTicks(
      Graphics2D g2, AxisState state, Rectangle2D dataArea, RectangleEdge edge) {
    boolean isHorizontal = RectangleEdge.isTopOrBottom(edge);
    double length = isHorizontal ? dataArea.getWidth() : dataArea.getHeight();
    double step = step(length, isHorizontal, g2.getFontRenderContext());
    TextAnchor anchor = isHorizontal ? TextAnchor.TOP_CENTER : sideAnchor(edge);
    List<Tick> ticks = new ArrayList<>();
    for (long i = first(step); i <= last(step); i++) {
      double value = i * step;
      ticks.add(new NumberTick(value, scale.say(value, step), anchor, TextAnchor.CENTER, 0));
    }
    return ticks;
  }

  private static TextAnchor sideAnchor(RectangleEdge edge) {
    return edge == RectangleEdge.LEFT ? TextAnchor.CENTER_RIGHT : TextAnchor.CENTER_LEFT;
  }

  private double step(double length, boolean isHorizontal, FontRenderContext context) {
    double span = getUpperBound() - getLowerBound();
    double height = getTickLabelFont().getLineMetrics("0", context).getHeight();
    double step = span;
    double finer = span;
    for (double candidate : candidates(span)) {
      double pixels = candidate / span * length;
      double room =
          isHorizontal ? widest(candidate, context) + HORIZONTAL_GAP : VERTICAL_ROOM * height;
      room = Math.max(room, length / MOST_STEPS);
      finer = step;
      step = candidate;
      if (pixels >= room) {
        break;
      }
    }
    // A single number on an axis gives no scale.
    return ticks(step) < 2 ? finer : step;
  }

  private long ticks(double step) {
    return last(step) - first(step) + 1;
  }

  private long first(double step) {
    return (long) Math.ceil(getLowerBound() / step - 1e-9);
  }

  private long last(double step) {
    return (long) Math.floor(getUpperBound() / step + 1e-9);
  }

  /** Steps from a fiftieth of the span to the whole of it, finest first. */
  private double[] candidates(double span) {
    if (unit == Unit.DEGREE && span > 5) {
      return ANGLES;
    }
    List<Double> steps = new ArrayList<>();
    double decade = Math.pow(10, AxisScale.leadingPower(span / 50));
    for (int power = 0; power < 3; power++, decade *= 10) {
      for (int i = 0; i < 3; i++) {
        steps.add(STEPS[i] * decade);
      }
    }
    return steps.stream().mapToDouble(Double::doubleValue).toArray();
  }

  private double widest(double step, FontRenderContext context) {
    double lower = width(scale.say(getLowerBound(), step), context);
    return Math.max(lower, width(scale.say(getUpperBound(), step), context));
  }

  private double width(String text, FontRenderContext context) {
    return getTickLabelFont().getStringBounds(text, context).getWidth();
  }
}
