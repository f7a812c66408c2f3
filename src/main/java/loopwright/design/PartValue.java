package loopwright.design;

import java.util.Optional;
import loopwright.quantity.Quantity;

/**
 * The value of a resistor or capacitor: what is printed on it, and where known its own tolerance
 * and what a meter showed. A file may write it as a plain value or as a block of these three.
 *
 * @param value nominal value, Ω or F
 * @param tolerance fraction; absent: the design's general tolerance holds
 * @param measured measured value, Ω or F
 */
public record PartValue(Quantity value, Optional<Quantity> tolerance, Optional<Quantity> measured) {
  /** A value with nothing known beyond it. */
  public static PartValue of(Quantity value) {
    return new PartValue(value, Optional.empty(), Optional.empty());
  }

  /** A value of the program's own making. */
  public static PartValue of(double value) {
    return of(Quantity.of(value));
  }

  /** The value to solve with: the measured one where there is one. */
  public double effective() {
    return measured.orElse(value).value();
  }
}
