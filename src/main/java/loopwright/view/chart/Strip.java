package loopwright.view.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.List;
import java.util.function.BiFunction;
import loopwright.quantity.EngineeringFormat;
import loopwright.quantity.Unit;
import org.jfree.chart.annotations.XYLineAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.IntervalMarker;
import org.jfree.chart.plot.Marker;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;
import org.jfree.data.xy.XYSeriesCollection;

/** One strip of a picture: curves of one unit over the shared axis, with their marks and labels. */
final class Strip {
  private static final double DOT = 5;

  private final PlotTheme theme;
  private final Unit unit;
  private final Unit along;
  private final XYSeriesCollection dataset = new XYSeriesCollection();
  private final XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false);
  private final List<PlotLabel> labels = new ArrayList<>();
  private final StripPlot plot;

  /**
   * @param unit of its values
   * @param span what its axis shows
   * @param along unit of the shared axis
   */
  Strip(Unit unit, Span span, Unit along, PlotTheme theme) {
    this(unit, engineering(unit, span), along, theme);
  }

  /**
   * @param unit of its values
   * @param axis of its values
   * @param along unit of the shared axis
   */
  Strip(Unit unit, ValueAxis axis, Unit along, PlotTheme theme) {
    this.theme = theme;
    this.unit = unit;
    this.along = along;
    ChartStyle.axis(axis, theme);
    renderer.setDrawSeriesLineAsPath(true);
    renderer.setDefaultToolTipGenerator((data, series, item) -> says(series, item));
    plot = new StripPlot(dataset, null, axis, renderer, along, unit, false);
    ChartStyle.plot(plot, theme);
  }

  private static ValueAxis engineering(Unit unit, Span span) {
    EngineeringAxis axis = new EngineeringAxis(unit, span);
    if (!axis.scale().onAxis().isEmpty()) {
      axis.setLabel(axis.scale().onAxis());
    }
    return axis;
  }

  /**
   * Draws a curve with its name beside it.
   *
   * @param style place in the theme's set of colours and strokes
   * @param share where along the curve its name would best stand, 0 to 1
   */
  Strip curve(Curve curve, int style, double share) {
    int series = dataset.getSeriesCount();
    dataset.addSeries(curve.series());
    Color colour = theme.curves().get(style);
    renderer.setSeriesPaint(series, colour);
    renderer.setSeriesStroke(series, PlotTheme.stroke(style));
    labels.add(new PlotLabel(curve.name(), colour, curve.anchors(share), false));
    return this;
  }

  /**
   * Draws where something wanders, a small dot for each point, its name where there is room.
   *
   * @param style place in the theme's set of colours and strokes
   */
  Strip locus(Curve curve, int style, boolean isNamed) {
    int series = dataset.getSeriesCount();
    dataset.addSeries(curve.series());
    Color colour = theme.curves().get(style % theme.curves().size());
    double size = DOT - 1;
    renderer.setSeriesPaint(series, colour);
    renderer.setSeriesStroke(series, PlotTheme.stroke(style));
    renderer.setSeriesShapesVisible(series, true);
    renderer.setSeriesShape(series, new Ellipse2D.Double(-size / 2, -size / 2, size, size));
    if (isNamed) {
      labels.add(new PlotLabel(curve.name(), colour, curve.anchors(0.5), true));
    }
    return this;
  }

  /** Puts dots on the latest curve: full where said, hollow elsewhere. */
  Strip dots(boolean[] full) {
    int series = dataset.getSeriesCount() - 1;
    Shape dot = new Ellipse2D.Double(-DOT / 2, -DOT / 2, DOT, DOT);
    XYLineAndShapeRenderer dotted =
        new XYLineAndShapeRenderer(true, true) {
          @Override
          public boolean getItemShapeFilled(int row, int column) {
            return row != series || full[column];
          }
        };
    dotted.setSeriesPaint(series, renderer.getSeriesPaint(series));
    dotted.setSeriesStroke(series, new BasicStroke(1.2f));
    dotted.setSeriesShape(series, dot);
    dotted.setDefaultToolTipGenerator((data, row, item) -> says(row, item));
    plot.setRenderer(dotted);
    return this;
  }

  /**
   * Makes it a plane: both axes are values of a third quantity.
   *
   * @param says that quantity, by curve and point
   */
  Strip plane(BiFunction<Integer, Integer, String> says) {
    plot.asPlane(says);
    return this;
  }

  /** A line across at a value. */
  Strip level(double value, Color colour) {
    return mark(new ValueMarker(value), colour, false);
  }

  /** A line from bottom to top at a place. */
  Strip place(double place, Color colour) {
    return mark(new ValueMarker(place), colour, true);
  }

  private Strip mark(ValueMarker marker, Color colour, boolean isPlace) {
    marker.setPaint(colour);
    marker.setStroke(PlotTheme.dashed(1f, 4f, 3f));
    return add(marker, isPlace);
  }

  /** A shade over all values between two. */
  Strip shadeValues(Span values, Color colour) {
    return shade(values, colour, false);
  }

  /** A shade over all places between two. */
  Strip shadePlaces(Span places, Color colour) {
    return shade(places, colour, true);
  }

  private Strip shade(Span span, Color colour, boolean isPlace) {
    IntervalMarker marker = new IntervalMarker(span.lower(), span.upper());
    marker.setPaint(colour);
    marker.setAlpha(0.1f);
    return add(marker, isPlace);
  }

  private Strip add(Marker marker, boolean isPlace) {
    if (isPlace) {
      plot.addDomainMarker(marker, Layer.BACKGROUND);
    } else {
      plot.addRangeMarker(marker, Layer.BACKGROUND);
    }
    return this;
  }

  /** A solid line from one value to another at a place: how much is left between them. */
  Strip distance(double place, double from, double to, Color colour) {
    plot.addAnnotation(new XYLineAnnotation(place, from, place, to, new BasicStroke(3f), colour));
    return this;
  }

  /** Words, after those that are there already. */
  Strip label(PlotLabel label) {
    labels.add(label);
    return this;
  }

  /** Words before all others, since they matter most. */
  Strip labelFirst(PlotLabel label) {
    labels.add(0, label);
    return this;
  }

  /** The finished strip. */
  XYPlot plot() {
    plot.addAnnotation(new LabelLayer(labels, theme.small(), theme.background()));
    return plot;
  }

  private String says(int series, int item) {
    Point2D point =
        new Point2D.Double(dataset.getXValue(series, item), dataset.getYValue(series, item));
    return dataset.getSeriesKey(series)
        + " "
        + EngineeringFormat.format(point.getY(), unit)
        + " at "
        + EngineeringFormat.format(point.getX(), along);
  }
}
