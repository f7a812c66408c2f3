package loopwright.circuit;

import loopwright.part.TransistorParameters;

/** Parameters of transistors that hold what a textbook assumes, at a temperature of its choice. */
public final class IdealParts {
  private IdealParts() {}

  /**
   * A transistor without Early effect, knee, recombination, resistances and capacitances.
   *
   * @param saturationCurrent at 25 °C, A
   * @param beta at 25 °C
   */
  public static TransistorParameters transistor(double saturationCurrent, double beta) {
    return TransistorParameters.DEFAULTS
        .withSaturationCurrent(saturationCurrent)
        .withForwardBeta(beta);
  }

  /**
   * One that carries a given current at a given base-emitter voltage and has a given β at the
   * temperature it works at.
   *
   * @param current I_C, A
   * @param baseEmitterVoltage V_BE at that current, V
   * @param beta at the temperature
   * @param kelvin the temperature, K
   */
  public static TransistorParameters carrying(
      double current, double baseEmitterVoltage, double beta, double kelvin) {
    double here = current * Math.exp(-baseEmitterVoltage / Physics.thermalVoltage(kelvin));
    return transistor(
        here / Physics.saturationCurrentFactor(kelvin), beta / Physics.betaFactor(kelvin));
  }

  /**
   * These parameters with a base resistance and a flicker corner.
   *
   * @param resistance r_B, Ω
   * @param corner Hz; 0 for none
   */
  public static TransistorParameters withNoise(
      TransistorParameters p, double resistance, double corner) {
    return new TransistorParameters(
        p.saturationCurrent(),
        p.forwardBeta(),
        p.reverseBeta(),
        p.earlyVoltage(),
        p.kneeCurrent(),
        p.recombinationCurrent(),
        p.recombinationIdeality(),
        resistance,
        p.emitterResistance(),
        p.collectorResistance(),
        p.baseEmitterCapacitance(),
        p.baseCollectorCapacitance(),
        p.transitTime(),
        p.reverseTransitTime(),
        corner);
  }

  /** Temperature at which kT/q is a given voltage, K. */
  public static double kelvinWhere(double thermalVoltage) {
    return thermalVoltage * Physics.ELEMENTARY_CHARGE / Physics.BOLTZMANN;
  }

  /** These parameters with another reverse beta. */
  public static TransistorParameters withReverseBeta(TransistorParameters p, double reverseBeta) {
    return new TransistorParameters(
        p.saturationCurrent(),
        p.forwardBeta(),
        reverseBeta,
        p.earlyVoltage(),
        p.kneeCurrent(),
        p.recombinationCurrent(),
        p.recombinationIdeality(),
        p.baseResistance(),
        p.emitterResistance(),
        p.collectorResistance(),
        p.baseEmitterCapacitance(),
        p.baseCollectorCapacitance(),
        p.transitTime(),
        p.reverseTransitTime(),
        p.flickerCorner());
  }
}
