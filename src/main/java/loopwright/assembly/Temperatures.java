package loopwright.assembly;

import loopwright.circuit.Physics;
import loopwright.design.Design;

/** Junction temperatures by device role. */
@FunctionalInterface
public interface Temperatures {
  /** Junction temperature of a device, K. */
  double kelvin(String role);

  /** Every junction at ambient. */
  static Temperatures ambient(Design design) {
    double kelvin = Physics.ZERO_CELSIUS + design.surroundings().ambient().value();
    return role -> kelvin;
  }
}
