package loopwright.sheet;

import java.awt.geom.Point2D;
import java.util.List;

/**
 * Words in a schematic.
 *
 * @param of the symbol's name, or the node's
 * @param kind what they speak of
 * @param at middle of the block's height, and its left end, middle or right end, grid units
 * @param align which of these
 * @param lines one below the other
 */
record SchematicLabel(String of, Kind kind, Point2D at, Align align, List<String> lines) {
  /** What words speak of. */
  enum Kind {
    PART,
    NODE,
    PORT
  }

  /** Where they stand at their point. */
  enum Align {
    LEFT,
    CENTRE,
    RIGHT
  }

  /** Keeps its own copy. */
  SchematicLabel {
    lines = List.copyOf(lines);
  }
}
