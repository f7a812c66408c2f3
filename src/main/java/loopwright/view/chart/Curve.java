package loopwright.view.chart;

import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.data.xy.XYSeries;

/**
 * A curve as it was predicted.
 *
 * @param name what it is, in a word or two
 * @param x along the shared axis
 * @param y values; not a number where there is none, which leaves a gap
 */
record Curve(String name, double[] x, double[] y) {
  private static final int ANCHORS = 24;

  /** Checks the lengths. */
  Curve {
    if (x.length != y.length) {
      throw new IllegalArgumentException(
          "found " + x.length + " places and " + y.length + " values, expected as many of each");
    }
  }

  /** The same points for a chart. */
  XYSeries series() {
    XYSeries series = new XYSeries(name, false, true);
    for (int i = 0; i < x.length; i++) {
      series.add(x[i], Double.isFinite(y[i]) ? Double.valueOf(y[i]) : null, false);
    }
    return series;
  }

  /**
   * Points along the curve at which its name could stand, those nearest to a share of its length
   * first.
   *
   * @param share 0 the start, 1 the end
   */
  List<Point2D> anchors(double share) {
    List<Point2D> points = new ArrayList<>();
    int step = Math.max(1, x.length / ANCHORS);
    for (int i = step / 2; i < x.length; i += step) {
      if (Double.isFinite(y[i])) {
        points.add(new Point2D.Double(x[i], y[i]));
      }
    }
    if (points.isEmpty()) {
      return points;
    }
    List<Point2D> ordered = new ArrayList<>();
    int middle = (int) Math.round(share * (points.size() - 1));
    for (int away = 0; away < points.size(); away++) {
      if (middle + away < points.size()) {
        ordered.add(points.get(middle + away));
      }
      if (away > 0 && middle - away >= 0) {
        ordered.add(points.get(middle - away));
      }
    }
    return ordered;
  }

  /** The value at a place between two points of a curve whose places ascend. */
  double at(double place) {
    for (int i = 1; i < x.length; i++) {
      if (x[i] >= place && x[i - 1] <= place) {
        double share = x[i] == x[i - 1] ? 0 : (place - x[i - 1]) / (x[i] - x[i - 1]);
        return y[i - 1] + share * (y[i] - y[i - 1]);
      }
    }
    return Double.NaN;
  }
}
