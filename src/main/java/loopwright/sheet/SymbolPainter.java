package loopwright.sheet;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.AffineTransform;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.List;

/** Draws the symbols of IEC 60617, in points. */
final class SymbolPainter {
  private static final double UNIT = SchematicDrawing.UNIT;
  private static final BasicStroke THIN =
      new BasicStroke(0.9f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
  private static final BasicStroke THICK =
      new BasicStroke(2f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER);
  private static final double DOT = 3.4;

  private final Graphics2D g2;
  private final SchematicInk ink;

  SymbolPainter(Graphics2D g2, SchematicInk ink) {
    this.g2 = g2;
    this.ink = ink;
  }

  void wire(Point2D from, Point2D to) {
    g2.setColor(ink.lines());
    g2.setStroke(THIN);
    g2.draw(new Line2D.Double(from, to));
  }

  void dot(Point2D at) {
    g2.setColor(ink.lines());
    g2.fill(new Ellipse2D.Double(at.getX() - DOT / 2, at.getY() - DOT / 2, DOT, DOT));
  }

  /** A part between its terminals; colour tells how a device stands. */
  void symbol(SchematicSymbol.Kind kind, List<Point2D> terminals, SchematicOverlay.Health health) {
    g2.setColor(colour(health));
    g2.setStroke(THIN);
    switch (kind) {
      case NPN -> transistor(terminals, true);
      case PNP -> transistor(terminals, false);
      case AMPLIFIER -> amplifier(terminals);
      default -> between(kind, terminals.get(0), terminals.get(1));
    }
  }

  private Color colour(SchematicOverlay.Health health) {
    return switch (health) {
      case GOOD -> ink.lines();
      case SATURATED -> ink.fails();
      case CUT_OFF -> ink.quiet();
      case HOT -> ink.risky();
    };
  }

  /** A part of two terminals, drawn along the x axis from one to the other. */
  private void between(SchematicSymbol.Kind kind, Point2D from, Point2D to) {
    double length = from.distance(to);
    AffineTransform before = g2.getTransform();
    g2.translate(from.getX(), from.getY());
    g2.rotate(Math.atan2(to.getY() - from.getY(), to.getX() - from.getX()));
    double middle = length / 2;
    switch (kind) {
      case RESISTOR -> box(middle, UNIT, 0.45 * UNIT, length);
      case CAPACITOR -> capacitor(middle, length);
      case INDUCTOR -> inductor(middle, length);
      case DIODE -> diode(middle, length);
      case CURRENT_SOURCE -> currentSource(middle, length);
      case GENERATOR -> generator(middle, length);
      default -> throw new IllegalArgumentException("no part of two terminals: " + kind);
    }
    g2.setTransform(before);
  }

  private void leads(double start, double end, double length) {
    line(0, 0, start, 0);
    line(end, 0, length, 0);
  }

  private void box(double middle, double half, double high, double length) {
    leads(middle - half, middle + half, length);
    g2.draw(new Rectangle2D.Double(middle - half, -high, 2 * half, 2 * high));
  }

  private void capacitor(double middle, double length) {
    double gap = 0.22 * UNIT;
    leads(middle - gap, middle + gap, length);
    g2.setStroke(THICK);
    line(middle - gap, -0.85 * UNIT, middle - gap, 0.85 * UNIT);
    line(middle + gap, -0.85 * UNIT, middle + gap, 0.85 * UNIT);
  }

  private void inductor(double middle, double length) {
    double radius = 0.35 * UNIT;
    double start = middle - 3 * radius;
    leads(start, middle + 3 * radius, length);
    Path2D coil = new Path2D.Double();
    coil.moveTo(start, 0);
    for (int k = 0; k < 3; k++) {
      double x = start + 2 * radius * k;
      coil.curveTo(x, -1.6 * radius, x + 2 * radius, -1.6 * radius, x + 2 * radius, 0);
    }
    g2.draw(coil);
  }

  private void diode(double middle, double length) {
    double half = 0.55 * UNIT;
    leads(middle - half, middle + half, length);
    Path2D triangle = new Path2D.Double();
    triangle.moveTo(middle - half, -half);
    triangle.lineTo(middle + half, 0);
    triangle.lineTo(middle - half, half);
    triangle.closePath();
    g2.draw(triangle);
    line(middle + half, -half, middle + half, half);
  }

  /** An ideal current source: a circle with a line across (IEC 60617-2). */
  private void currentSource(double middle, double length) {
    double radius = UNIT;
    leads(middle - radius, middle + radius, length);
    g2.draw(new Ellipse2D.Double(middle - radius, -radius, 2 * radius, 2 * radius));
    line(middle, -radius, middle, radius);
    arrow(middle + radius + 0.9 * UNIT, 0, 1, 0);
  }

  private void generator(double middle, double length) {
    double radius = 1.2 * UNIT;
    leads(middle - radius, middle + radius, length);
    g2.draw(new Ellipse2D.Double(middle - radius, -radius, 2 * radius, 2 * radius));
    Path2D wave = new Path2D.Double();
    double wide = 0.7 * UNIT;
    wave.moveTo(middle, wide);
    wave.curveTo(middle - wide, wide / 3, middle + wide, -wide / 3, middle, -wide);
    g2.draw(wave);
  }

  private void amplifier(List<Point2D> terminals) {
    Point2D plus = terminals.get(0);
    Point2D minus = terminals.get(1);
    Point2D out = terminals.get(2);
    double left = plus.getX() + UNIT;
    double top = Math.min(plus.getY(), minus.getY()) - 2 * UNIT;
    double bottom = Math.max(plus.getY(), minus.getY()) + 2 * UNIT;
    double right = out.getX() - UNIT;
    g2.draw(new Rectangle2D.Double(left, top, right - left, bottom - top));
    line(plus.getX(), plus.getY(), left, plus.getY());
    line(minus.getX(), minus.getY(), left, minus.getY());
    line(right, out.getY(), out.getX(), out.getY());
    double sign = 0.4 * UNIT;
    for (Point2D input : List.of(plus, minus)) {
      line(left + sign, input.getY(), left + 3 * sign, input.getY());
    }
    line(left + 2 * sign, plus.getY() - sign, left + 2 * sign, plus.getY() + sign);
  }

  private void transistor(List<Point2D> terminals, boolean npn) {
    Point2D collector = terminals.get(0);
    Point2D base = terminals.get(1);
    Point2D emitter = terminals.get(2);
    double inward = Math.signum(collector.getX() - base.getX());
    double bar = base.getX() + inward * 1.4 * UNIT;
    line(base.getX(), base.getY(), bar, base.getY());
    g2.setStroke(THICK);
    line(bar, base.getY() - 1.2 * UNIT, bar, base.getY() + 1.2 * UNIT);
    g2.setStroke(THIN);
    leg(collector, bar, base.getY());
    double way = leg(emitter, bar, base.getY());
    double fromX = bar;
    double fromY = base.getY() + way * 0.5 * UNIT;
    double toX = emitter.getX();
    double toY = base.getY() + way * 1.7 * UNIT;
    double size = Math.hypot(toX - fromX, toY - fromY);
    double dx = (toX - fromX) / size;
    double dy = (toY - fromY) / size;
    if (npn) {
      arrow(toX - 0.15 * size * dx, toY - 0.15 * size * dy, dx, dy);
    } else {
      arrow(fromX + 0.12 * size * dx, fromY + 0.12 * size * dy, -dx, -dy);
    }
  }

  /** From the bar to a terminal; on which side it lies. */
  private double leg(Point2D terminal, double bar, double middle) {
    double way = Math.signum(terminal.getY() - middle);
    line(bar, middle + way * 0.5 * UNIT, terminal.getX(), middle + way * 1.7 * UNIT);
    line(terminal.getX(), middle + way * 1.7 * UNIT, terminal.getX(), terminal.getY());
    return way;
  }

  /** An arrow's head whose tip stands at a point. */
  private void arrow(double x, double y, double dx, double dy) {
    double length = 0.75 * UNIT;
    double half = 0.28 * UNIT;
    Path2D head = new Path2D.Double();
    head.moveTo(x, y);
    head.lineTo(x - length * dx - half * dy, y - length * dy + half * dx);
    head.lineTo(x - length * dx + half * dy, y - length * dy - half * dx);
    head.closePath();
    g2.fill(head);
  }

  /** Ground, or a bar at which a name stands. */
  void port(SchematicPort port, Point2D at) {
    g2.setColor(ink.lines());
    g2.setStroke(THIN);
    double way = port.down() ? 1 : -1;
    if (port.isGround()) {
      for (int k = 0; k < 3; k++) {
        double half = (0.8 - 0.27 * k) * UNIT;
        double y = at.getY() + way * 0.3 * UNIT * k;
        line(at.getX() - half, y, at.getX() + half, y);
      }
    } else {
      line(at.getX() - 0.7 * UNIT, at.getY(), at.getX() + 0.7 * UNIT, at.getY());
    }
  }

  private void line(double x1, double y1, double x2, double y2) {
    g2.draw(new Line2D.Double(x1, y1, x2, y2));
  }
}
