package loopwright.circuit;

/**
 * Limits how far a junction voltage may move in one Newton step. Above the voltage of least radius
 * of curvature, V_crit = n V_T ln(n V_T/(√2 I_S)), the step is taken in current instead: V_new =
 * V_old + n V_T ln(1 + ΔV/(n V_T)) (from memory; common practice since the early nodal programs).
 */
public final class JunctionLimit {
  private JunctionLimit() {}

  /**
   * The voltage to linearise at.
   *
   * @param proposed what the linear solution proposes, V
   * @param previous where the junction was linearised last, V
   * @param emissionVoltage n V_T, V
   * @param criticalVoltage V_crit, V
   */
  public static double limit(
      double proposed, double previous, double emissionVoltage, double criticalVoltage) {
    if (proposed <= criticalVoltage || Math.abs(proposed - previous) <= 2 * emissionVoltage) {
      return proposed;
    }
    if (previous <= 0) {
      return emissionVoltage * Math.log(proposed / emissionVoltage);
    }
    double relative = 1 + (proposed - previous) / emissionVoltage;
    return relative > 0 ? previous + emissionVoltage * Math.log(relative) : criticalVoltage;
  }
}
