package loopwright.view.chart;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.font.LineMetrics;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;

/** Draws what is read: a line through all strips, dots on the curves, the values on a plate. */
final class Crosshair {
  private static final double DOT = 7;
  private static final double PADDING = 5;
  private static final double AWAY = 12;

  private final PlotTheme theme;

  Crosshair(PlotTheme theme) {
    this.theme = theme;
  }

  /** Draws a reading over strips that are drawn. */
  void draw(Graphics2D g2, List<DrawnStrip> strips, Reading reading) {
    g2.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g2.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_NORMALIZE);
    g2.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    g2.setFont(theme.small());
    for (int i = 0; i < strips.size(); i++) {
      DrawnStrip strip = strips.get(i);
      // On whole pixels, so that the line is thin and dark.
      double x = Math.rint(strip.pixelOf(reading.place()));
      Rectangle2D area = strip.area();
      if (x < area.getMinX() - 1 || x > area.getMaxX() + 1) {
        continue;
      }
      g2.setColor(theme.text());
      g2.setStroke(new BasicStroke(1f));
      g2.draw(new Line2D.Double(x, area.getMinY(), x, area.getMaxY()));
      double sum = 0;
      List<Point2D> points = reading.points(strip);
      for (Point2D point : points) {
        double y = strip.pixelOfValue(point.getY());
        sum += y;
        if (strip.plot().isPlane()) {
          g2.draw(new Line2D.Double(area.getMinX(), y, area.getMaxX(), y));
        }
        if (area.contains(x, y)) {
          g2.fill(new Ellipse2D.Double(x - DOT / 2, y - DOT / 2, DOT, DOT));
        }
      }
      List<String> lines = new ArrayList<>(reading.says(strip));
      if (i == 0 && !strip.plot().isPlane()) {
        lines.add(0, "at " + strip.plot().places(reading.place()));
      }
      boolean isHigh = !points.isEmpty() && sum / points.size() < area.getCenterY();
      plate(g2, area, x, lines, isHigh);
    }
  }

  /** The plate stands at the bottom where the curves are at the top. */
  private void plate(
      Graphics2D g2, Rectangle2D area, double x, List<String> lines, boolean atBottom) {
    if (lines.isEmpty()) {
      return;
    }
    LineMetrics metrics = theme.small().getLineMetrics("0", g2.getFontRenderContext());
    double height = metrics.getAscent() + metrics.getDescent();
    double width = 0;
    for (String line : lines) {
      width =
          Math.max(
              width, theme.small().getStringBounds(line, g2.getFontRenderContext()).getWidth());
    }
    double whole = width + 2 * PADDING;
    boolean isRight = x + AWAY + whole < area.getMaxX();
    double left = isRight ? x + AWAY : Math.max(area.getMinX(), x - AWAY - whole);
    double tall = lines.size() * height + 2 * PADDING;
    double top = atBottom ? area.getMaxY() - PADDING - tall : area.getMinY() + PADDING;
    Rectangle2D plate = new Rectangle2D.Double(left, top, whole, tall);
    g2.setColor(PlotTheme.thin(theme.background(), 0.92f));
    g2.fill(plate);
    g2.setColor(theme.rule());
    g2.draw(plate);
    g2.setColor(theme.text());
    for (int i = 0; i < lines.size(); i++) {
      g2.drawString(
          lines.get(i),
          (float) (left + PADDING),
          (float) (top + PADDING + i * height + metrics.getAscent()));
    }
  }
}
