package loopwright.propose;

import loopwright.circuit.Physics;

/** The hand formulas that first values come from. Junctions are at 25 °C. */
final class HandFormulas {
  /** Fall of V_BE with temperature, V/K (textbooks agree on about 2 mV/K). */
  static final double FALL = 2e-3;

  static final double THERMAL_VOLTAGE = Physics.thermalVoltage(Physics.NOMINAL_TEMPERATURE);

  private HandFormulas() {}

  /**
   * What one of two class-B transistors dissipates at the worst amplitude up to a peak, W: V²/(π²R)
   * at 2V/π, else V V_p/(πR) − V_p²/(4R).
   *
   * @param rail V
   * @param peak V
   * @param load Ω
   */
  static double classBDissipation(double rail, double peak, double load) {
    double worst = Math.min(peak, 2 * rail / Math.PI);
    return rail * worst / (Math.PI * load) - worst * worst / (4 * load);
  }

  /** Thermal loop V_CE R_θ κ/(R_E + V_T/I_C); from 1 on it runs away. */
  static double runaway(
      double collectorEmitter, double thermalResistance, double emitterResistance, double current) {
    return collectorEmitter
        * thermalResistance
        * FALL
        / (emitterResistance + THERMAL_VOLTAGE / current);
  }

  /**
   * Emitter resistor that keeps the thermal loop at {@code most}, Ω; not above 0 when none must.
   */
  static double leastEmitterResistance(
      double collectorEmitter, double thermalResistance, double current, double most) {
    return collectorEmitter * thermalResistance * FALL / most - THERMAL_VOLTAGE / current;
  }

  /**
   * Transconductance of the pair to its output, S: of a mirror load g_m, of a resistor load g_m/2,
   * each over 1 + g_m R_E.
   */
  static double pairTransconductance(double tail, double emitterResistance, boolean mirror) {
    double each = tail / 2 / THERMAL_VOLTAGE;
    return (mirror ? each : each / 2) / (1 + each * emitterResistance);
  }

  /** Compensation G_m/(2π f_u NG), F. */
  static double compensation(double transconductance, double unity, double noiseGain) {
    return transconductance / (2 * Math.PI * unity * noiseGain);
  }

  /**
   * Slew rate about balance, V/s: the tail over the capacitance, half of it for a resistor load.
   */
  static double slewRate(double tail, double capacitance, boolean mirror) {
    return (mirror ? tail : tail / 2) / capacitance;
  }

  /** Slew rate over 2π times the unity frequency of the amplifier: 2V_T + I_tail R_E, V. */
  static double slewVoltage(double tail, double emitterResistance) {
    return 2 * THERMAL_VOLTAGE + tail * emitterResistance;
  }

  /** Collector current of least noise with a source, A: V_T √β/R. */
  static double quietCurrent(double beta, double source) {
    return THERMAL_VOLTAGE * Math.sqrt(beta) / source;
  }

  /**
   * Input noise of pair, source and divider, V/√Hz: root of 2·4kT(r_B + R_E + 1/(2 g_m)) + 4kT(R₊ +
   * R₋) + 2q I_B (R₊² + R₋²).
   */
  static double inputNoise(
      double current,
      double beta,
      double baseResistance,
      double emitterResistance,
      double source,
      double divider) {
    double thermal = 4 * Physics.BOLTZMANN * Physics.NOMINAL_TEMPERATURE;
    double shot = 2 * Physics.ELEMENTARY_CHARGE * current / beta;
    return Math.sqrt(
        2 * thermal * (baseResistance + emitterResistance + THERMAL_VOLTAGE / current / 2)
            + thermal * (source + divider)
            + shot * (source * source + divider * divider));
  }

  /** Capacitance whose corner with a resistance lies at a frequency, F: 1/(2π f R). */
  static double corner(double frequency, double resistance) {
    return 1 / (2 * Math.PI * frequency * resistance);
  }
}
