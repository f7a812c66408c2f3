package loopwright.circuit;

/**
 * Capacitance of a junction's depletion layer: C₀/(1 − v/ψ)^(1/3) with ψ = 0.7 V below 0.42 V,
 * continued above along its tangent, and its charge, the integral from zero.
 */
public final class DepletionCapacitance {
  private static final double POTENTIAL = 0.7;
  private static final double JOIN = 0.42;
  private static final double JOIN_FACTOR = 1 / Math.cbrt(1 - JOIN / POTENTIAL);
  private static final double JOIN_SLOPE = JOIN_FACTOR / (3 * (POTENTIAL - JOIN));
  private static final double JOIN_CHARGE = chargeBelow(JOIN);

  private DepletionCapacitance() {}

  /** Capacitance per zero-bias capacitance at a junction voltage in V, forward positive. */
  public static double factor(double voltage) {
    return voltage < JOIN
        ? 1 / Math.cbrt(1 - voltage / POTENTIAL)
        : JOIN_FACTOR + JOIN_SLOPE * (voltage - JOIN);
  }

  /** Derivative of {@link #factor} by the junction voltage, 1/V. */
  public static double slope(double voltage) {
    return voltage < JOIN ? factor(voltage) / (3 * (POTENTIAL - voltage)) : JOIN_SLOPE;
  }

  /** Charge per zero-bias capacitance, V, at a junction voltage in V, forward positive. */
  public static double charge(double voltage) {
    if (voltage < JOIN) {
      return chargeBelow(voltage);
    }
    double beyond = voltage - JOIN;
    return JOIN_CHARGE + beyond * (JOIN_FACTOR + 0.5 * JOIN_SLOPE * beyond);
  }

  private static double chargeBelow(double voltage) {
    double root = Math.cbrt(1 - voltage / POTENTIAL);
    return 1.5 * POTENTIAL * (1 - root * root);
  }
}
