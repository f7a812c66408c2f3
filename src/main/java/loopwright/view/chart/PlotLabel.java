package loopwright.view.chart;

import java.awt.Color;
import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.List;

/**
 * Words in a plot, and the points of the plot that they speak of.
 *
 * @param text what it says
 * @param colour of the text
 * @param anchors points in the plot's own units, best first; the label stands near one of them
 * @param optional whether it is better left out than laid over another
 */
record PlotLabel(String text, Color colour, List<Point2D> anchors, boolean optional) {
  /** Keeps its own copy of the anchors. */
  PlotLabel {
    anchors = List.copyOf(anchors);
  }

  /** Words at one point. */
  static PlotLabel at(double x, double y, String text, Color colour) {
    return new PlotLabel(text, colour, List.of(new Point2D.Double(x, y)), false);
  }

  /** Words at a line from bottom to top, at whichever height there is room; best first. */
  static PlotLabel along(double x, List<Double> heights, String text, Color colour) {
    List<Point2D> anchors = new ArrayList<>();
    heights.forEach(y -> anchors.add(new Point2D.Double(x, y)));
    return new PlotLabel(text, colour, anchors, false);
  }

  /** The same words, left out where there is no room. */
  PlotLabel orNone() {
    return new PlotLabel(text, colour, anchors, true);
  }
}
