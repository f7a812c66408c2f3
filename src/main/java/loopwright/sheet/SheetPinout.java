package loopwright.sheet;

import java.util.List;
import loopwright.part.Pin;

/**
 * The pins of a type.
 *
 * @param part its name
 * @param diode whether it is a diode, else a transistor
 * @param pins flat face forward, left to right; empty when the record does not say
 * @param designators of the devices that are of this type
 */
public record SheetPinout(String part, boolean diode, List<Pin> pins, List<String> designators) {
  /** Keeps its own copies. */
  public SheetPinout {
    pins = List.copyOf(pins);
    designators = List.copyOf(designators);
  }
}
