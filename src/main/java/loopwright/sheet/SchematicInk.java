package loopwright.sheet;

import java.awt.Color;

/**
 * The colours of a schematic.
 *
 * @param lines symbols and wires
 * @param words values and names
 * @param quiet names of nodes, what is cut off
 * @param overlay voltages and currents
 * @param fails what is saturated
 * @param risky what is hot
 */
public record SchematicInk(
    Color lines, Color words, Color quiet, Color overlay, Color fails, Color risky) {
  /** Black on paper. */
  public static final SchematicInk PAPER =
      new SchematicInk(
          Color.BLACK, Color.BLACK, Color.DARK_GRAY, Color.BLACK, Color.BLACK, Color.BLACK);
}
