package loopwright.sheet;

import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.List;

/**
 * A part in a schematic.
 *
 * @param kind what it is
 * @param name the part's path, with what tells it from its twin behind an {@code @}, or the
 *     device's role
 * @param terminals where wires end at it, in grid units: of a two-terminal part from and to, of a
 *     diode anode and cathode, of a transistor collector, base, emitter, of a generator its hot end
 *     and ground, of an amplifier in+, in- and out
 */
record SchematicSymbol(Kind kind, String name, List<Point2D> terminals) {
  /** What a symbol stands for. */
  enum Kind {
    RESISTOR,
    CAPACITOR,
    INDUCTOR,
    DIODE,
    NPN,
    PNP,
    CURRENT_SOURCE,
    GENERATOR,
    AMPLIFIER
  }

  /** Half the width of a two-terminal body, grid units. */
  private static final double HALF = 0.45;

  /** Keeps its own copy. */
  SchematicSymbol {
    terminals = List.copyOf(terminals);
  }

  /** The area that neither wires nor labels may enter: the symbol without its leads. */
  Rectangle2D body() {
    Point2D first = terminals.get(0);
    Point2D second = terminals.get(1);
    switch (kind) {
      case NPN, PNP -> {
        Point2D base = second;
        double inward = Math.signum(first.getX() - base.getX());
        Rectangle2D body =
            new Rectangle2D.Double(base.getX() + inward * 1.2, base.getY() - 1.4, 0, 0);
        body.add(first.getX() - inward * 0.15, base.getY() + 1.4);
        return body;
      }
      case AMPLIFIER -> {
        Point2D out = terminals.get(2);
        Rectangle2D body = new Rectangle2D.Double(first.getX() + 1, first.getY() - 2, 0, 0);
        body.add(out.getX() - 1, second.getY() + 2);
        return body;
      }
      default -> {
        boolean upright = first.getX() == second.getX();
        double along = kind == Kind.CAPACITOR ? 0.25 : kind == Kind.GENERATOR ? 1.5 : 1;
        double across =
            kind == Kind.CAPACITOR
                ? 0.9
                : kind == Kind.GENERATOR || kind == Kind.CURRENT_SOURCE ? 1.2 : HALF;
        double x = (first.getX() + second.getX()) / 2;
        double y = (first.getY() + second.getY()) / 2;
        double wide = upright ? across : along;
        double high = upright ? along : across;
        return new Rectangle2D.Double(x - wide, y - high, 2 * wide, 2 * high);
      }
    }
  }
}
