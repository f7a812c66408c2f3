package loopwright.predict;

import loopwright.circuit.Physics;
import loopwright.part.TransistorParameters;

/**
 * A transistor as hand formulas see it: its currents at rest and a few part values.
 *
 * @param role its role
 * @param state at rest
 * @param parameters at 25 °C
 * @param kelvin junction temperature, K
 */
record HandTransistor(
    String role,
    DeviceState.TransistorState state,
    TransistorParameters parameters,
    double kelvin) {
  /** The transistor of a role. */
  static HandTransistor of(HookupSolution solution, String role) {
    double ambient = Physics.ZERO_CELSIUS + solution.design().surroundings().ambient().value();
    return new HandTransistor(
        role,
        (DeviceState.TransistorState) solution.devices().get(role),
        solution.assembled().models().transistor(role),
        solution.rest().kelvins().getOrDefault(role, ambient));
  }

  /** V_T, V. */
  double thermalVoltage() {
    return Physics.thermalVoltage(kelvin);
  }

  /** I_C, A. */
  double collectorCurrent() {
    return state.collectorCurrent();
  }

  /** I_B, A. */
  double baseCurrent() {
    return state.baseCurrent();
  }

  /** I_E, A. */
  double emitterCurrent() {
    return state.collectorCurrent() + state.baseCurrent();
  }

  /** Whether it carries a current that a technician would call on. */
  boolean conducts() {
    return state.collectorCurrent() > 1e-9 && state.baseCurrent() > 0;
  }

  /** I_C/I_B, or the model's β where it does not conduct. */
  double beta() {
    return conducts()
        ? state.collectorCurrent() / state.baseCurrent()
        : parameters.forwardBeta() * Physics.betaFactor(kelvin);
  }

  /** Transconductance I_C/V_T, S. */
  double transconductance() {
    return collectorCurrent() / thermalVoltage();
  }

  /** r_π = β V_T/I_C, Ω. */
  double inputResistance() {
    return beta() / transconductance();
  }

  /** V_T/I_E, Ω. */
  double emitterResistance() {
    return thermalVoltage() / emitterCurrent();
  }

  /** I_S at the junction temperature, A. */
  double saturationCurrent() {
    return parameters.saturationCurrent() * Physics.saturationCurrentFactor(kelvin);
  }

  /** V_T ln(I/I_S), V, for a collector current in A. */
  double baseEmitterVoltage(double current) {
    return thermalVoltage() * Math.log(current / saturationCurrent());
  }

  /** v_BC at rest between terminals, V; negative in normal operation. */
  double baseCollectorVoltage() {
    return state.baseEmitterVoltage() - state.collectorEmitterVoltage();
  }

  /**
   * Resistance into the collector: r_o (1 + β R_E/(R_source + r_π + R_E)), r_o = (V_A + V_CB)/I_C
   * (from memory, any text on degenerated stages).
   *
   * @param source resistance that the base sees, Ω; may be infinite
   * @param emitter resistance that the emitter sees, Ω
   */
  double collectorResistance(double source, double emitter) {
    double own =
        (parameters.earlyVoltage() - baseCollectorVoltage()) / Math.abs(collectorCurrent());
    if (Double.isInfinite(own)) {
      return own;
    }
    double share = Double.isInfinite(source) ? 0 : emitter / (source + inputResistance() + emitter);
    return own * (1 + beta() * share);
  }
}
