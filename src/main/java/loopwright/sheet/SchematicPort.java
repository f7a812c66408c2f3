package loopwright.sheet;

import java.awt.geom.Point2D;

/**
 * The end of a wire at a node that is drawn elsewhere too: a rail, ground, or a name.
 *
 * @param node its name
 * @param at where the wire ends, grid units
 * @param down whether it points downward on the page, else upward
 * @param text what stands at it; empty for ground, whose symbol says it
 */
record SchematicPort(String node, Point2D at, boolean down, String text) {
  /** Whether it is drawn as ground. */
  boolean isGround() {
    return text.isEmpty();
  }
}
