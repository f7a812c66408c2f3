package loopwright.assembly;

/**
 * How one device differs from its record.
 *
 * @param baseEmitterVoltage more V_BE, or forward voltage of a diode, at the same current, V
 * @param betaRatio a transistor's forward current gain over the record's
 */
public record DeviceDeviation(double baseEmitterVoltage, double betaRatio) {
  /** As its record says. */
  public static final DeviceDeviation NONE = new DeviceDeviation(0, 1);

  /** Checks that such a transistor can exist. */
  public DeviceDeviation {
    if (!Double.isFinite(baseEmitterVoltage) || !(betaRatio > 0)) {
      throw new IllegalArgumentException(
          "found " + baseEmitterVoltage + " V and a ratio of " + betaRatio);
    }
  }
}
