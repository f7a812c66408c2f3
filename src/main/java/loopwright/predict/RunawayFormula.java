package loopwright.predict;

import loopwright.circuit.Physics;

/**
 * Thermal runaway by hand: a transistor whose bias voltage is held takes κ R_θ V_CE/(R_E + V_T/I_C)
 * times the heat that a first bit of heat gave it. Below 1 it settles, from 1 on it runs away
 * (common practice; a worked case stands in the tests).
 */
public final class RunawayFormula {
  /** Share of the loop that a design should stay below; common practice, no source. */
  public static final double WANTED = 0.5;

  /** Bandgap of silicon in the saturation current's law, V. */
  private static final double BANDGAP = 1.12;

  /** Exponent of the temperature in the same law. */
  private static final double EXPONENT = 3;

  private RunawayFormula() {}

  /**
   * The loop of dissipation and temperature.
   *
   * @param collectorEmitter V_CE, V
   * @param thermalResistance junction to ambient, K/W
   * @param kappa −dV_BE/dT at constant current, V/K
   * @param emitterResistance in series with the emitter, Ω
   * @param thermalVoltage V_T, V
   * @param collectorCurrent I_C, A, above 0
   */
  public static double loop(
      double collectorEmitter,
      double thermalResistance,
      double kappa,
      double emitterResistance,
      double thermalVoltage,
      double collectorCurrent) {
    return collectorEmitter
        * thermalResistance
        * kappa
        / (emitterResistance + thermalVoltage / collectorCurrent);
  }

  /**
   * Least resistance in series with the emitter for which the loop stays at a value, Ω; 0 where
   * none is needed. Arguments as of {@link #loop}.
   */
  public static double leastResistance(
      double collectorEmitter,
      double thermalResistance,
      double kappa,
      double wanted,
      double thermalVoltage,
      double collectorCurrent) {
    return Math.max(
        0,
        collectorEmitter * thermalResistance * kappa / wanted - thermalVoltage / collectorCurrent);
  }

  /**
   * κ = −dV_BE/dT at constant current, V/K, of the saturation current's law T³ exp(−1.12 eV/kT):
   * (1.12 V − V_BE)/T + 3k/q; close to 2 mV/K for silicon.
   *
   * @param baseEmitter V_BE, V
   * @param kelvin junction temperature, K
   */
  public static double kappa(double baseEmitter, double kelvin) {
    return (BANDGAP - baseEmitter) / kelvin + EXPONENT * Physics.thermalVoltage(kelvin) / kelvin;
  }
}
