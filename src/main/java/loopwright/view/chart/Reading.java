package loopwright.view.chart;

import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.axis.LogAxis;
import org.jfree.data.xy.XYDataset;

/**
 * What is read off a chart: every curve at one place, or on a plane one point of one curve.
 *
 * @param place along the shared axis
 * @param series the curve, on a plane
 * @param item the point of it, on a plane
 */
record Reading(double place, int series, int item) {
  /** Nearer than this to another point, in pixels, a step of the keyboard goes on to the next. */
  private static final double STEP = 6;

  /** What is under the mouse; on a plane the point of a curve nearest to it. */
  static Reading at(List<DrawnStrip> strips, Point2D pixel) {
    DrawnStrip first = strips.get(0);
    if (!first.plot().isPlane()) {
      double x = Math.max(first.area().getMinX(), Math.min(first.area().getMaxX(), pixel.getX()));
      return new Reading(first.placeAt(x), 0, 0);
    }
    XYDataset data = first.plot().getDataset();
    Reading best = new Reading(0, 0, 0);
    double least = Double.POSITIVE_INFINITY;
    for (int series = 0; series < data.getSeriesCount(); series++) {
      for (int item = 0; item < data.getItemCount(series); item++) {
        double distance = pixelOf(first, series, item).distance(pixel);
        if (distance < least) {
          least = distance;
          best = new Reading(data.getXValue(series, item), series, item);
        }
      }
    }
    return best;
  }

  /** In the middle of what is shown. */
  static Reading middle(List<DrawnStrip> strips) {
    DrawnStrip first = strips.get(0);
    return at(strips, new Point2D.Double(first.area().getCenterX(), first.area().getCenterY()));
  }

  /** So many pixels to the right, on a plane so many points of a few pixels along the curve. */
  Reading moved(List<DrawnStrip> strips, int pixels) {
    DrawnStrip first = strips.get(0);
    if (!first.plot().isPlane()) {
      return at(strips, new Point2D.Double(first.pixelOf(place) + pixels, 0));
    }
    XYDataset data = first.plot().getDataset();
    int direction = Integer.signum(pixels);
    double wanted = Math.max(STEP, Math.abs(pixels));
    Point2D from = pixelOf(first, series, item);
    int at = item;
    while (at + direction >= 0 && at + direction < data.getItemCount(series)) {
      at += direction;
      if (first.area().contains(pixelOf(first, series, at))
          && pixelOf(first, series, at).distance(from) >= wanted) {
        break;
      }
    }
    return new Reading(data.getXValue(series, at), series, at);
  }

  /** The next curve, on a plane. */
  Reading otherCurve(List<DrawnStrip> strips, int direction) {
    XYDataset data = strips.get(0).plot().getDataset();
    if (!strips.get(0).plot().isPlane() || data.getSeriesCount() == 0) {
      return this;
    }
    int next = Math.floorMod(series + direction, data.getSeriesCount());
    int point = Math.max(0, Math.min(item, data.getItemCount(next) - 1));
    return new Reading(data.getXValue(next, point), next, point);
  }

  /** Points of a strip that are read, in its own units. */
  List<Point2D> points(DrawnStrip strip) {
    XYDataset data = strip.plot().getDataset();
    List<Point2D> points = new ArrayList<>();
    if (strip.plot().isPlane()) {
      points.add(new Point2D.Double(data.getXValue(series, item), data.getYValue(series, item)));
      return points;
    }
    for (int curve = 0; curve < data.getSeriesCount(); curve++) {
      double value = valueAt(data, curve, strip.domain() instanceof LogAxis);
      if (Double.isFinite(value)) {
        points.add(new Point2D.Double(place, value));
      }
    }
    return points;
  }

  /** The same in words, one line a curve. */
  List<String> says(DrawnStrip strip) {
    StripPlot plot = strip.plot();
    XYDataset data = plot.getDataset();
    if (plot.isPlane()) {
      return List.of(data.getSeriesKey(series).toString(), plot.point(series, item));
    }
    List<String> lines = new ArrayList<>();
    for (int curve = 0; curve < data.getSeriesCount(); curve++) {
      double value = valueAt(data, curve, strip.domain() instanceof LogAxis);
      if (Double.isFinite(value)) {
        lines.add(plot.says(data.getSeriesKey(curve).toString(), value));
      }
    }
    return lines;
  }

  /** Between the two neighbouring points of a curve; not a number beyond its ends. */
  private double valueAt(XYDataset data, int curve, boolean isLogarithmic) {
    for (int i = 1; i < data.getItemCount(curve); i++) {
      double before = data.getXValue(curve, i - 1);
      double after = data.getXValue(curve, i);
      if (before <= place && place <= after) {
        double share =
            before == after
                ? 0
                : isLogarithmic
                    ? Math.log(place / before) / Math.log(after / before)
                    : (place - before) / (after - before);
        double low = data.getYValue(curve, i - 1);
        return low + share * (data.getYValue(curve, i) - low);
      }
    }
    return Double.NaN;
  }

  private static Point2D pixelOf(DrawnStrip strip, int series, int item) {
    XYDataset data = strip.plot().getDataset();
    return new Point2D.Double(
        strip.pixelOf(data.getXValue(series, item)),
        strip.pixelOfValue(data.getYValue(series, item)));
  }
}
