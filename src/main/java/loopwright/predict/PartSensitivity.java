package loopwright.predict;

import java.util.OptionalDouble;
import loopwright.circuit.Parameter;

/**
 * How a figure changes with one part.
 *
 * @param parameter what of the part changes, and how the change is measured
 * @param name path of a resistor or capacitor, {@code rails.positive} or {@code rails.negative}, or
 *     role of a device; where one path stands for several parts they change together
 * @param slope the figure's unit per unit of the parameter, signed: for one natural logarithm of a
 *     value or current gain, for one volt of a junction voltage; empty where it has none
 * @param method how it was found
 * @param error what the slope may be off by, in its unit: an estimate for differences, 0 where only
 *     rounding is left
 * @param says why there is no slope; empty where there is one
 */
public record PartSensitivity(
    Parameter parameter,
    String name,
    OptionalDouble slope,
    Method method,
    double error,
    String says) {
  /** How a sensitivity is found. */
  public enum Method {
    /** By adjoint solutions, exact to rounding. */
    ADJOINT,
    /** By central differences of whole solutions at two steps, extrapolated (Richardson 1911). */
    DIFFERENCES
  }

  /** Change of the figure for one per cent more, or one millivolt more of a junction voltage. */
  public OptionalDouble perSmallStep() {
    double step = parameter == Parameter.JUNCTION_VOLTAGE ? 1e-3 : 1e-2;
    return slope.isPresent() ? OptionalDouble.of(slope.getAsDouble() * step) : slope;
  }

  /**
   * Change of the figure in per cent for one per cent more, or in shares for one volt more of a
   * junction voltage.
   *
   * @param figure value of the figure, other than 0
   */
  public OptionalDouble relative(double figure) {
    return slope.isPresent() ? OptionalDouble.of(slope.getAsDouble() / figure) : slope;
  }
}
