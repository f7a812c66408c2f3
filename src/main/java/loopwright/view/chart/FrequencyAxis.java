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
 * A horizontal logarithmic axis of frequency: a major tick at every decade, labels in engineering
 * form at as many of them as there is room for, minor ticks between.
 */
final class FrequencyAxis extends LogAxis {
  private static final int[] DECADES_A_LABEL = {1, 2, 3, 6, 12};
  private static final double GAP = 10;

  /** Below so many decades the ticks at 2 and 5 are labelled too. */
  private static final double FEW_DECADES = 1.3;

  /**
   * @param lowest Hz, above 0
   * @param highest Hz, above the lowest
   */
  FrequencyAxis(double lowest, double highest) {
    super(null);
    setAutoRange(false);
    setRange(lowest, highest);
  }

  @Override
  public List<Tick> refreshTicks(
      Graphics2D g2, AxisState state, Rectangle2D dataArea, RectangleEdge edge) {
    double decades = Math.log10(getUpperBound() / getLowerBound());
    int apart = decadesApart(dataArea.getWidth() / decades, widestLabel(g2));
    List<Tick> ticks = new ArrayList<>();
    int first = (int) Math.floor(Math.log10(getLowerBound()));
    int last = (int) Math.ceil(Math.log10(getUpperBound()));
    for (int power = first; power <= last; power++) {
      for (int digit = 1; digit < 10; digit++) {
        double value = digit * Math.pow(10, power);
        if (isInside(value)) {
          ticks.add(tick(value, digit, power, apart, decades));
        }
      }
    }
    return ticks;
  }

  private boolean isInside(double value) {
    return value >= getLowerBound() * (1 - 1e-9) && value <= getUpperBound() * (1 + 1e-9);
  }

  private static Tick tick(double value, int digit, int power, int apart, double decades) {
    boolean isDecade = digit == 1;
    boolean isLabelled =
        isDecade && Math.floorMod(power, apart) == offset(apart)
            || decades < FEW_DECADES && (isDecade || digit == 2 || digit == 5);
    return new NumberTick(
        isDecade ? TickType.MAJOR : TickType.MINOR,
        value,
        isLabelled ? EngineeringFormat.format(value, Unit.HERTZ) : "",
        TextAnchor.TOP_CENTER,
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

  private double widestLabel(Graphics2D g2) {
    return getTickLabelFont().getStringBounds("100 MHz", g2.getFontRenderContext()).getWidth();
  }
}
