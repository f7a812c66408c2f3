package loopwright.sheet;

import java.util.List;

/**
 * Equal parts of the list.
 *
 * @param value what is printed on them: a resistance, a capacitance, a type
 * @param what a resistor, a capacitor, npn, pnp, a diode, with tolerance and measured value
 * @param designators of all of them
 */
public record SheetPart(String value, String what, List<String> designators) {
  /** Keeps its own copy. */
  public SheetPart {
    designators = List.copyOf(designators);
  }
}
