package loopwright.sheet;

import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.util.List;

/**
 * A schematic laid out on a grid: what stands where, before anything is drawn.
 *
 * @param symbols parts
 * @param wires straight pieces, each along or across
 * @param ports ends of wires at nodes that are drawn elsewhere too
 * @param dots where wires join
 * @param labels of parts and ports
 * @param nodes names of nodes, for what is laid over them
 */
record SchematicLayout(
    List<SchematicSymbol> symbols,
    List<Line2D> wires,
    List<SchematicPort> ports,
    List<Point2D> dots,
    List<SchematicLabel> labels,
    List<SchematicLabel> nodes) {
  /** Keeps its own copies. */
  SchematicLayout {
    symbols = List.copyOf(symbols);
    wires = List.copyOf(wires);
    ports = List.copyOf(ports);
    dots = List.copyOf(dots);
    labels = List.copyOf(labels);
    nodes = List.copyOf(nodes);
  }
}
