package loopwright.view.chart;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.Tick;
import org.jfree.chart.axis.TickType;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;

/**
 * A logarithmic axis: a major tick at every decade, labels in engineering form at as many of them
 * as there is room for, minor ticks between. Where it is zoomed to less than a decade its ticks are
 * those of a linear axis.
 */
final class DecadeAxis extends LogAxis implements UnitAxis {
  private static final int[] DECADES_A_LABEL = {1, 2, 3, 6, 12};
  private static final double GAP = 10;

  /** Below so many decades the ticks at 2 and 5 are labelled too. */
  private static final double FEW_DECADES = 1.3;

  /** Below so many there may be none of 1, 2 and 5 on it. */
  private static final double NARROW = 0.75;

  private final transient Unit unit;

  /**
   * @param unit of its values
   * @param lowest above 0
   * @param highest above the lowest
   */
  DecadeAxis(Unit unit, double lowest, double highest) {
    super(null);
    this.unit = unit;
    setAutoRange(false);
    setRange(lowest, highest);
  }

  @Override
  public Unit unit() {
    return unit;
  }

  @Override
  public List<Tick> refreshTicks(
      Graphics2D g2, AxisState state, Rectangle2D dataArea, RectangleEdge edge) {
    boolean isHorizontal = RectangleEdge.isTopOrBottom(edge);
    double decades = Math.log10(getUpperBound() / getLowerBound());
    if (decades < NARROW) {
      return linear(g2, state, dataArea, edge);
    }
    TextAnchor anchor = isHorizontal ? TextAnchor.TOP_CENTER : TextAnchor.CENTER_RIGHT;
    double length = isHorizontal ? dataArea.getWidth() : dataArea.getHeight();
    int apart = decadesApart(length / decades, isHorizontal ? widest(g2) : height(g2));
    List<Tick> ticks = new ArrayList<>();
    int first = (int) Math.floor(Math.log10(getLowerBound()));
    int last = (int) Math.ceil(Math.log10(getUpperBound()));
    for (int power = first; power <= last; power++) {
      for (int digit = 1; digit < 10; digit++) {
        double value = digit * Math.pow(10, power);
        if (isInside(value)) {
          ticks.add(tick(value, digit, power, apart, decades, anchor));
        }
      }
    }
    return ticks;
  }

  private List<Tick> linear(
      Graphics2D g2, AxisState state, Rectangle2D dataArea, RectangleEdge edge) {
    EngineeringAxis axis = new EngineeringAxis(unit, new Span(getLowerBound(), getUpperBound()));
    axis.setTickLabelFont(getTickLabelFont());
    return axis.refreshTicks(g2, state, dataArea, edge);
  }

  private boolean isInside(double value) {
    return value >= getLowerBound() * (1 - 1e-9) && value <= getUpperBound() * (1 + 1e-9);
  }

  private Tick tick(
      double value, int digit, int power, int apart, double decades, TextAnchor anchor) {
    boolean isDecade = digit == 1;
    boolean isLabelled =
        isDecade && Math.floorMod(power, apart) == offset(apart)
            || decades < FEW_DECADES && (isDecade || digit == 2 || digit == 5);
    return new NumberTick(
        isDecade ? TickType.MAJOR : TickType.MINOR,
        value,
        isLabelled ? EngineeringFormat.format(value, unit) : "",
        anchor,
        TextAnchor.CENTER,
        0);
  }

  /** Two decades apart the round ones are 10 Hz, 1 kHz, 100 kHz; else 1 Hz, 1 kHz, 1 MHz. */
  private static int offset(int apart) {
    return apart == 2 ? 1 : 0;
  }

  private static int decadesApart(double pixelsADecade, double label) {
    for (int apart : DECADES_A_LABEL) {
      if (apart * pixelsADecade >= label + GAP) {
        return apart;
      }
    }
    return DECADES_A_LABEL[DECADES_A_LABEL.length - 1];
  }

  private double widest(Graphics2D g2) {
    return getTickLabelFont()
        .getStringBounds(EngineeringFormat.format(1e8, unit), g2.getFontRenderContext())
        .getWidth();
  }

  private double height(Graphics2D g2) {
    return getTickLabelFont().getLineMetrics("0", g2.getFontRenderContext()).getHeight() / 2;
  }
}
