package loopwright.sheet;

import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * What a drawing connects, by its geometry alone: wires join where one ends on another, and where
 * two lie across each other they do not.
 */
final class SchematicNets {
  private static final double CLOSE = 1e-6;

  private final List<Line2D> wires;
  private final int[] net;
  private final List<Point2D> ends = new ArrayList<>();

  SchematicNets(List<SchematicSymbol> symbols, List<Line2D> wires, List<SchematicPort> ports) {
    this.wires = wires;
    this.net = new int[wires.size()];
    for (int k = 0; k < net.length; k++) {
      net[k] = k;
    }
    for (Line2D wire : wires) {
      ends.add(wire.getP1());
      ends.add(wire.getP2());
    }
    symbols.forEach(symbol -> ends.addAll(symbol.terminals()));
    ports.forEach(port -> ends.add(port.at()));
    for (Point2D end : ends) {
      int first = -1;
      for (int k = 0; k < wires.size(); k++) {
        if (on(wires.get(k), end)) {
          if (first >= 0) {
            join(first, k);
          }
          first = k;
        }
      }
    }
  }

  /**
   * The net of a point: the same number for points that are connected; −1 − its place where alone.
   */
  int at(Point2D point) {
    for (int k = 0; k < wires.size(); k++) {
      if (on(wires.get(k), point)) {
        return root(k);
      }
    }
    // Terminals that touch without a wire between them are one place.
    for (int k = 0; k < ends.size(); k++) {
      if (ends.get(k).distance(point) < CLOSE) {
        return -1 - k;
      }
    }
    throw new IllegalArgumentException("nothing ends at " + point);
  }

  /** Where three or more ends meet, a wire that goes through counting twice. */
  List<Point2D> dots() {
    Map<Point2D, Integer> meeting = new LinkedHashMap<>();
    for (Point2D end : ends) {
      meeting.merge(end, 1, Integer::sum);
    }
    List<Point2D> dots = new ArrayList<>();
    meeting.forEach(
        (end, count) -> {
          int through =
              (int)
                  wires.stream()
                      .filter(
                          wire ->
                              on(wire, end)
                                  && wire.getP1().distance(end) > CLOSE
                                  && wire.getP2().distance(end) > CLOSE)
                      .count();
          if (count + 2 * through >= 3) {
            dots.add(end);
          }
        });
    return dots;
  }

  private static boolean on(Line2D wire, Point2D point) {
    return wire.ptSegDist(point) < CLOSE;
  }

  private void join(int one, int other) {
    net[root(one)] = root(other);
  }

  private int root(int wire) {
    int at = wire;
    while (net[at] != at) {
      at = net[at];
    }
    return at;
  }
}
