package loopwright.sheet;

import java.util.List;

/**
 * A node to measure.
 *
 * @param name of the node
 * @param at what meets there, by designator: {@code Q1 C}
 * @param volts to expect at rest
 * @param ifHigh what to suspect when it reads above its band
 * @param ifLow what to suspect when it reads below
 */
public record SheetNode(String name, List<String> at, Expected volts, String ifHigh, String ifLow) {
  /** Keeps its own copy. */
  public SheetNode {
    at = List.copyOf(at);
  }
}
