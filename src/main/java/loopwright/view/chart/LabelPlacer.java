package loopwright.view.chart;

import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Finds room for labels, one after the other: near an anchor, off the curves, off the labels that
 * stand already, inside the plot. Knows pixels only.
 */
final class LabelPlacer {
  private static final double[] GAPS = {5, 14};

  /** What a label keeps clear of curves, for the width of their strokes. */
  private static final double CLEAR = 2;

  private static final double ON_LABEL = 10_000;
  private static final double ON_CURVE = 100;
  private static final double ON_MARK = 40;
  private static final double PER_MOVED_PIXEL = 1.5;
  private static final double PER_LATER_ANCHOR = 0.4;
  private static final double PER_LATER_SIDE = 0.3;

  private final Rectangle2D area;
  private final List<Line2D> curves;
  private final List<Line2D> marks;
  private final List<Rectangle2D> taken = new ArrayList<>();

  /**
   * @param area to stay inside
   * @param curves to keep off
   * @param marks lines to keep off where that is easily done
   */
  LabelPlacer(Rectangle2D area, List<Line2D> curves, List<Line2D> marks) {
    this.area = area;
    this.curves = List.copyOf(curves);
    this.marks = List.copyOf(marks);
  }

  /**
   * The place of a label of this size; it counts as taken from then on.
   *
   * @param anchors points it speaks of, best first
   * @param optional whether it may be left out
   * @return empty where it is optional and could only stand on another, or is larger than the plot
   */
  Optional<Rectangle2D> place(
      List<? extends Point2D> anchors, double width, double height, boolean optional) {
    if (width > area.getWidth() || height > area.getHeight()) {
      return Optional.empty();
    }
    Rectangle2D best = null;
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < anchors.size(); i++) {
      List<Rectangle2D> sides = sides(anchors.get(i), width, height);
      for (int side = 0; side < sides.size(); side++) {
        Rectangle2D wanted = sides.get(side);
        Rectangle2D inside = moveInside(wanted);
        double cost = PER_LATER_ANCHOR * i + PER_LATER_SIDE * side + cost(wanted, inside);
        if (cost < least) {
          least = cost;
          best = inside;
        }
      }
    }
    if (best == null || optional && least >= ON_CURVE) {
      return Optional.empty();
    }
    taken.add(best);
    return Optional.of(best);
  }

  private static List<Rectangle2D> sides(Point2D at, double width, double height) {
    List<Rectangle2D> sides = new ArrayList<>();
    for (double gap : GAPS) {
      addSides(at, width, height, gap, sides);
    }
    return sides;
  }

  private static void addSides(
      Point2D at, double width, double height, double gap, List<Rectangle2D> sides) {
    double x = at.getX();
    double y = at.getY();
    double above = y - gap - height;
    double below = y + gap;
    double left = x - gap - width;
    double right = x + gap;
    double[][] corners = {
      {x - width / 2, above},
      {x - width / 2, below},
      {right, y - height / 2},
      {left, y - height / 2},
      {right, above},
      {left, above},
      {right, below},
      {left, below}
    };
    for (double[] corner : corners) {
      sides.add(new Rectangle2D.Double(corner[0], corner[1], width, height));
    }
  }

  private Rectangle2D moveInside(Rectangle2D wanted) {
    double x = Math.min(wanted.getX(), area.getMaxX() - wanted.getWidth());
    double y = Math.min(wanted.getY(), area.getMaxY() - wanted.getHeight());
    return new Rectangle2D.Double(
        Math.max(area.getX(), x), Math.max(area.getY(), y), wanted.getWidth(), wanted.getHeight());
  }

  private double cost(Rectangle2D wanted, Rectangle2D inside) {
    double cost =
        PER_MOVED_PIXEL * Math.hypot(wanted.getX() - inside.getX(), wanted.getY() - inside.getY());
    for (Rectangle2D other : taken) {
      cost += other.intersects(inside) ? ON_LABEL : 0;
    }
    Rectangle2D around =
        new Rectangle2D.Double(
            inside.getX() - CLEAR,
            inside.getY() - CLEAR,
            inside.getWidth() + 2 * CLEAR,
            inside.getHeight() + 2 * CLEAR);
    cost += marks.stream().anyMatch(inside::intersectsLine) ? ON_MARK : 0;
    return cost + (curves.stream().anyMatch(around::intersectsLine) ? ON_CURVE : 0);
  }
}
